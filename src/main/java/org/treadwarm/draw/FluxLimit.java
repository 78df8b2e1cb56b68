package org.treadwarm.draw;

/**
 * One limit of a floor's upward heat flux.
 *
 * @param name what sets the limit
 * @param maximumFlux most it allows in W/m²
 * @param governs whether it is the limit that decides
 */
public record FluxLimit(String name, double maximumFlux, boolean governs) {
    /** @throws IllegalArgumentException if the flux cannot be drawn */
    public FluxLimit {
        Checks.drawable("Limit", maximumFlux);
    }
}
