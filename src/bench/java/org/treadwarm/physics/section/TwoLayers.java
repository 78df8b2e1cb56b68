package org.treadwarm.physics.section;

/**
 * An invented section to time: insulation below, screed above it, a cable on the insulation, a uniform grid of square cells, films on the
 * upper and lower edge. The comparison script sets up the same balances.
 */
final class TwoLayers {
    private static final double SIDE = 0.1;
    private static final double INSULATION = 0.03;
    private static final double HEAT = 7.5;

    final Lattice lattice;
    final double[] load;

    TwoLayers(int cellsAlong) {
        this.lattice = new Lattice(cellsAlong, cellsAlong);
        this.load = new double[lattice.cells()];
        double size = SIDE / cellsAlong;
        for (int row = 0; row < cellsAlong; row++) {
            double own = conductivity(row, size);
            double above = conductivity(row + 1, size);
            for (int column = 0; column < cellsAlong; column++) {
                int cell = lattice.cell(column, row);
                lattice.right[cell] = column + 1 < cellsAlong ? own : 0;
                lattice.up[cell] = row + 1 < cellsAlong ? 2 / (1 / own + 1 / above) : 0;
            }
        }
        hold(0, size, 1 / 0.17);
        hold(cellsAlong - 1, size, 10.8);
        int lowest = 0;
        while ((lowest + 0.5) * size < INSULATION) {
            lowest++;
        }
        load[lattice.cell(0, lowest)] = HEAT;
    }

    private static double conductivity(int row, double size) {
        return (row + 0.5) * size < INSULATION ? 0.04 : 1.2;
    }

    private void hold(int row, double size, double film) {
        for (int column = 0; column < lattice.columns; column++) {
            lattice.held[lattice.cell(column, row)] = size / (size / 2 / conductivity(row, size) + 1 / film);
        }
    }

    /** Solves from nothing to a relative residual of 1e-8. */
    Convergence solve(double[] temperature) {
        return new ConjugateGradients(lattice).solve(load, temperature, 1e-8, () -> false);
    }
}
