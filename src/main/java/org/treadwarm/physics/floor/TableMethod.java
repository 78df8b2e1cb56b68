package org.treadwarm.physics.floor;

/**
 * Closed forms of the standard's table method for warm-water floors that the published checks reproduce. A sizing by method 1
 * does not use them: it solves its own balance through the layers.
 *
 * <p>Source: EN 1264-2:2008+A1:2012, clause 6 and annex A (from memory).
 */
public final class TableMethod {
    /** Exchange coefficient of a heated floor, W/(m²·K): EN 1264-2 (from memory). */
    static final double SURFACE = 10.8;

    private TableMethod() {}

    /**
     * Covering factor a_B of types A and C: (1/10.8 + 0.045/1.0)/(1/10.8 + 0.045/lambda_E + R).
     *
     * @param screedConductivity lambda_E, W/(m·K)
     * @param covering R of the covering, m²·K/W
     */
    public static double coveringFactor(double screedConductivity, double covering) {
        return (1 / SURFACE + 0.045) / (1 / SURFACE + 0.045 / screedConductivity + covering);
    }

    /** Resistance from the pipes up into the room R_o = 1/10.8 + R + s_u/lambda_E, m²·K/W. */
    public static double resistanceUp(double covering, double cover, double screedConductivity) {
        return 1 / SURFACE + covering + cover / screedConductivity;
    }

    /** Downward flux q_u = (R_o q + theta_i - theta_u)/R_u, W/m². */
    public static double downwardFlux(
            double resistanceUp, double resistanceDown, double flux, double room, double roomBelow) {
        return (resistanceUp * flux + room - roomBelow) / resistanceDown;
    }

    /** Conversion factor phi = ((theta_F,max - theta_i)/9)^1.1 of the limit curves to another surface overtemperature. */
    public static double limitConversion(double overtemperature) {
        return Math.pow(overtemperature / 9, HeatedFloor.EXPONENT);
    }
}
