package org.treadwarm.draw;

/**
 * Turns the directions of a section into those of the sheet, so that walls and flat assemblies are drawn by the same
 * code: along goes through the layers, across goes from the temperature chart to the section.
 *
 * @param stacked whether along goes down and across goes left; otherwise along goes right and across goes down
 * @param origin where both are zero
 */
record Plane(boolean stacked, Point origin) {
    Point at(double along, double across) {
        return stacked
                ? new Point(origin.x() - across, origin.y() + along)
                : new Point(origin.x() + along, origin.y() + across);
    }

    Box box(double along, double across, double alongEnd, double acrossEnd) {
        return Box.between(at(along, across), at(alongEnd, acrossEnd));
    }
}
