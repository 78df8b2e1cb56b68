package org.treadwarm.physics.network;

import java.util.Arrays;

/**
 * Steady temperatures of the spaces that float between spaces of known temperature.
 *
 * <p>Each floating space i obeys sum_j H_ij (theta_i - theta_j) + H_i theta_i = s_i, with H_ij the conductances to other floating
 * spaces, H_i the sum of those to known temperatures and s_i the sum of conductance times known temperature (ISO 13789:2017,
 * heat balance of an unheated space). The matrix is symmetric; it is factored as L D Lᵀ inside its envelope after numbering
 * the spaces by the reverse Cuthill-McKee order, so that a job of many small groups costs the sum of the groups.
 */
public final class Network {
    private final int size;
    private final int[] from;
    private final int[] to;
    private final double[] conductance;
    private final double[] anchor;
    private final int[] position;
    private final int[] first;
    private final int[] row;
    private final double[] factor;
    private final double[] diagonal;
    private final double[] work;

    /**
     * A network of a fixed shape.
     *
     * @param size number of floating spaces
     * @param from one end of each link between floating spaces
     * @param to the other end of each link
     */
    public Network(int size, int[] from, int[] to) {
        this.size = size;
        this.from = from.clone();
        this.to = to.clone();
        this.conductance = new double[from.length];
        this.anchor = new double[size];
        this.position = Ordering.reverseCuthillMcKee(size, from, to);
        this.first = new int[size];
        this.row = new int[size + 1];
        this.diagonal = new double[size];
        this.work = new double[size];
        for (int i = 0; i < size; i++) {
            first[i] = i;
        }
        for (int link = 0; link < from.length; link++) {
            int a = position[from[link]];
            int b = position[to[link]];
            int later = Math.max(a, b);
            first[later] = Math.min(first[later], Math.min(a, b));
        }
        for (int i = 0; i < size; i++) {
            row[i + 1] = row[i] + i - first[i];
        }
        this.factor = new double[row[size]];
    }

    /** Number of floating spaces. */
    public int size() {
        return size;
    }

    /** Forgets every conductance. */
    public void clear() {
        Arrays.fill(conductance, 0);
        Arrays.fill(anchor, 0);
    }

    /** Adds a conductance in W/K to a link between two floating spaces. */
    public void addLink(int link, double wattsPerKelvin) {
        conductance[link] += wattsPerKelvin;
    }

    /** Adds a conductance in W/K from a floating space to some known temperature. */
    public void addAnchor(int space, double wattsPerKelvin) {
        anchor[space] += wattsPerKelvin;
    }

    /**
     * Factors the balances.
     *
     * @return whether every space is held by some known temperature, so that the balances have one answer
     */
    public boolean factor() {
        Arrays.fill(factor, 0);
        for (int i = 0; i < size; i++) {
            diagonal[position[i]] = anchor[i];
        }
        for (int link = 0; link < from.length; link++) {
            int a = position[from[link]];
            int b = position[to[link]];
            int later = Math.max(a, b);
            factor[row[later] + Math.min(a, b) - first[later]] -= conductance[link];
            diagonal[a] += conductance[link];
            diagonal[b] += conductance[link];
        }
        for (int i = 0; i < size; i++) {
            if (!eliminate(i)) {
                return false;
            }
        }
        return true;
    }

    private boolean eliminate(int i) {
        double full = diagonal[i];
        int start = row[i] - first[i];
        for (int j = first[i]; j < i; j++) {
            double sum = factor[start + j];
            int other = row[j] - first[j];
            for (int k = Math.max(first[i], first[j]); k < j; k++) {
                sum -= factor[start + k] * factor[other + k];
            }
            factor[start + j] = sum;
        }
        double pivot = full;
        for (int j = first[i]; j < i; j++) {
            double scaled = factor[start + j] / diagonal[j];
            pivot -= scaled * factor[start + j];
            factor[start + j] = scaled;
        }
        diagonal[i] = pivot;
        return pivot > 1e-13 * full;
    }

    /**
     * Solves the balances for one right-hand side.
     *
     * @param source conductance times known temperature, summed for each floating space, W
     * @param temperature receives the temperatures, degrees Celsius
     */
    public void solve(double[] source, double[] temperature) {
        for (int i = 0; i < size; i++) {
            work[position[i]] = source[i];
        }
        substitute();
        for (int i = 0; i < size; i++) {
            temperature[i] = work[position[i]];
        }
    }

    private void substitute() {
        for (int i = 0; i < size; i++) {
            int start = row[i] - first[i];
            for (int j = first[i]; j < i; j++) {
                work[i] -= factor[start + j] * work[j];
            }
        }
        for (int i = 0; i < size; i++) {
            work[i] /= diagonal[i];
        }
        for (int i = size - 1; i >= 0; i--) {
            int start = row[i] - first[i];
            for (int j = first[i]; j < i; j++) {
                work[j] -= factor[start + j] * work[i];
            }
        }
    }

    /** Largest heat left over in any space's balance, W: how well the answer satisfies the equations. */
    public double residual(double[] source, double[] temperature) {
        double[] left = work;
        for (int i = 0; i < size; i++) {
            left[i] = anchor[i] * temperature[i] - source[i];
        }
        for (int link = 0; link < from.length; link++) {
            double heat = conductance[link] * (temperature[from[link]] - temperature[to[link]]);
            left[from[link]] += heat;
            left[to[link]] -= heat;
        }
        double largest = 0;
        for (int i = 0; i < size; i++) {
            largest = Math.max(largest, Math.abs(left[i]));
        }
        return largest;
    }
}
