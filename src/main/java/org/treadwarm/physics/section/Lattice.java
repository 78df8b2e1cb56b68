package org.treadwarm.physics.section;

/**
 * Conductances between the cells of a rectilinear grid and from cells to known temperatures, W/(m·K) per metre of depth. Cells
 * are numbered row by row from the lowest row, each row from the left. A cell without any conductance is no unknown; its held
 * conductance is then 1, so that its balance reads temperature = 0.
 */
final class Lattice {
    final int columns;
    final int rows;

    /** From each cell to the next one to the right; 0 in the last column. */
    final double[] right;

    /** From each cell to the one above; 0 in the last row. */
    final double[] up;

    /** From each cell to all known temperatures together. */
    final double[] held;

    Lattice(int columns, int rows) {
        this.columns = columns;
        this.rows = rows;
        this.right = new double[columns * rows];
        this.up = new double[columns * rows];
        this.held = new double[columns * rows];
    }

    int cells() {
        return columns * rows;
    }

    int cell(int column, int row) {
        return row * columns + column;
    }
}
