package org.treadwarm.draw;

import java.util.List;

/** A bar of a round length, so that a plan can be measured at whatever size it is shown or printed. */
final class ScaleBar {
    /** Room that it takes below its upper edge, in pixels. */
    static final double HEIGHT = 24;

    private static final double MOST_WIDTH = 140;
    private static final double THICKNESS = 6;
    /** In m. */
    private static final List<Double> LENGTHS = List.of(20.0, 10.0, 5.0, 2.0, 1.0, 0.5, 0.2, 0.1, 0.05);

    private ScaleBar() {}

    /** Draws it from a point to the right, its length beside it. */
    static void draw(Canvas canvas, Point from, double pixelsPerMetre) {
        double length = length(pixelsPerMetre);
        double width = length * pixelsPerMetre;
        Box whole = new Box(from.x(), from.y(), width, THICKNESS);
        canvas.rectangle(whole, Palette.PAPER, Stroke.OUTLINE);
        canvas.rectangle(new Box(from.x(), from.y(), width / 2, THICKNESS), Palette.INK, Stroke.NONE);
        canvas.text(
                new Point(whole.right() + 8, from.y() + THICKNESS / 2),
                words(length),
                TextStyle.PLAIN.at(TextStyle.Anchor.START));
    }

    /** The longest round length that is not too wide, m. */
    static double length(double pixelsPerMetre) {
        return LENGTHS.stream()
                .filter(length -> length * pixelsPerMetre <= MOST_WIDTH)
                .findFirst()
                .orElse(LENGTHS.get(LENGTHS.size() - 1));
    }

    private static String words(double length) {
        return length < 1 ? Figures.thickness(length) : Figures.rounded(length, 0) + "\u00a0m";
    }
}
