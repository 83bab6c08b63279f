package org.wellwright.solver.potential.table;

import java.util.Arrays;
import java.util.concurrent.atomic.AtomicReferenceArray;
import org.wellwright.solver.potential.Rounding;
import org.wellwright.solver.potential.TableInterpolation;

/**
 * S(x) through (x[i], y[i]): on piece i the cubic c₀ + s(c₁ + s(c₂ + s c₃)), s = x − x[i]. Immutable; keeps what it had
 * to compute for derivatives.
 */
final class PiecewiseCubic {
    private final double[] x;
    private final double[][] c;
    private final double[] pieceError;
    private final double[] slope;
    private final double[] slopeError;
    private final SplineSlopes slopes;
    private final AtomicReferenceArray<double[]> slopeDerivatives;

    /** {@code knotError[i]} bounds the rounding of x[i], {@code valueError[i]} that of y[i]. */
    PiecewiseCubic(TableInterpolation.Spline kind, double[] x, double[] y, double[] knotError, double[] valueError) {
        int n = x.length;
        this.x = x.clone();
        this.slopes = new SplineSlopes(kind, x, y);
        this.slope = slopes.slopes();
        this.slopeError = slopes.errors(slope, knotError);
        this.slopeDerivatives = new AtomicReferenceArray<>(n);
        this.c = new double[n - 1][];
        this.pieceError = new double[n - 1];
        for (int i = 0; i + 1 < n; i++) {
            double h = x[i + 1] - x[i];
            double d = slopes.secant(i);
            double c2 = (3 * d - 2 * slope[i] - slope[i + 1]) / h;
            double c3 = (slope[i] + slope[i + 1] - 2 * d) / (h * h);
            c[i] = new double[] {y[i], slope[i], c2, c3};
            double inherited = 5 * slopes.secantError(i, knotError) + 3 * slopeError[i] + 2 * slopeError[i + 1];
            double own = 8 * Rounding.UNIT * (5 * Math.abs(d) + 3 * Math.abs(slope[i]) + 2 * Math.abs(slope[i + 1]));
            pieceError[i] = valueError[i] + valueError[i + 1] + h * (inherited + own);
        }
    }

    int pieces() {
        return c.length;
    }

    double knot(int i) {
        return x[i];
    }

    /** The piece that holds x, the first or last if x lies outside; starts looking at {@code hint}. */
    int piece(double at, int hint) {
        if (x[hint] <= at && at < x[hint + 1]) {
            return hint;
        }
        int found = Arrays.binarySearch(x, at);
        int i = found >= 0 ? found : -found - 2;
        return Math.max(0, Math.min(c.length - 1, i));
    }

    double value(int piece, double s) {
        double[] p = c[piece];
        return p[0] + s * (p[1] + s * (p[2] + s * p[3]));
    }

    double slope(int piece, double s) {
        double[] p = c[piece];
        return p[1] + s * (2 * p[2] + s * (3 * p[3]));
    }

    double slopeAtKnot(int i) {
        return slope[i];
    }

    double slopeErrorAtKnot(int i) {
        return slopeError[i];
    }

    double[] coefficients(int piece) {
        return c[piece].clone();
    }

    /** Bound on the rounding of {@link #value} but for that of s itself. */
    double error(int piece, double s) {
        double[] p = c[piece];
        double size = Math.abs(p[0])
                + Math.abs(s)
                        * (2 * Math.abs(p[1]) + Math.abs(s) * (3 * Math.abs(p[2]) + Math.abs(s) * 4 * Math.abs(p[3])));
        double result = Math.abs(value(piece, s));
        double inner = 2 * (size - Math.abs(p[0]));
        return pieceError[piece] + Rounding.UNIT * (result + inner) * 1.01;
    }

    /** ∂(slope at knot i)/∂y[j]. */
    double slopeDerivative(int i, int j) {
        double[] column = slopeDerivatives.get(j);
        if (column == null) {
            column = slopes.derivatives(j);
            slopeDerivatives.set(j, column);
        }
        return column[i];
    }

    /** ∂S/∂y[j] on a piece: Hermite's basis with the change of both slopes. */
    double valueDerivative(int piece, double s, int j) {
        double h = x[piece + 1] - x[piece];
        double t = s / h;
        double away = 1 - t;
        double sum = 0;
        if (j == piece) {
            sum += away * away * (1 + 2 * t);
        }
        if (j == piece + 1) {
            sum += t * t * (3 - 2 * t);
        }
        sum += h * t * away * away * slopeDerivative(piece, j);
        sum -= h * t * t * away * slopeDerivative(piece + 1, j);
        return sum;
    }
}
