package org.treadwarm.survey;

import org.treadwarm.units.Numbers;
import org.treadwarm.units.Reading;

/** What must hold for the plan of a room's floor: its fixed parts lie within it. */
final class PlanRules {
    /** Sizes and distances are read one by one, so their sum may miss the wall by a little, m. */
    private static final double ROUNDING = 1e-6;

    private final Findings findings;

    PlanRules(Findings findings) {
        this.findings = findings;
    }

    void check(String pointer, RoomPlan plan) {
        if (plan.fixed().size() > RoomPlan.MOST_PARTS) {
            findings.add(
                    pointer + "/fixed",
                    plan.fixed().size() + " fixed parts",
                    "a plan with so many fixed parts cannot be told apart; join those that touch",
                    "at most " + RoomPlan.MOST_PARTS);
            return;
        }
        for (int i = 0; i < plan.fixed().size(); i++) {
            FixedPart part = plan.fixed().get(i);
            String at = Pointer.to(pointer + "/fixed", i);
            within(new Side(pointer + "/width", plan.width()), at, "width", part.width(), "x", part.x(), "right");
            within(new Side(pointer + "/length", plan.length()), at, "length", part.length(), "y", part.y(), "upper");
        }
    }

    /** A side of the floor. */
    private record Side(String pointer, Reading size) {}

    private void within(Side side, String at, String sizeKey, Reading size, String fromKey, Reading from, String wall) {
        boolean read = findings.clean(side.pointer())
                && findings.clean(at + "/" + sizeKey)
                && findings.clean(at + "/" + fromKey);
        if (!read) {
            return;
        }
        double most = side.size().value();
        if (size.value() > most + ROUNDING) {
            findings.add(
                    at + "/" + sizeKey,
                    size.typed(),
                    "the fixed part is larger than the floor",
                    "at most " + Numbers.significant(most, 4) + " m");
        } else if (from.value() + size.value() > most + ROUNDING) {
            findings.add(
                    at + "/" + fromKey,
                    from.typed(),
                    "the fixed part reaches beyond the " + wall + " wall",
                    "at most " + Numbers.significant(most - size.value(), 4) + " m");
        }
    }
}
