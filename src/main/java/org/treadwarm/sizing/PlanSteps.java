package org.treadwarm.sizing;

import org.treadwarm.sizing.Sizing.FreeFloor;

/** Steps of a floor's free area. */
final class PlanSteps {
    private final Addresses addresses;
    private final Steps steps;

    PlanSteps(Addresses addresses, Steps steps) {
        this.addresses = addresses;
        this.steps = steps;
    }

    void all(Plan.FloorPlan floor, FreeFloor found) {
        String given = addresses.pointer(floor.room()) + "/heatedFloor/plan";
        String floorAt = addresses.pointer(floor.room()) + "/floor";
        String at = floorAt + "/plan";
        Symbol area = symbol("A", at + "/area");
        Symbol free = symbol("A_free", at + "/freeArea");
        steps.add(
                at + "/area",
                "area-of-plan",
                "A",
                Symbol.of("b", Addresses.survey(given + "/width")),
                Symbol.of("l", Addresses.survey(given + "/length")));
        steps.add(at + "/fixedArea", "union-of-rectangles", "x");
        steps.add(at + "/freeArea", "free-area", "A_free", area, symbol("A_fixed", at + "/fixedArea"));
        steps.add(at + "/freeShare", "free-share", "s", free, area);
        if (found.heatedShare().isPresent()) {
            steps.add(at + "/heatedShare", "heated-share", "s", symbol("A_F", floorAt + "/area"), free);
        }
    }

    private static Symbol symbol(String name, String pointer) {
        return Symbol.of(name, Addresses.sizing(pointer));
    }
}
