package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;

/** Draws layers in section: hatched, with members that cross them and with marks where they are not to scale. */
final class SectionPainter {
    private final Canvas canvas;
    private final Plane plane;
    private final double near;
    private final double far;

    /** A section between two places across. */
    SectionPainter(Canvas canvas, Plane plane, double near, double far) {
        this.canvas = canvas;
        this.plane = plane;
        this.near = near;
        this.far = far;
    }

    void draw(List<LayerSpan> spans) {
        for (LayerSpan span : spans) {
            Box whole = plane.box(span.start(), near, span.end(), far);
            canvas.rectangle(whole, canvas.hatch(span.layer().family()), Stroke.OUTLINE);
            span.layer().bridge().ifPresent(bridge -> members(span, bridge));
            switch (span.drawn()) {
                case WIDENED -> breakMark(span);
                case SYMBOL -> zigzag(span);
                case TO_SCALE -> {}
            }
        }
    }

    /** Two members that together take up the bridge's share of what is seen. */
    private void members(LayerSpan span, Bridge bridge) {
        double width = (far - near) * bridge.share() / 2;
        for (double place : new double[] {0.25, 0.75}) {
            double middle = near + (far - near) * place;
            Box member = plane.box(span.start(), middle - width / 2, span.end(), middle + width / 2);
            canvas.rectangle(member, canvas.hatch(MaterialFamily.of(bridge.name())), Stroke.OUTLINE);
        }
    }

    /** The layer is broken across, as a draughtsman breaks what he does not draw to scale. */
    private void breakMark(LayerSpan span) {
        double middle = (near + far) / 2;
        double from = span.start() - 3;
        double to = span.end() + 3;
        List<Point> gap = List.of(
                plane.at(from, middle - 1),
                plane.at(to, middle - 7),
                plane.at(to, middle + 1),
                plane.at(from, middle + 7));
        canvas.polygon(gap, Palette.PAPER, Stroke.NONE);
        canvas.line(gap.get(0), gap.get(1), Stroke.OUTLINE);
        canvas.line(gap.get(3), gap.get(2), Stroke.OUTLINE);
    }

    private void zigzag(LayerSpan span) {
        double third = (span.end() - span.start()) / 3;
        double step = (far - near) / 12;
        List<Point> points = new ArrayList<>();
        for (int i = 0; i <= 12; i++) {
            double along = span.middle() + (i % 2 == 0 ? -third : third) / 1.2;
            points.add(plane.at(along, near + i * step));
        }
        canvas.polyline(points, Stroke.OUTLINE);
    }
}
