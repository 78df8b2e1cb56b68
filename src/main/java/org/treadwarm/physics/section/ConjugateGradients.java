package org.treadwarm.physics.section;

import java.util.Arrays;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;

/**
 * Solves a lattice's balances by conjugate gradients, preconditioned by {@link Multigrid}.
 *
 * <p>Source: Y. Saad, "Iterative Methods for Sparse Linear Systems", 2003, algorithm 9.1 (from memory). Sums are taken row by row
 * and then over the rows, so that the answer is the same to the last digit on one thread and on two.
 */
final class ConjugateGradients {
    private static final int MOST_ITERATIONS = 400;

    /** How often the residual is formed anew from the answer, when the running one has drifted from it. */
    private static final int MOST_RESTARTS = 4;

    private final Multigrid multigrid;
    private final Level level;
    private final double[] answer;
    private final double[] direction;
    private final double[] product;
    private final double[] rowSums;
    private double step;
    private double keep;

    ConjugateGradients(Lattice lattice) {
        this.multigrid = new Multigrid(lattice);
        this.level = multigrid.finest();
        this.answer = new double[level.cells()];
        this.direction = new double[level.cells()];
        this.product = new double[level.cells()];
        this.rowSums = new double[level.rows];
    }

    /**
     * The temperatures at which all balances hold.
     *
     * @param load right-hand side, W/m; in the order of the lattice
     * @param temperature the first guess; receives the answer
     * @param tolerance largest relative residual, or what rounding leaves where that is more
     * @param stopped asked at every step
     * @throws CancellationException when asked to stop
     * @throws IllegalStateException when the residual does not fall to the tolerance
     */
    Convergence solve(double[] load, double[] temperature, double tolerance, BooleanSupplier stopped) {
        level.arrange(temperature, answer);
        level.arrange(load, level.load);
        double scale = Math.sqrt(run(this::residualSquares));
        if (scale == 0) {
            Arrays.fill(temperature, 0);
            return new Convergence(0, 0);
        }
        int iterations = 0;
        double residual = Double.NaN;
        for (int restart = 0; restart <= MOST_RESTARTS; restart++) {
            level.arrange(load, level.load);
            residual = Math.sqrt(run(this::formResidual)) / scale;
            if (residual <= Math.max(tolerance, rounding() / scale)) {
                level.restore(answer, temperature);
                return new Convergence(residual, iterations);
            }
            iterations += descend(tolerance * scale, MOST_ITERATIONS - iterations, stopped);
        }
        throw new IllegalStateException(
                "the temperatures did not converge: residual " + residual + " after " + iterations + " steps");
    }

    private int descend(double goal, int most, BooleanSupplier stopped) {
        double before = 0;
        int iteration = 0;
        for (double residual = Double.MAX_VALUE; residual > goal && iteration < most; iteration++) {
            if (stopped.getAsBoolean()) {
                throw new CancellationException("stopped while solving a section");
            }
            multigrid.cycle();
            double now = run(this::loadTimesCycle);
            keep = iteration == 0 ? 0 : now / before;
            before = now;
            Workers.run(level.rows, level.cells(), this::turn);
            step = now / run(this::curvature);
            residual = Math.sqrt(run(this::advance));
        }
        return iteration;
    }

    /** Sums over rows in their order, each row having been summed by itself. */
    private double run(Workers.Stretch rows) {
        Workers.run(level.rows, level.cells(), rows);
        double sum = 0;
        for (double row : rowSums) {
            sum += row;
        }
        return sum;
    }

    private void residualSquares(int from, int to) {
        for (int row = from; row < to; row++) {
            rowSums[row] = product(level.load, level.load, row * level.columns, (row + 1) * level.columns);
        }
    }

    /** The load becomes what is left of it at the present answer. */
    private void formResidual(int from, int to) {
        level.multiply(answer, product, from, to);
        for (int i = from * level.columns; i < to * level.columns; i++) {
            level.load[i] -= product[i];
        }
        residualSquares(from, to);
    }

    /** The residual that rounding leaves of the exact answer, W/m. */
    private double rounding() {
        return 2 * Math.ulp(1.0) * Math.sqrt(run(this::termSquares));
    }

    private void termSquares(int from, int to) {
        for (int row = from; row < to; row++) {
            rowSums[row] = level.termSquares(answer, row);
        }
    }

    private void loadTimesCycle(int from, int to) {
        for (int row = from; row < to; row++) {
            rowSums[row] = product(level.load, level.answer, row * level.columns, (row + 1) * level.columns);
        }
    }

    private void turn(int from, int to) {
        double share = keep;
        for (int i = from * level.columns; i < to * level.columns; i++) {
            direction[i] = level.answer[i] + share * direction[i];
        }
    }

    private void curvature(int from, int to) {
        level.multiply(direction, product, from, to);
        for (int row = from; row < to; row++) {
            rowSums[row] = product(direction, product, row * level.columns, (row + 1) * level.columns);
        }
    }

    private void advance(int from, int to) {
        double length = step;
        for (int i = from * level.columns; i < to * level.columns; i++) {
            answer[i] += length * direction[i];
            level.load[i] -= length * product[i];
        }
        residualSquares(from, to);
    }

    private static double product(double[] a, double[] b, int from, int to) {
        double first = 0;
        double second = 0;
        int i = from;
        for (; i + 1 < to; i += 2) {
            first += a[i] * b[i];
            second += a[i + 1] * b[i + 1];
        }
        return i < to ? first + second + a[i] * b[i] : first + second;
    }
}
