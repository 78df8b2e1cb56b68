package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.sizing.Plan.LayerLimit;
import org.treadwarm.sizing.Sizing.ElectricLayout;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.Limit;
import org.treadwarm.sizing.Sizing.MatLayout;
import org.treadwarm.survey.Zone;

/** Steps of the largest fluxes that a heated floor's limits allow, in the order of the answer: zone, covering, layers, heater. */
final class LimitSteps {
    private static final String MATS_DENSITY = "/electric/mats/meanDensity";

    private final Addresses addresses;
    private final Steps steps;
    private final FloorPlan floor;
    private final Zone zone;
    private final String at;
    private final Symbol room;
    private int next;

    LimitSteps(Addresses addresses, Steps steps, FloorPlan floor, Zone zone) {
        this.addresses = addresses;
        this.steps = steps;
        this.floor = floor;
        this.zone = zone;
        this.at = addresses.pointer(floor.room()) + "/floor";
        this.room = Symbol.of("theta_i", addresses.temperature(floor.room()));
    }

    void all(FloorSizing answer) {
        if (!answer.parts().isEmpty()) {
            parts(answer);
        } else if (answer.section().isPresent()) {
            solved(answer);
        } else {
            plane(answer);
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

    /** Each limit as the mean over the parts when one of them is at it. */
    private void parts(FloorSizing answer) {
        while (next < answer.limits().size()) {
            steps.add(claim(), "part-limit", "q_max");
        }
    }

    private void plane(FloorSizing answer) {
        zone(claim());
        if (floor.maximumSurface() != Stack.NONE) {
            surface(claim(), "covering-limit", addresses.input(floor.maximumSurface()));
        }
        for (LayerLimit limit : floor.layerLimits()) {
            layer(limit, answer.limits().get(next));
        }
        if (floor.heater().hasDensity()) {
            heater(answer.limits().get(next), "/installedDensity", answer.installedDensity());
        }
        if (isNext(answer, Limits.MATS)) {
            heater(answer.limits().get(next), MATS_DENSITY, matsDensity(answer));
        }
    }

    /** Limits of a solved section, in the same order. */
    private void solved(FloorSizing answer) {
        String maximum = TableNumbers.zone(zone);
        if (zone == Zone.BATHROOM) {
            reached(answer, "section-bathroom-limit", Symbol.of("Delta_theta", maximum));
        } else {
            reached(answer, "section-limit", Symbol.of("theta_max", maximum), room);
        }
        if (floor.maximumSurface() != Stack.NONE) {
            reached(answer, "section-limit", Symbol.of("theta_max", addresses.input(floor.maximumSurface())), room);
        }
        for (LayerLimit limit : floor.layerLimits()) {
            if (isNext(answer, Limits.LAYER + limit.name())) {
                reached(answer, "section-limit", Symbol.of("theta_max", addresses.input(limit.maximum())), room);
            }
        }
        if (floor.heater().hasDensity()) {
            density(answer.limits().get(next), "/installedDensity", answer.installedDensity());
        }
        if (isNext(answer, Limits.WATER)) {
            supply(answer);
        }
        if (isNext(answer, Limits.MATS)) {
            density(answer.limits().get(next), MATS_DENSITY, matsDensity(answer));
        }
    }

    private static OptionalDouble matsDensity(FloorSizing answer) {
        return answer.electric()
                .flatMap(ElectricLayout::mats)
                .map(MatLayout::meanDensity)
                .orElse(OptionalDouble.empty());
    }

    private boolean isNext(FloorSizing answer, String name) {
        return next < answer.limits().size() && answer.limits().get(next).name().equals(name);
    }

    /** A limit that a temperature of the section reaches, or has reached without any flux. */
    private void reached(FloorSizing answer, String formula, Symbol... maximum) {
        boolean already = answer.limits().get(next).maximumFlux() == 0;
        String found = at + "/section/limits/" + next;
        List<Symbol> symbols = new ArrayList<>(List.of(maximum));
        if (!already) {
            symbols.add(Symbol.of("s_o", Addresses.sizing(found + "/temperature/perUpwardFlux")));
        }
        symbols.add(Symbol.of("s_u", Addresses.sizing(found + "/temperature/perDownwardFlux")));
        symbols.add(Symbol.of("q_u", Addresses.sizing(found + "/downwardFlux")));
        steps.add(claim(), formula + (already ? "-already-reached" : ""), "q_max", symbols.toArray(new Symbol[0]));
    }

    private void density(Limit answer, String key, OptionalDouble made) {
        String found = at + "/section/limits/" + next;
        Symbol density = answered("p", key);
        if (answer.maximumFlux() == made.orElseThrow()) {
            steps.add(claim(), "heater-limit-nothing-lost", "q_max", density);
            return;
        }
        steps.add(
                claim(),
                answer.maximumFlux() == 0 ? "section-heater-limit-all-lost" : "section-heater-limit",
                "q_max",
                density,
                Symbol.of("q_u", Addresses.sizing(found + "/downwardFlux")),
                Symbol.of("q_e", Addresses.sizing(found + "/edgeFlux")));
    }

    private void supply(FloorSizing answer) {
        Symbol supply = Symbol.of("theta_V", addresses.input(floor.heater().supplyTemperature()));
        Symbol spread = answered("sigma", "/section/spread");
        if (answer.limits().get(next).maximumFlux() == 0) {
            steps.add(claim(), "section-water-limit-too-cold", "q_max");
            return;
        }
        reached(answer, "section-water-limit", supply, spread, room);
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

    private void heater(Limit answer, String key, OptionalDouble made) {
        String here = claim();
        Symbol density = answered("p", key);
        if (answer.maximumFlux() == made.orElseThrow()) {
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
