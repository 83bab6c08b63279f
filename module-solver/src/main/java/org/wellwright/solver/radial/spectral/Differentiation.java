package org.wellwright.solver.radial.spectral;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.wellwright.solver.numerics.ElementBasis;

/**
 * Differentiation matrices of the interpolant through the nodes of a rule. Source: Berrut and Trefethen (2004), eq.
 * 9.4.
 */
final class Differentiation {
    private static final Map<Integer, double[][]> MATRICES = new ConcurrentHashMap<>();

    private Differentiation() {}

    /** d/dt on [0, 1] at the nodes of an ordinary table. */
    static double[][] at(ElementBasis.Table table) {
        return MATRICES.computeIfAbsent(table.size, size -> compute(table.position));
    }

    private static double[][] compute(double[] t) {
        int n = t.length;
        double[] weight = new double[n];
        for (int i = 0; i < n; i++) {
            double product = 1;
            for (int j = 0; j < n; j++) {
                if (j != i) {
                    product *= 4 * (t[i] - t[j]);
                }
            }
            weight[i] = 1 / product;
        }
        double[][] d = new double[n][n];
        for (int i = 0; i < n; i++) {
            double sum = 0;
            for (int j = 0; j < n; j++) {
                if (j != i) {
                    d[i][j] = weight[j] / weight[i] / (t[i] - t[j]);
                    sum += d[i][j];
                }
            }
            d[i][i] = -sum;
        }
        return d;
    }
}
