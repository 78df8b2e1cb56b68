package org.treadwarm.physics.section;

/**
 * Temperatures on a lattice of points, for drawing. The arrays belong to whoever asked for the map.
 *
 * @param x from the plane through the heater's axis, or from a wall's inner face outward, m
 * @param y upward from the lowest face, or from the heated plane beside a wall, m
 * @param temperature degrees Celsius, by row, then by column: {@code temperature[j][i]} at {@code x[i], y[j]}; NaN where a wall's foot
 *     has air
 */
@SuppressWarnings("ArrayRecordComponent")
public record TemperatureMap(double[] x, double[] y, double[][] temperature) {}
