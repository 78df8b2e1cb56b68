package org.treadwarm.physics.section;

import java.util.Arrays;

/**
 * One grid of the multigrid cycle: its balances, and the exact solution of whole columns.
 *
 * <p>In every row the even columns (0, 2, ...) stand first, then the odd ones, so that the columns that are solved together stand
 * side by side. Columns are solved by elimination without pivoting (the balances are diagonally dominant). The kernel is longer
 * than other classes since the balances are written out for both halves, to run without branches and garbage.
 */
final class Level {
    final int columns;
    final int rows;
    final int evens;
    final int odds;

    /** From each odd column to its left and right neighbour, row by row over the odd columns. */
    private final double[] left;

    private final double[] right;
    private final double[] up;
    private final double[] held;

    /** The sum of a cell's conductances. */
    private final double[] diagonal;

    private final double[] pivot;

    /** Right-hand side, W/m. */
    final double[] load;

    /** Unknowns, K. */
    final double[] answer;

    private Level(int columns, int rows) {
        this.columns = columns;
        this.rows = rows;
        this.evens = (columns + 1) / 2;
        this.odds = columns / 2;
        this.left = new double[odds * rows];
        this.right = new double[odds * rows];
        this.up = new double[columns * rows];
        this.held = new double[columns * rows];
        this.diagonal = new double[columns * rows];
        this.pivot = new double[columns * rows];
        this.load = new double[columns * rows];
        this.answer = new double[columns * rows];
    }

    /** The finest level. */
    static Level of(Lattice lattice) {
        Level level = new Level(lattice.columns, lattice.rows);
        Workers.run(level.rows, level.cells(), (from, to) -> level.take(lattice, from, to));
        level.factor();
        return level;
    }

    private void take(Lattice lattice, int from, int to) {
        for (int row = from; row < to; row++) {
            int cell = row * columns;
            for (int column = 0; column < columns; column++) {
                int place = cell + place(column);
                up[place] = lattice.up[cell + column];
                held[place] = lattice.held[cell + column];
                setRight(row, column, lattice.right[cell + column]);
            }
        }
    }

    /** Where a column stands in its row. */
    int place(int column) {
        return (column & 1) == 0 ? column >> 1 : evens + (column >> 1);
    }

    private void setRight(int row, int column, double conductance) {
        int pair = column >> 1;
        if (pair < odds) {
            ((column & 1) == 0 ? left : right)[row * odds + pair] = conductance;
        }
    }

    int cells() {
        return columns * rows;
    }

    /**
     * The grid of the even columns alone. Each odd cell is replaced by the star-mesh rule for its links to the left, to the right
     * and to known temperatures; its link upward is given to its neighbours in the same shares. So the coarse balances have the
     * same shape, and every conductance is at least 0.
     */
    Level coarser() {
        Level coarse = new Level(evens, rows);
        Workers.run(rows, cells(), (from, to) -> coarsen(coarse, from, to));
        coarse.factor();
        return coarse;
    }

    private void coarsen(Level coarse, int from, int to) {
        double[] share = new double[2 * odds];
        double[] shareAbove = new double[2 * odds];
        shares(from, share);
        for (int row = from; row < to; row++) {
            int cell = row * columns;
            int target = row * evens;
            if (row + 1 < rows) {
                shares(row + 1, shareAbove);
            }
            for (int k = 0; k < evens; k++) {
                coarse.up[target + coarse.place(k)] = up[cell + k];
                coarse.held[target + coarse.place(k)] = held[cell + k];
            }
            for (int k = 0; k < odds; k++) {
                int odd = cell + evens + k;
                double upward = up[odd] / 2;
                int west = target + coarse.place(k);
                coarse.held[west] += held[odd] * share[2 * k];
                coarse.up[west] += upward * (share[2 * k] + shareAbove[2 * k]);
                if (k + 1 < evens) {
                    int east = target + coarse.place(k + 1);
                    coarse.held[east] += held[odd] * share[2 * k + 1];
                    coarse.up[east] += upward * (share[2 * k + 1] + shareAbove[2 * k + 1]);
                    coarse.setRight(row, k, right[row * odds + k] * share[2 * k]);
                }
            }
            double[] swap = share;
            share = shareAbove;
            shareAbove = swap;
        }
    }

    /** The shares of the left and the right neighbour in each odd cell of a row. */
    private void shares(int row, double[] share) {
        for (int k = 0; k < odds; k++) {
            double west = left[row * odds + k];
            double east = right[row * odds + k];
            double sum = west + east + held[row * columns + evens + k];
            share[2 * k] = sum > 0 ? west / sum : 0;
            share[2 * k + 1] = sum > 0 ? east / sum : 0;
        }
    }

    private void factor() {
        Workers.run(rows, cells(), this::sum);
        Workers.run(columns, cells(), this::eliminate);
    }

    private void sum(int from, int to) {
        for (int row = from; row < to; row++) {
            int cell = row * columns;
            for (int place = 0; place < columns; place++) {
                diagonal[cell + place] =
                        held[cell + place] + up[cell + place] + (row > 0 ? up[cell - columns + place] : 0);
            }
            for (int k = 0; k < odds; k++) {
                double west = left[row * odds + k];
                double east = right[row * odds + k];
                diagonal[cell + k] += west;
                diagonal[cell + evens + k] += west + east;
                if (k + 1 < evens) {
                    diagonal[cell + k + 1] += east;
                }
            }
        }
    }

    private void eliminate(int from, int to) {
        for (int place = from; place < to; place++) {
            pivot[place] = 1 / diagonal[place];
        }
        for (int row = 1; row < rows; row++) {
            int cell = row * columns;
            for (int place = from; place < to; place++) {
                double below = up[cell - columns + place];
                pivot[cell + place] = 1 / (diagonal[cell + place] - below * below * pivot[cell - columns + place]);
            }
        }
    }

    /** Solves the even columns for odd ones that are 0. */
    void startEvens(int from, int to) {
        for (int k = from; k < to; k++) {
            answer[k] = load[k] * pivot[k];
        }
        for (int row = 1; row < rows; row++) {
            int cell = row * columns;
            int below = cell - columns;
            for (int k = from; k < to; k++) {
                answer[cell + k] = (load[cell + k] + up[below + k] * answer[below + k]) * pivot[cell + k];
            }
        }
        substitute(from, to);
    }

    /** Solves the even columns for the odd ones as they are. */
    void relaxEvens(int from, int to) {
        int first = Math.max(from, 1);
        int last = Math.min(to, odds);
        for (int row = 0; row < rows; row++) {
            int cell = row * columns;
            int odd = cell + evens;
            int link = row * odds;
            if (from == 0 && odds > 0) {
                answer[cell] = load[cell] + left[link] * answer[odd];
            }
            for (int k = first; k < last; k++) {
                answer[cell + k] =
                        load[cell + k] + left[link + k] * answer[odd + k] + right[link + k - 1] * answer[odd + k - 1];
            }
            if (to > odds && odds > 0) {
                answer[cell + odds] = load[cell + odds] + right[link + odds - 1] * answer[odd + odds - 1];
            }
            forward(row, cell, from, to);
        }
        substitute(from, to);
    }

    /** Solves the odd columns for the even ones as they are. */
    void relaxOdds(int from, int to) {
        int last = Math.min(to, evens - 1);
        for (int row = 0; row < rows; row++) {
            int cell = row * columns;
            int odd = cell + evens;
            int link = row * odds;
            for (int k = from; k < last; k++) {
                answer[odd + k] =
                        load[odd + k] + left[link + k] * answer[cell + k] + right[link + k] * answer[cell + k + 1];
            }
            if (to > last) {
                answer[odd + last] = load[odd + last] + left[link + last] * answer[cell + last];
            }
            forward(row, odd, from, to);
        }
        substitute(evens + from, evens + to);
    }

    private void forward(int row, int start, int from, int to) {
        if (row == 0) {
            for (int k = from; k < to; k++) {
                answer[start + k] *= pivot[start + k];
            }
            return;
        }
        int below = start - columns;
        for (int k = from; k < to; k++) {
            answer[start + k] = (answer[start + k] + up[below + k] * answer[below + k]) * pivot[start + k];
        }
    }

    private void substitute(int from, int to) {
        for (int row = rows - 2; row >= 0; row--) {
            int cell = row * columns;
            int above = cell + columns;
            for (int place = from; place < to; place++) {
                answer[cell + place] += up[cell + place] * pivot[cell + place] * answer[above + place];
            }
        }
    }

    /**
     * What is left of the even cells' balances once {@link #startEvens} and {@link #relaxOdds} have run: only what the odd cells
     * send them. It becomes the right-hand side of the coarser level.
     */
    void restrict(Level coarse, int from, int to) {
        for (int row = from; row < to; row++) {
            int odd = row * columns + evens;
            int link = row * odds;
            int target = row * evens;
            for (int k = 0; k < evens; k++) {
                double fromRight = k < odds ? left[link + k] * answer[odd + k] : 0;
                double fromLeft = k > 0 ? right[link + k - 1] * answer[odd + k - 1] : 0;
                coarse.load[target + coarse.place(k)] = fromLeft + fromRight;
            }
        }
    }

    /** Adds the coarser level's answer to the even cells. */
    void correct(Level coarse, int from, int to) {
        for (int row = from; row < to; row++) {
            int cell = row * columns;
            int source = row * evens;
            for (int k = 0; k < evens; k++) {
                answer[cell + k] += coarse.answer[source + coarse.place(k)];
            }
        }
    }

    /** Sum of squares of a row's largest terms in the product with a vector. */
    double termSquares(double[] vector, int row) {
        double sum = 0;
        for (int place = row * columns; place < (row + 1) * columns; place++) {
            double term = diagonal[place] * vector[place];
            sum += term * term;
        }
        return sum;
    }

    /** The heat that leaves each cell of some rows at given temperatures: the matrix times a vector. */
    void multiply(double[] vector, double[] product, int from, int to) {
        for (int row = from; row < to; row++) {
            int cell = row * columns;
            int odd = cell + evens;
            int link = row * odds;
            for (int place = cell; place < cell + columns; place++) {
                product[place] = diagonal[place] * vector[place];
            }
            if (row > 0) {
                for (int place = cell; place < cell + columns; place++) {
                    product[place] -= up[place - columns] * vector[place - columns];
                }
            }
            if (row + 1 < rows) {
                for (int place = cell; place < cell + columns; place++) {
                    product[place] -= up[place] * vector[place + columns];
                }
            }
            for (int k = 0; k < odds; k++) {
                product[odd + k] -= left[link + k] * vector[cell + k];
                product[cell + k] -= left[link + k] * vector[odd + k];
            }
            for (int k = 0; k < evens - 1; k++) {
                product[odd + k] -= right[link + k] * vector[cell + k + 1];
                product[cell + k + 1] -= right[link + k] * vector[odd + k];
            }
        }
    }

    /** Puts a vector of the lattice into this level's order. */
    void arrange(double[] natural, double[] arranged) {
        Arrays.fill(arranged, 0);
        for (int row = 0; row < rows; row++) {
            int cell = row * columns;
            for (int column = 0; column < columns; column++) {
                arranged[cell + place(column)] = natural[cell + column];
            }
        }
    }

    /** Puts a vector of this level's order into the order of the lattice. */
    void restore(double[] arranged, double[] natural) {
        for (int row = 0; row < rows; row++) {
            int cell = row * columns;
            for (int column = 0; column < columns; column++) {
                natural[cell + column] = arranged[cell + place(column)];
            }
        }
    }
}
