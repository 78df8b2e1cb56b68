package org.treadwarm.physics.water;

import org.treadwarm.physics.Require;

/**
 * The inside of a pipe.
 *
 * @param innerDiameter m
 * @param roughness eps, m, at least 0
 */
public record Tube(double innerDiameter, double roughness) {
    /** Roughness of plastic and copper pipes, m: common practice, no source. */
    public static final double SMOOTH = 7e-6;

    public Tube {
        Require.positive("inner diameter of the pipe", innerDiameter);
        Require.within("roughness of the pipe", roughness, 0, 0.05 * innerDiameter);
    }

    /** A plastic or copper pipe. */
    public static Tube smooth(double innerDiameter) {
        return new Tube(innerDiameter, SMOOTH);
    }

    /**
     * Flow through the pipe.
     *
     * @param velocity mean velocity u, m/s
     * @param reynolds Re = rho u d/mu
     * @param friction Darcy friction factor f
     * @param pressureGradient f/d rho u²/2, Pa/m
     */
    public record Flow(double velocity, double reynolds, double friction, double pressureGradient) {}

    /** Cross-section, m². */
    public double section() {
        return Math.PI / 4 * innerDiameter * innerDiameter;
    }

    /** Water in so many metres of pipe, m³. */
    public double content(double length) {
        return section() * length;
    }

    /**
     * Flow of a carrier (Darcy and Weisbach).
     *
     * @param massFlow kg/s, above 0
     * @param temperature of the carrier, degrees Celsius
     */
    public Flow flow(double massFlow, HeatCarrier carrier, double temperature) {
        double density = carrier.density(temperature);
        double velocity = Require.positive("mass flow", massFlow) / (density * section());
        double reynolds = density * velocity * innerDiameter / carrier.dynamicViscosity(temperature);
        double friction = PipeFriction.factor(reynolds, roughness / innerDiameter);
        return new Flow(velocity, reynolds, friction, friction / innerDiameter * density * velocity * velocity / 2);
    }
}
