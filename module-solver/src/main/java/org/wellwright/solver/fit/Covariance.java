package org.wellwright.solver.fit;

import java.util.List;

/** Covariance of the free parameters and the unknown group errors, in that order and in their units. Immutable. */
public final class Covariance {
    private final List<String> names;
    private final double[][] matrix;

    private Covariance(List<String> names, double[][] matrix) {
        this.names = List.copyOf(names);
        this.matrix = matrix;
    }

    /** Copies a symmetric matrix, one row and column per name. */
    public static Covariance of(List<String> names, double[][] matrix) {
        if (matrix.length != names.size()) {
            throw new IllegalArgumentException(
                    "a covariance needs one row per name, got %d for %d".formatted(matrix.length, names.size()));
        }
        double[][] copy = new double[matrix.length][];
        for (int i = 0; i < matrix.length; i++) {
            copy[i] = matrix[i].clone();
        }
        return new Covariance(names, copy);
    }

    /** What the rows stand for. */
    public List<String> names() {
        return names;
    }

    /** Number of rows. */
    public int size() {
        return names.size();
    }

    /** Covariance of two quantities, in the product of their units. */
    public double at(int row, int column) {
        return matrix[row][column];
    }

    /** Correlation of two quantities, −1 to 1; 0 where one of them does not vary. */
    public double correlation(int row, int column) {
        double product = Math.sqrt(matrix[row][row]) * Math.sqrt(matrix[column][column]);
        return product > 0 ? matrix[row][column] / product : 0;
    }

    /** A copy of the matrix. */
    public double[][] toArray() {
        double[][] copy = new double[matrix.length][];
        for (int i = 0; i < matrix.length; i++) {
            copy[i] = matrix[i].clone();
        }
        return copy;
    }
}
