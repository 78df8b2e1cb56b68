package org.treadwarm.physics.water;

import org.treadwarm.physics.Require;

/**
 * Dynamic viscosity of water without the critical enhancement, which matters only near the critical point.
 *
 * <p>Source: IAPWS 2008 formulation for the viscosity of ordinary water substance, equations 10 to 12, tables 1 and 2
 * (coefficients from memory; they reproduce the release's verification values to all their digits).
 */
public final class WaterViscosity {
    private static final double TEMPERATURE = 647.096;
    private static final double DENSITY = 322.0;
    private static final double VISCOSITY = 1e-6;

    private static final double[] DILUTE = {1.67752, 2.20462, 0.6366564, -0.241605};

    /** Rows by the power of (1/T - 1), columns by the power of (density - 1). */
    private static final double[][] RESIDUAL = {
        {5.20094e-1, 2.22531e-1, -2.81378e-1, 1.61913e-1, -3.25372e-2, 0, 0},
        {8.50895e-2, 9.99115e-1, -9.06851e-1, 2.57399e-1, 0, 0, 0},
        {-1.08374, 1.88797, -7.72479e-1, 0, 0, 0, 0},
        {-2.89555e-1, 1.26613, -4.89837e-1, 0, 6.98452e-2, 0, -4.35673e-3},
        {0, 0, -2.57040e-1, 0, 0, 8.72102e-3, 0},
        {0, 1.20573e-1, 0, 0, 0, 0, -5.93264e-4},
    };

    private WaterViscosity() {}

    /**
     * Dynamic viscosity mu, Pa·s.
     *
     * @param kelvin 273.15 to 1173.15 K
     * @param density kg/m³, above 0
     */
    public static double at(double kelvin, double density) {
        double t = Require.within("temperature of the water in kelvin", kelvin, 273.15, 1173.15) / TEMPERATURE;
        double r = Require.positive("density of the water", density) / DENSITY;
        double dilute = 0;
        for (int i = 0; i < DILUTE.length; i++) {
            dilute += DILUTE[i] / Math.pow(t, i);
        }
        double residual = 0;
        for (int i = 0; i < RESIDUAL.length; i++) {
            double row = 0;
            for (int j = RESIDUAL[i].length - 1; j >= 0; j--) {
                row = row * (r - 1) + RESIDUAL[i][j];
            }
            residual += Math.pow(1 / t - 1, i) * row;
        }
        return VISCOSITY * 100 * Math.sqrt(t) / dilute * Math.exp(r * residual);
    }
}
