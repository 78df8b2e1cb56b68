package org.treadwarm.draw;

import java.util.Collections;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** Draws a heated floor in section to scale, with its heater, its temperatures and where the heat goes. */
public final class FloorBuildUpDrawing {
    private static final double MARGIN = 12;
    private static final double ARROW = 46;
    private static final double GROUND = 20;

    private final Canvas canvas;
    private final Sheet sheet;
    private final FloorSection floor;
    private final List<LayerSpan> spans;
    private final FloorNotes notes;
    private final double left;
    private final double right;
    private final double top;

    private FloorBuildUpDrawing(Sheet sheet, FloorSection floor) {
        this.canvas = new Canvas(sheet);
        this.sheet = sheet;
        this.floor = floor;
        this.left = MARGIN + 44;
        this.right = sheet.width() - (sheet.roomy() ? 240 : 150);
        this.top = 26 + heading("above: " + floor.room().words()).height() + ARROW;
        List<Layer> layers =
                Stream.concat(floor.above().stream(), floor.below().stream()).toList();
        this.notes = new FloorNotes(canvas, floor, right, sheet.width() - MARGIN);
        this.spans = LayerSpan.over(layers, top, Math.max(Math.max(200, notes.height()), layers.size() * 30.0));
    }

    /** The drawing as SVG text. */
    public static String draw(Sheet sheet, FloorSection floor) {
        return new FloorBuildUpDrawing(sheet, floor).draw();
    }

    private String draw() {
        heading("above: " + floor.room().words(), 10);
        Plane plane = new Plane(true, new Point(right, 0));
        new SectionPainter(canvas, plane, 0, right - left).draw(spans);
        LayerNumbers.draw(canvas, plane, spans, right - left, top - ARROW, bottom() + ARROW);
        canvas.line(new Point(left, top), new Point(right, top), Stroke.HEAVY);
        heater();
        flow(floor.fluxUp() >= 0, top - 8 - ARROW, floor.fluxUp());
        double under = beneath();
        notes.draw(top, heaterY(), top - ARROW, bottom() + GROUND);
        Box room = new Box(MARGIN, under + 22, sheet.width() - 2 * MARGIN, 0);
        double end = new LayerKey(canvas, room).draw(spans, Collections.nCopies(spans.size(), List.of()));
        return canvas.write(end, "Heated floor: " + floor.name(), description());
    }

    private Label heading(String text) {
        return Label.empty().and(text, sheet.width() - 2 * MARGIN, TextStyle.PLAIN);
    }

    private double heading(String text, double y) {
        Label label = heading(text);
        canvas.label(new Point(MARGIN, y + label.height() / 2), label, TextStyle.Anchor.START);
        return y + label.height();
    }

    private double bottom() {
        return spans.get(spans.size() - 1).end();
    }

    private double heaterY() {
        int above = floor.above().size();
        return above == 0 ? top : spans.get(above - 1).end();
    }

    /** A row of dots on a paper line: the heater cut across, not to scale. */
    private void heater() {
        double y = heaterY();
        canvas.line(new Point(left, y), new Point(right, y), new Stroke(Palette.PAPER, 6, ""));
        canvas.line(new Point(left, y), new Point(right, y), Stroke.OUTLINE);
        // An even number leaves the middle free for the break marks of thin layers.
        int count = 2 * (int) ((right - left) / 60);
        double pitch = (right - left) / count;
        for (int i = 0; i < count; i++) {
            Point at = new Point(left + (i + 0.5) * pitch, y);
            canvas.circle(at, 8, Palette.PAPER, Stroke.NONE);
            canvas.circle(at, 5, Palette.ACCENT, Stroke.OUTLINE);
        }
    }

    /** An upright arrow with its number beside it. */
    private void flow(boolean up, double from, double flux) {
        double x = left + 30;
        Point high = new Point(x, from);
        Point low = new Point(x, from + ARROW);
        FlowArrow.draw(canvas, up ? low : high, up ? high : low);
        Label label = Label.empty()
                .and("heat " + (up ? "up" : "down"), 200, TextStyle.PLAIN)
                .and(Figures.flux(Math.abs(flux)), 200, TextStyle.STRONG);
        canvas.label(new Point(x + 16, from + ARROW / 2), label, TextStyle.Anchor.START);
    }

    private double beneath() {
        double y = bottom();
        if (floor.beneath().kind() == Beneath.Kind.GROUND) {
            Box strip = new Box(left, y, right - left, GROUND);
            canvas.rectangle(strip, canvas.hatch(MaterialFamily.GROUND), Stroke.NONE);
            y += GROUND;
        }
        flow(floor.fluxDown() < 0, y + 8, floor.fluxDown());
        return heading("beneath: " + floor.beneath().words(), y + ARROW + 18);
    }

    private String description() {
        String above = names(floor.above());
        String below = names(floor.below());
        String edge = floor.fluxEdge().isPresent()
                ? ", by the edges " + Figures.flux(floor.fluxEdge().getAsDouble())
                : "";
        return "Under " + floor.room().words() + ": " + above + "; then " + floor.heater() + " at "
                + Figures.celsius(floor.heaterTemperature()) + "; then " + below + "; beneath "
                + floor.beneath().words() + ". Surface " + Figures.celsius(floor.surfaceTemperature()) + ". Heat up "
                + Figures.flux(floor.fluxUp()) + ", down " + Figures.flux(floor.fluxDown()) + edge + ".";
    }

    private static String names(List<Layer> layers) {
        return layers.isEmpty() ? "no layer" : layers.stream().map(Layer::name).collect(Collectors.joining(", "));
    }
}
