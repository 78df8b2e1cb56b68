package org.treadwarm.physics.section;

import java.util.function.BooleanSupplier;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;

/** The two fields that all others of a floor are made of, at one coefficient above after another, on one grid. */
final class UnitFields {
    private final FloorSection floor;
    private final FloorLayout layout;
    private final Grid grid;
    private final BooleanSupplier stopped;
    private final Runnable solved;
    private final boolean wet;
    private final double[] warmAbove;
    private final double[] driven;

    UnitFields(FloorSection floor, Grid grid, BooleanSupplier stopped, Runnable solved) {
        this.floor = floor;
        this.layout = floor.layout();
        this.grid = grid;
        this.stopped = stopped;
        this.solved = solved;
        this.wet = floor.heater() instanceof WaterPipe;
        this.warmAbove = new double[(int) grid.cells()];
        this.driven = new double[(int) grid.cells()];
    }

    /**
     * What each number rises by with 1 K more above than below, and what with 1 W/m² upward, each with the other unchanged. Between
     * them stands what drives the floor, the water's temperature or the cable's heat, which follows from the flux.
     */
    double[][] factors(double coefficient) {
        Section section = section(coefficient);
        Balances balances = new Balances(section, grid);
        ConjugateGradients solver = new ConjugateGradients(balances.lattice);
        double[] above = section.known();
        above[FloorLayout.ABOVE] = 1;
        double[] drive = section.known();
        if (wet) {
            drive[drive.length - 1] = 1;
        }
        double[] byDifference = numbers(balances, solver, above, 0, warmAbove);
        double[] byDrive = numbers(balances, solver, drive, wet ? 0 : 1, driven);
        int flux = byDrive.length - 1;
        double[][] factors = new double[2][flux];
        for (int number = 0; number < flux; number++) {
            factors[1][number] = byDrive[number] / byDrive[flux];
            factors[0][number] = byDifference[number] - factors[1][number] * byDifference[flux];
        }
        solved.run();
        return factors;
    }

    /** The floor with everything at 0 °C; a cable gives 1 W/m². */
    private Section section(double coefficient) {
        FloorHeater heater = floor.heater().driven(wet ? 0 : floor.spacing());
        return new FloorLayout(floor.spacing(), floor.layers(), heater)
                .section(new Film(0, coefficient), new Film(0, floor.below().coefficient()));
    }

    /** The numbers of a field in the order of {@link FloorResponse}, then the flux upward. */
    private double[] numbers(
            Balances balances, ConjugateGradients solver, double[] known, double heatFactor, double[] guess) {
        Field field =
                Conduction.linear(balances, solver, known, heatFactor, guess, FloorSection.RESIDUAL_GOAL, stopped);
        FloorReading reading = new FloorReading(layout, field);
        int layers = layout.layers().size();
        double[] numbers = new double[FloorResponse.FACES + layers + 1];
        double[] surface = reading.surface();
        numbers[FloorResponse.AT_HEATER] = reading.atHeater(surface);
        numbers[FloorResponse.BETWEEN] = reading.between(surface);
        numbers[FloorResponse.HEATER] = reading.heaterTemperature();
        numbers[FloorResponse.WATER] = wet ? known[known.length - 1] : 0;
        numbers[FloorResponse.INPUT] = reading.heatInput();
        for (int layer = 0; layer < layers; layer++) {
            numbers[FloorResponse.FACES + layer] = layer == layout.heater().layer()
                    ? reading.heaterTemperature()
                    : reading.atHeater(reading.warmFace(layer));
        }
        numbers[FloorResponse.FACES + layers] = reading.upwardFlux();
        return numbers;
    }
}
