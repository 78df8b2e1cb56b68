package org.treadwarm.physics.water;

import org.treadwarm.physics.Require;

/**
 * A part of a heated floor with one spacing: the peripheral strip, the occupied area, or the whole.
 *
 * @param area m²
 * @param spacing T, m
 * @param upwardFlux q, W/m²
 * @param downwardFlux q_u, W/m², at least 0
 */
public record HeatedZone(double area, double spacing, double upwardFlux, double downwardFlux) {
    public HeatedZone {
        Require.positive("area of the zone", area);
        Require.positive("spacing", spacing);
        Require.positive("upward flux", upwardFlux);
        Require.within("downward flux", downwardFlux, 0, Double.MAX_VALUE);
    }

    /** Pipe laid in the zone: area over spacing, m. */
    public double pipeLength() {
        return area / spacing;
    }

    /** Heat that the water leaves in the zone, upward and downward, W. */
    public double heat() {
        return area * (upwardFlux + downwardFlux);
    }
}
