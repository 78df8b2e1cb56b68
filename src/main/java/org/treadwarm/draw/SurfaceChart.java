package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Draws the temperatures of a floor's surface over its section: axis, line, and what is highest, mean and lowest. */
final class SurfaceChart {
    private static final double LEAST = 110;
    private static final double PAD = 8;
    /** Keeps the axis in whole steps if all is at one temperature; in K. */
    private static final double SPARE = 0.25;

    private static final Stroke LIMIT = new Stroke(Palette.INK, 1.5, "9 5");

    private final SurfaceProfile surface;
    private final SectionScale scale;
    private final double end;
    private final Ticks ticks;
    private final double height;

    /** A chart over a section, with labels from its right side to the end of the sheet. */
    SurfaceChart(SurfaceProfile surface, SectionScale scale, double end) {
        this.surface = surface;
        this.scale = scale;
        this.end = end;
        double limit = surface.limit().orElse(surface.highest());
        double lowest = Math.min(surface.lowest(), limit);
        double highest = Math.max(surface.highest(), limit);
        this.ticks = Ticks.around(lowest - SPARE, highest + SPARE, 3);
        this.height = Math.max(LEAST, labels(0).height());
    }

    double height() {
        return height;
    }

    void draw(Canvas canvas, double top, double[] columns, double[] temperatures) {
        axis(canvas, top);
        guide(canvas, top, surface.highest(), Stroke.GUIDE);
        guide(canvas, top, surface.mean(), Stroke.GUIDE);
        guide(canvas, top, surface.lowest(), Stroke.GUIDE);
        OptionalDouble limit = surface.limit();
        limit.ifPresent(degrees -> guide(canvas, top, degrees, LIMIT));
        canvas.rectangle(new Box(scale.left(), top, scale.width(), height), Palette.NONE, Stroke.THIN);
        List<Point> line = new ArrayList<>();
        for (int i = 0; i < columns.length; i++) {
            line.add(new Point(columns[i], y(top, temperatures[i])));
        }
        canvas.polyline(line, Stroke.ACCENT);
        labels(top).draw(canvas, top, top + height);
    }

    private void axis(Canvas canvas, double top) {
        double x = scale.left();
        for (double degrees : ticks.values()) {
            double y = y(top, degrees);
            canvas.line(new Point(x - 5, y), new Point(x, y), Stroke.THIN);
            canvas.text(new Point(x - 9, y), ticks.text(degrees), TextStyle.QUIET.at(TextStyle.Anchor.END));
        }
    }

    private void guide(Canvas canvas, double top, double degrees, Stroke stroke) {
        double y = y(top, degrees);
        canvas.line(new Point(scale.left(), y), new Point(scale.right(), y), stroke);
    }

    private SideLabels labels(double top) {
        SideLabels labels = new SideLabels(scale.right(), end);
        surface.limit().ifPresent(degrees -> labels.add(y(top, degrees), "limit", Figures.celsius(degrees)));
        labels.add(y(top, surface.highest()), "highest", Figures.celsius(surface.highest()));
        labels.add(y(top, surface.mean()), "mean", Figures.celsius(surface.mean()));
        labels.add(y(top, surface.lowest()), "lowest", Figures.celsius(surface.lowest()));
        return labels;
    }

    private double y(double top, double degrees) {
        double part = (ticks.highest() - degrees) / (ticks.highest() - ticks.lowest());
        return top + PAD + part * (height - 2 * PAD);
    }
}
