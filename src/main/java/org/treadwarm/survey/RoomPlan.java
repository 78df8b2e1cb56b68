package org.treadwarm.survey;

import java.util.List;
import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** The rectangle of a room's floor, and what stands on it for good. */
public record RoomPlan(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0.3,
                max = 100,
                plausibleFrom = 0.8,
                plausibleTo = 30,
                label = "width of the floor",
                help = "From the left wall to the right one, as it is drawn.")
        Reading width,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0.3,
                max = 100,
                plausibleFrom = 0.8,
                plausibleTo = 30,
                label = "length of the floor",
                help = "From the lower wall to the upper one.")
        Reading length,

        @Wording(
                label = "fixed parts",
                help =
                        "What stands on the floor for good: units, a bath, built-in furniture. Nothing heats under them.")
        List<FixedPart> fixed) {
    /** As many fixed parts as a drawing can tell apart. */
    public static final int MOST_PARTS = 12;
}
