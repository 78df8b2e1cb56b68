package org.treadwarm.physics.warmup;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BooleanSupplier;

/**
 * Heat beyond the steady heat that brings a room from a setback temperature to its setpoint within a time, at the design day.
 *
 * <p>The start is the state in which the heater keeps the room at the setback temperature, as after a long setback; after a short
 * one the floor and the mass are warmer, so less is needed. The heater is then on at one density throughout, and the answer is
 * the density at which the room's air or operative temperature comes to the setpoint just at the end. No gain but the room's own,
 * no limit of the surface temperature: whoever uses the answer must hold it against those.
 *
 * @param steadyDensity heat of the heater that keeps the room at the setpoint, W/m², at least 0
 * @param neededDensity heat of the heater that reaches it in time, W/m², at least the steady one
 * @param extraDensity the difference of the two, at the heater
 * @param extraHeat the difference of the upward fluxes that the two densities give to a room kept at the setpoint, W/m² of heated
 *     floor: what a heat load must be raised by, so that a floor sized for steady heat has the density needed
 */
public record Reheat(double steadyDensity, double neededDensity, double extraDensity, double extraHeat) {
    /**
     * Computes it; empty when no density up to {@link WarmUp#HIGHEST_DENSITY} is enough, as when the time is shorter than heat
     * takes to pass the layers above the heater.
     *
     * @param setback degrees Celsius, at most the setpoint
     * @param setpoint degrees Celsius
     * @param seconds more than 0
     * @throws IllegalArgumentException when setback is warmer than setpoint, or the time is not more than 0
     */
    public static Optional<Reheat> of(
            BuildUp floor,
            Room room,
            Watched watched,
            double setback,
            double setpoint,
            double seconds,
            BooleanSupplier stopped) {
        Require.positive("time", seconds);
        if (!(setback <= setpoint)) {
            throw new IllegalArgumentException(
                    "setback to " + setback + " °C; it must be at most the setpoint of " + setpoint + " °C");
        }
        WarmUp warmUp = new WarmUp(floor, room);
        double steady = Math.max(0, warmUp.held(setpoint).density());
        OptionalDouble found = warmUp.densityWithin(warmUp.heldByHeating(setback), watched, setpoint, seconds, stopped);
        if (found.isEmpty()) {
            return Optional.empty();
        }
        double needed = Math.max(steady, found.getAsDouble());
        double extraHeat =
                SteadyState.upwardFlux(floor, setpoint, needed) - SteadyState.upwardFlux(floor, setpoint, steady);
        return Optional.of(new Reheat(steady, needed, needed - steady, extraHeat));
    }
}
