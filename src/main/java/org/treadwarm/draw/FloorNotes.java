package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;

/** What is said at the right of a floor's section: its temperatures, and the heat that leaves by the edges. */
final class FloorNotes {
    private static final double LEADER = 34;
    private static final double BELOW_HEATER = 40;
    private static final double GAP = 8;

    private final Canvas canvas;
    private final FloorSection floor;
    private final double x;
    private final double width;

    /** Notes from the section's right side to the end of the sheet, less a margin. */
    FloorNotes(Canvas canvas, FloorSection floor, double x, double end) {
        this.canvas = canvas;
        this.floor = floor;
        this.x = x;
        this.width = end - x - LEADER - 6;
    }

    /** Height they need in any case. */
    double height() {
        return PushApart.size(wishes(0, 0));
    }

    /** Draws them beside what they belong to, between two heights. */
    void draw(double surface, double heater, double from, double to) {
        List<Double> places = PushApart.centres(wishes(surface, heater), from, to);
        leader(surface, places.get(0));
        leader(heater, places.get(1));
        if (floor.fluxEdge().isPresent()) {
            edge(floor.fluxEdge().getAsDouble() >= 0, places.get(2));
        }
        for (int i = 0; i < places.size(); i++) {
            canvas.label(new Point(x + LEADER + 6, places.get(i)), labels().get(i), TextStyle.Anchor.START);
        }
    }

    private void leader(double from, double to) {
        double end = x + LEADER;
        canvas.polyline(
                List.of(new Point(x, from), new Point(x + 8, from), new Point(end - 8, to), new Point(end, to)),
                Stroke.LEADER);
        canvas.circle(new Point(x, from), 3, Palette.INK, Stroke.NONE);
    }

    private void edge(boolean out, double y) {
        Point inner = new Point(x + 2, y);
        Point outer = new Point(x + LEADER, y);
        FlowArrow.draw(canvas, out ? inner : outer, out ? outer : inner);
    }

    private List<PushApart.Wish> wishes(double surface, double heater) {
        List<Label> labels = labels();
        List<Double> places = List.of(surface, heater, heater + BELOW_HEATER);
        List<PushApart.Wish> wishes = new ArrayList<>();
        for (int i = 0; i < labels.size(); i++) {
            wishes.add(new PushApart.Wish(places.get(i), labels.get(i).height() + GAP));
        }
        return wishes;
    }

    private List<Label> labels() {
        List<Label> labels = new ArrayList<>();
        labels.add(label("surface", Figures.celsius(floor.surfaceTemperature())));
        labels.add(label(floor.heater(), Figures.celsius(floor.heaterTemperature())));
        floor.fluxEdge().ifPresent(flux -> {
            String words = flux < 0 ? "in by the edges" : "out by the edges";
            labels.add(label(words, Figures.flux(Math.abs(flux))));
        });
        return labels;
    }

    private Label label(String name, String number) {
        return Label.empty().and(name, width, TextStyle.PLAIN).and(number, width, TextStyle.STRONG);
    }
}
