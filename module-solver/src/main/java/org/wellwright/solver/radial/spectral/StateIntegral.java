package org.wellwright.solver.radial.spectral;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;
import org.wellwright.solver.numerics.GaussRule;

/** Integrals of piecewise smooth functions over element edges, graded towards r = 0 where they may be singular. */
final class StateIntegral {
    private static final GaussRule RULE = GaussRule.legendre(28);

    private StateIntegral() {}

    /**
     * ∫ f dr over all elements. On an element that starts at 0 the intervals shrink in ratio ½ until the rest follows a
     * power, which is summed as a geometric series.
     */
    static double integrate(double[] edges, DoubleUnaryOperator f) {
        double sum = 0;
        int first = 0;
        if (edges[0] == 0 && edges.length > 1) {
            sum = fromOrigin(edges[1], f);
            first = 1;
        }
        for (int e = first; e + 1 < edges.length; e++) {
            sum += gauss(edges[e], edges[e + 1], f);
        }
        return sum;
    }

    private static double fromOrigin(double b, DoubleUnaryOperator f) {
        double sum = 0;
        double upper = b;
        double previous = 0;
        double ratio = 0;
        for (int k = 0; k < 200; k++) {
            double part = gauss(upper / 2, upper, f);
            sum += part;
            double next = previous == 0 ? 0 : part / previous;
            if (part == 0 || Math.abs(part) < 1e-17 * Math.abs(sum) && next < 0.75) {
                return sum;
            }
            // The last parts form a geometric series once the integrand is a power.
            if (k > 4 && next > 0 && next < 1 && Math.abs(next - ratio) < 1e-13) {
                return sum + part * next / (1 - next);
            }
            ratio = next;
            previous = part;
            upper /= 2;
        }
        return ratio > 0 && ratio < 1 ? sum + previous * ratio / (1 - ratio) : sum;
    }

    private static double gauss(double a, double b, DoubleUnaryOperator f) {
        double sum = 0;
        double width = b - a;
        for (int i = 0; i < RULE.size(); i++) {
            sum += RULE.weight(i) * f.applyAsDouble(a + width * RULE.node(i));
        }
        return sum * width;
    }

    /** All edges of two meshes where both are defined. */
    static double[] common(double[] a, double[] b) {
        double from = Math.max(a[0], b[0]);
        double to = Math.min(a[a.length - 1], b[b.length - 1]);
        if (!(from < to)) {
            return new double[0];
        }
        double[] all = new double[a.length + b.length + 2];
        int n = 0;
        all[n++] = from;
        all[n++] = to;
        for (double x : a) {
            if (x > from && x < to) {
                all[n++] = x;
            }
        }
        for (double x : b) {
            if (x > from && x < to) {
                all[n++] = x;
            }
        }
        Arrays.sort(all, 0, n);
        int kept = 1;
        for (int i = 1; i < n; i++) {
            if (all[i] - all[kept - 1] > 1e-14 * all[i]) {
                all[kept++] = all[i];
            } else if (i == n - 1) {
                all[kept - 1] = all[i];
            }
        }
        return Arrays.copyOf(all, kept);
    }
}
