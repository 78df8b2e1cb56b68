package org.treadwarm.survey;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.units.Reading;

/** What must hold between the warm-water floors of one manifold: one liquid flows through all of them, and it has one pressure drop. */
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

        Reading drop() {
            return heater.manifoldDrop().orElseThrow();
        }
    }

    void check() {
        Map<Optional<String>, Fed> first = new HashMap<>();
        Map<Optional<String>, Fed> firstDrop = new HashMap<>();
        for (int i = 0; i < survey.rooms().size(); i++) {
            Room room = survey.rooms().get(i);
            Optional<Fed> fed = room.heatedFloor()
                    .flatMap(HeatedFloor::heater)
                    .filter(heater -> heater.kind() == HeaterKind.WATER)
                    .map(heater -> new Fed(room.name(), heater));
            if (fed.isPresent()) {
                Fed known = first.computeIfAbsent(fed.get().heater().manifold(), name -> fed.get());
                if (known.glycol() != fed.get().glycol()) {
                    differs("/rooms/" + i + "/heatedFloor/heater/glycol", fed.get(), known);
                }
                if (fed.get().heater().manifoldDrop().isPresent()) {
                    Fed stated = firstDrop.computeIfAbsent(fed.get().heater().manifold(), name -> fed.get());
                    if (stated.drop().value() != fed.get().drop().value()) {
                        dropDiffers("/rooms/" + i + "/heatedFloor/heater/manifoldDrop", fed.get(), stated);
                    }
                }
            }
        }
    }

    private void dropDiffers(String pointer, Fed fed, Fed first) {
        findings.add(
                pointer,
                fed.drop().typed(),
                "the same manifold feeds \"" + first.room() + "\", which states "
                        + first.drop().typed(),
                "one pressure drop for a manifold; one of its rooms is enough to state it");
    }

    private void differs(String pointer, Fed fed, Fed first) {
        String given = words(fed.heater());
        findings.add(
                pointer,
                given,
                "the same liquid flows through \"" + first.room() + "\", which has " + words(first.heater()),
                "one share of glycol for all floors of a manifold");
    }

    private static String words(Heater heater) {
        return heater.glycol().map(Reading::typed).orElse("no glycol");
    }
}
