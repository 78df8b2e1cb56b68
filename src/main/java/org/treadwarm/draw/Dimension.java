package org.treadwarm.draw;

/** Dimension lines as a draughtsman draws them: a line between two strokes, its length beside it. */
final class Dimension {
    private static final double TICK = 5;

    private Dimension() {}

    /** Along the sheet; the words stand under it. */
    static void across(Canvas canvas, double from, double to, double y, String words) {
        ticked(canvas, from, to, y);
        canvas.text(new Point((from + to) / 2, y + 14), words, TextStyle.PLAIN.at(TextStyle.Anchor.MIDDLE));
    }

    private static void ticked(Canvas canvas, double from, double to, double y) {
        canvas.line(new Point(from, y), new Point(to, y), Stroke.THIN);
        canvas.line(new Point(from, y - TICK), new Point(from, y + TICK), Stroke.THIN);
        canvas.line(new Point(to, y - TICK), new Point(to, y + TICK), Stroke.THIN);
    }

    /** Along the sheet; the words stand over it. */
    static void over(Canvas canvas, double from, double to, double y, String words) {
        ticked(canvas, from, to, y);
        canvas.text(new Point((from + to) / 2, y - 14), words, TextStyle.PLAIN.at(TextStyle.Anchor.MIDDLE));
    }

    /** Down the sheet, without words. */
    static void down(Canvas canvas, double x, double from, double to) {
        canvas.line(new Point(x, from), new Point(x, to), Stroke.THIN);
        canvas.line(new Point(x - TICK, from), new Point(x + TICK, from), Stroke.THIN);
        canvas.line(new Point(x - TICK, to), new Point(x + TICK, to), Stroke.THIN);
    }

    /** Down the sheet; the words stand left of it. */
    static void down(Canvas canvas, double x, double from, double to, String words) {
        down(canvas, x, from, to);
        canvas.text(new Point(x - 8, (from + to) / 2), words, TextStyle.PLAIN.at(TextStyle.Anchor.END));
    }
}
