package org.wellwright.solver.potential.formula;

import org.apache.commons.numbers.gamma.RegularizedGamma;
import org.wellwright.solver.potential.Interval;
import org.wellwright.solver.potential.Rounding;

/**
 * The damping function of dispersion forces and the spherical Bessel function, with slopes, bounds of rounding and
 * enclosures.
 */
final class SpecialFunctions {
    /** Largest order. */
    static final int MAX_ORDER = 30;

    /** Bound on the relative error of {@link #damp} in units of 2⁻⁵³. */
    static final double DAMP_UNITS = 200;

    private SpecialFunctions() {}

    /**
     * 1 − e^(−x) Σ x^k/k!, k = 0…n: the regularised incomplete gamma function P(n + 1, x); NaN for x < 0 (Tang and
     * Toennies 1984).
     */
    static double damp(int n, double x) {
        return x == Double.POSITIVE_INFINITY ? 1 : x >= 0 ? RegularizedGamma.P.value(n + 1.0, x) : Double.NaN;
    }

    /** xⁿ e^(−x)/n!. */
    static double dampSlope(int n, double x) {
        if (x > 2_000) {
            return 0;
        }
        double term = Math.exp(-x);
        for (int k = 1; k <= n; k++) {
            term *= x / k;
        }
        return term;
    }

    static Interval damp(int n, Interval x) {
        if (x.lower() < 0) {
            return Interval.ENTIRE;
        }
        double margin = DAMP_UNITS * Rounding.UNIT;
        double low = damp(n, x.lower()) * (1 - margin);
        double high = damp(n, x.upper()) * (1 + margin) + Double.MIN_NORMAL;
        return new Interval(Math.max(0, low - Double.MIN_NORMAL), Math.min(1, high));
    }

    static Interval dampSlope(int n, Interval x) {
        if (x.lower() < 0) {
            return Interval.ENTIRE;
        }
        double low = Math.min(dampSlope(n, x.lower()), dampSlope(n, x.upper()));
        double top = x.contains(n) ? n : x.upper() < n ? x.upper() : x.lower();
        double margin = (8 + 3 * n) * Rounding.UNIT * 8;
        return new Interval(low * (1 - margin), dampSlope(n, top) * (1 + margin) + Double.MIN_NORMAL);
    }

    /**
     * j_n(x): upward recurrence beyond x = n + 1, Miller's downward recurrence below (Abramowitz and Stegun 1964,
     * 10.1.19 and 10.5).
     */
    static double sphericalBessel(int n, double x) {
        if (x < 0) {
            return n % 2 == 0 ? sphericalBessel(n, -x) : -sphericalBessel(n, -x);
        }
        if (Double.isInfinite(x)) {
            return 0;
        }
        if (x < 1e-2) {
            double[] a = Taylor.sphericalBessel(n);
            double square = x * x;
            return Real.integerPower(x, n) * (a[0] + square * (a[2] + square * (a[4] + square * a[6])));
        }
        double zero = Math.sin(x) / x;
        if (n == 0) {
            return zero;
        }
        double one = (zero - Math.cos(x)) / x;
        return x > n + 1 ? upward(n, x, zero, one) : downward(n, x, zero, one);
    }

    private static double upward(int n, double x, double zero, double one) {
        double below = zero;
        double here = one;
        for (int k = 1; k < n; k++) {
            double above = (2 * k + 1) / x * here - below;
            below = here;
            here = above;
        }
        return here;
    }

    private static double downward(int n, double x, double zero, double one) {
        double above = 0;
        double here = 1e-280;
        double wanted = 0;
        for (int k = n + 26 + (int) x; k > 0; k--) {
            double below = (2 * k + 1) / x * here - above;
            above = here;
            here = below;
            if (k - 1 == n) {
                wanted = here;
            }
            if (Math.abs(here) > 1e200) {
                above *= 1e-300;
                here *= 1e-300;
                wanted *= 1e-300;
            }
        }
        // Now here belongs to order 0 and above to order 1; the larger of the two sets the scale.
        return Math.abs(zero) > Math.abs(one) ? wanted * (zero / here) : wanted * (one / above);
    }

    /** j_n′ = j_(n−1) − (n + 1)/x j_n, −j_1 for n = 0. */
    static double sphericalBesselSlope(int n, double x) {
        if (n == 0) {
            return -sphericalBessel(1, x);
        }
        if (x == 0) {
            return n == 1 ? 1.0 / 3 : 0;
        }
        return sphericalBessel(n - 1, x) - (n + 1) / x * sphericalBessel(n, x);
    }

    /** Bound on the rounding of {@link #sphericalBessel}. */
    static double sphericalBesselError(int n, double x) {
        double size = Math.abs(sphericalBessel(n, x)) + (Math.abs(x) > 0.5 ? 1 / Math.abs(x) : 0);
        double relative = Math.abs(x) > n + 1 ? size : Math.abs(sphericalBessel(n, x));
        return (40 + 12 * n) * Rounding.UNIT * relative + Double.MIN_NORMAL;
    }

    /**
     * |j_n′| < 0.44 for every n and x (j₀′ = −j₁ has the largest), so that j_n stays within half the width of its value
     * in the middle.
     */
    static Interval sphericalBessel(int n, Interval x) {
        Interval bounded = new Interval(n == 0 ? -0.22 : -0.5, n == 0 ? 1 : 0.5);
        if (!x.isBounded()) {
            return bounded;
        }
        double middle = x.lower() + x.width() / 2;
        double radius = 0.5 * Math.max(x.upper() - middle, middle - x.lower());
        return Interval.around(sphericalBessel(n, middle), radius * 1.01 + sphericalBesselError(n, middle))
                .meet(bounded);
    }

    static Interval sphericalBesselSlope(int n, Interval x) {
        Interval bounded = new Interval(-0.5, 0.5);
        if (n == 0) {
            return sphericalBessel(1, x).negate();
        }
        Interval factor = Interval.of(n + 1.0).over(x);
        return x.contains(0)
                ? bounded
                : sphericalBessel(n - 1, x)
                        .minus(factor.times(sphericalBessel(n, x)))
                        .meet(bounded);
    }
}
