package org.treadwarm.physics.section;

import java.util.Arrays;

/** The lines of a rectilinear grid, m: from left to right and from below to above. Immutable. */
public final class Grid {
    private final double[] across;
    private final double[] upward;

    /**
     * A grid from its lines.
     *
     * @param across positions of the vertical lines, at least two, rising
     * @param upward heights of the horizontal lines, at least two, rising
     * @throws IllegalArgumentException when lines do not rise
     */
    public Grid(double[] across, double[] upward) {
        this.across = rising("vertical", across);
        this.upward = rising("horizontal", upward);
    }

    private static double[] rising(String direction, double[] lines) {
        if (lines.length < 2) {
            throw new IllegalArgumentException(
                    "a grid needs at least two " + direction + " lines, not " + lines.length);
        }
        for (int i = 1; i < lines.length; i++) {
            if (!(lines[i] > lines[i - 1])) {
                throw new IllegalArgumentException("the " + direction + " lines must rise; " + lines[i]
                        + " m does not lie above " + lines[i - 1] + " m");
            }
        }
        return lines.clone();
    }

    /** A grid of equal cells. */
    public static Grid uniform(double width, double height, int columns, int rows) {
        return new Grid(equal(width, columns), equal(height, rows));
    }

    private static double[] equal(double length, int parts) {
        double[] lines = new double[parts + 1];
        Arrays.setAll(lines, i -> length * i / parts);
        return lines;
    }

    /** The same grid with every cell cut into four. */
    public Grid halved() {
        return new Grid(halved(across), halved(upward));
    }

    private static double[] halved(double[] lines) {
        double[] halved = new double[2 * lines.length - 1];
        for (int i = 0; i < halved.length; i++) {
            halved[i] = (lines[i / 2] + lines[(i + 1) / 2]) / 2;
        }
        return halved;
    }

    /** Number of columns of cells. */
    public int columns() {
        return across.length - 1;
    }

    /** Number of rows of cells. */
    public int rows() {
        return upward.length - 1;
    }

    /** Number of cells. */
    public long cells() {
        return (long) columns() * rows();
    }

    double width(int column) {
        return across[column + 1] - across[column];
    }

    double height(int row) {
        return upward[row + 1] - upward[row];
    }

    /** Middle of a column. */
    double x(int column) {
        return (across[column] + across[column + 1]) / 2;
    }

    /** Middle of a row. */
    double y(int row) {
        return (upward[row] + upward[row + 1]) / 2;
    }

    double across(int line) {
        return across[line];
    }

    double upward(int line) {
        return upward[line];
    }

    /**
     * The horizontal line at a height.
     *
     * @throws IllegalArgumentException when there is none
     */
    int lineAt(double height) {
        int line = lineAt(upward, height);
        Require.that(line >= 0, "no grid line at a height of " + height + " m");
        return line;
    }

    private static int lineAt(double[] lines, double position) {
        double slack = 1e-9 * (lines[lines.length - 1] - lines[0]);
        for (int line = 0; line < lines.length; line++) {
            if (Math.abs(lines[line] - position) <= slack) {
                return line;
            }
        }
        return -1;
    }

    /** Refuses borders inside the grid that do not lie on vertical lines. */
    void requireAcross(double... positions) {
        require("x = ", across, positions);
    }

    /** Refuses borders inside the grid that do not lie on horizontal lines. */
    void requireUpward(double... positions) {
        require("y = ", upward, positions);
    }

    private static void require(String coordinate, double[] lines, double... positions) {
        for (double position : positions) {
            boolean inside = position > lines[0] && position < lines[lines.length - 1];
            Require.that(
                    !inside || lineAt(lines, position) >= 0,
                    "the grid has no line at the border " + coordinate + position + " m");
        }
    }

    /** The column a position lies in; the first or the last one for a position beyond them. */
    int columnAt(double x) {
        return cellAt(across, x);
    }

    /** The row a height lies in; the first or the last one for a height beyond them. */
    int rowAt(double y) {
        return cellAt(upward, y);
    }

    private static int cellAt(double[] lines, double position) {
        int found = Arrays.binarySearch(lines, position);
        int cell = found >= 0 ? found : -found - 2;
        return Math.max(0, Math.min(cell, lines.length - 2));
    }
}
