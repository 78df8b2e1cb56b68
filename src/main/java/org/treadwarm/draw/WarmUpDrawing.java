package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/** Draws how a floor and its room warm up, or cool when the power is cut, with the moments that matter. */
public final class WarmUpDrawing {
    private static final double MARGIN = 12;
    private static final double AXIS = 42;
    /** Height of the row over the chart with the axis's unit. */
    private static final double UNIT = 28;

    /** Keeps the lines off the frame; in K. */
    private static final double SPARE = 0.5;

    private final Canvas canvas;
    private final Sheet sheet;
    private final WarmUpCurve curve;
    private final Ticks degrees;
    private final Ticks hours;
    private final Label head;
    private final Box plot;

    private WarmUpDrawing(Sheet sheet, WarmUpCurve curve) {
        this.canvas = new Canvas(sheet);
        this.sheet = sheet;
        this.curve = curve;
        this.head = head();
        List<Double> drawn = new ArrayList<>();
        curve.traces().forEach(trace -> drawn.addAll(trace.temperatures()));
        curve.thresholds().forEach(threshold -> drawn.add(threshold.temperature()));
        double lowest = drawn.stream().mapToDouble(Double::doubleValue).min().orElseThrow();
        double highest = drawn.stream().mapToDouble(Double::doubleValue).max().orElseThrow();
        this.degrees = Ticks.around(lowest - SPARE, highest + SPARE, 6);
        this.hours = Ticks.around(0, curve.end(), sheet.roomy() ? 8 : 5);
        double left = MARGIN + AXIS;
        double width = sheet.width() - left - (sheet.roomy() ? 160 : 124);
        Box sketch = new Box(left, 0, width, sheet.roomy() ? 300 : 240);
        double top = 10 + head.height() + 12 + UNIT + flags(sketch).height();
        this.plot = new Box(
                left, top, width, Math.max(sketch.height(), labels(sketch).height()));
    }

    /** The drawing as SVG text. */
    public static String draw(Sheet sheet, WarmUpCurve curve) {
        return new WarmUpDrawing(sheet, curve).draw();
    }

    private String draw() {
        canvas.label(new Point(MARGIN, 10 + head.height() / 2), head, TextStyle.Anchor.START);
        axes();
        for (Threshold threshold : curve.thresholds()) {
            double y = y(plot, threshold.temperature());
            canvas.line(new Point(plot.x(), y), new Point(plot.right(), y), new Stroke(Palette.MUTED, 1, "14 6"));
        }
        curve.traces().forEach(this::line);
        canvas.rectangle(plot, Palette.NONE, Stroke.THIN);
        flags(plot).draw(canvas);
        labels(plot).draw(canvas, plot.y(), plot.bottom());
        return canvas.write(plot.bottom() + 54, title(), description());
    }

    private String title() {
        return curve.event().words() + ": " + curve.name();
    }

    /** What is not reached is said over the chart, as it has no place in it. */
    private Label head() {
        Label label = Label.empty().and(title(), sheet.width() - 2 * MARGIN, TextStyle.PLAIN);
        for (Threshold threshold : curve.thresholds()) {
            if (threshold.reachedAfter().isEmpty()) {
                String words = threshold.name() + " " + Figures.celsius(threshold.temperature()) + ": "
                        + curve.outcome(threshold);
                label = label.and(words, sheet.width() - 2 * MARGIN, TextStyle.STRONG);
            }
        }
        return label;
    }

    private void axes() {
        for (double temperature : degrees.values()) {
            double y = y(plot, temperature);
            canvas.line(new Point(plot.x(), y), new Point(plot.right(), y), Stroke.GRID);
            canvas.line(new Point(plot.x() - 5, y), new Point(plot.x(), y), Stroke.THIN);
            canvas.text(
                    new Point(plot.x() - 9, y), degrees.text(temperature), TextStyle.QUIET.at(TextStyle.Anchor.END));
        }
        canvas.text(new Point(plot.x() - 9, plot.y() - 19), "°C", TextStyle.QUIET.at(TextStyle.Anchor.END));
        for (double hour : hours.values()) {
            if (hour <= curve.end() * (1 + 1e-9)) {
                double x = x(hour);
                canvas.line(new Point(x, plot.y()), new Point(x, plot.bottom()), Stroke.GRID);
                canvas.line(new Point(x, plot.bottom()), new Point(x, plot.bottom() + 5), Stroke.THIN);
                canvas.text(
                        new Point(x, plot.bottom() + 16),
                        hours.text(hour),
                        TextStyle.QUIET.at(TextStyle.Anchor.MIDDLE));
            }
        }
        canvas.text(
                new Point(plot.right(), plot.bottom() + 37),
                "hours after the " + (curve.event() == WarmUpCurve.Event.WARM_UP ? "start" : "power is cut"),
                TextStyle.QUIET.at(TextStyle.Anchor.END));
    }

    private void line(Trace trace) {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < curve.hours().size(); i++) {
            points.add(new Point(
                    x(curve.hours().get(i)), y(plot, trace.temperatures().get(i))));
        }
        boolean marked = curve.thresholds().stream().anyMatch(threshold -> threshold.of() == trace.place());
        canvas.polyline(
                points,
                new Stroke(
                        marked ? Palette.ACCENT : Palette.INK, 2, trace.place().dashes()));
    }

    private WarmUpFlags flags(Box box) {
        WarmUpFlags flags = new WarmUpFlags(new Box(MARGIN, 0, sheet.width() - 2 * MARGIN, box.y() - UNIT));
        for (Threshold threshold : curve.thresholds()) {
            threshold.reachedAfter().ifPresent(reached -> {
                Label label = Label.empty()
                        .and(flagWords(threshold), 140, TextStyle.PLAIN)
                        .and(Figures.duration(reached), 140, TextStyle.STRONG);
                double x = box.x() + reached / curve.end() * box.width();
                flags.add(x, y(box, threshold.temperature()), label);
            });
        }
        return flags;
    }

    private String flagWords(Threshold threshold) {
        boolean only = curve.thresholds().size() == 1;
        return only ? "reached after" : Figures.celsius(threshold.temperature()) + " after";
    }

    private SideLabels labels(Box box) {
        SideLabels labels = new SideLabels(box.right(), sheet.width() - MARGIN);
        for (Trace trace : curve.traces()) {
            labels.add(y(box, trace.last()), trace.place().words(), Figures.celsius(trace.last()));
        }
        for (Threshold threshold : curve.thresholds()) {
            labels.add(y(box, threshold.temperature()), threshold.name(), Figures.celsius(threshold.temperature()));
        }
        return labels;
    }

    private double x(double hour) {
        return plot.x() + hour / curve.end() * plot.width();
    }

    private double y(Box box, double temperature) {
        double part = (degrees.highest() - temperature) / (degrees.highest() - degrees.lowest());
        return box.y() + part * box.height();
    }

    private String description() {
        String traces = curve.traces().stream()
                .map(trace -> trace.place().words() + " from "
                        + Figures.celsius(trace.temperatures().get(0)) + " to " + Figures.celsius(trace.last()))
                .collect(Collectors.joining(", "));
        String thresholds = curve.thresholds().stream()
                .map(threshold -> " " + threshold.name() + " " + Figures.celsius(threshold.temperature()) + " of the "
                        + threshold.of().words() + ": " + curve.outcome(threshold) + ".")
                .collect(Collectors.joining());
        return "Over " + Figures.duration(curve.end()) + ": " + traces + "." + thresholds;
    }
}
