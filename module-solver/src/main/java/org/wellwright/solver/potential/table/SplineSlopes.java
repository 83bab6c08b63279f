package org.wellwright.solver.potential.table;

import org.wellwright.solver.potential.Rounding;
import org.wellwright.solver.potential.TableInterpolation;

/**
 * The slopes at the knots that make a piecewise cubic: of the natural and the clamped spline (de Boor 1978, chapter IV)
 * or the monotone one (Fritsch and Butland 1984, with the three-point end formula of Kahaner, Moler and Nash 1989).
 * Immutable.
 */
final class SplineSlopes {
    private final TableInterpolation.Spline kind;
    private final double[] x;
    private final double[] y;
    private final double[] h;
    private final double[] d;

    /** Knots x[i] ascending, values y[i], at least four. */
    SplineSlopes(TableInterpolation.Spline kind, double[] x, double[] y) {
        this.kind = kind;
        this.x = x.clone();
        this.y = y.clone();
        int n = x.length;
        this.h = new double[n - 1];
        this.d = new double[n - 1];
        for (int i = 0; i + 1 < n; i++) {
            h[i] = x[i + 1] - x[i];
            d[i] = (y[i + 1] - y[i]) / h[i];
        }
    }

    /** Slopes m[i] at the knots. */
    double[] slopes() {
        return kind == TableInterpolation.Spline.MONOTONE ? monotone() : linear(x, h, d, y);
    }

    /** ∂m[i]/∂y[j] for all i. */
    double[] derivatives(int j) {
        int n = x.length;
        double[] dd = new double[n - 1];
        if (j > 0) {
            dd[j - 1] = 1 / h[j - 1];
        }
        if (j + 1 < n) {
            dd[j] = -1 / h[j];
        }
        if (kind == TableInterpolation.Spline.MONOTONE) {
            return monotoneDerivatives(dd);
        }
        double[] unit = new double[n];
        unit[j] = 1;
        return linear(x, h, dd, unit);
    }

    /** Bounds on the rounding of the slopes; {@code knotError[i]} bounds that of x[i]. */
    double[] errors(double[] m, double[] knotError) {
        int n = x.length;
        double u = Rounding.UNIT;
        double[] e = new double[n];
        for (int i = 0; i < n; i++) {
            double left = i > 0 ? secantError(i - 1, knotError) : 0;
            double right = i + 1 < n ? secantError(i, knotError) : 0;
            double size = Math.abs(m[i]) + (i > 0 ? Math.abs(m[i - 1]) : 0) + (i + 1 < n ? Math.abs(m[i + 1]) : 0);
            double factor =
                    kind == TableInterpolation.Spline.CLAMPED && (i == 0 || i == n - 1) ? endAmplification(i) : 1;
            e[i] = factor * (3 * Math.max(left, right) + 16 * u * size);
        }
        // The inverse of the spline's matrix decays at least as 2^−|i − j|.
        for (int i = 1; i < n; i++) {
            e[i] += e[i - 1] / 2;
        }
        for (int i = n - 2; i >= 0; i--) {
            e[i] += e[i + 1] / 2;
        }
        return e;
    }

    double secantError(int i, double[] knotError) {
        return Math.abs(d[i]) * (3 * Rounding.UNIT + 2 * (knotError[i] + knotError[i + 1]) / h[i]);
    }

    double secant(int i) {
        return d[i];
    }

    private double endAmplification(int i) {
        double sum = 0;
        for (double weight : endWeights(x, i == 0)) {
            sum += Math.abs(weight) * Math.abs(x[3] - x[0] + x[x.length - 1] - x[x.length - 4]);
        }
        return 8 + sum;
    }

    /** Natural or clamped: the tridiagonal system for the slopes, linear in the values. */
    private double[] linear(double[] knots, double[] steps, double[] secants, double[] values) {
        int n = knots.length;
        double[] lower = new double[n];
        double[] diagonal = new double[n];
        double[] upper = new double[n];
        double[] right = new double[n];
        for (int i = 1; i + 1 < n; i++) {
            lower[i] = steps[i];
            diagonal[i] = 2 * (steps[i - 1] + steps[i]);
            upper[i] = steps[i - 1];
            right[i] = 3 * (steps[i] * secants[i - 1] + steps[i - 1] * secants[i]);
        }
        if (kind == TableInterpolation.Spline.NATURAL) {
            diagonal[0] = 2;
            upper[0] = 1;
            right[0] = 3 * secants[0];
            lower[n - 1] = 1;
            diagonal[n - 1] = 2;
            right[n - 1] = 3 * secants[n - 2];
        } else {
            diagonal[0] = 1;
            right[0] = endSlope(knots, values, true);
            diagonal[n - 1] = 1;
            right[n - 1] = endSlope(knots, values, false);
        }
        for (int i = 1; i < n; i++) {
            double factor = lower[i] / diagonal[i - 1];
            diagonal[i] -= factor * upper[i - 1];
            right[i] -= factor * right[i - 1];
        }
        right[n - 1] /= diagonal[n - 1];
        for (int i = n - 2; i >= 0; i--) {
            right[i] = (right[i] - upper[i] * right[i + 1]) / diagonal[i];
        }
        return right;
    }

    private static double endSlope(double[] knots, double[] values, boolean first) {
        double[] weights = endWeights(knots, first);
        int start = first ? 0 : knots.length - 4;
        int end = first ? 0 : knots.length - 1;
        double slope = 0;
        for (int k = 0; k < 4; k++) {
            slope += weights[k] * (values[start + k] - values[end]);
        }
        return slope;
    }

    /**
     * Weights of the derivative at an end knot of the cubic through the four outermost knots (Lagrange); they sum to
     * zero.
     */
    private static double[] endWeights(double[] knots, boolean first) {
        int start = first ? 0 : knots.length - 4;
        int at = first ? 0 : 3;
        double[] weights = new double[4];
        for (int k = 0; k < 4; k++) {
            if (k == at) {
                continue;
            }
            double top = 1;
            double bottom = 1;
            for (int i = 0; i < 4; i++) {
                if (i != k) {
                    bottom *= knots[start + k] - knots[start + i];
                    top *= i == at ? 1 : knots[start + at] - knots[start + i];
                }
            }
            weights[k] = top / bottom;
        }
        return weights;
    }

    private double[] monotone() {
        int n = x.length;
        double[] m = new double[n];
        for (int i = 1; i + 1 < n; i++) {
            if (d[i - 1] * d[i] > 0) {
                double w1 = 2 * h[i] + h[i - 1];
                double w2 = h[i] + 2 * h[i - 1];
                m[i] = (w1 + w2) / (w1 / d[i - 1] + w2 / d[i]);
            }
        }
        m[0] = limited(raw(0, 1), d[0], d[1]);
        m[n - 1] = limited(raw(n - 2, n - 3), d[n - 2], d[n - 3]);
        return m;
    }

    /** The three-point slope at an end whose nearest piece is {@code near}. */
    private double raw(int near, int next) {
        return ((2 * h[near] + h[next]) * d[near] - h[near] * d[next]) / (h[near] + h[next]);
    }

    private static double limited(double slope, double near, double next) {
        if (slope * near <= 0) {
            return 0;
        }
        return near * next <= 0 && Math.abs(slope) > 3 * Math.abs(near) ? 3 * near : slope;
    }

    /** Change of the monotone slopes for a change {@code dd} of the secants. */
    private double[] monotoneDerivatives(double[] dd) {
        int n = x.length;
        double[] m = monotone();
        double[] dm = new double[n];
        for (int i = 1; i + 1 < n; i++) {
            if (d[i - 1] * d[i] > 0) {
                double w1 = 2 * h[i] + h[i - 1];
                double w2 = h[i] + 2 * h[i - 1];
                double a = m[i] / d[i - 1];
                double b = m[i] / d[i];
                dm[i] = (w1 * a * a * dd[i - 1] + w2 * b * b * dd[i]) / (w1 + w2);
            }
        }
        dm[0] = limitedDerivative(0, 1, dd);
        dm[n - 1] = limitedDerivative(n - 2, n - 3, dd);
        return dm;
    }

    private double limitedDerivative(int near, int next, double[] dd) {
        double slope = raw(near, next);
        if (slope * d[near] <= 0) {
            return 0;
        }
        if (d[near] * d[next] <= 0 && Math.abs(slope) > 3 * Math.abs(d[near])) {
            return 3 * dd[near];
        }
        return ((2 * h[near] + h[next]) * dd[near] - h[near] * dd[next]) / (h[near] + h[next]);
    }
}
