package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.DoubleFunction;

/** Draws isotherms over a section whose materials are drawn, in ink, each broken for its temperature. */
final class IsothermLines {
    private static final Stroke ISOTHERM = new Stroke(Palette.INK, 1.25, "");
    /** Under each isotherm, so that the hatching does not run into it. */
    private static final Stroke HALO = new Stroke(Palette.PAPER, 4, "");

    private final Canvas canvas;
    private final Box frame;
    private final Map<Double, List<List<Point>>> lines;
    private final DoubleFunction<String> text;
    private final String unit;

    /**
     * Lines over a frame.
     *
     * @param lines the lines of each level
     * @param text a level as it is written on its line
     * @param unit what is added where it stands beside the frame
     */
    IsothermLines(
            Canvas canvas, Box frame, Map<Double, List<List<Point>>> lines, DoubleFunction<String> text, String unit) {
        this.canvas = canvas;
        this.frame = frame;
        this.lines = lines;
        this.text = text;
        this.unit = unit;
    }

    /**
     * What was drawn.
     *
     * @param pieces of the lines
     * @param numbers where numbers stand on them
     * @param unlabelled levels whose number stands nowhere
     */
    record Drawn(List<List<Point>> pieces, List<Box> numbers, List<String> unlabelled) {}

    /**
     * Draws them; where there is no room for a number it stands at the right, if the line goes there.
     *
     * @param wanted the x that numbers are to stand near
     * @param taken where no number may stand
     * @param outlines drawn again over the halos
     */
    Drawn draw(double wanted, List<Box> taken, List<Box> outlines, SideLabels labels) {
        IsothermLabels places = new IsothermLabels(frame.grown(-3), wanted, taken);
        List<String> unlabelled = new ArrayList<>();
        List<Box> numbers = new ArrayList<>();
        List<List<Point>> pieces = new ArrayList<>();
        lines.forEach((level, line) -> {
            List<Box> gap = places.place(level, text.apply(level), lines);
            line.forEach(whole -> pieces.addAll(LineBreak.outside(whole, gap)));
            if (gap.isEmpty() && !line.isEmpty() && !beside(line, text.apply(level) + unit, labels)) {
                unlabelled.add(text.apply(level));
            }
            gap.forEach(box -> number(box, text.apply(level)));
            numbers.addAll(gap);
        });
        canvas.keep("isotherms", pieces);
        canvas.again("isotherms", HALO);
        outlines.forEach(box -> canvas.rectangle(box, Palette.NONE, Stroke.OUTLINE));
        canvas.again("isotherms", ISOTHERM);
        return new Drawn(pieces, numbers, unlabelled);
    }

    private boolean beside(List<List<Point>> line, String words, SideLabels labels) {
        return line.stream()
                .flatMap(List::stream)
                .filter(point -> point.x() > frame.right() - 0.01)
                .findFirst()
                .map(point -> {
                    labels.add(point.y(), words);
                    return true;
                })
                .orElse(false);
    }

    private void number(Box box, String words) {
        canvas.rectangle(box.grown(-1), Palette.PAPER, Stroke.NONE);
        canvas.text(new Point(box.middleX(), box.middleY()), words, TextStyle.PLAIN.at(TextStyle.Anchor.MIDDLE));
    }
}
