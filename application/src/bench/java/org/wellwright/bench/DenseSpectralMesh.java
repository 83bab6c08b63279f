package org.wellwright.bench;

import java.util.Arrays;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.DecompositionFactory_DDRM;
import org.ejml.interfaces.decomposition.EigenDecomposition_F64;

/**
 * Reference: a dense spectral mesh of Gauss–Lobatto points under the map r = a + s(1 + x)/(1 − x + 2s/(b − a)), all
 * eigenvalues by EJML's symmetric solver. Size and map are searched for the least error.
 */
final class DenseSpectralMesh {
    private static final int[] SIZES = {24, 32, 48, 64, 96, 128, 192, 256, 320};
    private static final double[] SCALES = {0.003, 0.01, 0.03, 0.1, 0.3, 1, 3, 30};

    private DenseSpectralMesh() {}

    static ReferenceResult best(ReferenceTask task) {
        double least = Double.POSITIVE_INFINITY;
        int size = 0;
        double scale = 0;
        for (int n : SIZES) {
            if (n < 1.5 * task.energies.length) {
                continue;
            }
            for (double s : SCALES) {
                double error = task.error(levels(task, n, s * (task.outer - task.inner)));
                // A larger mesh must earn its time.
                if (error < (n == size ? 1 : 0.5) * least) {
                    least = error;
                    size = n;
                    scale = s;
                }
            }
            if (least < 1e-15) {
                break;
            }
        }
        int n = size;
        double s = scale * (task.outer - task.inner);
        double millis = ReferenceTask.millis(() -> levels(task, n, s)[0]);
        return new ReferenceResult(millis, least, "%d points, scale %.3g".formatted(n, s));
    }

    private static double[] levels(ReferenceTask task, int n, double s) {
        double[] x = new double[n];
        double[] w = new double[n];
        double[] p = lobatto(x, w);
        double width = task.outer - task.inner;
        double[] slope = new double[n];
        double[] r = new double[n];
        double c = 1 + 2 * s / width;
        for (int i = 0; i < n; i++) {
            r[i] = task.inner + s * (1 + x[i]) / (c - x[i]);
            slope[i] = s * (c + 1) / ((c - x[i]) * (c - x[i]));
        }
        // Derivatives of the Lagrange polynomials: D_ki = P(x_k)/(P(x_i)(x_k − x_i)), Abramowitz and Stegun (1964),
        // 25.3.
        double[][] d = new double[n][n];
        for (int k = 0; k < n; k++) {
            for (int i = 0; i < n; i++) {
                d[k][i] = k == i ? 0 : p[k] / (p[i] * (x[k] - x[i]));
            }
        }
        d[0][0] = -0.25 * n * (n - 1);
        d[n - 1][n - 1] = 0.25 * n * (n - 1);
        int m = n - 2;
        DMatrixRMaj h = new DMatrixRMaj(m, m);
        for (int i = 0; i < m; i++) {
            for (int j = 0; j <= i; j++) {
                double sum = 0;
                for (int k = 0; k < n; k++) {
                    sum += w[k] / slope[k] * d[k][i + 1] * d[k][j + 1];
                }
                double mass = Math.sqrt(w[i + 1] * slope[i + 1] * w[j + 1] * slope[j + 1]);
                double element = task.kinetic * sum / mass + (i == j ? task.value(r[i + 1]) : 0);
                h.set(i, j, element);
                h.set(j, i, element);
            }
        }
        EigenDecomposition_F64<DMatrixRMaj> eigen = DecompositionFactory_DDRM.eig(m, false, true);
        if (!eigen.decompose(h)) {
            return new double[0];
        }
        double[] values = new double[m];
        for (int i = 0; i < m; i++) {
            values[i] = eigen.getEigenvalue(i).getReal();
        }
        Arrays.sort(values);
        return values;
    }

    /** Fills points and weights, returns P_{n−1} at the points (Abramowitz and Stegun 1964, 25.4.32). */
    private static double[] lobatto(double[] x, double[] w) {
        int n = x.length;
        double[] p = new double[n];
        for (int i = 0; i < n; i++) {
            double t = -Math.cos(Math.PI * i / (n - 1));
            double value = 0;
            for (int iteration = 0; iteration < 30; iteration++) {
                double before = 1;
                value = t;
                for (int k = 2; k < n; k++) {
                    double next = ((2 * k - 1) * t * value - (k - 1) * before) / k;
                    before = value;
                    value = next;
                }
                double step = (t * value - before) / (n * value);
                t -= step;
                if (Math.abs(step) < 1e-16) {
                    break;
                }
            }
            x[i] = t;
            p[i] = value;
            w[i] = 2 / (n * (n - 1.0) * value * value);
        }
        return p;
    }
}
