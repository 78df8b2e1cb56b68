package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class WorkingEquationTest {
    private static final Map<String, double[]> VALUES = Map.of(
            "a", new double[] {2},
            "R_se", new double[] {0.04},
            "none", new double[] {},
            "x", new double[] {1, 2, 3},
            "y", new double[] {4, 5, 6},
            "z", new double[] {-5, 4});

    @ParameterizedTest
    @CsvSource({
        "1 + 2 * 3, 7",
        "(1 + 2) * 3, 9",
        "8 - 3 - 2, 3",
        "8 / 4 / 2, 1",
        "-2^2, -4",
        "2^-2, 0.25",
        "2^(-2), 0.25",
        "a - -a, 4",
        "2 * R_se, 0.08",
        "5.67e-8 * 1e8, 5.67",
        "2 * pi, 6.283185307179586",
        "ln(1), 0",
        "sum(x), 6",
        "sum(x * y), 32",
        "sum(a * x), 12",
        "sum(none), 0",
        "sum(a * none), 0",
        "count(x), 3",
        "count(none), 0",
        "min(y), 4",
        "max(y), 6",
        "max(0; a), 2",
        "sum(max(0; z)), 4",
        "sum(max(0; -z)), 5",
    })
    void computes(String text, double expected) {
        assertThat(left(text)).isCloseTo(expected, within(1e-14));
    }

    private static double left(String text) {
        return WorkingEquation.sides(text + " = 0", VALUES).left();
    }

    @Test
    void setsPathsSideBySide() {
        Map<String, double[]> values = Map.of(
                "R", new double[] {0.5, 0.5},
                "f1", new double[] {0.25},
                "L1", new double[] {1, 2},
                "B1", new double[] {1},
                "f2", new double[] {0.5},
                "L2", new double[] {4},
                "B2", new double[] {0});
        double right =
                WorkingEquation.sides("0 = paths(sum(R); f#; L#; B#)", values).right();
        double expected = 0.75 * 0.5 / 8 + 0.75 * 0.5 / 4 + 0.25 * 0.5 / 6 + 0.25 * 0.5 / 2;
        assertThat(right).isCloseTo(expected, within(1e-15));
    }

    @Test
    void findsTheWorstImbalance() {
        Map<String, double[]> values = Map.of("phi1", new double[] {3, -2.5}, "phi2", new double[] {1, -4, 1});
        assertThat(WorkingEquation.sides("2 = imbalance(phi#)", values).agree()).isTrue();
        assertThat(WorkingEquation.sides("0 = imbalance(q#)", values).agree()).isTrue();
    }

    @Test
    void tellsSidesApart() {
        assertThat(WorkingEquation.sides("a = 2", VALUES).agree()).isTrue();
        assertThat(WorkingEquation.sides("a = 2 + 1e-8", VALUES).agree()).isFalse();
        assertThat(WorkingEquation.sides("1e9 * a = 2e9 + 1", VALUES).agree()).isTrue();
        assertThat(WorkingEquation.sides("0 / 0 = 0", VALUES).agree()).isFalse();
        assertThat(WorkingEquation.sides("a = sum(x) - 4", VALUES).used()).containsExactly("a", "x");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "a",
                "a =",
                "= a",
                "a = b",
                "a = 2 = 2",
                "a = (2",
                "a = 2)",
                "a = 2 3",
                "a = 2 $ 3",
                "a = x",
                "a = none",
                "a = sum(x * z)",
                "a = sum(x * none)",
                "a = cosh(a)",
                "a = ln(a; a)",
                "a = min(none)",
                "a = paths(1; x)",
                "a = paths(1; f#; L#)",
                "a = imbalance(x)",
            })
    void refuses(String text) {
        assertThatThrownBy(() -> WorkingEquation.sides(text, VALUES))
                .isInstanceOfAny(IllegalArgumentException.class, java.util.NoSuchElementException.class);
    }
}
