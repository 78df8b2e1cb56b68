package org.treadwarm.draw;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;

/** Collects the shapes of one drawing on a sheet and writes the whole SVG. */
final class Canvas {
    /** From the middle of a line of text down to its baseline, as a part of its size. */
    private static final double BASELINE = 0.35;

    private final Sheet sheet;
    private final Svg definitions = Svg.element("defs");
    private final Svg body = Svg.element("g");
    private final Set<String> patterns = new HashSet<>();

    Canvas(Sheet sheet) {
        this.sheet = sheet;
    }

    void line(Point from, Point to, Stroke stroke) {
        shape(
                Svg.element("line")
                        .with("x1", from.x())
                        .with("y1", from.y())
                        .with("x2", to.x())
                        .with("y2", to.y()),
                stroke);
    }

    void polyline(List<Point> points, Stroke stroke) {
        shape(Svg.element("polyline").with("points", joined(points)).with("fill", Palette.NONE), stroke);
    }

    /** Lines that are drawn more than once, kept under a word; see {@link #again}. */
    void keep(String word, List<List<Point>> lines) {
        Svg kept = Svg.element("g").with("id", sheet.idPrefix() + "-" + word).with("fill", Palette.NONE);
        lines.forEach(line -> kept.add(Svg.element("polyline").with("points", joined(line))));
        definitions.add(kept);
    }

    /** Draws the lines kept under a word. */
    void again(String word, Stroke stroke) {
        shape(Svg.element("use").with("href", "#" + sheet.idPrefix() + "-" + word), stroke);
    }

    void polygon(List<Point> points, String fill, Stroke stroke) {
        shape(Svg.element("polygon").with("points", joined(points)).with("fill", fill), stroke);
    }

    /** A cubic curve from the first to the last of four points. */
    void curve(Point start, Point control, Point secondControl, Point end, Stroke stroke) {
        String path = "M" + joined(List.of(start)) + " C" + joined(List.of(control, secondControl, end));
        shape(Svg.element("path").with("d", path).with("fill", Palette.NONE), stroke);
    }

    void rectangle(Box box, String fill, Stroke stroke) {
        shape(
                Svg.element("rect")
                        .with("x", box.x())
                        .with("y", box.y())
                        .with("width", box.width())
                        .with("height", box.height())
                        .with("fill", fill),
                stroke);
    }

    void circle(Point centre, double radius, String fill, Stroke stroke) {
        shape(
                Svg.element("circle")
                        .with("cx", centre.x())
                        .with("cy", centre.y())
                        .with("r", radius)
                        .with("fill", fill),
                stroke);
    }

    /** One line of text, its middle at the height of the point. */
    void text(Point at, String text, TextStyle style) {
        Svg element = Svg.text("text", text)
                .with("x", at.x())
                .with("y", at.y() + BASELINE * TextStyle.SIZE)
                .with("fill", style.colour());
        if (style.anchor() != TextStyle.Anchor.START) {
            element.with("text-anchor", style.anchor().word());
        }
        if (style.strong()) {
            element.with("font-weight", "bold");
        }
        body.add(element);
    }

    /** A label, its middle at the height of the point. */
    void label(Point at, Label label, TextStyle.Anchor anchor) {
        double y = at.y() - label.height() / 2 + TextStyle.LINE_HEIGHT / 2;
        for (Label.Line line : label.lines()) {
            text(new Point(at.x(), y), line.text(), line.style().at(anchor));
            y += TextStyle.LINE_HEIGHT;
        }
    }

    /** The fill that hatches an area as the material is hatched in section. */
    String hatch(MaterialFamily family) {
        return pattern(family.word(), id -> Hatch.pattern(family, id));
    }

    /** The fill of heat that a room gains. */
    String gainHatch() {
        return pattern("gain", Hatch::gain);
    }

    /** The fill of what stands on a floor in plan. */
    String unitHatch() {
        return pattern("unit", Hatch::unit);
    }

    private String pattern(String word, Function<String, Svg> drawn) {
        String id = sheet.idPrefix() + "-hatch-" + word;
        if (patterns.add(id)) {
            definitions.add(drawn.apply(id));
        }
        return "url(#" + id + ")";
    }

    String write(double height, String title, String description) {
        String titleId = sheet.idPrefix() + "-title";
        String descriptionId = sheet.idPrefix() + "-desc";
        Svg root = Svg.element("svg")
                .with("xmlns", "http://www.w3.org/2000/svg")
                .with("viewBox", "0 0 " + sheet.width() + " " + Figures.coordinate(Math.ceil(height)))
                .with("width", "100%")
                .with("role", "img")
                .with("aria-labelledby", titleId + " " + descriptionId)
                .with("font-family", "system-ui, sans-serif")
                .with("font-size", TextStyle.SIZE)
                .add(Svg.text("title", title).with("id", titleId))
                .add(Svg.text("desc", description).with("id", descriptionId));
        if (!definitions.isEmpty()) {
            root.add(definitions);
        }
        Box all = new Box(0, 0, sheet.width(), Math.ceil(height));
        Svg paper = Svg.element("rect")
                .with("width", all.width())
                .with("height", all.height())
                .with("fill", Palette.PAPER);
        return root.add(paper).add(body).write();
    }

    private void shape(Svg element, Stroke stroke) {
        stroke.onto(element);
        body.add(element);
    }

    private static String joined(List<Point> points) {
        StringBuilder text = new StringBuilder(12 * points.size());
        for (Point point : points) {
            text.append(text.isEmpty() ? "" : " ");
            Figures.coordinate(text, point.x());
            Figures.coordinate(text.append(','), point.y());
        }
        return text.toString();
    }
}
