package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.sizing.PartedFloor.Part;
import org.treadwarm.sizing.SectionEvaluation.SectionAccuracy;
import org.treadwarm.sizing.SectionFloor.Bound;
import org.treadwarm.sizing.SectionFloor.State;
import org.treadwarm.sizing.Sizing.FloorState;
import org.treadwarm.sizing.Sizing.PartLimit;
import org.treadwarm.sizing.Sizing.PartSizing;
import org.treadwarm.sizing.Sizing.PartState;
import org.treadwarm.survey.HeatedFloor;

/** Makes the answer of a floor that is laid in parts. */
final class PartAnswers {
    private final FloorEvaluation floor;
    private final PartedFloor parted;
    private final HeatedFloor given;
    private final double outdoor;

    PartAnswers(FloorEvaluation floor, HeatedFloor given) {
        this.floor = floor;
        this.parted = floor.parted;
        this.given = given;
        this.outdoor = floor.whole().outdoor;
    }

    /** The whole floor at one flux: the warmest of its parts, and the mean of what they make. */
    static FloorState whole(PartedFloor parted, double flux, double outdoor) {
        List<State> states = parted.at(flux, outdoor);
        double down = parted.mean(states, State::downward);
        double edge = parted.mean(states, State::edge);
        double made = flux + down + edge;
        return new FloorState(
                states.stream().mapToDouble(State::warmest).max().orElseThrow(),
                states.stream().mapToDouble(State::heater).max().orElseThrow(),
                down,
                edge,
                made,
                made * parted.plane.area);
    }

    List<PartSizing> all() {
        List<State> required = parted.at(floor.requiredFlux, outdoor);
        List<State> carrying = parted.at(floor.carryingFlux, outdoor);
        boolean water = floor.plan.heater().water();
        List<PartSizing> answers = new ArrayList<>();
        for (int i = 0; i < parted.parts.size(); i++) {
            Part part = parted.parts.get(i);
            SectionFloor section = part.section();
            double spacing = section.geometry.spacing();
            answers.add(new PartSizing(
                    part.name(),
                    part.zone().label(),
                    part.area(),
                    spacing,
                    section.geometry.heater().diameter(),
                    water ? OptionalDouble.of(section.spread()) : OptionalDouble.empty(),
                    floor.plan.heater().hasDensity()
                            ? OptionalDouble.of(
                                    floor.whole().in[floor.plan.heater().linearPower()] / spacing)
                            : OptionalDouble.empty(),
                    state(section, required.get(i)),
                    state(section, carrying.get(i)),
                    limits(i, part),
                    SectionAccuracy.of(section.response.accuracy())));
        }
        return List.copyOf(answers);
    }

    private PartState state(SectionFloor section, State state) {
        return new PartState(
                state.flux(),
                state.warmest(),
                state.heater(),
                state.downward(),
                state.edge(),
                state.made(),
                floor.plan.heater().water()
                        ? Optional.of(section.split(State::water, state.flux(), outdoor))
                        : Optional.empty(),
                new SectionAnswers(section, given).state(state.flux()));
    }

    private List<PartLimit> limits(int number, Part part) {
        List<PartLimit> limits = new ArrayList<>();
        for (Bound bound : parted.bounds(number)) {
            double flux = part.section().largestFlux(bound.number(), bound.maximum(), outdoor);
            if (Double.isFinite(floor.limits[bound.slot()])) {
                limits.add(new PartLimit(
                        name(bound.slot() - number * floor.slotsOfAPart(), part),
                        flux,
                        part.section().at(flux, outdoor).downward(),
                        part.section().split(bound.number(), flux, outdoor)));
            }
        }
        return List.copyOf(limits);
    }

    /** The name of the limit in one of a part's slots. */
    private String name(int slot, Part part) {
        return Limits.name(floor.plan, part.zone(), slot);
    }
}
