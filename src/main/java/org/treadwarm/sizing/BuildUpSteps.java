package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.Pointer;

/** Steps of a heated floor's layers: their resistances above and below the heater, their height and dead load. */
final class BuildUpSteps {
    private final Plan plan;
    private final Steps steps;
    private final LayerSteps layers;
    private final FloorPlan floor;
    private final HeatedFloor given;
    private final String from;
    private final String at;

    BuildUpSteps(Plan plan, Addresses addresses, Steps steps, FloorPlan floor, HeatedFloor given) {
        this.plan = plan;
        this.steps = steps;
        this.layers = new LayerSteps(addresses, steps);
        this.floor = floor;
        this.given = given;
        this.from = addresses.pointer(floor.room()) + "/heatedFloor";
        this.at = addresses.pointer(floor.room()) + "/floor";
    }

    void all(FloorSizing answer) {
        layers.resistances(from + "/above", at + "/layersAbove", given.above(), HeatFlow.UP);
        layers.resistances(from + "/below", at + "/layersBelow", given.below(), HeatFlow.DOWN);
        steps.add(
                at + "/resistanceAbove",
                "resistances-in-series",
                "R_T",
                Symbol.all("R", LayerSteps.unbridged(plan.stacks.get(floor.above()), at + "/layersAbove")));
        if (answer.buildUpHeight().isPresent()) {
            height();
        }
        if (answer.load().isPresent()) {
            load();
        }
    }

    private void height() {
        List<String> thicknesses = new ArrayList<>();
        visit((layer, pointer) -> thicknesses.add(thickness(layer, pointer)));
        steps.add(at + "/buildUpHeight", "build-up-height", "h", Symbol.all("d", thicknesses));
    }

    private void load() {
        List<String> thicknesses = new ArrayList<>();
        List<String> densities = new ArrayList<>();
        visit((layer, pointer) -> {
            if (layer.density().isPresent() || layer.airGap().isEmpty()) {
                thicknesses.add(thickness(layer, pointer));
                densities.add(density(layer, pointer));
            }
        });
        steps.add(at + "/load", "dead-load", "g", Symbol.all("d", thicknesses), Symbol.all("rho", densities));
    }

    private void visit(Visitor visitor) {
        visit(from + "/above", given.above(), visitor);
        visit(from + "/below", given.below(), visitor);
    }

    private static void visit(String pointer, List<Layer> layers, Visitor visitor) {
        for (int i = 0; i < layers.size(); i++) {
            visitor.layer(layers.get(i), Addresses.survey(Pointer.to(pointer, i)));
        }
    }

    private static String thickness(Layer layer, String given) {
        return given + (layer.thickness().isPresent() ? "/thickness" : "/airGap/thickness");
    }

    private static String density(Layer layer, String given) {
        return layer.density().isPresent()
                ? given + "/density"
                : TableNumbers.density(layer.material().orElseThrow());
    }

    @FunctionalInterface
    private interface Visitor {
        void layer(Layer layer, String pointer);
    }
}
