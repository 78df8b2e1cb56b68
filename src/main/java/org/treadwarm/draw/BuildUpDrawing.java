package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/**
 * Draws an assembly in section to scale with the temperatures through it and a key of its layers.
 *
 * <p>A wall is drawn with its first layer at the left. A flat assembly, or one with more layers than a narrow sheet
 * can number side by side, is drawn with its first layer at the top.
 */
public final class BuildUpDrawing {
    private static final double KEY_GAP = 30;

    private final Canvas canvas;
    private final Sheet sheet;
    private final BuildUp buildUp;
    private final BuildUpLayout layout;
    private final List<LayerSpan> spans;
    private final Label head;

    private BuildUpDrawing(Sheet sheet, BuildUp buildUp) {
        this.canvas = new Canvas(sheet);
        this.sheet = sheet;
        this.buildUp = buildUp;
        double width = sheet.width() - 2 * BuildUpLayout.MARGIN;
        this.head = Label.empty()
                .and("From " + buildUp.first().words(), width, TextStyle.PLAIN)
                .and("to " + buildUp.last().words(), width, TextStyle.PLAIN);
        this.layout = BuildUpLayout.of(sheet, buildUp, head.height() + 14);
        this.spans = LayerSpan.over(buildUp.layers(), layout.film(), layout.layers());
    }

    /** The drawing as SVG text. */
    public static String draw(Sheet sheet, BuildUp buildUp) {
        return new BuildUpDrawing(sheet, buildUp).draw();
    }

    private String draw() {
        canvas.label(new Point(BuildUpLayout.MARGIN, 8 + head.height() / 2), head, TextStyle.Anchor.START);
        TemperatureChart chart = new TemperatureChart(canvas, buildUp, layout, spans);
        chart.draw();
        new SectionPainter(canvas, layout.plane(), layout.sectionNear(), layout.sectionFar()).draw(spans);
        double end = layout.end(spans);
        LayerNumbers.draw(canvas, layout.plane(), spans, layout.sectionFar(), 0, end);
        Box room = new Box(BuildUpLayout.MARGIN, keyTop(), sheet.width() - 2 * BuildUpLayout.MARGIN, 0);
        double bottom = new LayerKey(canvas, room).draw(spans, behind(chart.numbersAll()));
        return canvas.write(bottom, "Build-up of " + buildUp.name(), description());
    }

    private double keyTop() {
        Plane plane = layout.plane();
        double under = plane.stacked()
                ? plane.at(layout.end(spans), 0).y() + (buildUp.dewPoint().isPresent() ? 48 : 4)
                : plane.at(0, layout.sectionFar()).y() + 44;
        return under + KEY_GAP;
    }

    /** Temperatures the chart had no room for, to be given in the key. */
    private List<List<String>> behind(boolean numbersAll) {
        List<List<String>> added = new ArrayList<>();
        for (int i = 0; i < spans.size(); i++) {
            boolean said = numbersAll || i == spans.size() - 1;
            String words = Figures.celsius(buildUp.temperatures().get(i + 1)) + " behind it";
            added.add(said ? List.of() : List.of(words));
        }
        return added;
    }

    private String description() {
        String layers = buildUp.layers().stream()
                .map(layer -> layer.name() + " " + Figures.resistance(layer.resistance()))
                .collect(Collectors.joining(", "));
        String temperatures =
                buildUp.temperatures().stream().map(Figures::celsius).collect(Collectors.joining(", "));
        String dewPoint = buildUp.dewPoint().isPresent()
                ? " Dew point " + Figures.celsius(buildUp.dewPoint().getAsDouble()) + "."
                : "";
        return "From " + buildUp.first().words() + " to " + buildUp.last().words() + ". Layers: " + layers
                + ". Temperatures at their faces: " + temperatures + "." + dewPoint;
    }
}
