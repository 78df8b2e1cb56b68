package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.sizing.Plan.PartPlan;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.PartLimit;
import org.treadwarm.sizing.Sizing.PartSizing;
import org.treadwarm.sizing.Sizing.PartState;
import org.treadwarm.survey.Zone;

/** Steps of the parts of a heated floor: the same supply for all, their mean for the floor, and a limit of its own for each. */
final class PartSteps {
    private final Plan plan;
    private final Addresses addresses;
    private final Steps steps;
    private final FloorPlan floor;
    private final String floorAt;

    PartSteps(Plan plan, Addresses addresses, Steps steps, FloorPlan floor) {
        this.plan = plan;
        this.addresses = addresses;
        this.steps = steps;
        this.floor = floor;
        this.floorAt = addresses.pointer(floor.room()) + "/floor";
    }

    void all(FloorSizing answer) {
        whole(floorAt, "/atRequiredFlux");
        whole(floorAt + "/atCarryingFlux", "/atCarryingFlux");
        for (int i = 0; i < answer.parts().size(); i++) {
            part(i, answer.parts().get(i));
        }
    }

    /** What the floor as a whole takes from its parts. */
    private void whole(String here, String state) {
        for (String key : List.of("/surfaceTemperature", "/heaterTemperature")) {
            steps.add(here + key, "warmest-part", "theta", Symbol.all("theta_p", each(state + key)));
        }
        for (String key : List.of("/downwardFlux", "/edgeFlux")) {
            steps.add(
                    here + key,
                    "mean-over-parts",
                    "X",
                    Symbol.all("A_p", each("/area")),
                    Symbol.all("x_p", each(state + key)));
        }
    }

    private List<String> each(String key) {
        return IntStream.range(0, floor.parts().size())
                .mapToObj(i -> Addresses.sizing(floorAt + "/parts/" + i + key))
                .toList();
    }

    private void part(int number, PartSizing answer) {
        PartPlan part = floor.parts().get(number);
        String at = floorAt + "/parts/" + number;
        SectionSteps section = new SectionSteps(addresses, steps, floor, "/parts/" + number);
        steps.add(at + "/area", "area", "A", Symbol.of("A_given", addresses.input(part.area())));
        section.heater(part.spacing());
        if (answer.density().isPresent()) {
            steps.add(
                    at + "/density",
                    "density-of-cable",
                    "p",
                    Symbol.of("p_l", addresses.input(floor.heater().linearPower())),
                    symbol("T", at + "/spacing"));
        }
        state(number, "/atRequiredFlux", "/requiredFlux", answer.atRequiredFlux(), section);
        state(number, "/atCarryingFlux", "/carryingFlux", answer.atCarryingFlux(), section);
        for (int i = 0; i < answer.limits().size(); i++) {
            limit(at + "/limits/" + i, part, answer.limits().get(i), section);
        }
        section.accuracy();
    }

    private void state(int number, String state, String flux, PartState answer, SectionSteps section) {
        String here = floorAt + "/parts/" + number + state;
        flux(number, state, flux, answer);
        section.state(here + "/section", answer.section(), here + "/flux", here);
        if (answer.water().isPresent()) {
            section.split(here + "/water");
        }
        new FloorSteps(plan, addresses, steps, floor)
                .made(here, symbol("q", here + "/flux"), here + "/section/heaterPlane");
    }

    /** The first part makes the mean what it must be; the others have its water, or its power of a metre of cable. */
    private void flux(int number, String state, String flux, PartState answer) {
        String here = floorAt + "/parts/" + number + state;
        if (answer.flux() == 0) {
            steps.add(here + "/flux", "part-gives-nothing", "q_p");
        } else if (number == 0) {
            steps.add(
                    here + "/flux",
                    "mean-of-parts-is-flux",
                    "q_p",
                    symbol("A_p", floorAt + "/parts/0/area"),
                    Symbol.all("A_each", each("/area")),
                    Symbol.all("A_other", others("/area")),
                    Symbol.all("q_other", others(state + "/flux")),
                    symbol("q", floorAt + flux));
        } else if (floor.heater().water()) {
            steps.add(
                    here + "/flux",
                    "same-water",
                    "q_p",
                    Symbol.of("theta_i", addresses.temperature(floor.room())),
                    symbol("s_o", here + "/water/perUpwardFlux"),
                    symbol("s_u", here + "/water/perDownwardFlux"),
                    symbol("q_u", here + "/downwardFlux"),
                    symbol("theta_m", floorAt + "/parts/0" + state + "/section/waterTemperature"));
        } else {
            steps.add(
                    here + "/flux",
                    "same-cable",
                    "q_p",
                    symbol("q_u", here + "/downwardFlux"),
                    symbol("q_e", here + "/edgeFlux"),
                    symbol("T", floorAt + "/parts/" + number + "/spacing"),
                    symbol("q_first", floorAt + "/parts/0" + state + "/heaterFlux"),
                    symbol("T_first", floorAt + "/parts/0/spacing"));
        }
    }

    private List<String> others(String key) {
        List<String> all = each(key);
        return all.subList(1, all.size());
    }

    private void limit(String here, PartPlan part, PartLimit answer, SectionSteps section) {
        boolean already = answer.maximumFlux() == 0;
        boolean bathroom = part.zone() == Zone.BATHROOM && answer.name().startsWith(Limits.SURFACE);
        List<Symbol> symbols = new ArrayList<>();
        if (bathroom) {
            symbols.add(Symbol.of("Delta_theta", TableNumbers.zone(part.zone())));
        } else {
            symbols.add(Symbol.of("theta_max", maximum(part, answer.name())));
            symbols.add(Symbol.of("theta_i", addresses.temperature(floor.room())));
        }
        if (!already) {
            symbols.add(symbol("s_o", here + "/temperature/perUpwardFlux"));
        }
        symbols.add(symbol("s_u", here + "/temperature/perDownwardFlux"));
        symbols.add(symbol("q_u", here + "/downwardFlux"));
        String formula = (bathroom ? "section-bathroom-limit" : "section-limit") + (already ? "-already-reached" : "");
        steps.add(here + "/maximumFlux", formula, "q_max", symbols.toArray(new Symbol[0]));
        section.solved(here + "/downwardFlux");
        section.split(here + "/temperature");
    }

    private String maximum(PartPlan part, String name) {
        if (name.equals(Limits.COVERING)) {
            return addresses.input(floor.maximumSurface());
        }
        return floor.layerLimits().stream()
                .filter(limit -> name.equals(Limits.LAYER + limit.name()))
                .findFirst()
                .map(limit -> addresses.input(limit.maximum()))
                .orElseGet(() -> TableNumbers.zone(part.zone()));
    }

    private static Symbol symbol(String name, String pointer) {
        return Symbol.of(name, Addresses.sizing(pointer));
    }
}
