package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleBinaryOperator;
import org.junit.jupiter.api.Test;

/** Against fields whose lines are known. */
class IsolinesTest {
    /** Not even, as a section's grid is not. */
    private static final double[] UNEVEN = {-1, -0.9, -0.7, -0.4, 0, 0.1, 0.3, 0.6, 1};

    @Test
    void aLinearFieldHasStraightLines() {
        List<List<Point>> lines = isolines(UNEVEN, (x, y) -> 2 * x + 3 * y).at(0.55);
        assertThat(lines).hasSize(1);
        assertThat(lines.get(0))
                .hasSizeGreaterThan(8)
                .allSatisfy(point -> assertThat(2 * point.x() + 3 * point.y()).isCloseTo(0.55, within(1e-12)));
        assertThat(List.of(first(lines.get(0)).x(), last(lines.get(0)).x())).containsExactlyInAnyOrder(-1.0, 1.0);
    }

    @Test
    void aLineThroughNodesIsOneLine() {
        List<List<Point>> lines = isolines(UNEVEN, (x, y) -> x).at(0.1);
        assertThat(lines).hasSize(1);
        assertThat(lines.get(0)).allSatisfy(point -> assertThat(point.x()).isEqualTo(0.1));
        assertThat(Math.abs(first(lines.get(0)).y() - last(lines.get(0)).y())).isEqualTo(2);
    }

    @Test
    void aRadialFieldHasClosedCircles() {
        double[] fine = new double[101];
        Arrays.setAll(fine, i -> -1 + i / 50.0);
        List<List<Point>> lines = isolines(fine, Math::hypot).at(0.617);
        assertThat(lines).hasSize(1);
        List<Point> circle = lines.get(0);
        assertThat(first(circle)).isEqualTo(last(circle));
        // Linear over a step h misses the radius r by at most h^2 / (8 r) = 8.1e-5.
        assertThat(circle)
                .allSatisfy(
                        point -> assertThat(Math.hypot(point.x(), point.y())).isCloseTo(0.617, within(8.2e-5)));
        double length = 0;
        for (int i = 1; i < circle.size(); i++) {
            length += Math.hypot(
                    circle.get(i).x() - circle.get(i - 1).x(),
                    circle.get(i).y() - circle.get(i - 1).y());
        }
        assertThat(length).isCloseTo(2 * Math.PI * 0.617, within(1e-3));
    }

    @Test
    void aSaddleIsJoinedAsItsSurfaceRuns() {
        Isolines saddle = isolines(new double[] {-1, 1}, (x, y) -> x * y);
        assertThat(saddle.at(0.2))
                .hasSize(2)
                .allSatisfy(line -> assertThat(line)
                        .hasSize(2)
                        .satisfies(
                                ends -> assertThat(first(ends).x() + last(ends).x())
                                        .isCloseTo(first(ends).y() + last(ends).y(), within(1e-12))));
        assertThat(saddle.at(-0.2))
                .hasSize(2)
                .allSatisfy(line -> assertThat(first(line).x() + last(line).x())
                        .isCloseTo(-first(line).y() - last(line).y(), within(1e-12)));
    }

    @Test
    void leavesOutCellsWithACornerThatIsNoNumber() {
        double[] even = {0, 1, 2, 3, 4};
        List<List<Point>> lines =
                isolines(even, (x, y) -> x == 2 && y == 2 ? Double.NaN : x).at(1.5);
        assertThat(lines).hasSize(2);
        assertThat(lines.stream().flatMap(List::stream).map(Point::y)).containsOnly(0.0, 1.0, 3.0, 4.0);
        assertThat(isolines(even, (x, y) -> Double.NaN).at(1)).isEmpty();
    }

    @Test
    void hasNoLineBeyondTheField() {
        assertThat(isolines(UNEVEN, (x, y) -> x).at(1.5)).isEmpty();
        assertThat(isolines(UNEVEN, (x, y) -> 7).at(7)).isEmpty();
    }

    private static Isolines isolines(double[] places, DoubleBinaryOperator field) {
        double[][] values = Arrays.stream(places)
                .mapToObj(y -> Arrays.stream(places)
                        .map(x -> field.applyAsDouble(x, y))
                        .toArray())
                .toArray(double[][]::new);
        return new Isolines(places, places, values);
    }

    private static Point first(List<? extends Point> line) {
        return line.get(0);
    }

    private static Point last(List<? extends Point> line) {
        return line.get(line.size() - 1);
    }
}
