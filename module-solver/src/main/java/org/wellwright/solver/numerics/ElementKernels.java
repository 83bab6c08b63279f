package org.wellwright.solver.numerics;

/**
 * Values of functions on one element and sums over its nodes, in loops that compile well; ordinary elements use the
 * parity of their functions, which halves the work.
 */
public final class ElementKernels {
    private ElementKernels() {}

    /**
     * Values at all nodes of a table.
     *
     * @param coefficient bubble k at {@code coefficient[at + k]}, {@code count} of them
     * @param scratch length ≥ 2·halfStride
     */
    public static void values(
            ElementBasis.Table table,
            double left,
            double right,
            double[] coefficient,
            int at,
            int count,
            double[] scratch,
            double[] into) {
        if (table.even == null) {
            plain(table.bubble, table.left, table.right, left, right, coefficient, at, count, into, table.size);
            return;
        }
        int stride = table.halfStride;
        separate(coefficient, at, count, scratch, stride);
        mirrored(
                table.even,
                table.odd,
                stride,
                (count + 3) / 4 * 2,
                scratch,
                0.5 * (left + right),
                right - left,
                table.position,
                into,
                table.size);
    }

    /** The operator part −L²/κ (kinetic) at all nodes of a table; see {@link ElementBasis.Table#second}. */
    public static void second(
            ElementBasis.Table table, double[] coefficient, int at, int count, double[] scratch, double[] into) {
        if (table.even == null) {
            plain(table.second, table.left, table.right, 0, 0, coefficient, at, count, into, table.size);
            return;
        }
        int stride = table.halfStride;
        separate(coefficient, at, count, scratch, stride);
        mirrored(
                table.evenSecond,
                table.oddSecond,
                stride,
                (count + 3) / 4 * 2,
                scratch,
                0,
                0,
                table.position,
                into,
                table.size);
    }

    private static void plain(
            double[][] rows,
            double[] leftTable,
            double[] rightTable,
            double left,
            double right,
            double[] coefficient,
            int at,
            int count,
            double[] into,
            int n) {
        for (int g = 0; g < n; g++) {
            into[g] = left * leftTable[g] + right * rightTable[g];
        }
        for (int k = 0; k < count; k++) {
            addMultiple(coefficient[at + k], rows[k], into, n);
        }
    }

    private static void addMultiple(double a, double[] row, double[] into, int n) {
        for (int g = 0; g < n; g++) {
            into[g] += a * row[g];
        }
    }

    /** Even coefficients to the first half of the scratch, odd ones to the second. */
    private static void separate(double[] coefficient, int at, int count, double[] scratch, int stride) {
        for (int i = 0; i < stride; i++) {
            int even = 2 * i;
            scratch[i] = even < count ? coefficient[at + even] : 0;
            scratch[stride + i] = even + 1 < count ? coefficient[at + even + 1] : 0;
        }
    }

    private static void mirrored(
            double[] even,
            double[] odd,
            int stride,
            int used,
            double[] scratch,
            double middle,
            double rise,
            double[] position,
            double[] into,
            int size) {
        for (int h = 0; h < size / 2; h++) {
            int row = h * stride;
            double e1 = 0;
            double e2 = 0;
            double o1 = 0;
            double o2 = 0;
            // Small terms first: coefficients fall with the degree.
            for (int i = used - 2; i >= 0; i -= 2) {
                e2 = Math.fma(scratch[i + 1], even[row + i + 1], e2);
                o2 = Math.fma(scratch[stride + i + 1], odd[row + i + 1], o2);
                e1 = Math.fma(scratch[i], even[row + i], e1);
                o1 = Math.fma(scratch[stride + i], odd[row + i], o1);
            }
            double sum = middle + (e1 + e2);
            double difference = Math.fma(rise, position[h] - 0.5, o1 + o2);
            into[h] = sum + difference;
            into[size - 1 - h] = sum - difference;
        }
    }

    /** Σ w_g x_g u_g v_g. */
    public static double weightedSum(double[] weight, double[] x, double[] u, double[] v, int n) {
        double a = 0;
        double b = 0;
        double c = 0;
        double d = 0;
        int g = 0;
        for (; g + 3 < n; g += 4) {
            a = Math.fma(weight[g] * x[g], u[g] * v[g], a);
            b = Math.fma(weight[g + 1] * x[g + 1], u[g + 1] * v[g + 1], b);
            c = Math.fma(weight[g + 2] * x[g + 2], u[g + 2] * v[g + 2], c);
            d = Math.fma(weight[g + 3] * x[g + 3], u[g + 3] * v[g + 3], d);
        }
        for (; g < n; g++) {
            a = Math.fma(weight[g] * x[g], u[g] * v[g], a);
        }
        return (a + b) + (c + d);
    }

    /** Σ w_g |x_g| u_g². */
    public static double absoluteSum(double[] weight, double[] x, double[] u, int n) {
        double a = 0;
        double b = 0;
        int g = 0;
        for (; g + 1 < n; g += 2) {
            a += weight[g] * Math.abs(x[g]) * (u[g] * u[g]);
            b += weight[g + 1] * Math.abs(x[g + 1]) * (u[g + 1] * u[g + 1]);
        }
        for (; g < n; g++) {
            a += weight[g] * Math.abs(x[g]) * (u[g] * u[g]);
        }
        return a + b;
    }

    /** Σ w_g u_g². */
    public static double squareSum(double[] weight, double[] u, int n) {
        double a = 0;
        double b = 0;
        double c = 0;
        double d = 0;
        int g = 0;
        for (; g + 3 < n; g += 4) {
            a = Math.fma(weight[g], u[g] * u[g], a);
            b = Math.fma(weight[g + 1], u[g + 1] * u[g + 1], b);
            c = Math.fma(weight[g + 2], u[g + 2] * u[g + 2], c);
            d = Math.fma(weight[g + 3], u[g + 3] * u[g + 3], d);
        }
        for (; g < n; g++) {
            a = Math.fma(weight[g], u[g] * u[g], a);
        }
        return (a + b) + (c + d);
    }

    /** Σ f_g h_g. */
    public static double product(double[] f, double[] h, int n) {
        double a = 0;
        double b = 0;
        double c = 0;
        double d = 0;
        int g = 0;
        for (; g + 3 < n; g += 4) {
            a += f[g] * h[g];
            b += f[g + 1] * h[g + 1];
            c += f[g + 2] * h[g + 2];
            d += f[g + 3] * h[g + 3];
        }
        for (; g < n; g++) {
            a += f[g] * h[g];
        }
        return (a + b) + (c + d);
    }

    /**
     * ∫u² over an ordinary element in units of L, from the Legendre coefficients of u: Σ b_m² 2/(2m + 1), exact but for
     * rounding, which it keeps small by adding the small terms first.
     *
     * @param norm {@code norm[k]} = 1/√(2(2k + 3)) for bubble k
     */
    public static double legendreSquare(
            double left, double right, double[] coefficient, int at, int count, double[] norm) {
        double sum = 0;
        for (int m = count + 1; m >= 2; m--) {
            double b = coefficient[at + m - 2] * norm[m - 2];
            if (m < count) {
                b = Math.fma(-coefficient[at + m], norm[m], b);
            }
            sum = Math.fma(b * b, 2.0 / (2 * m + 1), sum);
        }
        double slope = 0.5 * (right - left) - (count > 1 ? coefficient[at + 1] * norm[1] : 0);
        double mean = 0.5 * (left + right) - (count > 0 ? coefficient[at] * norm[0] : 0);
        sum = Math.fma(slope * slope, 2.0 / 3, sum);
        return Math.fma(2 * mean, mean, sum);
    }

    /** Σ c_k² with the small terms first. */
    public static double sumOfSquares(double[] coefficient, int at, int count) {
        double sum = 0;
        for (int k = count - 1; k >= 0; k--) {
            sum = Math.fma(coefficient[at + k], coefficient[at + k], sum);
        }
        return sum;
    }
}
