package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;

/** The key under a section: number, hatch, name, thickness and resistance of each layer. */
final class LayerKey {
    private static final double SWATCH = 26;
    private static final double TEXT = 76;
    private static final double ROW_GAP = 12;

    private final Canvas canvas;
    private final Box room;

    /** A key that starts at the top left of the box and takes its width. */
    LayerKey(Canvas canvas, Box room) {
        this.canvas = canvas;
        this.room = room;
    }

    /** Draws the rows, each with what is to be added to it, and returns where they end. */
    double draw(List<LayerSpan> spans, List<List<String>> added) {
        double y = room.y();
        for (int i = 0; i < spans.size(); i++) {
            LayerSpan span = spans.get(i);
            LayerNumbers.balloon(canvas, new Point(room.x() + 11, y + TextStyle.LINE_HEIGHT / 2), i + 1);
            y = row(y, span.layer().family(), span.layer().name(), details(span, added.get(i)));
            if (span.layer().bridge().isPresent()) {
                Bridge bridge = span.layer().bridge().get();
                String share = Figures.percent(bridge.share()) + " of the area";
                y = row(y, MaterialFamily.of(bridge.name()), "crossed by " + bridge.name(), List.of(share));
            }
        }
        return y;
    }

    /** Draws a row without a number and returns where it ends. */
    double row(double top, MaterialFamily family, String name, List<String> details) {
        Box swatch = new Box(room.x() + 34, top, SWATCH, TextStyle.LINE_HEIGHT - 1);
        canvas.rectangle(swatch, canvas.hatch(family), Stroke.THIN);
        double width = room.width() - TEXT;
        boolean beside = room.width() >= 500;
        double nameWidth = beside ? width * 0.46 : width;
        Label left = Label.empty().and(name, nameWidth, TextStyle.PLAIN);
        Label right = Label.empty();
        String joined = String.join(" · ", details);
        right = right.and(joined, beside ? width * 0.5 : width, TextStyle.QUIET);
        double x = room.x() + TEXT;
        canvas.label(new Point(x, top + left.height() / 2), left, TextStyle.Anchor.START);
        double rightTop = beside ? top : top + left.height();
        double rightX = beside ? x + width * 0.5 : x;
        canvas.label(new Point(rightX, rightTop + right.height() / 2), right, TextStyle.Anchor.START);
        return Math.max(top + left.height(), rightTop + right.height()) + ROW_GAP;
    }

    private static List<String> details(LayerSpan span, List<String> added) {
        List<String> details = new ArrayList<>();
        span.layer().thickness().ifPresent(metres -> details.add(Figures.thickness(metres)));
        details.add(Figures.resistance(span.layer().resistance()));
        details.addAll(span.layer().remarks());
        if (!span.drawn().words().isEmpty()) {
            details.add(span.drawn().words());
        }
        details.addAll(added);
        return details;
    }
}
