package org.treadwarm.physics.section;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.BooleanSupplier;

/**
 * A heated floor in section: parallel heaters of equal distance in a stack of layers, steady, as a two-dimensional field.
 *
 * <p>Source: steady conduction by finite volumes with the accuracy rules of ISO 10211:2017, clause 5 and annex C (from memory); the
 * given coefficient above, 10.8 W/(m²·K), or the basic characteristic is EN 1264-2:2008+A1:2012's.
 *
 * @param spacing between the axes of two heaters, m
 * @param layers from the finished surface down
 * @param heater which lies within one of the layers that have a thickness
 * @param above the room
 * @param below what lies under the lowest layer
 */
public record FloorSection(
        double spacing, List<FloorLayer> layers, FloorHeater heater, Condition above, Condition.Film below) {
    /** Largest estimated relative error of flux and overtemperatures. */
    public static final double ERROR_GOAL = 1e-3;

    /** Largest relative residual. */
    static final double RESIDUAL_GOAL = 4e-12;

    /** Cells across the heater on the first grid. */
    private static final int FIRST_ACROSS = 8;

    /** Assumed order of the error at a pipe's circle; 1.5 to 2 is observed. */
    private static final double ORDER = 1.5;

    private static final int MOST_HALVINGS = 5;

    public FloorSection {
        layers = List.copyOf(layers);
        new FloorLayout(spacing, layers, heater);
    }

    /** {@link #solve(BooleanSupplier)} without a way to stop. */
    public FloorTemperatures solve() {
        return solve(() -> false);
    }

    /**
     * The floor's temperatures, on grids that are made finer until the estimated error is at most {@link #ERROR_GOAL}.
     *
     * @param stopped asked at every step of the solver whether to give up
     * @throws IllegalStateException when the goal is not reached on the finest grid allowed
     * @throws java.util.concurrent.CancellationException when asked to give up
     */
    public FloorTemperatures solve(BooleanSupplier stopped) {
        FloorLayout layout = layout();
        Section section = layout.section(above, below);
        Grid grid = layout.grid(FIRST_ACROSS);
        Field field = Conduction.solve(section, grid, RESIDUAL_GOAL, stopped);
        FloorReading coarse = new FloorReading(layout, field);
        for (int halving = 1; halving <= MOST_HALVINGS && 4 * grid.cells() <= Conduction.MOST_CELLS; halving++) {
            grid = grid.halved();
            field = Conduction.solve(new Balances(section, grid), spread(field), RESIDUAL_GOAL, stopped);
            FloorReading fine = new FloorReading(layout, field);
            double error = error(coarse, fine);
            if (error <= ERROR_GOAL) {
                return temperatures(fine, field, error);
            }
            coarse = fine;
        }
        throw new IllegalStateException("the section's error did not fall to " + ERROR_GOAL + " within "
                + field.grid().cells() + " cells");
    }

    FloorLayout layout() {
        return new FloorLayout(spacing, layers, heater);
    }

    /** The temperatures of a grid on the grid with cells half as long. */
    private static double[] spread(Field field) {
        int columns = field.grid().columns();
        int rows = field.grid().rows();
        double[] fine = new double[4 * columns * rows];
        for (int row = 0; row < 2 * rows; row++) {
            for (int column = 0; column < 2 * columns; column++) {
                fine[row * 2 * columns + column] = field.temperatures()[row / 2 * columns + column / 2];
            }
        }
        return fine;
    }

    private double error(FloorReading coarse, FloorReading fine) {
        double upward = change(coarse.upwardFlux(), fine.upwardFlux(), 0);
        double surface = change(coarse.atHeater(coarse.surface()), fine.atHeater(fine.surface()), above.temperature());
        double heaterChange = change(coarse.heaterTemperature(), fine.heaterTemperature(), above.temperature());
        return Refinement.partLeft(ORDER) * Math.max(upward, Math.max(surface, heaterChange));
    }

    private static double change(double coarse, double fine, double reference) {
        double size = Math.abs(fine - reference);
        return size == 0 ? 0 : Math.abs(fine - coarse) / size;
    }

    private FloorTemperatures temperatures(FloorReading reading, Field field, double error) {
        double[] surface = reading.surface();
        List<Double> warmFaces = new ArrayList<>();
        for (int layer = 0; layer < layers.size(); layer++) {
            warmFaces.add(
                    layer == heater.layer() ? reading.heaterTemperature() : highest(reading, reading.warmFace(layer)));
        }
        return new FloorTemperatures(
                reading.upwardFlux(),
                reading.downwardFlux(),
                reading.heatInput(),
                reading.mean(surface),
                highest(reading, surface),
                lowest(reading, surface),
                reading.heaterTemperature(),
                warmFaces,
                new Accuracy(error, field.residual(), field.iterations(), (int)
                        field.grid().cells()),
                field);
    }

    private static double highest(FloorReading reading, double[] line) {
        double inside = Arrays.stream(line).max().orElseThrow();
        return Math.max(inside, Math.max(reading.atHeater(line), reading.between(line)));
    }

    private static double lowest(FloorReading reading, double[] line) {
        double inside = Arrays.stream(line).min().orElseThrow();
        return Math.min(inside, Math.min(reading.atHeater(line), reading.between(line)));
    }
}
