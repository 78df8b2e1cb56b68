package org.treadwarm.physics.moisture;

/**
 * Saturation pressure of water vapour and its inverse.
 *
 * <p>Source: ISO 13788:2012, annex E (from memory), within 0.13 % of the CRC Handbook's table from 0 to 30 °C.
 */
public final class WaterVapour {
    private static final double AT_ZERO = 610.5;

    private WaterVapour() {}

    /** Saturation pressure in Pa at a temperature in degrees Celsius; over ice below 0 °C. */
    public static double saturationPressure(double temperature) {
        return temperature >= 0
                ? AT_ZERO * Math.exp(17.269 * temperature / (237.3 + temperature))
                : AT_ZERO * Math.exp(21.875 * temperature / (265.5 + temperature));
    }

    /**
     * Temperature in degrees Celsius at which vapour of this pressure is saturated: the dew point.
     *
     * @param pressure Pa, more than 0
     */
    public static double saturationTemperature(double pressure) {
        double x = Math.log(pressure / AT_ZERO);
        return pressure >= AT_ZERO ? 237.3 * x / (17.269 - x) : 265.5 * x / (21.875 - x);
    }

    /** Dew point in degrees Celsius of air at a temperature and a relative humidity (0 to 1, more than 0). */
    public static double dewPoint(double temperature, double relativeHumidity) {
        return saturationTemperature(relativeHumidity * saturationPressure(temperature));
    }
}
