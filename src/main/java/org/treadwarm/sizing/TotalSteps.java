package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.sizing.Sizing.FloorSizing;

/** Steps of the sums over the rooms and of the floating spaces together. */
final class TotalSteps {
    private final Plan plan;
    private final Addresses addresses;
    private final Steps steps;

    TotalSteps(Plan plan, Addresses addresses, Steps steps) {
        this.plan = plan;
        this.addresses = addresses;
        this.steps = steps;
    }

    void all(Sizing sizing) {
        List<String> losses = new ArrayList<>();
        List<String> powers = new ArrayList<>();
        List<String> areas = new ArrayList<>();
        List<String> installed = new ArrayList<>();
        for (int i = 0; i < plan.rooms; i++) {
            String room = Addresses.sizing(addresses.pointer(i));
            FloorSizing floor = sizing.rooms().get(i).floor();
            losses.add(room + "/heatLoss/total");
            floor.heaterPower().ifPresent(power -> powers.add(room + "/floor/heaterPower"));
            floor.area().ifPresent(area -> areas.add(room + "/floor/area"));
            floor.installedPower().ifPresent(power -> installed.add(room + "/floor/installedPower"));
        }
        sum("/total/heatLoss", losses);
        sum("/total/heaterPower", powers);
        sum("/total/heatedArea", areas);
        if (sizing.total().installedPower().isPresent()) {
            sum("/total/installedPower", installed);
        }
        network();
    }

    private void sum(String at, List<String> rooms) {
        steps.add(at, "sum-over-rooms", "X", Symbol.all("x", rooms));
    }

    private void network() {
        List<String> temperatures = new ArrayList<>();
        List<Symbol> balances = new ArrayList<>();
        for (int i = 0; i < plan.floatingNodes.length; i++) {
            int node = plan.floatingNodes[i];
            temperatures.add(addresses.temperature(node));
            List<String> flows = new ArrayList<>();
            for (int k = 0; k < plan.paths[node].length; k++) {
                flows.add(Addresses.sizing(addresses.path(node, k) + "/heatFlow"));
            }
            balances.add(Symbol.all("phi" + (i + 1), flows));
        }
        steps.add("/network/floatingSpaces", "floating-spaces", "n", Symbol.all("theta_u", temperatures));
        steps.add("/network/residual", "residual", "r", balances.toArray(new Symbol[0]));
    }
}
