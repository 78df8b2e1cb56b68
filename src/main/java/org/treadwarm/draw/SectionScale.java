package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * How a section lies on the sheet: one scale for both directions, layers known only by their resistance as bands.
 *
 * @param section what is drawn
 * @param spacings how many spacings are seen: an odd number, so that a heater is in the middle
 * @param scale pixels per m
 * @param left left side in pixels
 */
record SectionScale(IsothermSection section, int spacings, double scale, double left) {
    /** Height of a layer whose thickness is not known. */
    private static final double BAND = 14;
    /** Share of the free width that a section takes up if more spacings can help it. */
    private static final double FILLED = 0.5;

    private static final int MOST_SPACINGS = 7;

    /** The section as large as a width and a height allow. */
    static SectionScale fitting(IsothermSection section, double left, double width, double height) {
        int spacings = 1;
        double byHeight = height / section.depth();
        while (spacings < MOST_SPACINGS && spacings * section.spacing() * byHeight < FILLED * width) {
            spacings += 2;
        }
        return new SectionScale(section, spacings, Math.min(width / (spacings * section.spacing()), byHeight), left);
    }

    double width() {
        return spacings * section.spacing() * scale;
    }

    double right() {
        return left + width();
    }

    double middle() {
        return left + width() / 2;
    }

    double pitch() {
        return section.spacing() * scale;
    }

    /** The axes of the heaters from left to right. */
    List<Double> axes() {
        List<Double> axes = new ArrayList<>();
        for (int i = 0; i < spacings; i++) {
            axes.add(left + (i + 0.5) * pitch());
        }
        return axes;
    }

    List<LayerSpan> spans(double top) {
        List<LayerSpan> spans = new ArrayList<>();
        double start = top;
        for (Layer layer : section.layers()) {
            boolean known = layer.thickness().isPresent();
            double end = start + (known ? layer.thickness().getAsDouble() * scale : BAND);
            spans.add(new LayerSpan(layer, start, end, known ? LayerSpan.Drawn.TO_SCALE : LayerSpan.Drawn.SYMBOL));
            start = end;
        }
        return spans;
    }

    /** The same without members that cross a layer: where they lie in this section is not known. */
    static List<LayerSpan> unbridged(List<LayerSpan> spans) {
        return spans.stream()
                .map(span -> {
                    Layer layer = span.layer();
                    Layer plain = new Layer(
                            layer.name(),
                            layer.thickness(),
                            layer.resistance(),
                            layer.family(),
                            Optional.empty(),
                            layer.remarks());
                    return new LayerSpan(plain, span.start(), span.end(), span.drawn());
                })
                .toList();
    }

    double height() {
        List<LayerSpan> spans = spans(0);
        return spans.get(spans.size() - 1).end();
    }

    /**
     * Where a depth is drawn under a top. At a face where bands lie there are two such places; between them for a row
     * that is not told to be the upper or the lower one.
     */
    double down(double top, double depth, boolean upper, boolean lower) {
        double above = top + depth * scale;
        double below = above;
        double face = 0;
        for (Layer layer : section.layers()) {
            if (layer.thickness().isPresent()) {
                face += layer.thickness().getAsDouble();
            } else if (face < depth - 1e-9) {
                above += BAND;
                below += BAND;
            } else if (face <= depth + 1e-9) {
                below += BAND;
            }
        }
        return upper ? above : lower ? below : (above + below) / 2;
    }
}
