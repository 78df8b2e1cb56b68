package org.treadwarm.physics.water;

import org.treadwarm.physics.Require;

/**
 * Temperatures and flow of the heating water of a floor.
 *
 * <p>Source: EN 1264-2 (logarithmic mean), EN 1264-3 (supply temperature, flow), from memory.
 */
public final class HeatingWater {
    private HeatingWater() {}

    /**
     * Logarithmic mean overtemperature of the water dT_H = (V - R)/ln((V - i)/(R - i)), K.
     *
     * @throws IllegalArgumentException unless supply is at least return, and return above the room
     */
    public static double meanOvertemperature(double supply, double returning, double room) {
        double coldest = Require.positive("overtemperature of the return", returning - room);
        double spread = Require.within("spread", supply - returning, 0, Double.MAX_VALUE);
        return spread == 0 ? coldest : spread / Math.log1p(spread / coldest);
    }

    /**
     * Supply overtemperature that makes a mean overtemperature with a spread, exactly: sigma/(1 - exp(-sigma/dT_H)), K.
     *
     * @param mean dT_H, K, above 0
     * @param spread sigma, supply less return, K, at least 0
     */
    public static double supplyOvertemperature(double mean, double spread) {
        Require.positive("mean overtemperature of the water", mean);
        Require.within("spread", spread, 0, Double.MAX_VALUE);
        return spread == 0 ? mean : mean * ratio(spread / mean);
    }

    /**
     * The standard's rule for the same: dT_H + sigma/2, and sigma²/(12 dT_H) more where sigma/dT_H is above 0.5, K. Up to there
     * it falls short of the exact value by as much as 2 %.
     */
    public static double supplyOvertemperatureByRule(double mean, double spread) {
        Require.positive("mean overtemperature of the water", mean);
        Require.within("spread", spread, 0, Double.MAX_VALUE);
        double linear = mean + spread / 2;
        return spread / mean > 0.5 ? linear + spread * spread / (12 * mean) : linear;
    }

    /**
     * Spread with which a supply overtemperature makes a mean overtemperature, K: the exact inverse of {@link
     * #supplyOvertemperature}, by Newton's method from above on a convex function.
     *
     * @param mean dT_H, K, above 0
     * @param supply supply overtemperature, K, at least the mean
     */
    public static double spread(double mean, double supply) {
        Require.positive("mean overtemperature of the water", mean);
        double target = Require.within("supply overtemperature", supply, mean, Double.MAX_VALUE) / mean;
        double excess = target - 1;
        if (excess < 1e-5) {
            // The series of the inverse; Newton's slope would be a difference of nearly equal numbers.
            return mean * excess * (2 + excess * (-2.0 / 3 + excess * 4 / 9));
        }
        // Both bounds lie above the root: x/(1 - exp(-x)) is more than x, and more than 1 + x/2.
        double x = Math.min(target, 2 * excess);
        while (true) {
            double decay = -Math.expm1(-x);
            double slope = (decay - x * (1 - decay)) / (decay * decay);
            double next = x - (x / decay - target) / slope;
            if (!(next < x * (1 - 1e-15))) {
                return x * mean;
            }
            x = next;
        }
    }

    private static double ratio(double x) {
        return x / -Math.expm1(-x);
    }

    /**
     * Mass flow of a floor's water: A q/(sigma c) (1 + R_o/R_u + (theta_i - theta_u)/(q R_u)), kg/s; the bracket is the heat
     * made, upward and downward, over the upward heat.
     *
     * @param area heated area A, m²
     * @param flux upward flux q, W/m², above 0
     * @param spread sigma, K, above 0
     * @param specificHeat c, J/(kg·K)
     * @param resistanceUp R_o from the pipes up into the room, m²·K/W
     * @param resistanceDown R_u from the pipes down into the space below, m²·K/W
     * @param room theta_i, degrees Celsius
     * @param roomBelow theta_u, degrees Celsius
     */
    public static double massFlow(
            double area,
            double flux,
            double spread,
            double specificHeat,
            double resistanceUp,
            double resistanceDown,
            double room,
            double roomBelow) {
        Require.positive("heated area", area);
        Require.positive("upward flux", flux);
        Require.positive("resistance upward", resistanceUp);
        Require.positive("resistance downward", resistanceDown);
        double whole = 1 + resistanceUp / resistanceDown + (room - roomBelow) / (flux * resistanceDown);
        return massFlow(area * flux * whole, spread, specificHeat);
    }

    /** Mass flow that carries a heat with a spread: heat/(sigma c), kg/s. */
    public static double massFlow(double heat, double spread, double specificHeat) {
        return Require.positive("heat of the water", heat)
                / (Require.positive("spread", spread) * Require.positive("specific heat capacity", specificHeat));
    }
}
