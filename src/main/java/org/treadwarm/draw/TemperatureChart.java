package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;

/** Draws the temperatures through an assembly over its section: axis, line, and a number at every face. */
final class TemperatureChart {
    /** Keeps the axis in whole steps if all is at one temperature, and the line off its frame; in K. */
    private static final double SPARE = 0.5;

    private final Canvas canvas;
    private final BuildUp buildUp;
    private final BuildUpLayout layout;
    private final List<LayerSpan> spans;
    private final Ticks ticks;
    private final Plane plane;
    private final double end;

    TemperatureChart(Canvas canvas, BuildUp buildUp, BuildUpLayout layout, List<LayerSpan> spans) {
        this.canvas = canvas;
        this.buildUp = buildUp;
        this.layout = layout;
        this.spans = spans;
        this.plane = layout.plane();
        this.end = layout.end(spans);
        double lowest = buildUp.drawn().min().orElseThrow();
        double highest = buildUp.drawn().max().orElseThrow();
        this.ticks = Ticks.around(lowest - SPARE, highest + SPARE, layout.chart() < 170 ? 2 : 5);
    }

    /** Whether every face has room for its number; otherwise only air and surfaces are numbered. */
    boolean numbersAll() {
        return PushApart.size(wishes(marks())) <= end;
    }

    void draw() {
        axis();
        buildUp.dewPoint().ifPresent(this::dewPoint);
        List<Mark> marks = marks();
        List<Mark> numbered = numbersAll() ? marks : outer(marks);
        List<Double> places = PushApart.centres(wishes(numbered), 0, end);
        for (int i = 0; i < numbered.size(); i++) {
            number(numbered.get(i), places.get(i));
        }
        line(marks);
    }

    /** A temperature at a place along; air is not at a face of the section. */
    private record Mark(double along, double temperature, boolean air) {}

    private List<Mark> marks() {
        List<Mark> marks = new ArrayList<>();
        marks.add(new Mark(layout.film() * 0.15, buildUp.first().temperature(), true));
        for (int i = 0; i < buildUp.temperatures().size(); i++) {
            double along = i == 0 ? spans.get(0).start() : spans.get(i - 1).end();
            marks.add(new Mark(along, buildUp.temperatures().get(i), false));
        }
        marks.add(new Mark(end - layout.film() * 0.15, buildUp.last().temperature(), true));
        return marks;
    }

    private static List<Mark> outer(List<Mark> marks) {
        int count = marks.size();
        return List.of(marks.get(0), marks.get(1), marks.get(count - 2), marks.get(count - 1));
    }

    private List<PushApart.Wish> wishes(List<Mark> marks) {
        return marks.stream()
                .map(mark -> new PushApart.Wish(mark.along(), plane.stacked() ? 22 : size(mark)))
                .toList();
    }

    private static double size(Mark mark) {
        return Lettering.width(Figures.degrees(mark.temperature()), false) + 8;
    }

    private void axis() {
        for (double temperature : ticks.values()) {
            double across = across(temperature);
            canvas.line(plane.at(0, across), plane.at(end, across), Stroke.GRID);
            tick(across, ticks.text(temperature));
        }
        Point unit = plane.at(plane.stacked() ? -16 : -8, layout.chart() + layout.labels() / 2);
        canvas.text(unit, "°C", TextStyle.QUIET.at(outside()));
        canvas.rectangle(plane.box(0, 0, end, layout.chart()), Palette.NONE, Stroke.THIN);
    }

    private void tick(double across, String text) {
        canvas.text(plane.at(plane.stacked() ? -14 : -8, across), text, TextStyle.QUIET.at(outside()));
    }

    private TextStyle.Anchor outside() {
        return plane.stacked() ? TextStyle.Anchor.MIDDLE : TextStyle.Anchor.END;
    }

    private void dewPoint(double temperature) {
        double across = across(temperature);
        canvas.line(plane.at(0, across), plane.at(end, across), new Stroke(Palette.MUTED, 1.5, "8 4 2 4"));
        Label label = Label.empty()
                .and("dew point", 200, TextStyle.QUIET)
                .and(Figures.celsius(temperature), 200, TextStyle.QUIET);
        boolean down = plane.stacked();
        double room = down ? label.width() / 2 : label.height() / 2;
        double middle = Math.max(room, Math.min(across, layout.chart() - (down ? room - 12 : 0)));
        Point at = plane.at(end + (down ? 6 + label.height() / 2 : 6), middle);
        canvas.label(at, label, down ? TextStyle.Anchor.MIDDLE : TextStyle.Anchor.START);
    }

    /** The number of a face, led to it from the line above and from the section below. */
    private void number(Mark mark, double place) {
        double chart = layout.chart();
        double half = plane.stacked() ? 24 : 10;
        double middle = chart + layout.labels() / 2;
        Point dot = plane.at(mark.along(), across(mark.temperature()));
        canvas.polyline(
                List.of(
                        dot,
                        plane.at(mark.along(), chart),
                        plane.at(mark.along(), chart + 3),
                        plane.at(place, middle - half)),
                Stroke.GUIDE);
        if (!mark.air()) {
            canvas.polyline(
                    List.of(
                            plane.at(place, middle + half),
                            plane.at(mark.along(), layout.sectionNear() - 3),
                            plane.at(mark.along(), layout.sectionNear())),
                    Stroke.GUIDE);
        }
        canvas.text(
                plane.at(place, middle),
                Figures.degrees(mark.temperature()),
                TextStyle.PLAIN.at(TextStyle.Anchor.MIDDLE));
    }

    private void line(List<Mark> marks) {
        int last = marks.size() - 1;
        film(0, marks.get(0), marks.get(1));
        film(end, marks.get(last), marks.get(last - 1));
        canvas.polyline(marks.subList(1, last).stream().map(this::point).toList(), Stroke.ACCENT);
        marks.forEach(mark -> canvas.circle(point(mark), 3.5, Palette.PAPER, new Stroke(Palette.ACCENT, 2, "")));
    }

    /** Level in the air, then bent to the surface, as the film does it. */
    private void film(double from, Mark air, Mark surface) {
        double bend = from + (surface.along() - from) * 0.6;
        canvas.curve(
                plane.at(from, across(air.temperature())),
                plane.at(bend, across(air.temperature())),
                plane.at(bend, across(air.temperature())),
                point(surface),
                Stroke.ACCENT);
    }

    private Point point(Mark mark) {
        return plane.at(mark.along(), across(mark.temperature()));
    }

    private double across(double temperature) {
        double pad = 10;
        double part = (ticks.highest() - temperature) / (ticks.highest() - ticks.lowest());
        return pad + part * (layout.chart() - 2 * pad);
    }
}
