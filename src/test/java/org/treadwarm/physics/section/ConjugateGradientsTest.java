package org.treadwarm.physics.section;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The solver needs few steps, whatever the size, the shape of the cells and the materials. */
class ConjugateGradientsTest {
    /** Two layers with a film on both faces; cells so many times as wide as high. */
    private static Lattice layers(int columns, int rows, double aspect, double jump) {
        Lattice lattice = new Lattice(columns, rows);
        for (int row = 0; row < rows; row++) {
            double own = row < rows / 3 ? 1 : jump;
            double above = row + 1 < rows / 3 ? 1 : jump;
            for (int column = 0; column < columns; column++) {
                int cell = lattice.cell(column, row);
                lattice.right[cell] = column + 1 < columns ? own / aspect : 0;
                lattice.up[cell] = row + 1 < rows ? aspect * 2 / (1 / own + 1 / above) : 0;
                lattice.held[cell] = row == 0 || row == rows - 1 ? 0.01 : 0;
            }
        }
        return lattice;
    }

    private static int iterations(Lattice lattice) {
        double[] load = new double[lattice.cells()];
        load[lattice.cell(0, lattice.rows / 3)] = 1;
        double[] answer = new double[lattice.cells()];
        Convergence convergence = new ConjugateGradients(lattice).solve(load, answer, 1e-8, () -> false);
        assertThat(convergence.residual()).isLessThanOrEqualTo(1e-8);
        assertThat(leftOver(lattice, load, answer)).isLessThan(1.1e-8);
        return convergence.iterations();
    }

    /** The relative residual, formed from the lattice itself. */
    private static double leftOver(Lattice lattice, double[] load, double[] answer) {
        double[] left = load.clone();
        for (int cell = 0; cell < lattice.cells(); cell++) {
            left[cell] -= lattice.held[cell] * answer[cell];
            move(left, answer, cell, cell + 1, lattice.right[cell]);
            move(left, answer, cell, cell + lattice.columns, lattice.up[cell]);
        }
        double squares = Arrays.stream(left).map(value -> value * value).sum();
        return Math.sqrt(
                squares / Arrays.stream(load).map(value -> value * value).sum());
    }

    private static void move(double[] left, double[] answer, int from, int to, double conductance) {
        if (conductance > 0) {
            double heat = conductance * (answer[from] - answer[to]);
            left[from] -= heat;
            left[to] += heat;
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {16, 33, 64, 127, 256, 500})
    void theNumberOfStepsHardlyGrowsWithTheSize(int size) {
        assertThat(iterations(layers(size, size, 1, 30))).isBetween(4, 14);
    }

    @ParameterizedTest
    @CsvSource({"0.001, 1", "0.03, 8000", "1, 8000", "1, 0.0001", "30, 8000", "100, 1", "100, 100"})
    void longCellsAndJumpsOfConductivityCostFewSteps(double aspect, double jump) {
        assertThat(iterations(layers(120, 90, aspect, jump))).isLessThanOrEqualTo(20);
    }

    @ParameterizedTest
    @CsvSource({"1, 1", "1, 7", "2, 1", "3, 5", "7, 1", "4, 4"})
    void theSmallestGridsAreSolved(int columns, int rows) {
        assertThat(iterations(layers(columns, rows, 1, 2))).isLessThanOrEqualTo(columns * rows + 1);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void conductancesWithoutAnyPatternTakeLonger(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        Lattice lattice = layers(60, 60, 1, 1);
        for (int cell = 0; cell < lattice.cells(); cell++) {
            lattice.right[cell] *= Math.pow(10, random.nextDouble(-2, 2));
            lattice.up[cell] *= Math.pow(10, random.nextDouble(-2, 2));
        }
        assertThat(iterations(lattice)).isBetween(20, 150);
    }
}
