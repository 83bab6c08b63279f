package org.wellwright.solver.radial.steps;

/**
 * The power series of a {@link CoupledStep}'s transfer matrix: u = Σ a_k x^k with (k + 2)(k + 1) a_{k+2} = Σ_j Q_j
 * a_{k−j} − h² e a_k, for both starts (1, 0) and (0, 1) at once. Its blocks A, B, C, D stand in u(1) = A u(0) + B
 * u′(0), u′(1) = C u(0) + D u′(0). Room that one thread uses again and again.
 */
final class CoupledSeries {
    private static final int MOST_POWERS = 160;

    private final int n;
    /** a_k as n rows of 2n columns. */
    private final double[][] a;
    /** ∂a_k/∂e in the same shape. */
    private final double[][] b;

    private final double[][] sums;
    private final double[][] blocks;

    CoupledSeries(int channels) {
        n = channels;
        a = new double[MOST_POWERS][2 * n * n];
        b = new double[MOST_POWERS][2 * n * n];
        sums = new double[4][2 * n * n];
        blocks = new double[8][n * n];
    }

    /** A, B, C, D after {@link #compute}, then their derivatives by e; overwritten by the next call. */
    double[][] blocks() {
        return blocks;
    }

    /**
     * Sums the series at x = 1.
     *
     * @param powers coefficient matrices Q_j, h² included
     * @param h2 square of the step's width
     */
    void compute(double[][] powers, double h2, double e, boolean derivative) {
        int columns = 2 * n;
        for (double[] sum : sums) {
            java.util.Arrays.fill(sum, 0);
        }
        for (int i = 0; i < 2; i++) {
            java.util.Arrays.fill(a[i], 0);
            java.util.Arrays.fill(b[i], 0);
        }
        for (int i = 0; i < n; i++) {
            a[0][i * columns + i] = 1;
            a[1][i * columns + n + i] = 1;
        }
        add(a[0], 0, sums[0], sums[1]);
        add(a[1], 1, sums[0], sums[1]);
        int small = 0;
        for (int k = 0; k + 2 < MOST_POWERS && small < powers.length + 1; k++) {
            double divisor = 1.0 / ((k + 2.0) * (k + 1));
            next(powers, a, k, h2 * e, divisor);
            double size = add(a[k + 2], k + 2, sums[0], sums[1]);
            if (derivative) {
                next(powers, b, k, h2 * e, divisor);
                for (int i = 0; i < b[k].length; i++) {
                    b[k + 2][i] -= h2 * divisor * a[k][i];
                }
                size = Math.max(size, add(b[k + 2], k + 2, sums[2], sums[3]) / h2);
            }
            small = size < 1e-18 ? small + 1 : 0;
        }
        for (int s = 0; s < (derivative ? 4 : 2); s++) {
            for (int i = 0; i < n; i++) {
                System.arraycopy(sums[s], i * columns, blocks[2 * s], i * n, n);
                System.arraycopy(sums[s], i * columns + n, blocks[2 * s + 1], i * n, n);
            }
        }
    }

    private static double add(double[] x, int power, double[] u, double[] p) {
        double size = 0;
        for (int i = 0; i < x.length; i++) {
            u[i] += x[i];
            p[i] += power * x[i];
            size = Math.max(size, power * Math.abs(x[i]));
        }
        return size;
    }

    private void next(double[][] powers, double[][] x, int k, double energy, double divisor) {
        int columns = 2 * n;
        double[] into = x[k + 2];
        java.util.Arrays.fill(into, 0);
        for (int j = 0; j <= Math.min(k, powers.length - 1); j++) {
            double[] q = powers[j];
            double[] y = x[k - j];
            for (int r = 0; r < n; r++) {
                for (int m = 0; m < n; m++) {
                    double factor = divisor * (q[r * n + m] - (j == 0 && r == m ? energy : 0));
                    for (int c = 0; factor != 0 && c < columns; c++) {
                        into[r * columns + c] += factor * y[m * columns + c];
                    }
                }
            }
        }
    }
}
