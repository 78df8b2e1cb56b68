package org.treadwarm.draw;

/**
 * Something that stands on the floor for good, under which nothing heats.
 *
 * @param name what it is, such as "bath"
 * @param x distance of its left side from the room's left wall in m, not negative
 * @param y distance of its upper side, as drawn, from the room's upper wall in m, not negative
 * @param width size from left to right in m, above 0
 * @param length size from top to bottom in m, above 0
 */
public record FixedUnit(String name, double x, double y, double width, double length) {
    /** @throws IllegalArgumentException if it lies outside or has no size */
    public FixedUnit {
        Checks.notNegative("Place of " + name, x);
        Checks.notNegative("Place of " + name, y);
        Checks.positive("Width of " + name, width);
        Checks.positive("Length of " + name, length);
    }
}
