package org.treadwarm.physics.section;

import java.util.function.BooleanSupplier;
import java.util.function.ToDoubleFunction;

/** Makes a grid finer until a number of the section hardly changes. */
final class Refinement {
    /** Refining ends at this relative error. */
    private static final double ERROR_GOAL = 1e-3;

    /** On the finest grid allowed, so much relative error is still an answer: it is told, and a coarse answer beats none. */
    private static final double ERROR_ALLOWED = 1e-2;

    private static final double RESIDUAL_GOAL = 1e-10;

    private Refinement() {}

    /** A number and how far it can be trusted. */
    record Answer(double value, Accuracy accuracy) {}

    /** The part of the change from a grid to one of half its cell size that is left as error, for errors of an order. */
    static double partLeft(double order) {
        return 1 / (Math.pow(2, order) - 1);
    }

    /**
     * The number on the first grid whose estimated error is at most 0.1 %, or on the finest grid allowed where it is at most 1 %.
     *
     * @param order assumed of the error
     * @throws IllegalStateException when no grid of a permitted size is fine enough
     */
    static Answer of(
            Section section, Grid first, ToDoubleFunction<Field> number, double order, BooleanSupplier stopped) {
        Grid grid = first;
        double coarse = number.applyAsDouble(Conduction.solve(section, grid, RESIDUAL_GOAL, stopped));
        while (4 * grid.cells() <= Conduction.MOST_CELLS) {
            grid = grid.halved();
            Field field = Conduction.solve(section, grid, RESIDUAL_GOAL, stopped);
            double fine = number.applyAsDouble(field);
            double error = partLeft(order) * Math.abs(fine - coarse) / Math.abs(fine);
            boolean finest = 4 * grid.cells() > Conduction.MOST_CELLS;
            if (error <= (finest ? ERROR_ALLOWED : ERROR_GOAL)) {
                return new Answer(fine, new Accuracy(error, field.residual(), field.iterations(), (int) grid.cells()));
            }
            coarse = fine;
        }
        throw new IllegalStateException(
                "the section's error did not fall to " + ERROR_ALLOWED + " within " + Conduction.MOST_CELLS + " cells");
    }
}
