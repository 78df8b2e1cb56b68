package org.treadwarm.draw;

import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * The two pointers above a flux scale and the span between them.
 *
 * <p>The left pointer's words stand left of its stem and the right one's right of its stem, so neither can touch the
 * other. Where the sheet ends too near, the words change sides and go up a row.
 */
final class FluxPointers {
    private static final double ROW = 44;
    private static final double BESIDE = 9;

    /** A pointer, its words and whether they stand left of its stem and in the upper row. */
    private record Pointer(double x, Label label, boolean required, boolean leftwards, boolean upper) {
        Pointer lowered() {
            return new Pointer(x, label, required, leftwards, false);
        }
    }

    private FluxPointers() {}

    /** Draws from the top of the box down and returns the height of the axis. */
    static double draw(Canvas canvas, FluxScale scale, DoubleUnaryOperator place, Box room) {
        double required = place.applyAsDouble(scale.requiredFlux());
        double carried = place.applyAsDouble(scale.carriedFlux());
        boolean requiredFirst = required <= carried;
        Pointer first = pointer(scale, Math.min(required, carried), requiredFirst, true, room);
        Pointer second = pointer(scale, Math.max(required, carried), !requiredFirst, false, room);
        if (first.upper()) {
            second = second.lowered();
        }
        boolean twoRows = first.upper() || second.upper();
        double lower = room.y() + (twoRows ? ROW : 0) + ROW / 2;
        double axis = lower + ROW / 2 + ROW + 18;
        for (Pointer pointer : List.of(first, second)) {
            pointer(canvas, pointer, pointer.upper() ? lower - ROW : lower, axis);
        }
        span(canvas, scale, first.x(), second.x(), new Box(room.x(), axis - 18 - ROW, room.width(), ROW));
        return axis;
    }

    /** The margin in words. */
    static String margin(FluxScale scale) {
        return words(scale) + " " + Figures.flux(Math.abs(scale.margin()));
    }

    private static String words(FluxScale scale) {
        return scale.margin() < 0 ? "short by" : "margin";
    }

    private static Pointer pointer(FluxScale scale, double x, boolean required, boolean leftwards, Box room) {
        double flux = required ? scale.requiredFlux() : scale.carriedFlux();
        Label label = Label.empty()
                .and(required ? "required" : "can carry", 200, TextStyle.PLAIN)
                .and(Figures.flux(flux), 200, TextStyle.STRONG);
        double needed = label.width() + BESIDE;
        boolean fits = leftwards ? x - needed >= room.x() : x + needed <= room.right();
        return new Pointer(x, label, required, leftwards == fits, !fits);
    }

    private static void pointer(Canvas canvas, Pointer pointer, double y, double axis) {
        double x = pointer.x();
        double side = pointer.leftwards() ? -BESIDE : BESIDE;
        TextStyle.Anchor anchor = pointer.leftwards() ? TextStyle.Anchor.END : TextStyle.Anchor.START;
        canvas.line(new Point(x, y - ROW / 2 + 4), new Point(x, axis - 13), Stroke.OUTLINE);
        canvas.polygon(
                List.of(new Point(x - 7, axis - 14), new Point(x + 7, axis - 14), new Point(x, axis - 1)),
                pointer.required() ? Palette.ACCENT : Palette.PAPER,
                Stroke.OUTLINE);
        canvas.label(new Point(x + side, y), pointer.label(), anchor);
    }

    /** The span as a draughtsman measures it: the number inside if it fits, otherwise beside. */
    private static void span(Canvas canvas, FluxScale scale, double from, double to, Box row) {
        boolean isShort = scale.margin() < 0;
        Label label = Label.empty()
                .and(words(scale), 200, TextStyle.PLAIN)
                .and(Figures.flux(Math.abs(scale.margin())), 200, isShort ? TextStyle.WARM : TextStyle.STRONG);
        double width = label.width();
        double y = row.middleY() - 4;
        if (to - from >= width + 2 * BESIDE) {
            canvas.label(new Point((from + to) / 2, y), label, TextStyle.Anchor.MIDDLE);
        } else if (to + BESIDE + width <= row.right()) {
            canvas.label(new Point(to + BESIDE, y), label, TextStyle.Anchor.START);
        } else {
            canvas.label(new Point(from - BESIDE, y), label, TextStyle.Anchor.END);
        }
        Stroke stroke = isShort ? Stroke.DASHED : Stroke.HEAVY;
        canvas.line(new Point(from, row.bottom() - 2), new Point(to, row.bottom() - 2), stroke);
    }
}
