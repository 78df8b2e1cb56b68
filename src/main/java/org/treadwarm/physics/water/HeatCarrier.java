package org.treadwarm.physics.water;

/** What carries the heat through the pipes. Temperatures in degrees Celsius; those at which it is no liquid are refused. */
public sealed interface HeatCarrier permits Water, PropyleneGlycol {
    /** Density rho, kg/m³. */
    double density(double temperature);

    /** Specific heat capacity c_p, J/(kg·K). */
    double specificHeat(double temperature);

    /** Dynamic viscosity mu, Pa·s. */
    double dynamicViscosity(double temperature);
}
