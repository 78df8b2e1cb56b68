package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** A rectangle of a room's floor that is never heated, its sides along the walls. */
public record FixedPart(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 100,
                moreThanMin = true,
                plausibleFrom = 0.05,
                plausibleTo = 10,
                label = "width",
                help = "From left to right.")
        Reading width,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 100,
                moreThanMin = true,
                plausibleFrom = 0.05,
                plausibleTo = 10,
                label = "length",
                help = "From its lower side to its upper one.")
        Reading length,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 100,
                plausibleFrom = 0,
                plausibleTo = 30,
                label = "distance from the left wall",
                help = "To its left side.")
        Reading x,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 100,
                plausibleFrom = 0,
                plausibleTo = 30,
                label = "distance from the lower wall",
                help = "To its lower side.")
        Reading y) {
    /** What it is called: its name, or "fixed part" with its number, counted from 1. */
    public String title(int number) {
        return name.orElse("fixed part " + number);
    }
}
