package org.treadwarm.draw;

import java.util.List;

/** An arrow that shows which way heat goes. */
final class FlowArrow {
    private static final double HEAD = 12;
    private static final double HALF = 6;

    private FlowArrow() {}

    static void draw(Canvas canvas, Point from, Point to) {
        double length = Math.hypot(to.x() - from.x(), to.y() - from.y());
        double dx = (to.x() - from.x()) / length;
        double dy = (to.y() - from.y()) / length;
        Point neck = new Point(to.x() - dx * HEAD, to.y() - dy * HEAD);
        canvas.line(from, neck, Stroke.ACCENT);
        Point one = new Point(neck.x() - dy * HALF, neck.y() + dx * HALF);
        Point other = new Point(neck.x() + dy * HALF, neck.y() - dx * HALF);
        canvas.polygon(List.of(to, one, other), Palette.ACCENT, Stroke.NONE);
    }
}
