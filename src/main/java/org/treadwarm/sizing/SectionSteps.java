package org.treadwarm.sizing;

import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.sizing.Sizing.SectionSizing;
import org.treadwarm.sizing.Sizing.SectionState;

/** Steps of a floor that is solved between its cables or pipes: what is read off the section, and what follows from it. */
final class SectionSteps {
    private final Addresses addresses;
    private final Steps steps;
    private final FloorPlan floor;
    private final String floorAt;
    private final String at;

    /**
     * Steps of a floor or of a part of it.
     *
     * @param at where what was solved stands, in the answer's floor
     */
    SectionSteps(Addresses addresses, Steps steps, FloorPlan floor, String at) {
        this.addresses = addresses;
        this.steps = steps;
        this.floor = floor;
        this.floorAt = addresses.pointer(floor.room()) + "/floor";
        this.at = floorAt + at;
    }

    void all(SectionSizing section) {
        heater(floor.heater().spacing());
        state(at + "/atRequiredFlux", section.atRequiredFlux(), floorAt + "/requiredFlux", floorAt);
        state(at + "/atCarryingFlux", section.atCarryingFlux(), floorAt + "/carryingFlux", floorAt + "/atCarryingFlux");
        for (int i = 0; i < section.limits().size(); i++) {
            String limit = at + "/limits/" + i;
            solved(limit + "/downwardFlux", limit + "/edgeFlux");
            if (section.limits().get(i).temperature().isPresent()) {
                split(limit + "/temperature");
            }
        }
        accuracy();
    }

    /** How the heater lies, and the spread of its water. */
    void heater(int spacing) {
        given("/spacing", "spacing-given", spacing);
        if (floor.heater().diameter() == Stack.NONE) {
            steps.add(at + "/diameter", floor.heater().water() ? "pipe-usual" : "cable-usual", "D");
        } else {
            given("/diameter", "diameter-given", floor.heater().diameter());
        }
        if (floor.heater().water()) {
            if (floor.heater().spread() == Stack.NONE) {
                steps.add(at + "/spread", "spread-usual", "sigma");
            } else {
                given("/spread", "spread-given", floor.heater().spread());
            }
        }
    }

    void accuracy() {
        String accuracy = at + "/accuracy";
        solved(accuracy + "/relativeError", accuracy + "/residual", accuracy + "/iterations", accuracy + "/cells");
    }

    private void given(String key, String formula, int input) {
        steps.add(at + key, formula, "x", Symbol.of("x_given", addresses.input(input)));
    }

    /**
     * Steps of one state.
     *
     * @param flux pointer of the flux that it is at
     * @param fluxes pointer of what has the downward flux, and the temperatures told of surface and heater
     */
    void state(String here, SectionState state, String flux, String fluxes) {
        Symbol upward = Symbol.of("q", Addresses.sizing(flux));
        Symbol downward = Symbol.of("q_u", Addresses.sizing(fluxes + "/downwardFlux"));
        Symbol room = Symbol.of("theta_i", addresses.temperature(floor.room()));
        steps.add(here + "/flux", "section-flux", "q_s", upward);
        steps.add(here + "/surfaceMean", "surface-temperature", "theta_F", room, upward);
        rise(here + "/surfaceMaximum", here + "/surface", room, upward, downward);
        rise(fluxes + "/surfaceTemperature", here + "/surface", room, upward, downward);
        rise(here + "/heaterPlane", here + "/plane", room, upward, downward);
        rise(here + "/heaterTemperature", here + "/heater", room, upward, downward);
        rise(fluxes + "/heaterTemperature", here + "/heater", room, upward, downward);
        solved(here + "/surfaceMinimum");
        for (int i = 0; i < state.layers().size(); i++) {
            solved(here + "/layers/" + i + "/temperature");
        }
        split(here + "/surface");
        split(here + "/plane");
        split(here + "/heater");
        if (state.waterTemperature().isPresent()) {
            solved(here + "/waterTemperature");
        }
        if (state.supplyTemperature().isPresent()) {
            steps.add(
                    here + "/supplyTemperature",
                    "supply-temperature",
                    "theta_V",
                    room,
                    Symbol.of("theta_m", Addresses.sizing(here + "/waterTemperature")),
                    Symbol.of("sigma", Addresses.sizing(at + "/spread")));
        }
    }

    private void rise(String pointer, String split, Symbol room, Symbol upward, Symbol downward) {
        steps.add(
                pointer,
                "section-temperature",
                "theta",
                room,
                Symbol.of("s_o", Addresses.sizing(split + "/perUpwardFlux")),
                upward,
                Symbol.of("s_u", Addresses.sizing(split + "/perDownwardFlux")),
                downward);
    }

    void split(String pointer) {
        solved(pointer + "/perUpwardFlux", pointer + "/perDownwardFlux");
    }

    void solved(String... pointers) {
        for (String pointer : pointers) {
            steps.add(pointer, "section-solved", "x");
        }
    }
}
