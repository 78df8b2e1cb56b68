package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** An electric mat that can be had, never cut. */
public record HeatingMat(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.AREA,
                min = 0,
                max = 10000,
                moreThanMin = true,
                plausibleFrom = 0.3,
                plausibleTo = 30,
                label = "area of one mat")
        Reading area,

        @Quantity(
                kind = QuantityKind.POWER,
                min = 0,
                max = 100000,
                moreThanMin = true,
                plausibleFrom = 20,
                plausibleTo = 4000,
                label = "power of one mat",
                help = "At the supply voltage of the heater.")
        Reading power,

        @Quantity(
                kind = QuantityKind.RATIO,
                min = 1,
                max = 1000,
                whole = true,
                plausibleTo = 50,
                label = "how many can be had",
                help = "As many as wanted when left out.")
        Optional<Reading> count) {
    /** What it is called: its name, or "mat" with its number, counted from 1. */
    public String title(int number) {
        return name.orElse("mat " + number);
    }
}
