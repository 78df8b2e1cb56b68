package org.treadwarm.physics.floor;

import org.treadwarm.physics.Require;

/**
 * Limit curve of a floor: the flux at which the hottest point of its surface reaches the largest temperature allowed, q_G = phi
 * B_G (dT_H/phi)^n_G.
 *
 * <p>Source: EN 1264-2, clause 6 (from memory, not read).
 *
 * @param coefficient B_G, W/m² at a surface overtemperature of 9 K, above 0
 * @param exponent n_G, 0 to less than 1
 */
public record LimitCurve(double coefficient, double exponent) {
    public LimitCurve {
        Require.positive("coefficient of the limit curve", coefficient);
        Require.within("exponent of the limit curve", exponent, 0, Math.nextDown(1.0));
    }

    /**
     * Where the limit curve meets the characteristic.
     *
     * @param waterOvertemperature dT_H,G, K
     * @param flux q_G, W/m²
     */
    public record Limit(double waterOvertemperature, double flux) {}

    /**
     * Flux of the curve, W/m².
     *
     * @param waterOvertemperature dT_H, K, above 0
     * @param surfaceOvertemperature theta_F,max - theta_i, K, above 0
     */
    public double flux(double waterOvertemperature, double surfaceOvertemperature) {
        double phi = conversion(surfaceOvertemperature);
        return phi
                * coefficient
                * Math.pow(Require.positive("overtemperature of the water", waterOvertemperature) / phi, exponent);
    }

    /**
     * Intersection with q = K_H dT_H: dT_H,G = phi (B_G/K_H)^(1/(1 - n_G)).
     *
     * @param characteristic K_H, W/(m²·K), above 0
     * @param surfaceOvertemperature theta_F,max - theta_i, K, above 0
     */
    public Limit meets(double characteristic, double surfaceOvertemperature) {
        double ratio = coefficient / Require.positive("coefficient of the characteristic", characteristic);
        double water = conversion(surfaceOvertemperature) * Math.pow(ratio, 1 / (1 - exponent));
        return new Limit(water, characteristic * water);
    }

    private static double conversion(double surfaceOvertemperature) {
        return TableMethod.limitConversion(
                Require.positive("largest overtemperature of the surface", surfaceOvertemperature));
    }
}
