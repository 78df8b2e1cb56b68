package org.treadwarm.sizing;

import java.util.List;
import java.util.OptionalDouble;
import org.treadwarm.physics.electric.FreeArea;
import org.treadwarm.physics.electric.FreeArea.Rectangle;
import org.treadwarm.sizing.Sizing.FreeFloor;
import org.treadwarm.survey.RoomPlan;

/** The free area of a room's floor, from its plan. */
final class FreeFloors {
    private FreeFloors() {}

    /**
     * The free area of a plan.
     *
     * @param heated heated area, m²
     */
    static FreeFloor of(RoomPlan plan, double heated) {
        FreeArea area = area(plan);
        return new FreeFloor(
                area.floor(),
                area.cutOut(),
                area.free(),
                area.share(),
                area.free() > 0 ? OptionalDouble.of(heated / area.free()) : OptionalDouble.empty());
    }

    private static FreeArea area(RoomPlan plan) {
        List<Rectangle> parts = plan.fixed().stream()
                .map(part -> new Rectangle(
                        part.x().value(),
                        part.y().value(),
                        part.width().value(),
                        part.length().value()))
                .toList();
        return FreeArea.of(
                new Rectangle(0, 0, plan.width().value(), plan.length().value()), parts);
    }
}
