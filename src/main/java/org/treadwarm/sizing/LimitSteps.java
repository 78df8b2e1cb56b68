package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.sizing.Plan.LayerLimit;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.Limit;
import org.treadwarm.survey.Zone;

/** Steps of the largest fluxes that a heated floor's limits allow, in the order of the answer: zone, covering, layers, heater. */
final class LimitSteps {
    private final Plan plan;
    private final Addresses addresses;
    private final Steps steps;
    private final FloorPlan floor;
    private final Zone zone;
    private final String at;
    private final Symbol room;
    private int next;

    LimitSteps(Plan plan, Addresses addresses, Steps steps, FloorPlan floor, Zone zone) {
        this.plan = plan;
        this.addresses = addresses;
        this.steps = steps;
        this.floor = floor;
        this.zone = zone;
        this.at = addresses.pointer(floor.room()) + "/floor";
        this.room = Symbol.of("theta_i", addresses.temperature(floor.room()));
    }

    void all(FloorSizing answer) {
        zone(claim());
        if (floor.maximumSurface() != Stack.NONE) {
            surface(claim(), "covering-limit", addresses.input(floor.maximumSurface()));
        }
        for (LayerLimit limit : floor.layerLimits()) {
            layer(limit, answer.limits().get(next));
        }
        if (floor.heater().hasDensity()) {
            heater(answer.limits().get(next), answer.installedDensity().orElseThrow());
        }
        for (int i = 0; i < answer.limits().size(); i++) {
            steps.add(
                    at + "/limits/" + i + "/margin",
                    "margin",
                    "m",
                    answered("q_max", "/limits/" + i + "/maximumFlux"),
                    answered("q", "/requiredFlux"));
        }
    }

    /** Pointer of the next limit's flux. */
    private String claim() {
        return at + "/limits/" + next++ + "/maximumFlux";
    }

    private void zone(String here) {
        String maximum = TableNumbers.zone(zone);
        if (zone == Zone.BATHROOM) {
            steps.add(here, "bathroom-limit", "q_max", Symbol.of("Delta_theta", maximum));
        } else {
            surface(here, "zone-limit", maximum);
        }
    }

    private void surface(String here, String formula, String maximum) {
        steps.add(here, formula, "q_max", Symbol.of("theta_max", maximum), room);
    }

    private void layer(LayerLimit limit, Limit answer) {
        String maximum = addresses.input(limit.maximum());
        String here = claim();
        if (answer.maximumFlux() == 0) {
            surface(here, "layer-limit-already-reached", maximum);
            return;
        }
        List<String> above = new ArrayList<>();
        for (int i = 0; i <= limit.layer(); i++) {
            above.add(Addresses.sizing(at + "/layersAbove/" + i + "/resistance"));
        }
        steps.add(here, "layer-limit", "q_max", Symbol.of("theta_max", maximum), room, Symbol.all("R", above));
    }

    private void heater(Limit answer, double made) {
        String here = claim();
        Symbol density = answered("p", "/installedDensity");
        if (answer.maximumFlux() == made) {
            steps.add(here, "heater-limit-nothing-lost", "q_max", density);
            return;
        }
        boolean exhausted = answer.maximumFlux() == 0;
        List<Symbol> symbols = new ArrayList<>(List.of(
                density, room, answered("U_u", "/below/conductance"), answered("theta_u", "/below/temperature")));
        if (!exhausted) {
            symbols.add(answered("R_o", "/resistanceAbove"));
        }
        if (!floor.edges().isEmpty()) {
            symbols.add(Symbol.all("H_j", FloorSteps.edges(at, floor, "/conductance")));
            symbols.add(Symbol.all("theta_j", FloorSteps.edges(at, floor, "/temperature")));
            symbols.add(answered("A_F", "/area"));
        }
        String formula = (exhausted ? "heater-limit-all-lost" : "heater-limit")
                + (floor.edges().isEmpty() ? "" : "-with-edge");
        steps.add(here, formula, "q_max", symbols.toArray(new Symbol[0]));
    }

    private Symbol answered(String name, String key) {
        return Symbol.of(name, Addresses.sizing(at + key));
    }
}
