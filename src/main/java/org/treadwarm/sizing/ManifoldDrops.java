package org.treadwarm.sizing;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.stream.IntStream;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Heater;
import org.treadwarm.survey.HeaterKind;
import org.treadwarm.survey.Survey;
import org.treadwarm.units.Reading;

/** The pressure drops of manifolds that a survey states, each in one or more of the rooms that the manifold feeds. */
final class ManifoldDrops {
    private final Survey survey;

    ManifoldDrops(Survey survey) {
        this.survey = survey;
    }

    /** The first room that states the drop of a manifold; empty when none does. */
    OptionalInt statedIn(Optional<String> manifold) {
        return IntStream.range(0, survey.rooms().size())
                .filter(room -> heater(room)
                        .filter(heater -> heater.kind() == HeaterKind.WATER)
                        .filter(heater -> heater.manifold().equals(manifold))
                        .flatMap(Heater::manifoldDrop)
                        .isPresent())
                .findFirst();
    }

    /** The drop of a manifold, Pa; all rooms that state it state the same. */
    OptionalDouble of(Optional<String> manifold) {
        OptionalInt room = statedIn(manifold);
        return room.isEmpty()
                ? OptionalDouble.empty()
                : OptionalDouble.of(heater(room.getAsInt())
                        .flatMap(Heater::manifoldDrop)
                        .map(Reading::value)
                        .orElseThrow());
    }

    /** The manifold that feeds a room; empty too for the one without a name. */
    Optional<String> feeding(int room) {
        return heater(room).flatMap(Heater::manifold);
    }

    private Optional<Heater> heater(int room) {
        return survey.rooms().get(room).heatedFloor().flatMap(HeatedFloor::heater);
    }
}
