package org.treadwarm.physics.warmup;

import java.util.OptionalDouble;
import java.util.function.BooleanSupplier;

/**
 * How long a room lasts when the heater fails in steady state.
 *
 * @param secondsToFive until the air is at +5 °C, 0 where it is no warmer from the start; empty when not within the time looked at
 * @param secondsToFreezing until the heater plane is at 0 °C, where water in its pipes may freeze; empty when not within that time
 * @param airInTheEnd temperature of the air at the end of that time, degrees Celsius
 * @param heaterInTheEnd temperature of the heater plane at that time, degrees Celsius
 */
public record PowerCut(
        OptionalDouble secondsToFive, OptionalDouble secondsToFreezing, double airInTheEnd, double heaterInTheEnd) {
    /** Common practice, no source: below it a house is left to be drained. */
    private static final double COLD = 5;

    private static final double FREEZING = 0;

    /**
     * Follows the cooling from the state in which the heater keeps the room at a temperature.
     *
     * @param indoorTemperature degrees Celsius
     * @param seconds how long it is followed, more than 0
     */
    public static PowerCut of(WarmUp warmUp, double indoorTemperature, double seconds, BooleanSupplier stopped) {
        State start = warmUp.heldByHeating(indoorTemperature);
        Moment end = warmUp.curve(start, 0, seconds, 1, stopped).moments().get(1);
        return new PowerCut(
                fall(warmUp, start, Watched.AIR, COLD, seconds, stopped),
                fall(warmUp, start, Watched.HEATER, FREEZING, seconds, stopped),
                end.air(),
                end.heater());
    }

    /** How long a temperature takes to fall to a target; no time where it is there already. */
    private static OptionalDouble fall(
            WarmUp warmUp, State start, Watched watched, double target, double seconds, BooleanSupplier stopped) {
        return warmUp.value(start, watched) <= target
                ? OptionalDouble.of(0)
                : warmUp.waitFor(start, 0, watched, target, seconds, stopped).seconds();
    }
}
