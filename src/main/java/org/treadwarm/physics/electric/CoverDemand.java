package org.treadwarm.physics.electric;

import org.treadwarm.physics.Require;

/**
 * An area to cover.
 *
 * @param area m²
 * @param requiredDensity power over the whole area, at least this, W/m², 0 or more
 * @param largestDensity power over any covered part, at most this, W/m², at least the required density
 * @param leastSpacing of a cable's runs, m
 */
public record CoverDemand(double area, double requiredDensity, double largestDensity, double leastSpacing) {
    public CoverDemand {
        Require.positive("area", area);
        Require.within("required density", requiredDensity, 0, Double.MAX_VALUE);
        Require.within("largest density", largestDensity, requiredDensity, Double.MAX_VALUE);
        Require.positive("least spacing", leastSpacing);
    }
}
