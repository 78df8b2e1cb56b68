package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import org.treadwarm.physics.section.Condition;
import org.treadwarm.physics.section.FloorHeater;
import org.treadwarm.physics.section.FloorHeater.HeatingCable;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;
import org.treadwarm.physics.section.FloorLayer;
import org.treadwarm.physics.section.FloorLayer.Resisting;
import org.treadwarm.physics.section.FloorLayer.Solid;
import org.treadwarm.physics.section.FloorResponse;
import org.treadwarm.physics.section.FloorSection;
import org.treadwarm.sizing.Plan.HeaterPlan;
import org.treadwarm.survey.Heater;

/**
 * A heated floor as a section between its cables or pipes, which lie on the topmost layer below the heater and are embedded in the
 * lowest layer above it.
 *
 * @param spacing axis to axis, m
 * @param layers from the finished surface down
 * @param heater the cable with no power, or the pipe with water at 0 °C: what they are heated by is left to the response
 * @param coefficientBelow from the lowest layer to what lies below, W/(m²·K)
 */
record SectionGeometry(double spacing, List<FloorLayer> layers, FloorHeater heater, double coefficientBelow) {
    /** Coefficient between the water and the wall of a pipe, W/(m²·K): turbulent water in a floor's pipes, common practice, no source. */
    static final double WATER_FILM = 2000;

    /** The least resistance between the lowest layer and what lies below, m²·K/W; only rounding makes it matter. */
    private static final double LEAST_BELOW = 1e-3;

    SectionGeometry {
        layers = List.copyOf(layers);
    }

    /** Whether pipes lie in it, and not cables. */
    boolean isWater() {
        return heater instanceof WaterPipe;
    }

    /**
     * Solves it.
     *
     * @throws IllegalArgumentException if it cannot be built
     * @throws IllegalStateException if its error does not fall within the cells allowed
     * @throws java.util.concurrent.CancellationException when asked to give up
     */
    FloorResponse solve(BooleanSupplier stopped, DoubleConsumer progress) {
        Condition.Film film = new Condition.Film(0, coefficientBelow);
        return FloorResponse.of(new FloorSection(spacing, layers, heater, film, film), stopped, progress);
    }

    /** What was made of a floor: its geometry, or why there is none. */
    record Made(Optional<SectionGeometry> geometry, String whyNot) {}

    /** The geometry of a floor whose cables or pipes lie so far apart, m. */
    static Made of(FloorEvaluation floor, Evaluation whole, double spacing) {
        Stack above = whole.plan.stacks.get(floor.plan.above());
        HeaterPlan heater = floor.plan.heater();
        double[] in = whole.in;
        double diameter = value(in, heater.diameter(), heater.water() ? Heater.PIPE_DIAMETER : Heater.CABLE_DIAMETER);
        if (above.layers == 0) {
            return new Made(Optional.empty(), "no layer lies above the heater, so that none can hold it");
        }
        List<FloorLayer> layers = new ArrayList<>();
        for (int i = 0; i < above.layers; i++) {
            layers.add(layer(above, i, in, whole.layerResistance, "layer " + (i + 1) + " above"));
        }
        int holding = above.layers - 1;
        if (!(layers.get(holding) instanceof Solid around)) {
            return new Made(Optional.empty(), "the layer that holds the heater is known by its resistance alone");
        }
        if (around.thickness() < diameter) {
            return new Made(
                    Optional.empty(), "the layer above the heater is thinner than the cable or pipe that lies in it");
        }
        double depth = around.thickness() - diameter / 2;
        FloorHeater embedded = heater.water()
                ? new WaterPipe(
                        holding,
                        depth,
                        diameter,
                        value(in, heater.wallThickness(), Heater.WALL_THICKNESS),
                        value(in, heater.wallConductivity(), Heater.WALL_CONDUCTIVITY),
                        WATER_FILM,
                        0)
                : new HeatingCable(holding, depth, diameter, 0);
        below(floor, whole, layers);
        double rest = Math.max(LEAST_BELOW, floor.resistanceDown - floor.resistanceBelow);
        return new Made(Optional.of(new SectionGeometry(spacing, layers, embedded, 1 / rest)), "");
    }

    private static void below(FloorEvaluation floor, Evaluation whole, List<FloorLayer> layers) {
        Stack below = whole.plan.stacks.get(floor.plan.below());
        if (below.frames > 0) {
            layers.add(new Resisting("layers below, with their framing", floor.resistanceBelow));
            return;
        }
        for (int i = 0; i < below.layers; i++) {
            layers.add(layer(below, i, whole.in, whole.layerResistance, "layer " + (i + 1) + " below"));
        }
    }

    /** A layer of a stack, with its conductivity where it has a thickness and is no air. */
    static FloorLayer layer(Stack stack, int i, double[] in, double[] resistances, String name) {
        double resistance = resistances[stack.first + i];
        if (stack.resistance[i] != Stack.NONE || stack.airGap[i]) {
            return new Resisting(name, resistance);
        }
        double conductivity =
                stack.conductivity[i] == Stack.NONE ? stack.tableConductivity[i] : in[stack.conductivity[i]];
        return new Solid(name, in[stack.thickness[i]], conductivity);
    }

    private static double value(double[] in, int index, double otherwise) {
        return index == Stack.NONE ? otherwise : in[index];
    }
}
