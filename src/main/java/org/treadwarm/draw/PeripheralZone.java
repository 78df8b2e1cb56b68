package org.treadwarm.draw;

import java.util.Set;

/**
 * A strip along chosen walls whose runs are laid at a spacing of their own.
 *
 * @param sides along which walls, at least one
 * @param depth depth of the strip from the wall in m, 0.1 to 5
 * @param spacing distance of neighbouring runs in m, 0.02 to 1
 */
public record PeripheralZone(Set<Side> sides, double depth, double spacing) {
    /** A wall of the room as it is drawn. */
    public enum Side {
        TOP,
        BOTTOM,
        LEFT,
        RIGHT
    }

    /** @throws IllegalArgumentException if there is no side or a number is out of its range */
    public PeripheralZone {
        sides = Set.copyOf(sides);
        if (sides.isEmpty()) {
            throw new IllegalArgumentException("A peripheral zone lies along at least one side");
        }
        Checks.within("Depth of the peripheral zone", depth, 0.1, 5);
        Checks.within("Spacing in the peripheral zone", spacing, 0.02, 1);
    }

    /** Depth along a side in m; zero where there is no strip. */
    double along(Side side) {
        return sides.contains(side) ? depth : 0;
    }
}
