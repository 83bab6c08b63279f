package org.wellwright.bench;

import java.util.Arrays;
import org.ejml.dense.row.decomposition.eig.symm.SymmetricQrAlgorithm_DDRM;

/**
 * Reference: 3-point differences on an even or a square-root mesh, all eigenvalues by EJML's tridiagonal QR. The mesh
 * with the least error is taken.
 */
final class FiniteDifferences {
    private static final int[] SIZES = {500, 1000, 2000};

    private FiniteDifferences() {}

    static ReferenceResult best(ReferenceTask task) {
        double least = Double.POSITIVE_INFINITY;
        int size = 0;
        boolean roots = false;
        for (int n : SIZES) {
            for (boolean root : new boolean[] {false, true}) {
                double error = task.error(levels(task, n, root));
                if (error < least) {
                    least = error;
                    size = n;
                    roots = root;
                }
            }
        }
        int n = size;
        boolean root = roots;
        double millis = ReferenceTask.millis(() -> levels(task, n, root)[0]);
        return new ReferenceResult(millis, least, "%d points, %s".formatted(n, root ? "even in sqrt(r)" : "even"));
    }

    /** −κ (u_x/r′)_x + V r′ u = E r′ u in x, made symmetric by the square root of r′. */
    private static double[] levels(ReferenceTask task, int n, boolean root) {
        double h = 1.0 / (n + 1);
        double width = task.outer - task.inner;
        double[] diagonal = new double[n];
        double[] off = new double[n];
        for (int i = 0; i < n; i++) {
            double x = (i + 1) * h;
            double r = task.inner + width * (root ? x * x : x);
            double mass = slope(x, width, root);
            double left = 1 / slope(x - 0.5 * h, width, root);
            double right = 1 / slope(x + 0.5 * h, width, root);
            diagonal[i] = task.kinetic * (left + right) / (h * h * mass) + task.value(r);
            off[i] = -task.kinetic * right / (h * h * Math.sqrt(mass * slope(x + h, width, root)));
        }
        SymmetricQrAlgorithm_DDRM qr = new SymmetricQrAlgorithm_DDRM();
        double[] values = new double[n];
        if (!qr.process(n, diagonal, off)) {
            return new double[0];
        }
        for (int i = 0; i < n; i++) {
            values[i] = qr.getEigenvalue(i);
        }
        Arrays.sort(values);
        return values;
    }

    private static double slope(double x, double width, boolean root) {
        return width * (root ? 2 * x : 1);
    }
}
