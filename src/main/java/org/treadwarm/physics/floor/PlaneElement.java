package org.treadwarm.physics.floor;

import org.treadwarm.physics.Require;

/**
 * Coefficient K_H of floors with plane heating elements (type D): K_H = 6.5 a_B 1.06 a_U.
 *
 * <p>Source: EN 1264-2, clause 6, type D (from memory, not read).
 */
public final class PlaneElement {
    static final double SYSTEM_COEFFICIENT = 6.5;
    private static final double SPACING_FACTOR = 1.06;

    private PlaneElement() {}

    /** Cover factor of types B and D: (1/10.8 + 0.045/1.0)/(1/10.8 + s_u/lambda_E). */
    static double coverFactor(double coverResistance) {
        return (1 / TableMethod.SURFACE + 0.045) / (1 / TableMethod.SURFACE + coverResistance);
    }

    /**
     * K_H, W/(m²·K).
     *
     * @param coverResistance s_u/lambda_E of the layer above the element, m²·K/W, at least 0
     * @param covering R of the covering, m²·K/W, at least 0
     */
    public static double coefficient(double coverResistance, double covering) {
        Require.within("resistance of the cover", coverResistance, 0, Double.MAX_VALUE);
        Require.within("resistance of the covering", covering, 0, Double.MAX_VALUE);
        double bare = SYSTEM_COEFFICIENT * SPACING_FACTOR * coverFactor(coverResistance);
        return bare / (1 + bare * covering);
    }
}
