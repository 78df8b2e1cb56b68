package org.treadwarm.physics.water;

import org.treadwarm.physics.Require;

/**
 * Liquid water at a pressure: IAPWS-IF97 and the IAPWS 2008 viscosity, from 0 to 95 degrees Celsius.
 *
 * @param pressure absolute, 0.1 to 10 MPa, Pa
 */
public record Water(double pressure) implements HeatCarrier {
    private static final double KELVIN = 273.15;
    private static final double HOTTEST = 95;

    public Water {
        Require.within("pressure of the water", pressure, 0.1e6, 10e6);
    }

    /** Water at 0.1 MPa. The pressure of a heating system changes its density by less than 0.02 %. */
    public static Water atAtmosphere() {
        return new Water(0.1e6);
    }

    @Override
    public double density(double temperature) {
        return 1 / LiquidWater.at(kelvin(temperature), pressure).specificVolume();
    }

    @Override
    public double specificHeat(double temperature) {
        return LiquidWater.at(kelvin(temperature), pressure).specificHeat();
    }

    @Override
    public double dynamicViscosity(double temperature) {
        return WaterViscosity.at(kelvin(temperature), density(temperature));
    }

    /** Kinematic viscosity nu, m²/s. */
    public double kinematicViscosity(double temperature) {
        return dynamicViscosity(temperature) / density(temperature);
    }

    private static double kelvin(double temperature) {
        return KELVIN + Require.within("temperature of the water", temperature, 0, HOTTEST);
    }
}
