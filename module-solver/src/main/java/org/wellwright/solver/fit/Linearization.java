package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.SingularValueDecomposition;

/**
 * Covariance (JᵀJ)⁻¹ from the singular values of J with its columns scaled to length 1, and the directions in which J
 * does not change. Immutable.
 */
final class Linearization {
    /** Singular values below this fraction of the largest mean that the data fix only a combination. */
    private static final double FLAT = 1e-9;

    private final double[][] covariance;
    private final List<List<Integer>> flat;
    private final double[] leverage;

    private Linearization(double[][] covariance, List<List<Integer>> flat, double[] leverage) {
        this.covariance = covariance;
        this.flat = flat;
        this.leverage = leverage;
    }

    /**
     * Analyses a Jacobian.
     *
     * @param jacobian dr_i/dx_j, shape [m][n], m ≥ n
     * @param columns the variables to look at
     */
    static Linearization of(double[][] jacobian, List<Integer> columns) {
        int m = jacobian.length;
        int n = columns.size();
        if (n == 0) {
            return new Linearization(new double[0][0], List.of(), new double[m]);
        }
        double[] norms = new double[n];
        RealMatrix scaled = new Array2DRowRealMatrix(Math.max(m, n), n);
        for (int j = 0; j < n; j++) {
            for (double[] row : jacobian) {
                norms[j] = Math.hypot(norms[j], row[columns.get(j)]);
            }
            for (int i = 0; norms[j] > 0 && i < m; i++) {
                scaled.setEntry(i, j, jacobian[i][columns.get(j)] / norms[j]);
            }
        }
        SingularValueDecomposition svd = new SingularValueDecomposition(scaled);
        double[] singular = svd.getSingularValues();
        RealMatrix v = svd.getV();
        List<List<Integer>> flat = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            if (!(singular[k] > FLAT * singular[0])) {
                flat.add(members(v.getColumn(k)));
            }
        }
        double[][] covariance = new double[n][n];
        for (int a = 0; a < n; a++) {
            for (int b = 0; b < n; b++) {
                double sum = 0;
                for (int k = 0; k < n; k++) {
                    sum += v.getEntry(a, k) * v.getEntry(b, k) / (singular[k] * singular[k]);
                }
                covariance[a][b] = sum / norms[a] / norms[b];
            }
        }
        double[] leverage = new double[m];
        for (int i = 0; i < m; i++) {
            for (int k = 0; k < n; k++) {
                leverage[i] +=
                        singular[k] > FLAT * singular[0] ? square(svd.getU().getEntry(i, k)) : 0;
            }
        }
        return new Linearization(covariance, List.copyOf(flat), leverage);
    }

    /** Positions among the columns of the variables in each direction that the data do not fix. */
    List<List<Integer>> flat() {
        return flat;
    }

    double covariance(int row, int column) {
        return covariance[row][column];
    }

    /** How much of a row's residual the variables take up: its element of the hat matrix' diagonal. */
    double leverage(int row) {
        return leverage[row];
    }

    double[][] covariance() {
        double[][] copy = new double[covariance.length][];
        for (int i = 0; i < copy.length; i++) {
            copy[i] = covariance[i].clone();
        }
        return copy;
    }

    private static List<Integer> members(double[] direction) {
        double largest = 0;
        for (double component : direction) {
            largest = Math.max(largest, Math.abs(component));
        }
        List<Integer> members = new ArrayList<>();
        for (int j = 0; j < direction.length; j++) {
            if (Math.abs(direction[j]) > 0.05 * largest) {
                members.add(j);
            }
        }
        return List.copyOf(members);
    }

    private static double square(double x) {
        return x * x;
    }
}
