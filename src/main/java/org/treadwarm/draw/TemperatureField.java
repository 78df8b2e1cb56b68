package org.treadwarm.draw;

import java.util.Arrays;

/** Temperatures over a section, at the nodes of a rectilinear grid whose steps need not be alike. */
public final class TemperatureField {
    private static final int MOST = 4000;

    private final double[] x;
    private final double[] y;
    private final double[][] temperatures;

    /**
     * A field; what is given is copied.
     *
     * @param x places of the columns in m from the axis of a heater, not negative and rising; at least 2, at most 4000
     * @param y depths of the rows in m below the finished surface, not negative and rising; at least 2, at most 4000;
     *     two rows may have the same depth where a layer known only by its resistance parts them
     * @param temperatures by row and column in °C; NaN where there is none, as inside a pipe
     * @throws IllegalArgumentException if the counts disagree, places do not rise or a number cannot be drawn
     */
    public TemperatureField(double[] x, double[] y, double[][] temperatures) {
        this.x = x.clone();
        this.y = y.clone();
        this.temperatures = Arrays.stream(temperatures).map(row -> row.clone()).toArray(double[][]::new);
        rises("Columns", this.x, true);
        rises("Rows", this.y, false);
        if (this.temperatures.length != this.y.length) {
            throw new IllegalArgumentException(
                    this.y.length + " depths do not go with " + this.temperatures.length + " rows");
        }
        for (double[] row : this.temperatures) {
            if (row.length != this.x.length) {
                throw new IllegalArgumentException(
                        this.x.length + " columns do not go with " + row.length + " temperatures in a row");
            }
            Arrays.stream(row)
                    .filter(degrees -> !Double.isNaN(degrees))
                    .forEach(degrees -> Checks.temperature("Temperature in the section", degrees));
        }
    }

    private static void rises(String what, double[] places, boolean always) {
        if (places.length < 2 || places.length > MOST) {
            throw new IllegalArgumentException(what + " are 2 to " + MOST + ", not " + places.length);
        }
        Checks.notNegative(what, places[0]);
        for (int i = 1; i < places.length; i++) {
            boolean rises = always ? places[i] > places[i - 1] : places[i] >= places[i - 1];
            boolean thrice = i > 1 && places[i] == places[i - 2];
            if (!rises || thrice) {
                throw new IllegalArgumentException(what + " must rise: " + places[i - 1] + " then " + places[i]);
            }
            Checks.drawable(what, places[i]);
        }
    }

    int columns() {
        return x.length;
    }

    int rows() {
        return y.length;
    }

    double x(int column) {
        return x[column];
    }

    double y(int row) {
        return y[row];
    }

    double at(int row, int column) {
        return temperatures[row][column];
    }

    /** Whether this row is the upper one of two at the same depth. */
    boolean upperOfTwo(int row) {
        return row + 1 < y.length && y[row + 1] == y[row];
    }

    /** Whether this row is the lower one of two at the same depth. */
    boolean lowerOfTwo(int row) {
        return row > 0 && y[row - 1] == y[row];
    }
}
