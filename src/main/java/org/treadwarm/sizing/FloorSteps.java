package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.sizing.Plan.RoomIndexes;
import org.treadwarm.sizing.Sizing.ElectricLayout;
import org.treadwarm.sizing.Sizing.FloorSizing;

/** Steps of a heated floor: what it must give, its margin, its temperatures and fluxes. */
final class FloorSteps {
    private final Plan plan;
    private final Addresses addresses;
    private final Steps steps;
    private final FloorPlan floor;
    private final String room;
    private final String at;

    FloorSteps(Plan plan, Addresses addresses, Steps steps, FloorPlan floor) {
        this.plan = plan;
        this.addresses = addresses;
        this.steps = steps;
        this.floor = floor;
        this.room = addresses.pointer(floor.room());
        this.at = room + "/floor";
    }

    void all(FloorSizing answer) {
        demand();
        margin(answer);
        if (answer.parts().isEmpty()) {
            boolean section = answer.section().isPresent();
            state(at, "/requiredFlux", section ? at + "/section/atRequiredFlux" : "");
            state(at + "/atCarryingFlux", "/carryingFlux", section ? at + "/section/atCarryingFlux" : "");
            answer.section().ifPresent(solved -> new SectionSteps(addresses, steps, floor, "/section").all(solved));
        } else {
            new PartSteps(plan, addresses, steps, floor).all(answer);
            power(at, answered("q", "/requiredFlux"));
            power(at + "/atCarryingFlux", answered("q", "/carryingFlux"));
        }
        if (answer.installedPower().isPresent()) {
            if (!answer.parts().isEmpty()) {
                steps.add(
                        at + "/installedDensity",
                        "mean-over-parts",
                        "X",
                        Symbol.all("A_p", parts(answer, "/area")),
                        Symbol.all("x_p", parts(answer, "/density")));
            } else if (floor.heater().density() == Stack.NONE) {
                steps.add(
                        at + "/installedDensity",
                        "density-of-cable",
                        "p",
                        Symbol.of("p_l", addresses.input(floor.heater().linearPower())),
                        Symbol.of("T", addresses.input(floor.heater().spacing())));
            } else {
                steps.add(
                        at + "/installedDensity",
                        "density-given",
                        "p",
                        Symbol.of("p_given", addresses.input(floor.heater().density())));
            }
            steps.add(
                    at + "/installedPower",
                    "installed-power",
                    "P",
                    answered("p", "/installedDensity"),
                    answered("A_F", "/area"));
        }
    }

    private void demand() {
        RoomIndexes inputs = plan.roomIndexes[floor.room()];
        steps.add(at + "/area", "heated-area", "A_F", Symbol.of("A_given", addresses.input(floor.area())));
        steps.add(
                at + "/requiredHeat",
                "required-heat",
                "phi_F",
                Symbol.of("phi_HL", Addresses.sizing(room + "/heatLoss/total")),
                Symbol.of("a", addresses.input(inputs.allowance())));
        steps.add(
                at + "/requiredFlux",
                "required-flux",
                "q",
                answered("phi_F", "/requiredHeat"),
                answered("A_F", "/area"));
        steps.add(
                at + "/supplement",
                "supplement",
                "phi_out",
                answered("phi_short", "/shortfall"),
                Symbol.of("phi_other", addresses.input(inputs.otherHeat())));
    }

    private void margin(FloorSizing answer) {
        List<String> maxima = new ArrayList<>();
        for (int i = 0; i < answer.limits().size(); i++) {
            maxima.add(Addresses.sizing(at + "/limits/" + i + "/maximumFlux"));
        }
        steps.add(at + "/carryingFlux", "carrying-flux", "q_max", Symbol.all("q_limit", maxima));
        steps.add(at + "/margin", "margin", "m", answered("q_max", "/carryingFlux"), answered("q", "/requiredFlux"));
        if (answer.marginShare().isPresent()) {
            steps.add(
                    at + "/marginShare", "margin-share", "s", answered("m", "/margin"), answered("q", "/requiredFlux"));
        }
        steps.add(at + "/shortfall", "shortfall", "phi_short", answered("m", "/margin"), answered("A_F", "/area"));
        if (answer.holdsDownTo().isPresent() && plan.roomIndexes[floor.room()].setback() != Stack.NONE) {
            steps.add(at + "/holdsDownTo", "holds-down-to-with-setback", "x");
        } else if (answer.holdsDownTo().isPresent()
                && answer.electric().flatMap(ElectricLayout::mats).isPresent()) {
            steps.add(at + "/holdsDownTo", "holds-down-to-with-mats", "x");
        } else if (answer.holdsDownTo().isPresent()) {
            steps.addAgain(
                    at + "/holdsDownTo",
                    "holds-down-to",
                    Symbol.of("q_max", Addresses.again(at + "/carryingFlux")),
                    Symbol.of("q", Addresses.again(at + "/requiredFlux")));
        }
    }

    private List<String> parts(FloorSizing answer, String key) {
        return IntStream.range(0, answer.parts().size())
                .mapToObj(i -> Addresses.sizing(at + "/parts/" + i + key))
                .toList();
    }

    /** Temperatures and fluxes with the floor giving a flux; solved ones come from the state of the section, when it has an address. */
    private void state(String here, String fluxKey, String section) {
        Symbol flux = answered("q", fluxKey);
        Symbol heater = section.isEmpty()
                ? plane(here, flux)
                : Symbol.of("theta_h", Addresses.sizing(section + "/heaterPlane"));
        losses(here, heater);
        power(here, flux);
    }

    /** What the floor, or a part of it, makes at a flux, with its heater plane at an address. */
    void made(String here, Symbol flux, String heaterPlane) {
        losses(here, Symbol.of("theta_h", Addresses.sizing(heaterPlane)));
        heaterFlux(here, flux);
    }

    private void losses(String here, Symbol heater) {
        steps.add(
                here + "/downwardFlux",
                "downward-flux",
                "q_u",
                answered("U_u", "/below/conductance"),
                heater,
                answered("theta_u", "/below/temperature"));
        edge(here + "/edgeFlux", heater);
    }

    private void heaterFlux(String here, Symbol flux) {
        steps.add(
                here + "/heaterFlux",
                "heater-flux",
                "q_h",
                flux,
                Symbol.of("q_u", Addresses.sizing(here + "/downwardFlux")),
                Symbol.of("q_e", Addresses.sizing(here + "/edgeFlux")));
    }

    private void power(String here, Symbol flux) {
        heaterFlux(here, flux);
        steps.add(
                here + "/heaterPower",
                "heater-power",
                "P",
                Symbol.of("q_h", Addresses.sizing(here + "/heaterFlux")),
                answered("A_F", "/area"));
    }

    /** Steps of the plane model; gives its heater plane. */
    private Symbol plane(String here, Symbol flux) {
        Symbol heater = Symbol.of("theta_h", Addresses.sizing(here + "/heaterTemperature"));
        Symbol surface = Symbol.of("theta_F", Addresses.sizing(here + "/surfaceTemperature"));
        steps.add(
                here + "/surfaceTemperature",
                "surface-temperature",
                "theta_F",
                Symbol.of("theta_i", addresses.temperature(floor.room())),
                flux);
        steps.add(
                here + "/heaterTemperature",
                "heater-temperature",
                "theta_h",
                surface,
                flux,
                answered("R_o", "/resistanceAbove"));
        return heater;
    }

    private void edge(String here, Symbol heater) {
        if (floor.edges().isEmpty()) {
            steps.add(here, "no-edge-flux", "q_e");
            return;
        }
        steps.add(
                here,
                "edge-flux",
                "q_e",
                Symbol.all("H_j", edges(at, floor, "/conductance")),
                heater,
                Symbol.all("theta_j", edges(at, floor, "/temperature")),
                answered("A_F", "/area"));
    }

    /** Addresses of a number of every edge. */
    static List<String> edges(String at, FloorPlan floor, String key) {
        List<String> edges = new ArrayList<>();
        for (int i = 0; i < floor.edges().size(); i++) {
            edges.add(Addresses.sizing(at + "/edges/" + i + key));
        }
        return edges;
    }

    private Symbol answered(String name, String key) {
        return Symbol.of(name, Addresses.sizing(at + key));
    }
}
