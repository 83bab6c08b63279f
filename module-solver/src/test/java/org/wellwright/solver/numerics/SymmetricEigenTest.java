package org.wellwright.solver.numerics;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SymmetricEigenTest {
    private static double[] random(int n, Random random, double grading) {
        double[] a = new double[n * n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                double x = random.nextGaussian() + (i == j ? Math.pow(1 + i, grading) : 0);
                a[i * n + j] = x;
                a[j * n + i] = x;
            }
        }
        return a;
    }

    /** Against the eigenvalues of Commons Math 3.6.1; residual and orthogonality of the vectors. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 8, 15, 30, 60})
    void agreesWithCommonsMath(int n) {
        Random random = new Random(20240501);
        for (double grading : new double[] {0, 3}) {
            double[] a = random(n, random, grading);
            double[][] rows = new double[n][n];
            double size = 0;
            for (int i = 0; i < n; i++) {
                System.arraycopy(a, i * n, rows[i], 0, n);
                for (double x : rows[i]) {
                    size = Math.max(size, Math.abs(x));
                }
            }
            double[] expected = new EigenDecomposition(new Array2DRowRealMatrix(rows)).getRealEigenvalues();
            java.util.Arrays.sort(expected);
            double[] vectors = a.clone();
            double[] values = new double[n];
            SymmetricEigen.decompose(vectors, n, values, new double[n + n * n]);
            for (int k = 0; k < n; k++) {
                assertThat(Math.abs(values[k] - expected[k])).isLessThan(1e-13 * n * size);
                for (int i = 0; i < n; i++) {
                    double residual = -values[k] * vectors[k * n + i];
                    double overlap = 0;
                    for (int j = 0; j < n; j++) {
                        residual += rows[i][j] * vectors[k * n + j];
                        overlap += vectors[k * n + j] * vectors[i * n + j];
                    }
                    assertThat(Math.abs(residual)).isLessThan(2e-14 * n * size);
                    assertThat(Math.abs(overlap - (i == k ? 1 : 0))).isLessThan(1e-14 * n);
                }
            }
        }
    }
}
