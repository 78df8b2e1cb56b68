package org.treadwarm.physics.electric;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.treadwarm.physics.Require;

/**
 * The part of a rectangular floor that is free to be heated: the floor less the union of rectangles (furniture, fixed units).
 *
 * @param floor area of the floor, m²
 * @param cutOut area of the union of the rectangles within the floor, m²
 */
public record FreeArea(double floor, double cutOut) {
    /** Floor less cut-outs, m². */
    public double free() {
        return floor - cutOut;
    }

    /** Share of the floor that is free. */
    public double share() {
        return free() / floor;
    }

    /**
     * A rectangle along the walls.
     *
     * @param x of its left side, m
     * @param y of its lower side, m
     * @param width m, above 0
     * @param depth m, above 0
     */
    public record Rectangle(double x, double y, double width, double depth) {
        public Rectangle {
            Require.within("x of a rectangle", x, -Double.MAX_VALUE, Double.MAX_VALUE);
            Require.within("y of a rectangle", y, -Double.MAX_VALUE, Double.MAX_VALUE);
            Require.positive("width of a rectangle", width);
            Require.positive("depth of a rectangle", depth);
        }

        double right() {
            return x + width;
        }

        double top() {
            return y + depth;
        }

        private Optional<Rectangle> within(Rectangle frame) {
            double left = Math.max(x, frame.x());
            double low = Math.max(y, frame.y());
            double clippedWidth = Math.min(right(), frame.right()) - left;
            double clippedDepth = Math.min(top(), frame.top()) - low;
            return clippedWidth > 0 && clippedDepth > 0
                    ? Optional.of(new Rectangle(left, low, clippedWidth, clippedDepth))
                    : Optional.empty();
        }
    }

    /** Free area of a floor; rectangles may overlap, and only their parts within the floor count. */
    public static FreeArea of(Rectangle floor, List<Rectangle> cutOuts) {
        List<Rectangle> clipped = cutOuts.stream()
                .flatMap(cutOut -> cutOut.within(floor).stream())
                .sorted(Comparator.comparingDouble(Rectangle::y))
                .toList();
        double[] sides = clipped.stream()
                .flatMapToDouble(cutOut -> DoubleStream.of(cutOut.x(), cutOut.right()))
                .sorted()
                .distinct()
                .toArray();
        double union = 0;
        for (int i = 1; i < sides.length; i++) {
            double left = sides[i - 1];
            double right = sides[i];
            Stream<Rectangle> across = clipped.stream().filter(cutOut -> cutOut.x() <= left && cutOut.right() >= right);
            union += (right - left) * covered(across.toList());
        }
        return new FreeArea(floor.width() * floor.depth(), Math.min(union, floor.width() * floor.depth()));
    }

    /** Length along y that rectangles cover together, given from low to high. */
    private static double covered(List<Rectangle> fromLowToHigh) {
        double covered = 0;
        double reached = Double.NEGATIVE_INFINITY;
        for (Rectangle cutOut : fromLowToHigh) {
            covered += Math.max(0, cutOut.top() - Math.max(reached, cutOut.y()));
            reached = Math.max(reached, cutOut.top());
        }
        return covered;
    }
}
