package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.sizing.SectionEvaluation.SectionAccuracy;
import org.treadwarm.sizing.SectionEvaluation.WarmFace;
import org.treadwarm.sizing.SectionFloor.Bound;
import org.treadwarm.sizing.SectionFloor.State;
import org.treadwarm.sizing.Sizing.SectionLimit;
import org.treadwarm.sizing.Sizing.SectionSizing;
import org.treadwarm.sizing.Sizing.SectionState;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Layer;

/** Makes the answer of a floor that is solved between its cables or pipes. */
final class SectionAnswers {
    private final FloorEvaluation floor;
    private final SectionFloor section;
    private final List<Layer> above;
    private final double outdoor;

    SectionAnswers(SectionFloor section, HeatedFloor given) {
        this.floor = section.plane;
        this.section = section;
        this.above = given.above();
        this.outdoor = floor.whole().outdoor;
    }

    SectionSizing all() {
        return new SectionSizing(
                section.geometry.spacing(),
                section.geometry.heater().diameter(),
                above.get(above.size() - 1).title(above.size()),
                floor.plan.heater().water() ? OptionalDouble.of(section.spread()) : OptionalDouble.empty(),
                state(floor.requiredFlux),
                state(floor.carryingFlux),
                limits(),
                SectionAccuracy.of(section.response.accuracy()));
    }

    SectionState state(double flux) {
        State state = section.at(flux, outdoor);
        boolean water = floor.plan.heater().water();
        List<WarmFace> layers = new ArrayList<>();
        for (int i = 0; i < above.size(); i++) {
            layers.add(new WarmFace(above.get(i).title(i + 1), state.faces()[i]));
        }
        return new SectionState(
                flux,
                state.mean(),
                state.warmest(),
                state.coldest(),
                state.plane(),
                state.heater(),
                water ? OptionalDouble.of(state.water()) : OptionalDouble.empty(),
                water && state.water() > floor.room
                        ? OptionalDouble.of(section.supply(state.water()))
                        : OptionalDouble.empty(),
                List.copyOf(layers),
                section.split(State::warmest, flux, outdoor),
                section.split(State::plane, flux, outdoor),
                section.split(State::heater, flux, outdoor));
    }

    private List<SectionLimit> limits() {
        List<SectionLimit> limits = new ArrayList<>();
        int density = 2 + floor.plan.layerLimits().size();
        for (Bound bound : section.bounds()) {
            double flux = floor.limits[bound.slot()];
            if (Double.isFinite(flux)) {
                State state = section.at(flux, outdoor);
                limits.add(new SectionLimit(
                        state.downward(),
                        state.edge(),
                        bound.slot() == density || bound.slot() == density + 2
                                ? Optional.empty()
                                : Optional.of(section.split(bound.number(), flux, outdoor))));
            }
        }
        return List.copyOf(limits);
    }
}
