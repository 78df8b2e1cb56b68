package org.treadwarm.sizing;

import java.util.List;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.sizing.Plan.EdgePlan;
import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.sizing.Plan.GroundPlan;
import org.treadwarm.sizing.Sizing.Below;
import org.treadwarm.sizing.Sizing.FloorSizing;

/** Steps of what a heater plane sees below and at its edge. */
final class BelowSteps {
    private static final String DECK_FILM = TableNumbers.insideFilm(HeatFlow.DOWN);
    private static final String OUTSIDE_FILM = TableNumbers.outsideFilm(HeatFlow.DOWN);

    private final Plan plan;
    private final Addresses addresses;
    private final Steps steps;
    private final LayerSteps layers;
    private final GroundSteps grounds;
    private final FloorPlan floor;
    private final String at;

    BelowSteps(Plan plan, Addresses addresses, Steps steps, FloorPlan floor) {
        this.plan = plan;
        this.addresses = addresses;
        this.steps = steps;
        this.layers = new LayerSteps(addresses, steps);
        this.grounds = new GroundSteps(plan, addresses, steps);
        this.floor = floor;
        this.at = addresses.pointer(floor.room()) + "/floor";
    }

    void all(FloorSizing answer) {
        Below below = answer.below().orElseThrow();
        resistance();
        if (floor.ground() == Stack.NONE) {
            steps.add(
                    at + "/below/conductance",
                    "conductance-below",
                    "U_u",
                    answered("R_u", "/resistanceBelow"),
                    Symbol.of("R_se", film()));
            temperature(at + "/below/temperature", floor.other());
        } else {
            ground(below);
        }
        for (int i = 0; i < floor.edges().size(); i++) {
            EdgePlan edge = floor.edges().get(i);
            steps.add(
                    at + "/edges/" + i + "/conductance",
                    "junction-conductance",
                    "H",
                    Symbol.of("psi", addresses.input(edge.psi())),
                    Symbol.of("l", addresses.input(edge.length())));
            temperature(at + "/edges/" + i + "/temperature", edge.other());
        }
    }

    private String film() {
        return floor.other() == plan.outdoors ? OUTSIDE_FILM : DECK_FILM;
    }

    private void resistance() {
        Stack stack = plan.stacks.get(floor.below());
        String layersBelow = at + "/layersBelow";
        String here = at + "/resistanceBelow";
        if (stack.frames == 0) {
            steps.add(here, "resistances-in-series", "R_T", Symbol.all("R", LayerSteps.unbridged(stack, layersBelow)));
            return;
        }
        boolean onGround = floor.ground() != Stack.NONE;
        List<String> films = onGround ? List.of() : List.of(film());
        layers.limits(at + "/below/upperLimit", at + "/below/lowerLimit", stack, films, layersBelow);
        Symbol upper = answered("R_upper", "/below/upperLimit");
        Symbol lower = answered("R_lower", "/below/lowerLimit");
        if (onGround) {
            steps.add(here, "total-resistance", "R_T", upper, lower);
        } else {
            steps.add(here, "resistance-below-without-film", "R_u", upper, lower, Symbol.of("R_se", film()));
        }
    }

    private void temperature(String here, int node) {
        if (addresses.isFactor(node)) {
            steps.add(
                    here,
                    "temperature-by-factor",
                    "theta_j",
                    Symbol.of("theta_i", addresses.temperature(floor.room())),
                    Symbol.of("b", addresses.input(plan.factor[node])),
                    Symbol.of("theta_e", addresses.outdoors()));
        } else {
            steps.add(here, "temperature-beyond", "theta_j", Symbol.of("theta_there", addresses.temperature(node)));
        }
    }

    private void ground(Below below) {
        GroundPlan ground = plan.grounds.get(floor.ground());
        String here = at + "/below/ground";
        grounds.common(here, ground);
        if (ground.suspended()) {
            suspended();
            return;
        }
        steps.add(
                here + "/equivalentThickness",
                "heated-slab-equivalent-thickness",
                "d_t",
                Symbol.of("w", addresses.input(ground.wall())),
                Symbol.of("lambda", addresses.input(ground.soil())),
                answered("R_u", "/resistanceBelow"),
                Symbol.of("R_se", OUTSIDE_FILM));
        Symbol[] slab = grounds.slab(here, ground);
        boolean little = GroundSteps.isLittleInsulated(below.ground().orElseThrow());
        steps.add(
                at + "/below/conductance",
                little ? "heated-slab-conductance" : "well-insulated-heated-slab-conductance",
                "U_u",
                answered("f_g", "/below/ground/seasonalFactor"),
                slab[0],
                slab[1],
                slab[2]);
        temperature(at + "/below/temperature", plan.ground);
    }

    private void suspended() {
        Symbol factor = answered("f_g", "/below/ground/seasonalFactor");
        Symbol soil = answered("U_g", "/below/ground/voidToGround");
        Symbol outdoors = answered("U_x", "/below/ground/voidToOutdoors");
        steps.add(
                at + "/below/conductance",
                "suspended-conductance-below",
                "U_u",
                answered("R_u", "/resistanceBelow"),
                Symbol.of("R_si", DECK_FILM),
                factor,
                soil,
                outdoors);
        steps.add(
                at + "/below/temperature",
                "suspended-temperature-below",
                "theta_u",
                factor,
                soil,
                outdoors,
                Symbol.of("theta_m", addresses.temperature(plan.ground)),
                Symbol.of("theta_e", addresses.outdoors()));
    }

    private Symbol answered(String name, String key) {
        return Symbol.of(name, Addresses.sizing(at + key));
    }
}
