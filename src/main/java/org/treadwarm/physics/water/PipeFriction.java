package org.treadwarm.physics.water;

import org.treadwarm.physics.Require;

/**
 * Darcy friction factor of a round pipe: 64/Re below Re 2300, Colebrook and White from there on, with no blending between, so
 * that it jumps there.
 *
 * <p>Source: Hagen and Poiseuille; Colebrook 1939, in the form read in Clamond 2009, "Efficient Resolution of the Colebrook
 * Equation"; Haaland 1983 (from memory).
 */
public final class PipeFriction {
    /** Reynolds number below which the flow is taken as laminar. */
    public static final double LAMINAR_BELOW = 2300;

    private static final int STEPS = 100;
    private static final double ROUGHEST = 0.05;

    private PipeFriction() {}

    /**
     * Friction factor at a Reynolds number.
     *
     * @param reynolds Re, above 0
     * @param relativeRoughness roughness over inner diameter, 0 to 0.05
     */
    public static double factor(double reynolds, double relativeRoughness) {
        return Require.positive("Reynolds number", reynolds) < LAMINAR_BELOW
                ? 64 / reynolds
                : colebrook(reynolds, relativeRoughness);
    }

    /**
     * Colebrook's factor, to the last digits: the root x = 1/sqrt(f) of x + 2 lg(eps/(3.7 d) + 2.51 x/Re) by Newton's method,
     * which climbs to it from below as the left side is concave.
     */
    public static double colebrook(double reynolds, double relativeRoughness) {
        double x = 1 / Math.sqrt(haaland(reynolds, relativeRoughness));
        for (int step = 0; step < STEPS; step++) {
            double inside = relativeRoughness / 3.7 + 2.51 * x / reynolds;
            double excess = x + 2 * Math.log10(inside);
            double slope = 1 + 2 / Math.log(10) * 2.51 / reynolds / inside;
            double change = excess / slope;
            x -= change;
            if (Math.abs(change) <= 1e-15 * x) {
                return 1 / (x * x);
            }
        }
        throw new IllegalStateException(
                "no friction factor found for Re " + reynolds + ", relative roughness " + relativeRoughness);
    }

    /** Haaland's explicit approximation of Colebrook's factor, within 2 %: 1/sqrt(f) = -1.8 lg((eps/(3.7 d))^1.11 + 6.9/Re). */
    public static double haaland(double reynolds, double relativeRoughness) {
        Require.within("Reynolds number", reynolds, 1000, 1e9);
        Require.within("relative roughness", relativeRoughness, 0, ROUGHEST);
        double root = -1.8 * Math.log10(Math.pow(relativeRoughness / 3.7, 1.11) + 6.9 / reynolds);
        return 1 / (root * root);
    }
}
