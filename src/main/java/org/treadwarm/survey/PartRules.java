package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Numbers;
import org.treadwarm.units.Reading;

/** What must hold for a heated floor that is laid in parts. */
final class PartRules {
    /** How far the parts may be from the whole, relative: the rounding of what was taped. */
    private static final double ROUNDING = 1e-3;

    private final Findings findings;
    private final Place at;
    private final HeatedFloor floor;

    PartRules(Findings findings, Place at, HeatedFloor floor) {
        this.findings = findings;
        this.at = at;
        this.floor = floor;
    }

    void check() {
        if (floor.parts().isEmpty() || !findings.clean(at, "/heater")) {
            return;
        }
        if (floor.heater().isEmpty()) {
            findings.missing(
                    at, "/heater", "parts differ in how their cables or pipes lie, so there is a heater", "a heater");
            return;
        }
        areas();
        for (int i = 0; i < floor.parts().size(); i++) {
            spacing(
                    at.item("/parts", i).at("/spacing").pointer(),
                    floor.parts().get(i),
                    floor.heater().get());
        }
        if (findings.clean(at, "/heater/kind") && floor.heater().get().kind() == HeaterKind.ELECTRIC) {
            cable(floor.heater().get());
        }
    }

    private void areas() {
        boolean read = findings.clean(at, "/area");
        double sum = 0;
        for (int i = 0; i < floor.parts().size(); i++) {
            read &= findings.clean(at, "/parts/" + i + "/area");
            read &= findings.clean(at, "/parts/" + i);
            sum += read ? floor.parts().get(i).area().value() : 0;
        }
        if (read
                && Math.abs(sum - floor.area().value())
                        > ROUNDING * floor.area().value()) {
            findings.add(
                    at,
                    "/parts",
                    "parts of " + Numbers.significant(sum, 5) + " m2 together",
                    "the parts are not the whole heated area of "
                            + Numbers.significant(floor.area().value(), 5) + " m2",
                    "areas that add up to the heated area within 0.1 %");
        }
    }

    private void spacing(String pointer, FloorPart part, Heater heater) {
        Optional<Reading> spacing = part.spacing();
        if (spacing.isEmpty() && heater.spacing().isEmpty() && findings.clean(at, "/heater/spacing")) {
            findings.missing(
                    pointer,
                    "a part is solved between its cables or pipes, so it needs their spacing",
                    "a spacing here, or one of the heater");
        }
        spacing.filter(given -> findings.clean(pointer) && given.value() <= heater.outsideDiameter())
                .ifPresent(given -> findings.add(
                        pointer,
                        given.typed(),
                        "the cables or pipes would lie inside one another",
                        "more than the outside diameter of " + Numbers.significant(heater.outsideDiameter() * 1000, 3)
                                + " mm"));
    }

    /** One cable lies in all parts, so its power per metre tells how dense each is. */
    private void cable(Heater heater) {
        heater.density()
                .ifPresent(density -> findings.add(
                        at,
                        "/heater/density",
                        density.typed(),
                        "with parts the density of each follows from the cable's power per metre and its spacing",
                        "leave it out, and give the power of the cable per metre"));
        if (heater.linearPower().isEmpty()) {
            findings.missing(
                    at,
                    "/heater/linearPower",
                    "with parts the density of each follows from the cable's power per metre and its spacing",
                    "the power of the cable per metre");
        }
    }
}
