package org.treadwarm.physics.water;

/** What carries the heat through the pipes. Temperatures in degrees Celsius. */
public sealed interface HeatCarrier permits Water, PropyleneGlycol {
    /** Density rho, kg/m³. */
    double density(double temperature);

    /** Specific heat capacity c_p, J/(kg·K). */
    double specificHeat(double temperature);

    /**
     * Dynamic viscosity mu, Pa·s.
     *
     * @throws NoPublishedValueException when no published value is known to this program
     */
    double dynamicViscosity(double temperature);
}
