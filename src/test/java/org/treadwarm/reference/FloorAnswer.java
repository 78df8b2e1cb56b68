package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;

/** A room's {@code floor} in the answer, for a room with a heated floor. */
final class FloorAnswer {
    private static final double COLDEST = -60;

    private final JsonNode room;
    private final Network network;
    private final HeatLoss loss;
    private final HeatedFloor floor;
    private final FloorLimits limits;

    FloorAnswer(JsonNode survey, JsonNode room, Network network) {
        this.room = room;
        this.network = network;
        this.loss = new HeatLoss(room, network.couplings());
        this.floor = new HeatedFloor(survey, room);
        this.limits = new FloorLimits(floor);
    }

    ObjectNode at(Conditions conditions) {
        ObjectNode node = JsonNodeFactory.instance.objectNode();
        double required = required(conditions);
        double carrying = limits.governing(conditions).maximumFlux();
        putComparison(node, required, carrying);
        putHoldsDownTo(node);
        putSection(node, floor.section(required, conditions));
        node.put("surfaceBasis", "mean (plane)");
        putSection(node.putObject("atCarryingFlux"), floor.section(carrying, conditions));
        putConstruction(node);
        putLimits(node, conditions, required);
        return node;
    }

    private double required(Conditions conditions) {
        return floor.requiredFlux(loss.total(conditions));
    }

    private void putComparison(ObjectNode node, double required, double carrying) {
        double margin = carrying - required;
        node.put("requiredFlux", required).put("carryingFlux", carrying).put("margin", margin);
        if (required != 0) {
            node.put("marginShare", margin / required);
        }
        node.put("supplement", Math.max(0, -margin * floor.area() - Fields.number(room, "otherHeat", 0)));
        node.put("verdict", margin >= 0 ? "carries" : "carries with supplement");
    }

    private void putHoldsDownTo(ObjectNode node) {
        if (holdsAt(COLDEST)) {
            node.put("holdsDownToReason", "beyond -60");
        } else if (!holdsAt(floor.indoor())) {
            node.put("holdsDownToReason", "never");
        } else {
            node.put("holdsDownTo", Bisection.firstHolding(this::holdsAt, COLDEST, floor.indoor()));
        }
    }

    private boolean holdsAt(double outdoor) {
        Conditions conditions = network.at(outdoor);
        return limits.governing(conditions).maximumFlux() - required(conditions) >= 0;
    }

    private void putSection(ObjectNode node, Section section) {
        node.put("surfaceTemperature", section.surface());
        node.put("heaterTemperature", section.heater());
        node.put("downwardFlux", section.downward());
        node.put("edgeFlux", section.edge());
        node.put("heaterFlux", section.heaterFlux());
        node.put("heaterPower", section.heaterFlux() * floor.area());
    }

    private void putConstruction(ObjectNode node) {
        JsonNode heater = floor.json().path("heater");
        if (heater.has("density")) {
            node.put("installedPower", Fields.number(heater, "density") * floor.area());
        }
        List<OptionalDouble> thicknesses = Stream.concat(
                        floor.above().stream(), Fields.list(floor.json(), "below").stream())
                .map(LayerResistance::thickness)
                .toList();
        if (!thicknesses.isEmpty() && thicknesses.stream().allMatch(OptionalDouble::isPresent)) {
            node.put(
                    "buildUpHeight",
                    thicknesses.stream()
                            .mapToDouble(OptionalDouble::getAsDouble)
                            .sum());
        }
    }

    private void putLimits(ObjectNode node, Conditions conditions, double required) {
        List<Limit> all = limits.at(conditions);
        Optional<Limit> governing = Optional.of(limits.governing(conditions));
        node.putArray("limits");
        for (Limit limit : all) {
            boolean governs = governing.filter(limit::equals).isPresent();
            if (governs) {
                governing = Optional.empty();
            }
            ObjectNode entry = node.withArray("limits").addObject();
            entry.put("name", limit.name()).put("maximumFlux", limit.maximumFlux());
            entry.put("margin", limit.maximumFlux() - required).put("governs", governs);
        }
    }
}
