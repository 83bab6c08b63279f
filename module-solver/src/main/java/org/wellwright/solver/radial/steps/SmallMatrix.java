package org.wellwright.solver.radial.steps;

import java.util.Arrays;

/**
 * Dense square matrices of a few rows, stored by rows in one array. All methods are pure but for the array they fill.
 */
final class SmallMatrix {
    private SmallMatrix() {}

    /** into = a b. */
    static void multiply(double[] a, double[] b, double[] into, int n) {
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                double sum = 0;
                for (int k = 0; k < n; k++) {
                    sum += a[i * n + k] * b[k * n + j];
                }
                into[i * n + j] = sum;
            }
        }
    }

    /** into = aᵀ. */
    static void transpose(double[] a, double[] into, int n) {
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                into[j * n + i] = a[i * n + j];
            }
        }
    }

    /** Makes a symmetric by averaging it with its transpose. */
    static void symmetrize(double[] a, int n) {
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < i; j++) {
                double mean = 0.5 * (a[i * n + j] + a[j * n + i]);
                a[i * n + j] = mean;
                a[j * n + i] = mean;
            }
        }
    }

    /**
     * into = a⁻¹ by Gauss–Jordan elimination with row pivots; a vanishing pivot counts as rounding of the largest
     * element.
     */
    static void invert(double[] a, double[] into, int n) {
        double[] work = a.clone();
        Arrays.fill(into, 0);
        double size = 0;
        for (int i = 0; i < n; i++) {
            into[i * n + i] = 1;
        }
        for (double element : work) {
            size = Math.max(size, Math.abs(element));
        }
        for (int c = 0; c < n; c++) {
            int pivot = c;
            for (int r = c + 1; r < n; r++) {
                if (Math.abs(work[r * n + c]) > Math.abs(work[pivot * n + c])) {
                    pivot = r;
                }
            }
            for (int j = 0; j < n && pivot != c; j++) {
                swap(work, pivot * n + j, c * n + j);
                swap(into, pivot * n + j, c * n + j);
            }
            double value = work[c * n + c];
            double factor = 1 / (value == 0 ? 1e-17 * Math.max(size, 1e-280) : value);
            for (int j = 0; j < n; j++) {
                work[c * n + j] *= factor;
                into[c * n + j] *= factor;
            }
            for (int r = 0; r < n; r++) {
                double f = work[r * n + c];
                if (r == c || f == 0) {
                    continue;
                }
                for (int j = 0; j < n; j++) {
                    work[r * n + j] -= f * work[c * n + j];
                    into[r * n + j] -= f * into[c * n + j];
                }
            }
        }
    }

    private static void swap(double[] a, int i, int j) {
        double keep = a[i];
        a[i] = a[j];
        a[j] = keep;
    }

    /** Number of negative eigenvalues of a symmetric matrix. */
    static int negatives(double[] a, int n) {
        if (n == 1) {
            return a[0] < 0 ? 1 : 0;
        }
        if (isPositive(a, n)) {
            return 0;
        }
        double[] values = new double[n];
        eigen(a, values, new double[n * n], n);
        int count = 0;
        for (double value : values) {
            count += value < 0 ? 1 : 0;
        }
        return count;
    }

    /** Whether Cholesky's decomposition exists. */
    private static boolean isPositive(double[] a, int n) {
        double[] l = a.clone();
        for (int j = 0; j < n; j++) {
            for (int k = 0; k < j; k++) {
                for (int i = j; i < n; i++) {
                    l[i * n + j] -= l[i * n + k] * l[j * n + k];
                }
            }
            if (!(l[j * n + j] > 0)) {
                return false;
            }
            double root = Math.sqrt(l[j * n + j]);
            for (int i = j; i < n; i++) {
                l[i * n + j] /= root;
            }
        }
        return true;
    }

    /**
     * Eigenvalues and, in the columns of {@code vectors}, eigenvectors of a symmetric matrix by cyclic Jacobi rotations
     * (Golub and Van Loan 1996, § 8.4).
     */
    static void eigen(double[] a, double[] values, double[] vectors, int n) {
        double[] m = a.clone();
        Arrays.fill(vectors, 0);
        for (int i = 0; i < n; i++) {
            vectors[i * n + i] = 1;
        }
        for (int sweep = 0; sweep < 40 && rotate(m, vectors, n); sweep++) {
            // The sweep itself says whether anything was left to rotate.
        }
        for (int i = 0; i < n; i++) {
            values[i] = m[i * n + i];
        }
    }

    private static boolean rotate(double[] m, double[] vectors, int n) {
        boolean rotated = false;
        for (int p = 0; p < n - 1; p++) {
            for (int q = p + 1; q < n; q++) {
                double off = m[p * n + q];
                double scale = Math.sqrt(Math.abs(m[p * n + p] * m[q * n + q]));
                if (off == 0 || Math.abs(off) <= 1e-18 * scale || Math.abs(off) < 1e-290) {
                    continue;
                }
                rotated = true;
                double theta = (m[q * n + q] - m[p * n + p]) / (2 * off);
                double t = Math.copySign(1, theta) / (Math.abs(theta) + Math.hypot(theta, 1));
                double c = 1 / Math.hypot(t, 1);
                double s = t * c;
                for (int k = 0; k < n; k++) {
                    double x = m[k * n + p];
                    double y = m[k * n + q];
                    m[k * n + p] = c * x - s * y;
                    m[k * n + q] = s * x + c * y;
                }
                for (int k = 0; k < n; k++) {
                    double x = m[p * n + k];
                    double y = m[q * n + k];
                    m[p * n + k] = c * x - s * y;
                    m[q * n + k] = s * x + c * y;
                    double v = vectors[k * n + p];
                    double w = vectors[k * n + q];
                    vectors[k * n + p] = c * v - s * w;
                    vectors[k * n + q] = s * v + c * w;
                }
                m[p * n + q] = 0;
                m[q * n + p] = 0;
            }
        }
        return rotated;
    }

    /** into = f(a) for a symmetric matrix, through its eigenvalues. */
    static void apply(java.util.function.DoubleUnaryOperator f, double[] a, double[] into, int n) {
        double[] values = new double[n];
        double[] vectors = new double[n * n];
        eigen(a, values, vectors, n);
        Arrays.fill(into, 0);
        for (int k = 0; k < n; k++) {
            double value = f.applyAsDouble(values[k]);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    into[i * n + j] += vectors[i * n + k] * value * vectors[j * n + k];
                }
            }
        }
    }

    /** Least eigenvalue of a symmetric matrix. */
    static double least(double[] a, int n) {
        if (n == 1) {
            return a[0];
        }
        if (n == 2) {
            double half = 0.5 * (a[0] - a[3]);
            return 0.5 * (a[0] + a[3]) - Math.hypot(half, a[1]);
        }
        double[] values = new double[n];
        eigen(a, values, new double[n * n], n);
        return Arrays.stream(values).min().getAsDouble();
    }
}
