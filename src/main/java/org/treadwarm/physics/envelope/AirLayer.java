package org.treadwarm.physics.envelope;

/**
 * Unventilated air layer between parallel faces.
 *
 * <p>Source: ISO 6946:2017, annex D (from memory): R = 1/(ha + E hr0), with the coefficients for a temperature difference of
 * at most 5 K across the layer. Valid for layers thinner than 0.3 m and than a tenth of their other dimensions.
 */
public final class AirLayer {
    /** Stefan-Boltzmann constant, W/(m²·K⁴): CODATA 2018, 5.670374419e-8. */
    static final double STEFAN_BOLTZMANN = 5.670374419e-8;

    /** Mean temperature of the layer in the standard's table, degrees Celsius. */
    public static final double MEAN_TEMPERATURE = 10;

    private static final double ABSOLUTE_ZERO = -273.15;
    private static final double CONDUCTIVITY_OF_AIR = 0.025;

    private AirLayer() {}

    /**
     * Resistance of the layer, m²·K/W.
     *
     * @param thickness m, more than 0
     * @param direction direction of the heat flow through it
     * @param emissivityInside emissivity of one face, more than 0 to 1
     * @param emissivityOutside emissivity of the other face, more than 0 to 1
     * @param meanTemperature degrees Celsius
     */
    public static double resistance(
            double thickness,
            HeatFlow direction,
            double emissivityInside,
            double emissivityOutside,
            double meanTemperature) {
        double between = 1 / (1 / emissivityInside + 1 / emissivityOutside - 1);
        return 1 / (conductionConvection(thickness, direction) + between * blackBodyCoefficient(meanTemperature));
    }

    /** Radiative coefficient of a black body hr0 = 4 sigma T³, W/(m²·K) (ISO 6946:2017, annex C, from memory). */
    public static double blackBodyCoefficient(double temperature) {
        double absolute = temperature - ABSOLUTE_ZERO;
        return 4 * STEFAN_BOLTZMANN * absolute * absolute * absolute;
    }

    /** Coefficient of conduction and convection ha, W/(m²·K). */
    private static double conductionConvection(double thickness, HeatFlow direction) {
        double convection = switch (direction) {
            case UP -> 1.95;
            case HORIZONTAL -> 1.25;
            case DOWN -> 0.12 * Math.pow(thickness, -0.44);
        };
        return Math.max(convection, CONDUCTIVITY_OF_AIR / thickness);
    }
}
