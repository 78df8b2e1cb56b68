package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Reading;

/** What must hold between the warm-water floors of a job: the same liquid flows through all of them. */
final class ManifoldRules {
    private final Survey survey;
    private final Findings findings;

    ManifoldRules(Survey survey, Findings findings) {
        this.survey = survey;
        this.findings = findings;
    }

    /** A heater of warm water and the room it lies in. */
    private record Fed(String room, Heater heater) {
        double glycol() {
            return heater.glycol().map(Reading::value).orElse(0.0);
        }
    }

    void check() {
        Optional<Fed> first = Optional.empty();
        for (int i = 0; i < survey.rooms().size(); i++) {
            Room room = survey.rooms().get(i);
            Optional<Fed> fed = room.heatedFloor()
                    .flatMap(HeatedFloor::heater)
                    .filter(heater -> heater.kind() == HeaterKind.WATER)
                    .map(heater -> new Fed(room.name(), heater));
            if (first.isPresent()
                    && fed.isPresent()
                    && first.get().glycol() != fed.get().glycol()) {
                differs("/rooms/" + i + "/heatedFloor/heater/glycol", fed.get(), first.get());
            }
            first = first.or(() -> fed);
        }
    }

    private void differs(String pointer, Fed fed, Fed first) {
        String given = words(fed.heater());
        findings.add(
                pointer,
                given,
                "the same liquid flows through \"" + first.room() + "\", which has " + words(first.heater()),
                "one share of glycol for all warm water of the job");
    }

    private static String words(Heater heater) {
        return heater.glycol().map(Reading::typed).orElse("no glycol");
    }
}
