package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.treadwarm.draw.FootSection.EdgeStrip;

class FootDrawingTest {
    private static final double OUTWARD = 0.5;
    private static final double INWARD = 0.5;
    private static final double UPWARD = 0.45;

    @Test
    void namesMaterialsAndTheDimensionsThatCount() {
        String words = words(Sheet.wide("f"), section(0.3, 0.15, 0.6, true, 1.0));

        assertThat(words)
                .contains("inside", "outdoors", "ground", "wall 300 mm", "foundation\n600 mm")
                .contains("heated plane\nabove ground\n150 mm", "50 mm · R 1.43 m²K/W · 400 mm deep")
                .contains("EPS", "concrete", "Dotted: the finished\nsurface.")
                .contains("Lines of equal temperature every 10 %, from 10 to 90 %");
    }

    @Test
    void tellsTheSameInWordsAlone() {
        String svg = FootDrawing.draw(Sheet.wide("f"), section(0.3, 0.15, 0.6, true, 1.0));
        assertThat(svg.replace('\u00a0', ' '))
                .contains("Wall foot in section: brick")
                .contains("Inside at the left, outdoors at the right of the brick, 300 mm.")
                .contains("Upright at the floor&#39;s edge: edge insulation 50 mm, 400 mm deep.");
        assertThat(FootDrawing.draw(Sheet.wide("f"), section(0.3, 0.15, 0.6, false, 1.0)))
                .contains("No edge insulation.");
    }

    @Test
    void saysHowFarAFoundationGoesOn() {
        assertThat(words(Sheet.wide("f"), section(0.3, 0.15, 3, false, 1.0)).replace('\n', ' '))
                .contains("The foundation goes on to 3.00 m below the ground.")
                .doesNotContain("foundation 3000 mm");
    }

    @ParameterizedTest
    @MethodSource("org.treadwarm.draw.DrawingsTest#cases")
    void isLegible(DrawingsTest.Case one) {
        Random random = one.random();
        double thickness = 0.05 + random.nextDouble() * 0.6;
        double plane = random.nextBoolean() ? 0 : random.nextDouble() * 0.5;
        double foundation = random.nextDouble() * 2;
        words(one.sheet(), section(thickness, plane, foundation, random.nextBoolean(), 0.9 + random.nextDouble()));
    }

    @Test
    void refusesWhatHasNoThickness() {
        Layer none = new Layer("felt", OptionalDouble.empty(), 1, MaterialFamily.OTHER, Optional.empty(), List.of());
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new EdgeStrip(none, 0.3))
                .withMessageContaining("must have a thickness");
    }

    private static FootSection section(
            double thickness, double plane, double foundation, boolean strip, double downward) {
        return new FootSection(
                "brick",
                List.of(layer("concrete", 0.1, 0.07), layer("EPS", 0.12, 3.4)),
                0.06,
                plane,
                layer("brick", thickness, 0.4),
                foundation,
                "λ 1.3 W/(m·K)",
                "λ 2 W/(m·K)",
                strip ? Optional.of(new EdgeStrip(layer("edge insulation", 0.05, 1.43), 0.4)) : Optional.empty(),
                INWARD,
                OUTWARD,
                UPWARD,
                downward,
                field(thickness, plane, downward));
    }

    private static Layer layer(String name, double thickness, double resistance) {
        return new Layer(
                name, OptionalDouble.of(thickness), resistance, MaterialFamily.of(name), Optional.empty(), List.of());
    }

    /** Not solved, but with lines of every level: it falls from the corner outward and down. */
    private static TemperatureField field(double thickness, double plane, double downward) {
        double[] x = places(INWARD + thickness + OUTWARD, INWARD, INWARD + thickness);
        double[] depth = places(UPWARD + downward, UPWARD, UPWARD + plane);
        double[][] values = new double[depth.length][x.length];
        for (int row = 0; row < depth.length; row++) {
            for (int column = 0; column < x.length; column++) {
                double across = x[column] - INWARD;
                double down = depth[row] - UPWARD;
                boolean air = across < 0 && down < 0 || across > thickness && down < plane;
                values[row][column] =
                        air ? Double.NaN : 100 * Math.exp(-2 * Math.max(0, across) - 2 * Math.max(0, down));
            }
        }
        return new TemperatureField(x, depth, values);
    }

    private static double[] places(double end, double... faces) {
        java.util.TreeSet<Double> places = new java.util.TreeSet<>();
        for (int i = 0; i <= 40; i++) {
            places.add(end * i / 40);
        }
        for (double face : faces) {
            places.add(face);
        }
        return places.stream().mapToDouble(Double::doubleValue).toArray();
    }

    private static String words(Sheet sheet, FootSection section) {
        return DrawingCheck.read(FootDrawing.draw(sheet, section)).holds().words();
    }
}
