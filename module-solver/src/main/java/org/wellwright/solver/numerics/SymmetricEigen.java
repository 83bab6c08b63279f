package org.wellwright.solver.numerics;

/**
 * Eigenvalues and vectors of small dense symmetric matrices by Householder's reduction and the QL method with implicit
 * shifts, laid out so that the inner loops run along rows.
 *
 * <p>Source: Martin, Reinsch and Wilkinson (1968) for the reduction; Bowdler, Martin, Reinsch and Wilkinson (1968) and
 * Dubrulle (1970) for QL. Matrices graded from small (top left) to large are treated with the least rounding.
 */
public final class SymmetricEigen {
    private SymmetricEigen() {}

    /**
     * Eigenvalues, ascending, and orthonormal eigenvectors of a symmetric matrix.
     *
     * @param a n×n matrix by rows; on return row k holds the eigenvector of the k-th eigenvalue
     * @param d the eigenvalues on return, length ≥ n
     * @param work scratch, length ≥ n + n²
     */
    public static void decompose(double[] a, int n, double[] d, double[] work) {
        if (n == 1) {
            d[0] = a[0];
            a[0] = 1;
            return;
        }
        reduce(a, n, d, work);
        // Row i of the accumulated product holds component i; rotations need vectors as rows.
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < i; j++) {
                double swap = a[i * n + j];
                a[i * n + j] = a[j * n + i];
                a[j * n + i] = swap;
            }
        }
        implicitQl(d, work, n, a);
        sort(d, a, n);
    }

    /**
     * Eigenvalues, ascending, of a symmetric tridiagonal matrix.
     *
     * @param diagonal length ≥ n, the eigenvalues on return
     * @param off {@code off[i]} couples i and i + 1; destroyed; length ≥ n
     */
    public static void tridiagonal(double[] diagonal, double[] off, int n) {
        off[n - 1] = 0;
        implicitQl(diagonal, off, n, null);
        java.util.Arrays.sort(diagonal, 0, n);
    }

    /**
     * Householder's reduction from the last row upwards; d diagonal, e[i] couples i and i + 1, a the product matrix.
     */
    private static void reduce(double[] a, int n, double[] d, double[] e) {
        for (int i = n - 1; i > 0; i--) {
            int row = i * n;
            double norm = 0;
            for (int k = 0; k < i; k++) {
                norm += a[row + k] * a[row + k];
            }
            double last = a[row + i - 1];
            double beside = norm - last * last;
            if (i == 1 || !(beside > 0x1p-1000 && beside > 0x1p-120 * last * last)) {
                e[i] = last;
                d[i] = 0;
                continue;
            }
            double f = Math.sqrt(norm);
            double g = last > 0 ? -f : f;
            e[i] = g;
            double h = norm - last * g;
            a[row + i - 1] = last - g;
            // e[0..i) = A v / h, using the lower triangle only.
            for (int j = 0; j < i; j++) {
                e[j] = 0;
            }
            for (int j = 0; j < i; j++) {
                int rj = j * n;
                double v = a[row + j];
                double sum = a[rj + j] * v;
                for (int k = 0; k < j; k++) {
                    sum += a[rj + k] * a[row + k];
                    e[k] += a[rj + k] * v;
                }
                e[j] += sum;
            }
            double vAv = 0;
            for (int j = 0; j < i; j++) {
                e[j] /= h;
                vAv += e[j] * a[row + j];
            }
            double half = vAv / (h + h);
            for (int j = 0; j < i; j++) {
                e[j] -= half * a[row + j];
            }
            for (int j = 0; j < i; j++) {
                int rj = j * n;
                double v = a[row + j];
                double w = e[j];
                for (int k = 0; k <= j; k++) {
                    a[rj + k] -= v * e[k] + w * a[row + k];
                }
            }
            d[i] = h;
        }
        accumulate(a, n, d, e);
        for (int i = 1; i < n; i++) {
            e[i - 1] = e[i];
        }
        e[n - 1] = 0;
    }

    private static void accumulate(double[] a, int n, double[] d, double[] e) {
        int scratch = n;
        d[0] = a[0];
        a[0] = 1;
        for (int i = 1; i < n; i++) {
            int row = i * n;
            double h = d[i];
            double diagonal = a[row + i];
            if (h != 0) {
                for (int j = 0; j < i; j++) {
                    e[scratch + j] = 0;
                }
                for (int k = 0; k < i; k++) {
                    double v = a[row + k] / h;
                    int rk = k * n;
                    for (int j = 0; j < i; j++) {
                        e[scratch + j] += v * a[rk + j];
                    }
                }
                for (int k = 0; k < i; k++) {
                    double v = a[row + k];
                    int rk = k * n;
                    for (int j = 0; j < i; j++) {
                        a[rk + j] -= v * e[scratch + j];
                    }
                }
            }
            d[i] = diagonal;
            for (int k = 0; k < i; k++) {
                a[row + k] = 0;
                a[k * n + i] = 0;
            }
            a[row + i] = 1;
        }
    }

    /** QL with implicit shifts; rotates the rows of {@code rows} (n×n) if given. */
    private static void implicitQl(double[] d, double[] e, int n, double[] rows) {
        double size = 0;
        for (int i = 0; i < n; i++) {
            size = Math.max(size, Math.abs(d[i]) + Math.abs(e[i]));
        }
        double floor = size * 0x1p-75;
        for (int l = 0; l < n; l++) {
            for (int iteration = 0; ; iteration++) {
                int m = l;
                while (m < n - 1) {
                    double test = Math.abs(d[m]) + Math.abs(d[m + 1]);
                    if (Math.abs(e[m]) <= 0x1p-53 * test || Math.abs(e[m]) <= floor) {
                        break;
                    }
                    m++;
                }
                if (m == l) {
                    break;
                }
                if (iteration > 60) {
                    throw new IllegalArgumentException(
                            "QL iteration does not converge; a matrix element is not finite");
                }
                double g = (d[l + 1] - d[l]) / (2 * e[l]);
                double r = Math.sqrt(g * g + 1);
                g = d[m] - d[l] + e[l] / (g + (g >= 0 ? r : -r));
                double s = 1;
                double c = 1;
                double p = 0;
                boolean underflow = false;
                for (int i = m - 1; i >= l; i--) {
                    double f = s * e[i];
                    double b = c * e[i];
                    r = Math.sqrt(f * f + g * g);
                    e[i + 1] = r;
                    if (r == 0) {
                        d[i + 1] -= p;
                        e[m] = 0;
                        underflow = true;
                        break;
                    }
                    double inverse = 1 / r;
                    s = f * inverse;
                    c = g * inverse;
                    g = d[i + 1] - p;
                    r = (d[i] - g) * s + 2 * c * b;
                    p = s * r;
                    d[i + 1] = g + p;
                    g = c * r - b;
                    if (rows != null) {
                        rotate(rows, i * n, n, s, c);
                    }
                }
                if (underflow) {
                    continue;
                }
                d[l] -= p;
                e[l] = g;
                e[m] = 0;
            }
        }
    }

    private static void rotate(double[] rows, int first, int n, double s, double c) {
        for (int k = first; k < first + n; k++) {
            double upper = rows[k];
            double lower = rows[k + n];
            rows[k + n] = s * upper + c * lower;
            rows[k] = c * upper - s * lower;
        }
    }

    private static void sort(double[] d, double[] rows, int n) {
        for (int i = 0; i < n - 1; i++) {
            int least = i;
            for (int j = i + 1; j < n; j++) {
                if (d[j] < d[least]) {
                    least = j;
                }
            }
            if (least != i) {
                double swap = d[i];
                d[i] = d[least];
                d[least] = swap;
                for (int k = 0; k < n; k++) {
                    double x = rows[i * n + k];
                    rows[i * n + k] = rows[least * n + k];
                    rows[least * n + k] = x;
                }
            }
        }
    }
}
