package org.treadwarm.physics.moisture;

/**
 * Inside surface temperature and its factor, for damp and mould.
 *
 * <p>Source: ISO 13788:2012, 4.3 and 4.4.1 (from memory): Rsi 0.25 m²·K/W on opaque parts for the mould check; below a factor
 * of 0.70 mould is likely in a dwelling at 20 °C and 50 % (the rule of DIN 4108-2, from memory).
 */
public final class SurfaceTemperature {
    /** Surface resistance of the mould check on opaque parts, m²·K/W. */
    public static final double MOULD_FILM = 0.25;

    /** The least factor at which mould is not expected in a dwelling. */
    public static final double LEAST_FACTOR = 0.70;

    private SurfaceTemperature() {}

    /** f_Rsi = (theta_si - theta_e)/(theta_i - theta_e). */
    public static double factor(double surface, double inside, double outside) {
        return (surface - outside) / (inside - outside);
    }

    /**
     * f_Rsi of a plane element = 1 - U' Rsi, with U' built on that same Rsi.
     *
     * @param resistance total resistance with Rsi {@value #MOULD_FILM} in it, m²·K/W
     */
    public static double factorOfPlaneElement(double resistance) {
        return 1 - MOULD_FILM / resistance;
    }
}
