package org.treadwarm.sizing;

import java.util.List;
import java.util.OptionalDouble;
import org.treadwarm.sizing.Sizing.ElectricLayout;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.FreeFloor;
import org.treadwarm.sizing.Sizing.MatLayout;
import org.treadwarm.sizing.Sizing.Warning;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Room;
import org.treadwarm.units.Numbers;

/** Second looks at where a heater lies on the floor. */
final class LayoutWarnings {
    /** Areas come from sums and products of readings. */
    private static final double ROUNDING = 1e-9;

    /** A plan may miss the floor's area by so much, as both are taped; a threshold of our own, no source. */
    private static final double TAPED = 0.05;

    /** More than this share bare deserves a look; common practice, no source. */
    private static final double MOST_BARE = 0.1;

    private final List<Warning> warnings;

    LayoutWarnings(List<Warning> warnings) {
        this.warnings = warnings;
    }

    void check(String pointer, Room room, HeatedFloor floor, FloorSizing answer) {
        answer.plan().ifPresent(plan -> {
            free(pointer, floor.area().value(), plan);
            size(pointer, room.floorArea().value(), plan);
        });
        answer.matsReason().ifPresent(reason -> notChosen(pointer + "/heater/mats", reason));
        answer.electric()
                .flatMap(ElectricLayout::mats)
                .ifPresent(mats -> mats(pointer + "/heater", mats, answer.installedPower()));
    }

    private void notChosen(String pointer, String reason) {
        add(
                "mats-not-chosen",
                pointer,
                "No mats are chosen: " + reason + ".",
                "Mats are laid whole and never cut.",
                "List mats that fit, or fewer kinds of them.");
    }

    private void mats(String pointer, MatLayout mats, OptionalDouble installed) {
        if (mats.margin() < 0) {
            add(
                    "mats-too-weak",
                    pointer + "/mats",
                    "The strongest mats that fit make " + Numbers.fixed(mats.power(), 0) + " W; "
                            + Numbers.fixed(mats.neededPower(), 0) + " W are needed on the design day.",
                    "They are on all the time then, and the room stays colder.",
                    "List stronger mats, lose less heat, or add heat from elsewhere.");
        }
        if (mats.bareArea() > MOST_BARE * mats.area()) {
            add(
                    "mats-leave-floor-bare",
                    pointer + "/mats",
                    "The chosen mats leave " + Numbers.fixed(mats.bareArea(), 2) + " m2 of "
                            + Numbers.fixed(mats.area(), 2) + " m2 bare.",
                    "Bare floor feels cool, and the heated part must be warmer than this sizing takes it to be.",
                    "List more sizes, or make the heated area smaller.");
        }
        if (installed.isPresent()
                && Math.abs(mats.power() - installed.getAsDouble()) > TAPED * installed.getAsDouble()) {
            add(
                    "mats-differ-from-density",
                    pointer + "/density",
                    "The chosen mats make " + Numbers.fixed(mats.power(), 0)
                            + " W; the density over the heated area makes " + Numbers.fixed(installed.getAsDouble(), 0)
                            + " W.",
                    "The verdict goes by the weaker of the two.",
                    "Give the density that the mats make over the heated area: " + Numbers.fixed(mats.power(), 0)
                            + " W over it.");
        }
        if (mats.circuits().isEmpty()) {
            add(
                    "mats-on-no-circuit",
                    pointer + "/mats",
                    "A mat draws more than the largest usual breaker carries, or there are too many mats.",
                    "A mat is fed whole.",
                    "Smaller mats; a licensed electrician decides.");
        }
    }

    private void free(String pointer, double heated, FreeFloor plan) {
        if (heated > plan.freeArea() * (1 + ROUNDING)) {
            add(
                    "heated-under-fixed-parts",
                    pointer + "/area",
                    "The heated area is " + Numbers.fixed(heated, 2) + " m2; the plan leaves "
                            + Numbers.fixed(plan.freeArea(), 2) + " m2 free.",
                    "A heater under what stands there for good cannot give its heat off and overheats.",
                    "Heat less, or correct the plan and its fixed parts.");
        }
    }

    private void size(String pointer, double whole, FreeFloor plan) {
        if (plan.area() < whole * (1 - TAPED) || plan.freeArea() > whole * (1 + TAPED)) {
            add(
                    "plan-differs-from-floor",
                    pointer + "/plan",
                    "The plan is " + Numbers.fixed(plan.area(), 2) + " m2 with " + Numbers.fixed(plan.freeArea(), 2)
                            + " m2 free; the room's floor is " + Numbers.fixed(whole, 2) + " m2.",
                    "A plan is the rectangle that holds the whole floor.",
                    "Tape again; in a room that is no rectangle, list the corners that are not its own as fixed parts.");
        }
    }

    private void add(String code, String pointer, String message, String why, String settle) {
        warnings.add(new Warning(code, pointer, message, why, settle));
    }
}
