package org.treadwarm.physics.warmup;

/**
 * Temperatures and fluxes at one time.
 *
 * @param seconds since the start
 * @param surface temperature of the floor's surface, degrees Celsius
 * @param air degrees Celsius
 * @param mass degrees Celsius
 * @param heater temperature of the heater plane, degrees Celsius
 * @param upwardFlux from the surface to the room, W/m²
 * @param downwardFlux from the lowest layer to what is below, W/m²
 */
public record Moment(
        double seconds,
        double surface,
        double air,
        double mass,
        double heater,
        double upwardFlux,
        double downwardFlux) {}
