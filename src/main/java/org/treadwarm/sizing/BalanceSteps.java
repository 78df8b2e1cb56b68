package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;
import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.sizing.Plan.LinkKind;
import org.treadwarm.sizing.Plan.PathRef;
import org.treadwarm.sizing.Plan.RoomIndexes;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.SpaceSizing;

/** Steps of what the paths of a room add up to, and of what holds a floating space in balance. */
final class BalanceSteps {
    private final Plan plan;
    private final Addresses addresses;
    private final Steps steps;

    BalanceSteps(Plan plan, Addresses addresses, Steps steps) {
        this.plan = plan;
        this.addresses = addresses;
        this.steps = steps;
    }

    void room(int node, RoomSizing answer) {
        String loss = addresses.pointer(node) + "/heatLoss";
        steps.add(
                addresses.pointer(node) + "/indoorTemperature",
                "indoor-temperature",
                "theta_i",
                Symbol.of("theta_given", addresses.input(plan.nodeTemperature[node])));
        steps.add(
                loss + "/total",
                "room-heat-loss",
                "phi_HL",
                Symbol.of("phi_T", Addresses.sizing(loss + "/transmission")),
                Symbol.of("phi_psi", Addresses.sizing(loss + "/junctions")),
                Symbol.of("phi_V", Addresses.sizing(loss + "/air")),
                Symbol.of("phi_RH", Addresses.sizing(loss + "/reheat")));
        sum(loss + "/transmission", "transmission-heat-loss", node, this::isTransmission);
        sum(loss + "/junctions", "junction-heat-loss", node, path -> kind(path) == LinkKind.JUNCTION);
        sum(loss + "/air", "air-heat-loss", node, path -> kind(path) == LinkKind.AIR);
        RoomIndexes room = plan.roomIndexes[node];
        if (answer.floor().warmup().isPresent()) {
            String floor = addresses.pointer(node) + "/floor";
            steps.add(
                    loss + "/reheat",
                    "reheat-computed",
                    "phi_RH",
                    Symbol.of("q_RH", Addresses.sizing(floor + "/warmup/reheatFlux")),
                    Symbol.of("A_F", Addresses.sizing(floor + "/area")));
        } else {
            steps.add(
                    loss + "/reheat",
                    "reheat",
                    "phi_RH",
                    Symbol.of("q_RH", addresses.input(room.reheat())),
                    Symbol.of("A", addresses.input(room.floorArea())));
        }
        sum(
                loss + "/gainsFromNeighbours",
                "gains-from-neighbours",
                node,
                path -> isTransmission(path) && addresses.other(path) < plan.outdoors);
        if (answer.fromFloorAbove().isPresent()) {
            fromFloorAbove(node);
        }
    }

    private void sum(String at, String formula, int node, Predicate<PathRef> chosen) {
        steps.add(at, formula, "phi_sum", Symbol.all("phi", values(node, "/heatFlow", chosen)));
    }

    void space(int node, SpaceSizing answer) {
        Predicate<PathRef> all = path -> true;
        Predicate<PathRef> outdoors = path -> addresses.other(path) == plan.outdoors;
        Predicate<PathRef> floating = path -> addresses.floats(addresses.other(path));
        Symbol conductances = Symbol.all("H", values(node, "/conductance", all));
        steps.add(
                addresses.pointer(node) + "/temperature",
                "space-temperature",
                "theta_u",
                conductances,
                Symbol.all("theta_j", others(node, all)));
        List<String> factors = new ArrayList<>();
        for (PathRef path : plan.paths[node]) {
            if (floating.test(path)) {
                factors.add(Addresses.sizing(addresses.pointer(addresses.other(path)) + "/temperatureFactor"));
            }
        }
        steps.add(
                addresses.pointer(node) + "/temperatureFactor",
                "space-temperature-factor",
                "b_u",
                conductances,
                Symbol.all("H_e", values(node, "/conductance", outdoors)),
                Symbol.all("H_j", values(node, "/conductance", floating)),
                Symbol.all("b_j", factors));
        if (answer.fromFloorAbove().isPresent()) {
            fromFloorAbove(node);
        }
    }

    private void fromFloorAbove(int node) {
        List<String> fluxes = new ArrayList<>();
        List<String> areas = new ArrayList<>();
        for (FloorPlan floor : plan.floors) {
            if (floor != null && floor.other() == node) {
                String at = addresses.pointer(floor.room()) + "/floor";
                fluxes.add(Addresses.sizing(at + "/downwardFlux"));
                areas.add(Addresses.sizing(at + "/area"));
            }
        }
        steps.add(
                addresses.pointer(node) + "/fromFloorAbove",
                "heat-of-the-floors-above",
                "phi_o",
                Symbol.all("q_u", fluxes),
                Symbol.all("A_F", areas));
    }

    private List<String> values(int node, String key, Predicate<PathRef> chosen) {
        List<String> values = new ArrayList<>();
        for (PathRef path : plan.paths[node]) {
            if (chosen.test(path)) {
                values.add(Addresses.sizing(addresses.path(node, path) + key));
            }
        }
        return values;
    }

    private List<String> others(int node, Predicate<PathRef> chosen) {
        List<String> temperatures = new ArrayList<>();
        for (PathRef path : plan.paths[node]) {
            if (chosen.test(path)) {
                temperatures.add(addresses.temperature(addresses.other(path)));
            }
        }
        return temperatures;
    }

    private LinkKind kind(PathRef path) {
        return plan.links.get(path.link()).kind();
    }

    private boolean isTransmission(PathRef path) {
        return kind(path) == LinkKind.SURFACE || kind(path) == LinkKind.OPENING;
    }
}
