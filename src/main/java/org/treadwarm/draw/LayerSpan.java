package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;

/**
 * Where a layer is drawn along the depth of an assembly.
 *
 * @param layer the layer
 * @param start first face in pixels
 * @param end last face in pixels
 * @param drawn how true to scale it is
 */
record LayerSpan(Layer layer, double start, double end, Drawn drawn) {
    /** How true to scale a layer is drawn. */
    enum Drawn {
        TO_SCALE(""),
        WIDENED("drawn thicker than to scale"),
        SYMBOL("thickness not given, not to scale");

        private final String words;

        Drawn(String words) {
            this.words = words;
        }

        String words() {
            return words;
        }
    }

    private static final double LEAST = 14;
    private static final double SYMBOL_WIDTH = 28;

    double middle() {
        return (start + end) / 2;
    }

    /**
     * Lays layers out over a length: to one scale, those that would be too thin to hatch widened, those without a
     * thickness at a fixed width, or all alike if none has one. The layers always take up the whole length.
     */
    static List<LayerSpan> over(List<Layer> layers, double from, double length) {
        double even = length / (1.5 * layers.size());
        double least = Math.min(LEAST, even);
        boolean anyToScale = layers.stream().anyMatch(layer -> layer.thickness().isPresent());
        double symbol = anyToScale ? Math.min(SYMBOL_WIDTH, even) : length / layers.size();
        double scale = scale(layers, length, least, symbol);
        List<LayerSpan> spans = new ArrayList<>();
        double start = from;
        for (Layer layer : layers) {
            Drawn drawn = drawn(layer, scale, least);
            double width = drawn == Drawn.SYMBOL
                    ? symbol
                    : drawn == Drawn.WIDENED ? least : layer.thickness().getAsDouble() * scale;
            spans.add(new LayerSpan(layer, start, start + width, drawn));
            start += width;
        }
        return spans;
    }

    private static Drawn drawn(Layer layer, double scale, double least) {
        if (layer.thickness().isEmpty()) {
            return Drawn.SYMBOL;
        }
        return layer.thickness().getAsDouble() * scale < least ? Drawn.WIDENED : Drawn.TO_SCALE;
    }

    /** Widening a layer takes room from the others, which may make another too thin: repeated until none is. */
    private static double scale(List<Layer> layers, double length, double least, double symbol) {
        double scale = Double.MAX_VALUE;
        while (true) {
            double room = length;
            double thickness = 0;
            for (Layer layer : layers) {
                switch (drawn(layer, scale, least)) {
                    case SYMBOL -> room -= symbol;
                    case WIDENED -> room -= least;
                    case TO_SCALE -> thickness += layer.thickness().getAsDouble();
                }
            }
            if (thickness == 0 || room / thickness >= scale) {
                return scale;
            }
            scale = room / thickness;
        }
    }
}
