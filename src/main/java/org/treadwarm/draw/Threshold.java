package org.treadwarm.draw;

import java.util.OptionalDouble;

/**
 * A temperature that is waited for or feared.
 *
 * @param name what it is, such as "setpoint" or "frost"
 * @param temperature in °C
 * @param of whose temperature it is held against
 * @param reachedAfter hours until it is reached; empty if it is not within the time drawn
 */
public record Threshold(String name, double temperature, Trace.Place of, OptionalDouble reachedAfter) {
    /** @throws IllegalArgumentException if a number cannot be drawn or it is reached before the start */
    public Threshold {
        Checks.temperature("Threshold", temperature);
        reachedAfter.ifPresent(hours -> Checks.notNegative("Hours until the threshold", hours));
    }
}
