package org.treadwarm.physics.floor;

/**
 * The heated floor as a plane: flux, surface and heater temperatures, and the largest flux that each limit allows.
 *
 * <p>Source: EN 1264-2:2008+A1:2012, clause 4 (basic characteristic q = 8.92 (theta_F - theta_i)^1.1; the formula was read in
 * "Gut geplant ist optimal waermeversorgt", ikz.de). Every flux is in W/m² of heated area, upward.
 */
public final class HeatedFloor {
    /** Coefficient of the basic characteristic. */
    public static final double COEFFICIENT = 8.92;

    /** Exponent of the basic characteristic. */
    public static final double EXPONENT = 1.1;

    private HeatedFloor() {}

    /** Flux given to the room by a surface so much warmer than the room: q = 8.92 dT^1.1; 0 for a colder surface. */
    public static double flux(double overtemperature) {
        return overtemperature > 0 ? COEFFICIENT * Math.pow(overtemperature, EXPONENT) : 0;
    }

    /** Mean surface temperature less room temperature at a flux, K: (q/8.92)^(1/1.1). */
    public static double overtemperature(double flux) {
        return flux > 0 ? Math.pow(flux / COEFFICIENT, 1 / EXPONENT) : 0;
    }

    /** How fast the overtemperature rises with the flux, K per W/m²; for a flux of more than 0. */
    public static double overtemperatureSlope(double flux) {
        return overtemperature(flux) / (EXPONENT * flux);
    }

    /** Temperature at a depth below the surface: theta_F + q R, with R from the surface down to there, m²·K/W. */
    public static double temperatureBelow(double room, double flux, double resistance) {
        return room + overtemperature(flux) + flux * resistance;
    }

    /**
     * Largest flux at which a depth below the surface stays at or below a temperature: the root of theta_F(q) + q R = maximum.
     *
     * @param maximum degrees Celsius
     * @param room degrees Celsius
     * @param resistance from the surface down to that depth, m²·K/W, at least 0
     */
    public static double fluxAtTemperature(double maximum, double room, double resistance) {
        double overtemperature = maximum - room;
        if (overtemperature <= 0) {
            return 0;
        }
        if (resistance == 0) {
            return flux(overtemperature);
        }
        return fluxAtHeater(overtemperature, 0, 1, resistance, flux(overtemperature));
    }

    /**
     * Largest flux that a heater of a given density can give upward: the root in [0, density] of
     * q + loss (theta_h(q) - reference) = density; 0 when the loss alone exceeds the density, the density itself when the floor
     * gains more from below than it loses.
     *
     * @param density heat the heater makes, W/m²
     * @param room room temperature, degrees Celsius
     * @param resistanceAbove layers above the heater plane, m²·K/W
     * @param lossCoefficient downward and edge loss per kelvin of the heater plane, W/(m²·K)
     * @param lossAtRoom downward and edge loss with the heater plane at room temperature, W/m²
     */
    public static double fluxOfDensity(
            double density, double room, double resistanceAbove, double lossCoefficient, double lossAtRoom) {
        double left = density - lossAtRoom;
        if (left <= 0) {
            return 0;
        }
        if (density + lossCoefficient * (temperatureBelow(room, density, resistanceAbove) - room) <= left) {
            return density;
        }
        return fluxAtHeater(left, 1, lossCoefficient, resistanceAbove, density);
    }

    /**
     * Root in (0, highest] of own q + coefficient (overtemperature(q) + q resistance) = target, by Newton's method held inside
     * a bracket that every step narrows.
     */
    private static double fluxAtHeater(
            double target, double own, double coefficient, double resistance, double highest) {
        double low = 0;
        double high = highest;
        double flux = highest;
        for (int step = 0; step < 200; step++) {
            double rise = overtemperature(flux);
            double excess = own * flux + coefficient * (rise + flux * resistance) - target;
            if (excess > 0) {
                high = flux;
            } else {
                low = flux;
            }
            double slope = own + coefficient * (rise / (EXPONENT * flux) + resistance);
            double next = flux - excess / slope;
            if (Math.abs(next - flux) <= 4e-16 * flux) {
                return next;
            }
            if (!(next > low && next < high)) {
                next = (low + high) / 2;
                if (next == low || next == high) {
                    return next;
                }
            }
            flux = next;
        }
        return flux;
    }
}
