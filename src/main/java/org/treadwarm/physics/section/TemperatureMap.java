package org.treadwarm.physics.section;

/**
 * Temperatures on a lattice of points, for drawing. The arrays belong to whoever asked for the map.
 *
 * @param x from the plane through the heater's axis, m
 * @param y from the lowest face, m
 * @param temperature degrees Celsius, by row, then by column: {@code temperature[j][i]} at {@code x[i], y[j]}
 */
@SuppressWarnings("ArrayRecordComponent")
public record TemperatureMap(double[] x, double[] y, double[][] temperature) {}
