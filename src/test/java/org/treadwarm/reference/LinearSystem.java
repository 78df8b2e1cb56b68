package org.treadwarm.reference;

/** Gaussian elimination with column pivoting. */
final class LinearSystem {
    private LinearSystem() {}

    /**
     * Solves matrix x = right side; both are overwritten.
     *
     * @throws IllegalArgumentException when the matrix is singular
     */
    static double[] solve(double[][] matrix, double[] right) {
        int size = right.length;
        for (int column = 0; column < size; column++) {
            bringLargestUp(matrix, right, column);
            for (int row = column + 1; row < size; row++) {
                double factor = matrix[row][column] / matrix[column][column];
                for (int k = column; k < size; k++) {
                    matrix[row][k] -= factor * matrix[column][k];
                }
                right[row] -= factor * right[column];
            }
        }
        double[] solution = new double[size];
        for (int row = size - 1; row >= 0; row--) {
            double rest = right[row];
            for (int k = row + 1; k < size; k++) {
                rest -= matrix[row][k] * solution[k];
            }
            solution[row] = rest / matrix[row][row];
        }
        return solution;
    }

    private static void bringLargestUp(double[][] matrix, double[] right, int column) {
        int best = column;
        for (int row = column + 1; row < right.length; row++) {
            if (Math.abs(matrix[row][column]) > Math.abs(matrix[best][column])) {
                best = row;
            }
        }
        if (matrix[best][column] == 0) {
            throw new IllegalArgumentException("a floating space is joined to no fixed temperature");
        }
        double[] line = matrix[column];
        matrix[column] = matrix[best];
        matrix[best] = line;
        double value = right[column];
        right[column] = right[best];
        right[best] = value;
    }
}
