package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/**
 * Draws a heated floor in section between its cables or pipes: isotherms to scale, the temperatures of the surface
 * over it, and where the heat goes.
 */
public final class IsothermDrawing {
    private static final double MARGIN = 12;
    private static final double AXIS = 46;
    private static final double ARROW = 46;
    private static final double GROUND = 20;
    private static final Stroke ISOTHERM = new Stroke(Palette.INK, 1.25, "");
    /** Under each isotherm, so that the hatching does not run into it. */
    private static final Stroke HALO = new Stroke(Palette.PAPER, 4, "");

    private final Canvas canvas;
    private final Sheet sheet;
    private final IsothermSection section;
    private final SectionScale scale;
    private final SurfaceChart chart;
    private final MirroredField field;
    private final IsothermLevels levels;
    private final Label head;
    private final double chartTop;
    private final double top;
    private final List<LayerSpan> spans;

    private IsothermDrawing(Sheet sheet, IsothermSection section) {
        this.canvas = new Canvas(sheet);
        this.sheet = sheet;
        this.section = section;
        double left = MARGIN + AXIS;
        double width = sheet.width() - left - (sheet.roomy() ? 160 : 124);
        this.scale = SectionScale.fitting(section, left, width, sheet.roomy() ? 400 : 340);
        this.chart = new SurfaceChart(section.surface(), scale, sheet.width() - MARGIN);
        this.field = new MirroredField(scale);
        double[] all = Arrays.stream(field.temperatures())
                .flatMapToDouble(Arrays::stream)
                .filter(degrees -> !Double.isNaN(degrees))
                .sorted()
                .toArray();
        this.levels =
                all.length == 0 ? IsothermLevels.between(0, 0) : IsothermLevels.between(all[0], all[all.length - 1]);
        this.head = Label.empty().and("above: " + section.room().words(), sheet.width() - 2 * MARGIN, TextStyle.PLAIN);
        this.chartTop = 10 + head.height() + 36;
        double space = Math.max(0, section.layers().size() * LayerNumbers.PITCH - scale.height());
        this.top = chartTop + chart.height() + 24 + Math.max(ARROW, space / 2);
        this.spans = scale.spans(top);
    }

    /** The drawing as SVG text. */
    public static String draw(Sheet sheet, IsothermSection section) {
        return new IsothermDrawing(sheet, section).draw();
    }

    private String draw() {
        canvas.label(new Point(MARGIN, 10 + head.height() / 2), head, TextStyle.Anchor.START);
        canvas.text(new Point(MARGIN, chartTop - 18), "Floor surface, °C", TextStyle.QUIET);
        chart.draw(canvas, chartTop, field.columns(), field.surface());
        flow(section.fluxUp() >= 0, top - 8 - ARROW, section.fluxUp());
        Plane plane = new Plane(true, new Point(scale.right(), 0));
        new SectionPainter(canvas, plane, 0, scale.width()).draw(SectionScale.unbridged(spans));
        double space = Math.max(0, spans.size() * LayerNumbers.PITCH - (bottom() - top)) / 2 + 1;
        LayerNumbers.draw(canvas, plane, spans, scale.width(), top - space, bottom() + space);
        canvas.line(new Point(scale.left(), top), new Point(scale.right(), top), Stroke.HEAVY);
        SideLabels labels = new SideLabels(scale.right(), sheet.width() - MARGIN);
        List<String> unlabelled = isotherms(labels);
        heaters(labels);
        double end = Math.max(bottom() + GROUND, top - ARROW + labels.height());
        labels.draw(canvas, top - ARROW, end);
        double under = beneath(Math.max(0, space - GROUND), end);
        double keyTop = notes(under + 22, unlabelled);
        Box room = new Box(MARGIN, keyTop + 14, sheet.width() - 2 * MARGIN, 0);
        double foot = new LayerKey(canvas, room).draw(spans, Collections.nCopies(spans.size(), List.of()));
        return canvas.write(foot, "Isotherms in the heated floor: " + section.name(), description());
    }

    private double bottom() {
        return spans.get(spans.size() - 1).end();
    }

    private double axis() {
        return scale.down(top, section.heater().depth(), false, false);
    }

    private double radius() {
        return Math.max(2.5, section.heater().diameter() / 2 * scale.scale());
    }

    /**
     * Draws the isotherms, each broken for its temperature; where there is no room it stands at the right, if the line
     * goes there. Returns the temperatures that stand nowhere.
     */
    private List<String> isotherms(SideLabels labels) {
        Isolines isolines = new Isolines(field.columns(), field.rows(top), field.temperatures());
        Map<Double, List<List<Point>>> lines = new LinkedHashMap<>();
        levels.values().forEach(level -> lines.put(level, isolines.at(level)));
        Box frame = new Box(scale.left(), top, scale.width(), bottom() - top);
        // Right of the heater in the middle, where the lines are neither level nor upright.
        double wanted = scale.middle() + Math.max(0.25 * scale.pitch(), radius() + 12);
        IsothermLabels places = new IsothermLabels(frame.grown(-3), wanted, taken());
        List<String> unlabelled = new ArrayList<>();
        List<List<Point>> pieces = new ArrayList<>();
        lines.forEach((level, line) -> {
            String text = levels.text(level);
            List<Box> gap = places.place(level, text, lines);
            line.forEach(whole -> pieces.addAll(LineBreak.outside(whole, gap)));
            if (gap.isEmpty() && !line.isEmpty() && !beside(line, text + "\u00a0°C", labels)) {
                unlabelled.add(text);
            }
            gap.forEach(box -> label(box, text));
        });
        pieces.forEach(piece -> canvas.polyline(piece, HALO));
        pieces.forEach(piece -> canvas.polyline(piece, ISOTHERM));
        return unlabelled;
    }

    private boolean beside(List<List<Point>> lines, String text, SideLabels labels) {
        return lines.stream()
                .flatMap(List::stream)
                .filter(point -> point.x() > scale.right() - 0.01)
                .findFirst()
                .map(point -> {
                    labels.add(point.y(), text);
                    return true;
                })
                .orElse(false);
    }

    private void label(Box box, String text) {
        canvas.rectangle(box.grown(-1), Palette.PAPER, Stroke.NONE);
        canvas.text(new Point(box.middleX(), box.middleY()), text, TextStyle.PLAIN.at(TextStyle.Anchor.MIDDLE));
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

    private void heaters(SideLabels labels) {
        double last = scale.axes().get(scale.spacings() - 1) + radius();
        canvas.line(new Point(last, axis()), new Point(scale.right(), axis()), Stroke.LEADER);
        for (double x : scale.axes()) {
            Point at = new Point(x, axis());
            canvas.circle(at, radius() + 2, Palette.PAPER, Stroke.NONE);
            canvas.circle(at, radius(), radius() > 9 ? Palette.PALE_ACCENT : Palette.ACCENT, Stroke.HEAVY);
        }
        labels.add(
                axis(),
                section.heater().words(),
                "axis " + Figures.thickness(section.heater().depth()) + " down");
    }

    /** An upright arrow with its number beside it. */
    private void flow(boolean up, double from, double flux) {
        double x = scale.left() + 20;
        Point high = new Point(x, from);
        Point low = new Point(x, from + ARROW);
        FlowArrow.draw(canvas, up ? low : high, up ? high : low);
        Label label = Label.empty()
                .and("heat " + (up ? "up" : "down"), 200, TextStyle.PLAIN)
                .and(Figures.flux(Math.abs(flux)), 200, TextStyle.STRONG);
        canvas.label(new Point(x + 14, from + ARROW / 2), label, TextStyle.Anchor.START);
    }

    private double beneath(double space, double reached) {
        double y = bottom();
        if (section.beneath().kind() == Beneath.Kind.GROUND) {
            Box strip = new Box(scale.left(), y, scale.width(), GROUND);
            canvas.rectangle(strip, canvas.hatch(MaterialFamily.GROUND), Stroke.NONE);
            y += GROUND;
        }
        y += Math.max(14, space);
        double half = scale.pitch() / 2;
        Dimension.across(
                canvas,
                scale.middle() - half,
                scale.middle() + half,
                y,
                "spacing " + Figures.thickness(section.spacing()));
        flow(section.fluxDown() < 0, y + 30, section.fluxDown());
        Label label =
                Label.empty().and("beneath: " + section.beneath().words(), sheet.width() - 2 * MARGIN, TextStyle.PLAIN);
        double under = Math.max(y + 30 + ARROW, reached) + 10;
        canvas.label(new Point(MARGIN, under + label.height() / 2), label, TextStyle.Anchor.START);
        return under + label.height();
    }

    private double notes(double from, List<String> unlabelled) {
        double width = sheet.width() - 2 * MARGIN;
        Label label = Label.empty().and(isothermWords(), width, TextStyle.PLAIN);
        if (!unlabelled.isEmpty()) {
            label = label.and(
                    "No room for a number at: " + String.join(", ", unlabelled) + " °C.", width, TextStyle.PLAIN);
        }
        label = label.and("To scale, the same across and down; mirrored at each axis.", width, TextStyle.QUIET);
        canvas.label(new Point(MARGIN, from + label.height() / 2), label, TextStyle.Anchor.START);
        return from + label.height();
    }

    private String isothermWords() {
        if (levels.values().isEmpty()) {
            return "No isotherms: the temperatures hardly differ.";
        }
        List<Double> values = levels.values();
        return "Lines of equal temperature every " + levels.text(levels.step()) + " K, from "
                + levels.text(values.get(0)) + " to " + levels.text(values.get(values.size() - 1)) + " °C.";
    }

    private String description() {
        SurfaceProfile surface = section.surface();
        String layers = section.layers().stream().map(Layer::name).collect(Collectors.joining(", "));
        String limit = surface.limit().isPresent()
                ? ", limit " + Figures.celsius(surface.limit().getAsDouble())
                : "";
        return "Under " + section.room().words() + ", from the surface down: " + layers + "; beneath "
                + section.beneath().words() + ". Heater: " + section.heater().words() + ", its axis "
                + Figures.thickness(section.heater().depth()) + " down, every "
                + Figures.thickness(section.spacing()) + ". Surface: highest " + Figures.celsius(surface.highest())
                + ", mean " + Figures.celsius(surface.mean()) + ", lowest " + Figures.celsius(surface.lowest()) + limit
                + ". Heat up " + Figures.flux(section.fluxUp()) + ", down " + Figures.flux(section.fluxDown()) + ". "
                + isothermWords();
    }
}
