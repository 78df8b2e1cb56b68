package org.treadwarm.physics.air;

/**
 * Heat that moving air carries.
 *
 * <p>Source: EN 12831-1:2017, 6.3.3 (from memory): 0.34 Wh/(m³·K), which is 1.2 kg/m³ at 1020 J/(kg·K); other texts use 0.33.
 */
public final class AirHeat {
    /** Volumetric heat capacity of air at sea level, Wh/(m³·K). */
    public static final double CAPACITY = 0.34;

    private AirHeat() {}

    /**
     * Conductance of an air flow, W/K.
     *
     * @param volumeFlow m³/h
     * @param pressureRatio pressure of the site's air over that at sea level
     */
    public static double conductance(double volumeFlow, double pressureRatio) {
        return CAPACITY * volumeFlow * pressureRatio;
    }

    /**
     * Pressure of the standard atmosphere at an altitude over that at sea level: (1 - 2.25577e-5 z)^5.25588.
     *
     * <p>Source: ISO 2533, standard atmosphere (from memory). The exponent is the pressure's: indoor air at one temperature
     * thins with pressure, not with the standard atmosphere's density, which cools with height.
     *
     * @param altitude m, -430 to 5 000
     */
    public static double pressureRatio(double altitude) {
        return Math.pow(1 - 2.25577e-5 * altitude, 5.25588);
    }
}
