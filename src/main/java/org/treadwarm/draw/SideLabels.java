package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;

/** Labels at the right of a drawing, each led to a height of it and pushed apart where they would collide. */
final class SideLabels {
    static final double LEADER = 26;
    private static final double GAP = 6;

    /** A label and the height it belongs to. */
    private record Entry(double y, Label label) {}

    private final double x;
    private final double width;
    private final List<Entry> entries = new ArrayList<>();

    /** Labels from a place of the sheet to its margin. */
    SideLabels(double x, double end) {
        this.x = x;
        this.width = end - x - LEADER - 4;
    }

    void add(double y, String name, String number) {
        Label label = Label.empty().and(name, width, TextStyle.PLAIN);
        entries.add(new Entry(y, label.and(number, width, TextStyle.STRONG)));
    }

    void add(double y, String text) {
        entries.add(new Entry(y, Label.empty().and(text, width, TextStyle.PLAIN)));
    }

    /** Height they need in any case. */
    double height() {
        return PushApart.size(wishes());
    }

    /** Draws them between two heights, those that belong higher above the others. */
    void draw(Canvas canvas, double from, double to) {
        entries.sort((one, other) -> Double.compare(one.y(), other.y()));
        List<Double> places = PushApart.centres(wishes(), from, to);
        double end = x + LEADER;
        for (int i = 0; i < entries.size(); i++) {
            double y = entries.get(i).y();
            double place = places.get(i);
            canvas.polyline(
                    List.of(new Point(x, y), new Point(x + 6, y), new Point(end - 6, place), new Point(end, place)),
                    Stroke.LEADER);
            canvas.label(new Point(end + 4, place), entries.get(i).label(), TextStyle.Anchor.START);
        }
    }

    private List<PushApart.Wish> wishes() {
        return entries.stream()
                .map(entry -> new PushApart.Wish(entry.y(), entry.label().height() + GAP))
                .toList();
    }
}
