package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** Draws a heated floor in section to scale, with its heater, its temperatures and where the heat goes. */
public final class FloorBuildUpDrawing {
    private static final double MARGIN = 12;
    private static final double ARROW = 46;
    private static final double GROUND = 20;
    private static final double LEADER = 34;

    private final Canvas canvas;
    private final Sheet sheet;
    private final FloorSection floor;
    private final List<LayerSpan> spans;
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
        double height = Math.max(200, layers.size() * 30.0);
        this.spans = layers.isEmpty() ? List.of() : LayerSpan.over(layers, top, height);
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
        beside();
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
        return spans.isEmpty() ? top : spans.get(spans.size() - 1).end();
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
        int count = (int) ((right - left) / 30);
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

    /** What is said at the right of the section: where it belongs, how it reads, and the heat that leaves there. */
    private record Note(double y, Label label, boolean edge) {}

    private void beside() {
        List<Note> notes = notes();
        List<PushApart.Wish> wishes = notes.stream()
                .map(note -> new PushApart.Wish(note.y(), note.label().height() + 8))
                .toList();
        List<Double> places = PushApart.centres(wishes, top - ARROW, bottom() + 4 * ARROW);
        for (int i = 0; i < notes.size(); i++) {
            beside(notes.get(i), places.get(i));
        }
    }

    private void beside(Note note, double y) {
        double end = right + LEADER;
        if (note.edge()) {
            Point inner = new Point(right + 2, y);
            Point outer = new Point(end, y);
            boolean out = floor.fluxEdge().orElseThrow() >= 0;
            FlowArrow.draw(canvas, out ? inner : outer, out ? outer : inner);
        } else {
            canvas.polyline(
                    List.of(
                            new Point(right, note.y()),
                            new Point(right + 8, note.y()),
                            new Point(end - 8, y),
                            new Point(end, y)),
                    Stroke.LEADER);
            canvas.circle(new Point(right, note.y()), 3, Palette.INK, Stroke.NONE);
        }
        canvas.label(new Point(end + 6, y), note.label(), TextStyle.Anchor.START);
    }

    private List<Note> notes() {
        List<Note> notes = new ArrayList<>();
        notes.add(new Note(top, note("surface", Figures.celsius(floor.surfaceTemperature())), false));
        notes.add(new Note(heaterY(), note(floor.heater(), Figures.celsius(floor.heaterTemperature())), false));
        floor.fluxEdge().ifPresent(flux -> {
            String words = flux < 0 ? "in by the edges" : "out by the edges";
            notes.add(new Note(heaterY() + 40, note(words, Figures.flux(Math.abs(flux))), true));
        });
        return notes;
    }

    private Label note(String name, String number) {
        double width = sheet.width() - right - LEADER - 6 - MARGIN;
        return Label.empty().and(name, width, TextStyle.PLAIN).and(number, width, TextStyle.STRONG);
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
