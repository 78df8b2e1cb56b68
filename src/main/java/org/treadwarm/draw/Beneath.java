package org.treadwarm.draw;

import java.util.OptionalDouble;

/**
 * What lies under a heated floor.
 *
 * @param kind how it is drawn
 * @param name what it is called
 * @param temperature its temperature in °C, if known
 */
public record Beneath(Kind kind, String name, OptionalDouble temperature) {
    /** What there can be under a floor. */
    public enum Kind {
        GROUND,
        ROOM,
        OUTDOORS
    }

    /** @throws IllegalArgumentException if the temperature cannot be drawn */
    public Beneath {
        temperature.ifPresent(degrees -> Checks.temperature("Temperature beneath", degrees));
    }

    String words() {
        return temperature.isPresent() ? name + ", " + Figures.celsius(temperature.getAsDouble()) : name;
    }
}
