package org.treadwarm.draw;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A rectangular room's floor in plan with runs of cable or pipe; the runs show spacing and extent, not how to lay them.
 *
 * @param name the room's name
 * @param width size from left to right in m, 0.3 to 100
 * @param length size from top to bottom in m, 0.3 to 100
 * @param heatedArea heated area in m² to be named, above 0, if it is known
 * @param units what stands on the floor for good, at most 12, within the room
 * @param runs how cable or pipe is laid
 * @param zone a strip along the walls with a spacing of its own, if there is one; it leaves some of the room
 * @param loops into how many circuits the floor, but for that strip, is divided, 1 to 50
 * @param mark where the runs are fed or controlled from, within the room, if it is to be marked
 */
public record FloorPlanStrip(
        String name,
        double width,
        double length,
        OptionalDouble heatedArea,
        List<FixedUnit> units,
        HeaterRuns runs,
        Optional<PeripheralZone> zone,
        int loops,
        Optional<PlanMark> mark) {
    /** Their letters end before those of the marks. */
    private static final int MOST_UNITS = 12;

    private static final int MOST_LOOPS = 50;
    /** In m; places are sums, which may miss the wall by a little. */
    private static final double ROUNDING = 1e-6;

    /** @throws IllegalArgumentException if a number is out of its range or something lies outside the room */
    public FloorPlanStrip {
        units = List.copyOf(units);
        Checks.within("Width of the room", width, 0.3, 100);
        Checks.within("Length of the room", length, 0.3, 100);
        heatedArea.ifPresent(area -> Checks.positive("Heated area", area));
        Checks.within("Number of fixed units", units.size(), 0, MOST_UNITS);
        Checks.within("Number of loops", loops, 1, MOST_LOOPS);
        for (FixedUnit unit : units) {
            Checks.within("Right side of " + unit.name(), unit.x() + unit.width(), 0, width + ROUNDING);
            Checks.within("Lower side of " + unit.name(), unit.y() + unit.length(), 0, length + ROUNDING);
        }
        zone.ifPresent(strip -> {
            double across = strip.along(PeripheralZone.Side.LEFT) + strip.along(PeripheralZone.Side.RIGHT);
            double down = strip.along(PeripheralZone.Side.TOP) + strip.along(PeripheralZone.Side.BOTTOM);
            if (across >= width || down >= length) {
                throw new IllegalArgumentException("A peripheral zone " + strip.depth() + " m deep leaves nothing of "
                        + width + " m x " + length + " m");
            }
        });
        mark.ifPresent(place -> {
            Checks.within("Place of the " + place.kind().words(), place.x(), 0, width + ROUNDING);
            Checks.within("Place of the " + place.kind().words(), place.y(), 0, length + ROUNDING);
        });
    }
}
