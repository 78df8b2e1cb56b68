package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Numbers;
import org.treadwarm.units.Reading;

/** What must hold for a heated floor that is laid in parts. */
final class PartRules {
    /** How far the parts may be from the whole, relative: the rounding of what was taped. */
    private static final double ROUNDING = 1e-3;

    private final Findings findings;
    private final String pointer;
    private final HeatedFloor floor;

    PartRules(Findings findings, String pointer, HeatedFloor floor) {
        this.findings = findings;
        this.pointer = pointer;
        this.floor = floor;
    }

    void check() {
        if (floor.parts().isEmpty() || !findings.clean(pointer, "/heater")) {
            return;
        }
        if (floor.heater().isEmpty()) {
            findings.missing(
                    pointer + "/heater",
                    "parts differ in how their cables or pipes lie, so there is a heater",
                    "a heater");
            return;
        }
        areas();
        for (int i = 0; i < floor.parts().size(); i++) {
            spacing(
                    pointer + "/parts/" + i + "/spacing",
                    floor.parts().get(i),
                    floor.heater().get());
        }
        if (findings.clean(pointer, "/heater/kind") && floor.heater().get().kind() == HeaterKind.ELECTRIC) {
            cable(floor.heater().get());
        }
    }

    private void areas() {
        boolean read = findings.clean(pointer, "/area");
        double sum = 0;
        for (int i = 0; i < floor.parts().size(); i++) {
            read &= findings.clean(pointer, "/parts/" + i + "/area");
            read &= findings.clean(pointer, "/parts/" + i);
            sum += read ? floor.parts().get(i).area().value() : 0;
        }
        if (read
                && Math.abs(sum - floor.area().value())
                        > ROUNDING * floor.area().value()) {
            findings.add(
                    pointer + "/parts",
                    "parts of " + Numbers.significant(sum, 5) + " m2 together",
                    "the parts are not the whole heated area of "
                            + Numbers.significant(floor.area().value(), 5) + " m2",
                    "areas that add up to the heated area within 0.1 %");
        }
    }

    private void spacing(String at, FloorPart part, Heater heater) {
        Optional<Reading> spacing = part.spacing();
        if (spacing.isEmpty() && heater.spacing().isEmpty() && findings.clean(pointer, "/heater/spacing")) {
            findings.missing(
                    at,
                    "a part is solved between its cables or pipes, so it needs their spacing",
                    "a spacing here, or one of the heater");
        }
        spacing.filter(given -> findings.clean(at) && given.value() <= heater.outsideDiameter())
                .ifPresent(given -> findings.add(
                        at,
                        given.typed(),
                        "the cables or pipes would lie inside one another",
                        "more than the outside diameter of " + Numbers.significant(heater.outsideDiameter() * 1000, 3)
                                + " mm"));
    }

    /** One cable lies in all parts, so its power per metre tells how dense each is. */
    private void cable(Heater heater) {
        heater.density()
                .ifPresent(density -> findings.add(
                        pointer + "/heater/density",
                        density.typed(),
                        "with parts the density of each follows from the cable's power per metre and its spacing",
                        "leave it out, and give the power of the cable per metre"));
        if (heater.linearPower().isEmpty()) {
            findings.missing(
                    pointer + "/heater/linearPower",
                    "with parts the density of each follows from the cable's power per metre and its spacing",
                    "the power of the cable per metre");
        }
    }
}
