package org.treadwarm.draw;

import java.util.List;

/** The numbers that lead from layers to the key. */
final class LayerNumbers {
    static final double PITCH = 24;
    private static final double RADIUS = 10;

    private LayerNumbers() {}

    /** Numbers beside a section, pushed apart between the bounds along. */
    static void draw(Canvas canvas, Plane plane, List<LayerSpan> spans, double across, double from, double to) {
        List<PushApart.Wish> wishes = spans.stream()
                .map(span -> new PushApart.Wish(span.middle(), PITCH))
                .toList();
        List<Double> places = PushApart.centres(wishes, from, to);
        for (int i = 0; i < spans.size(); i++) {
            double middle = spans.get(i).middle();
            canvas.polyline(
                    List.of(
                            plane.at(middle, across),
                            plane.at(middle, across + 5),
                            plane.at(places.get(i), across + 15),
                            plane.at(places.get(i), across + 20)),
                    Stroke.LEADER);
            balloon(canvas, plane.at(places.get(i), across + 20 + RADIUS), i + 1);
        }
    }

    static void balloon(Canvas canvas, Point at, int number) {
        canvas.circle(at, RADIUS, Palette.PAPER, Stroke.THIN);
        canvas.text(at, Integer.toString(number), TextStyle.PLAIN.at(TextStyle.Anchor.MIDDLE));
    }
}
