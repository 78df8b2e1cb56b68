package org.treadwarm.physics.warmup;

import java.util.function.DoubleUnaryOperator;

/**
 * The state that stays: what comes in goes out, and the mass is as warm as the air. It follows from resistances alone, without the
 * grid.
 */
final class SteadyState {
    private SteadyState() {}

    /** Heat of the heater that keeps the air at a temperature, W/m²; negative where it would have to cool. */
    static double densityHolding(BuildUp floor, Room room, double temperature) {
        return density(floor, temperature, room.steadyLoss(temperature));
    }

    /** Air temperature that a density comes to, degrees Celsius. */
    static double airTemperature(BuildUp floor, Room room, double density) {
        double low = room.outdoorTemperature();
        double high = low;
        double width = 1;
        while (densityHolding(floor, room, low) > density) {
            low -= width;
            width *= 2;
        }
        width = 1;
        while (densityHolding(floor, room, high) < density) {
            high += width;
            width *= 2;
        }
        return root(low, high, temperature -> densityHolding(floor, room, temperature) - density);
    }

    /** Flux given to a room that is kept at a temperature, W/m²: the root of q + downward flux(q) = density. */
    static double upwardFlux(BuildUp floor, double temperature, double density) {
        double low = density;
        double high = density;
        double width = 1;
        while (density(floor, temperature, low) > density) {
            low -= width;
            width *= 2;
        }
        width = 1;
        while (density(floor, temperature, high) < density) {
            high += width;
            width *= 2;
        }
        return root(low, high, flux -> density(floor, temperature, flux) - density);
    }

    /** Fills in the temperatures of the nodes at an air temperature that stays. */
    static void fill(Chain chain, BuildUp floor, Room room, double temperature, double[] temperatures) {
        double flux = room.steadyLoss(temperature);
        temperatures[chain.air] = temperature;
        temperatures[chain.mass] = temperature;
        double passed = temperature + floor.film().overtemperature(flux);
        temperatures[chain.surface] = passed;
        double[] conductance = chain.conductance();
        for (int i = chain.surface - 1; i >= chain.heater; i--) {
            passed += flux / conductance[i];
            temperatures[i] = passed;
        }
        double down = downwardFlux(floor, passed);
        for (int i = chain.heater - 1; i >= 0; i--) {
            passed -= down / conductance[i];
            temperatures[i] = passed;
        }
    }

    private static double density(BuildUp floor, double temperature, double flux) {
        double heater = temperature + floor.film().overtemperature(flux) + flux * floor.resistanceAbove();
        return flux + downwardFlux(floor, heater);
    }

    private static double downwardFlux(BuildUp floor, double heaterTemperature) {
        if (floor.underside() instanceof Underside.Exchange below) {
            return (heaterTemperature - below.temperature()) / (floor.resistanceBelow() + 1 / below.coefficient());
        }
        return 0;
    }

    /** Root of a rising function by bisection down to neighbouring doubles. */
    private static double root(double low, double high, DoubleUnaryOperator rising) {
        double from = low;
        double to = high;
        while (true) {
            double middle = from + (to - from) / 2;
            if (middle <= from || middle >= to) {
                return middle;
            }
            if (rising.applyAsDouble(middle) < 0) {
                from = middle;
            } else {
                to = middle;
            }
        }
    }
}
