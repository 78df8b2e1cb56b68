package org.treadwarm.physics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Test;

/** Tables between their rows, on them, and outside. */
class InterpolationTest {
    private final LinearTable line = LinearTable.of("spacing", Map.of(0.1, 3.0, 0.2, 5.0, 0.4, 1.0));
    private final BilinearTable grid = BilinearTable.of(
            "spacing", "covering", Map.of(0.1, Map.of(0.0, 1.0, 2.0, 5.0), 0.3, Map.of(0.0, 2.0, 2.0, 10.0)));

    @Test
    void aLineIsStraightBetweenItsRowsAndExactOnThem() {
        assertThat(line.at(0.1)).isEqualTo(3);
        assertThat(line.at(0.4)).isEqualTo(1);
        assertThat(line.at(0.15)).isCloseTo(4, within(1e-12));
        assertThat(line.at(0.35)).isCloseTo(2, within(1e-12));
    }

    @Test
    void aLineRefusesWhatLiesOutside() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> line.at(0.41))
                .withMessage("the spacing is 0.41, allowed is 0.1 to 0.4");
        assertThatIllegalArgumentException().isThrownBy(() -> line.at(0.09));
        assertThatIllegalArgumentException().isThrownBy(() -> line.at(Double.NaN));
        assertThatIllegalArgumentException().isThrownBy(() -> LinearTable.of("spacing", Map.of()));
        assertThatIllegalArgumentException().isThrownBy(() -> LinearTable.of("spacing", Map.of(1.0, Double.NaN)));
    }

    /** Over a function of the form a + b x + c y + d x y bilinear interpolation is exact. */
    @Test
    void aGridReproducesABilinearFunction() {
        for (double row = 0.1; row <= 0.3; row += 0.01) {
            for (double column = 0; column <= 2; column += 0.125) {
                double share = (row - 0.1) / 0.2;
                double expected = (1 + 2 * column) * (1 - share) + (2 + 4 * column) * share;
                assertThat(grid.at(row, column)).isCloseTo(expected, within(1e-12));
            }
        }
    }

    @Test
    void aGridRefusesWhatLiesOutside() {
        assertThatIllegalArgumentException().isThrownBy(() -> grid.at(0.31, 1)).withMessageContaining("spacing");
        assertThatIllegalArgumentException().isThrownBy(() -> grid.at(0.2, 2.1)).withMessageContaining("covering");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> BilinearTable.of("a", "b", Map.of(1.0, Map.of(1.0, 1.0), 2.0, Map.of(2.0, 1.0))))
                .withMessageContaining("same columns");
    }
}
