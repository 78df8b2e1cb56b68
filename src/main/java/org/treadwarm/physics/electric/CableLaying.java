package org.treadwarm.physics.electric;

import org.treadwarm.physics.Require;

/**
 * Spacing, density and length of a heating cable laid in parallel runs.
 *
 * <p>Source: definitions.
 */
public final class CableLaying {
    private CableLaying() {}

    /**
     * Spacing of the runs that makes a density: (W/m)/(W/m²), m.
     *
     * @param powerPerMetre W/m
     * @param density W/m²
     */
    public static double spacing(double powerPerMetre, double density) {
        return Require.positive("power per metre", powerPerMetre) / Require.positive("density", density);
    }

    /**
     * Density that a spacing makes, W/m².
     *
     * @param powerPerMetre W/m
     * @param spacing m
     */
    public static double density(double powerPerMetre, double spacing) {
        return Require.positive("power per metre", powerPerMetre) / Require.positive("spacing", spacing);
    }

    /**
     * Length of cable in an area, m.
     *
     * @param area m²
     * @param spacing m
     */
    public static double length(double area, double spacing) {
        return Require.positive("area", area) / Require.positive("spacing", spacing);
    }
}
