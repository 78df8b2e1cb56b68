package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** A part of a heated floor with a zone of use and a spacing of its own. */
public record FloorPart(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.AREA,
                min = 0,
                max = 10000,
                moreThanMin = true,
                plausibleFrom = 0.3,
                plausibleTo = 500,
                label = "area of the part")
        Reading area,

        @Wording(label = "zone of use of the part") Zone zone,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 1000,
                moreThanMin = true,
                plausibleFrom = 0.03,
                plausibleTo = 0.4,
                formUnit = "mm",
                label = "spacing in the part",
                help = "That of the heater when left out.")
        Optional<Reading> spacing) {
    /** Its name, or its number among the parts, from 1. */
    public String title(int number) {
        return name.orElse("part " + number);
    }
}
