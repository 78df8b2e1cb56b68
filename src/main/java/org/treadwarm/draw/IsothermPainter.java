package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Draws isotherms and heaters over a section whose layers are drawn. */
final class IsothermPainter {
    private final Canvas canvas;
    private final SectionScale scale;
    private final MirroredField field;
    private final IsothermLevels levels;
    private final List<LayerSpan> spans;
    private final HeaterCut heater;
    private final double top;

    IsothermPainter(
            Canvas canvas, SectionScale scale, MirroredField field, IsothermLevels levels, List<LayerSpan> spans) {
        this.canvas = canvas;
        this.scale = scale;
        this.field = field;
        this.levels = levels;
        this.spans = spans;
        this.heater = scale.section().heater();
        this.top = spans.get(0).start();
    }

    private double axis() {
        return scale.down(top, heater.depth(), false, false);
    }

    private double radius() {
        return Math.max(2.5, heater.diameter() / 2 * scale.scale());
    }

    /**
     * Draws the isotherms, each broken for its temperature; where there is no room it stands at the right, if the line
     * goes there. Returns the temperatures that stand nowhere.
     */
    List<String> isotherms(SideLabels labels) {
        Isolines isolines = new Isolines(field.columns(), field.rows(top), field.temperatures());
        Map<Double, List<List<Point>>> lines = new LinkedHashMap<>();
        levels.values().forEach(level -> lines.put(level, isolines.at(level)));
        Box frame = new Box(
                scale.left(), top, scale.width(), spans.get(spans.size() - 1).end() - top);
        // Right of the heater in the middle, where the lines are neither level nor upright.
        double wanted = scale.middle() + Math.max(0.25 * scale.pitch(), radius() + 12);
        // Again, where a halo has covered them.
        List<Box> outlines = spans.stream()
                .map(span -> new Box(scale.left(), span.start(), scale.width(), span.end() - span.start()))
                .toList();
        return new IsothermLines(canvas, frame, lines, levels::text, "\u00a0°C")
                .draw(wanted, taken(), outlines, labels)
                .unlabelled();
    }

    /** Faces of layers, bands, heaters and the leader to the heater's words. */
    private List<Box> taken() {
        List<Box> taken = new ArrayList<>();
        for (LayerSpan span : spans) {
            boolean band = span.drawn() == LayerSpan.Drawn.SYMBOL;
            taken.add(new Box(scale.left(), span.start(), scale.width(), band ? span.end() - span.start() : 1));
        }
        scale.axes().forEach(x -> taken.add(new Box(x, axis(), 0, 0).grown(radius() + 2)));
        double last = scale.axes().get(scale.spacings() - 1);
        taken.add(new Box(last, axis() - 1, scale.right() - last, 2));
        return taken;
    }

    /** Draws the heaters cut across; the words stand at the right. */
    void heaters(SideLabels labels) {
        double last = scale.axes().get(scale.spacings() - 1) + radius();
        canvas.line(new Point(last, axis()), new Point(scale.right(), axis()), Stroke.LEADER);
        for (double x : scale.axes()) {
            Point at = new Point(x, axis());
            canvas.circle(at, radius() + 2, Palette.PAPER, Stroke.NONE);
            canvas.circle(at, radius(), radius() > 9 ? Palette.PALE_ACCENT : Palette.ACCENT, Stroke.HEAVY);
        }
        labels.add(axis(), heater.words(), "axis at " + Figures.thickness(heater.depth()));
    }
}
