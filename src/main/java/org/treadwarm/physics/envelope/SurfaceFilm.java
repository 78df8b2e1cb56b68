package org.treadwarm.physics.envelope;

/**
 * Surface resistance from its coefficients: Rs = 1/(hc + epsilon hr0).
 *
 * <p>Source: ISO 6946:2017, annex C (from memory). The design films of a sizing come from the table; this formula is what the
 * table was made with, and the published checks hold the two together.
 */
public final class SurfaceFilm {
    private SurfaceFilm() {}

    /** Inside film, m²·K/W: convective coefficient 5.0 up, 2.5 horizontal, 0.7 down. */
    public static double inside(HeatFlow direction, double emissivity, double meanTemperature) {
        double convection = switch (direction) {
            case UP -> 5.0;
            case HORIZONTAL -> 2.5;
            case DOWN -> 0.7;
        };
        return 1 / (convection + emissivity * AirLayer.blackBodyCoefficient(meanTemperature));
    }

    /** Outside film, m²·K/W, for a wind speed in m/s: convective coefficient 4 + 4 v. */
    public static double outside(double windSpeed, double emissivity, double meanTemperature) {
        return 1 / (4 + 4 * windSpeed + emissivity * AirLayer.blackBodyCoefficient(meanTemperature));
    }
}
