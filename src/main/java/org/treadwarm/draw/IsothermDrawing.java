package org.treadwarm.draw;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;
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
        IsothermPainter painter = new IsothermPainter(canvas, scale, field, levels, spans);
        List<String> unlabelled = painter.isotherms(labels);
        painter.heaters(labels);
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
