package org.treadwarm.physics.section;

import java.util.List;

/**
 * What a floor gives and how warm it gets. Fluxes in W/m² of floor, temperatures in degrees Celsius.
 *
 * @param upwardFlux to the room
 * @param downwardFlux to what is below
 * @param heatInput from the heater: the sum of both fluxes
 * @param surfaceMean of the finished surface, above the covering
 * @param surfaceMaximum of the finished surface
 * @param surfaceMinimum of the finished surface
 * @param heaterTemperature mean of the cable's skin, or of the pipe's outside
 * @param warmFaces highest temperature of each layer's face towards the heater, from the topmost layer; of the heater's own layer
 *     the mean of the heater's outside
 * @param accuracy how far the numbers can be trusted
 * @param field the computed temperatures
 */
public record FloorTemperatures(
        double upwardFlux,
        double downwardFlux,
        double heatInput,
        double surfaceMean,
        double surfaceMaximum,
        double surfaceMinimum,
        double heaterTemperature,
        List<Double> warmFaces,
        Accuracy accuracy,
        Field field) {
    public FloorTemperatures {
        warmFaces = List.copyOf(warmFaces);
    }

    /**
     * Temperatures for drawing, over half a spacing and from the lowest face to the finished one; layers without thickness are not
     * seen.
     *
     * @param columns number of points across, at least 2
     * @param rows number of points upward, at least 2
     */
    public TemperatureMap map(int columns, int rows) {
        Require.that(columns >= 2 && rows >= 2, "a map needs at least two points each way");
        Grid grid = field.grid();
        double width = grid.across(grid.columns());
        double height = grid.upward(grid.rows());
        double[] x = new double[columns];
        double[] y = new double[rows];
        double[][] temperature = new double[rows][columns];
        for (int i = 0; i < columns; i++) {
            x[i] = width * i / (columns - 1);
        }
        for (int j = 0; j < rows; j++) {
            y[j] = height * j / (rows - 1);
            for (int i = 0; i < columns; i++) {
                temperature[j][i] = field.temperature(x[i], y[j]);
            }
        }
        return new TemperatureMap(x, y, temperature);
    }
}
