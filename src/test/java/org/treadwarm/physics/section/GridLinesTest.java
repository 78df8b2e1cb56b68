package org.treadwarm.physics.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Graded lines: fine where asked, growing smoothly, through every given position. */
class GridLinesTest {
    @Test
    void cellsGrowSmoothlyFromAFineStretch() {
        double[] lines = new GridLines(0.25, 0.1).fine(0, 0.01, 0.0025).at(1).lines();
        assertThat(lines[0]).isZero();
        assertThat(lines[4]).isEqualTo(0.01);
        assertThat(lines[lines.length - 1]).isEqualTo(1);
        for (int i = 1; i + 1 < lines.length; i++) {
            double before = lines[i] - lines[i - 1];
            double after = lines[i + 1] - lines[i];
            assertThat(after / before).isBetween(0.9, 1.4);
            assertThat(after).isLessThanOrEqualTo(0.11);
        }
    }

    @Test
    void positionsThatCoincideButForRoundingAreOneLine() {
        double[] lines = new GridLines(0, 0.5).at(0).at(0.1 + 0.2).at(0.3).at(1).lines();
        for (int i = 1; i < lines.length; i++) {
            assertThat(lines[i] - lines[i - 1]).isGreaterThan(0.1);
        }
    }

    @Test
    void halvingKeepsEveryLine() {
        Grid grid = new Grid(new double[] {0, 1, 3}, new double[] {0, 2}).halved();
        assertThat(grid.columns()).isEqualTo(4);
        assertThat(grid.rows()).isEqualTo(2);
        assertThat(grid.x(2)).isCloseTo(1.5, within(1e-15));
        assertThat(grid.width(3)).isCloseTo(1, within(1e-15));
    }

    @Test
    void linesMustRise() {
        assertThatThrownBy(() -> new Grid(new double[] {0, 1, 1}, new double[] {0, 2}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("vertical lines must rise");
    }
}
