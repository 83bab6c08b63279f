package org.wellwright.solver.potential;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.numbers.gamma.Erf;
import org.apache.commons.numbers.gamma.Erfc;

/**
 * Elementary functions of intervals. Where an operand reaches beyond the domain of a function, the values on the rest
 * of the operand are enclosed; where none of it lies in the domain, every number is returned.
 */
public final class IntervalFunctions {
    private static final int LIBRARY_STEPS = 2;
    private static final int HYPERBOLIC_STEPS = 4;
    private static final int ERF_STEPS = 8;

    private IntervalFunctions() {}

    private static double down(double x, int steps) {
        double y = x;
        for (int i = 0; i < steps; i++) {
            y = Math.nextDown(y);
        }
        return y;
    }

    private static double up(double x, int steps) {
        return -down(-x, steps);
    }

    /** A rising function; values stay within [least, most]. */
    private static Interval rising(DoubleUnaryOperator f, Interval x, int steps, double least, double most) {
        double low = Math.max(least, down(f.applyAsDouble(x.lower()), steps));
        double high = Math.min(most, up(f.applyAsDouble(x.upper()), steps));
        return low <= high ? new Interval(low, high) : Interval.ENTIRE;
    }

    /** The part of x in [low, high]; null if there is none. */
    private static Interval within(Interval x, double low, double high) {
        double a = Math.max(x.lower(), low);
        double b = Math.min(x.upper(), high);
        return a <= b ? new Interval(a, b) : null;
    }

    /** e^x. */
    public static Interval exp(Interval x) {
        return x.lower() == 0 && x.upper() == 0
                ? Interval.of(1)
                : rising(Math::exp, x, LIBRARY_STEPS, 0, Double.POSITIVE_INFINITY);
    }

    /** e^x − 1. */
    public static Interval expm1(Interval x) {
        return rising(Math::expm1, x, LIBRARY_STEPS, -1, Double.POSITIVE_INFINITY);
    }

    /** ln x. */
    public static Interval ln(Interval x) {
        Interval domain = within(x, 0, Double.POSITIVE_INFINITY);
        return domain == null || domain.upper() == 0
                ? Interval.ENTIRE
                : rising(Math::log, domain, LIBRARY_STEPS, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
    }

    /** ln(1 + x). */
    public static Interval log1p(Interval x) {
        Interval domain = within(x, -1, Double.POSITIVE_INFINITY);
        return domain == null || domain.upper() == -1
                ? Interval.ENTIRE
                : rising(Math::log1p, domain, LIBRARY_STEPS, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
    }

    /** √x. */
    public static Interval sqrt(Interval x) {
        Interval domain = within(x, 0, Double.POSITIVE_INFINITY);
        return domain == null ? Interval.ENTIRE : rising(Math::sqrt, domain, 1, 0, Double.POSITIVE_INFINITY);
    }

    /** sinh x. */
    public static Interval sinh(Interval x) {
        return rising(Math::sinh, x, HYPERBOLIC_STEPS, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
    }

    /** cosh x. */
    public static Interval cosh(Interval x) {
        return rising(Math::cosh, x.abs(), HYPERBOLIC_STEPS, 1, Double.POSITIVE_INFINITY);
    }

    /** tanh x. */
    public static Interval tanh(Interval x) {
        return rising(Math::tanh, x, HYPERBOLIC_STEPS, -1, 1);
    }

    /** asin x. */
    public static Interval asin(Interval x) {
        Interval domain = within(x, -1, 1);
        return domain == null
                ? Interval.ENTIRE
                : rising(Math::asin, domain, LIBRARY_STEPS, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
    }

    /** acos x. */
    public static Interval acos(Interval x) {
        Interval domain = within(x, -1, 1);
        return domain == null
                ? Interval.ENTIRE
                : rising(t -> -Math.acos(t), domain, LIBRARY_STEPS, Double.NEGATIVE_INFINITY, 0)
                        .negate();
    }

    /** atan x. */
    public static Interval atan(Interval x) {
        return rising(Math::atan, x, LIBRARY_STEPS, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
    }

    /** erf x. */
    public static Interval erf(Interval x) {
        return rising(Erf::value, x, ERF_STEPS, -1, 1);
    }

    /** erfc x. */
    public static Interval erfc(Interval x) {
        return rising(t -> -Erfc.value(t), x, ERF_STEPS, -2, 0).negate();
    }

    /** sin x. */
    public static Interval sin(Interval x) {
        return cos(x.minus(new Interval(Math.nextDown(Math.PI / 2), Math.nextUp(Math.PI / 2))), Math::sin, x);
    }

    /** cos x. */
    public static Interval cos(Interval x) {
        return cos(x, Math::cos, x);
    }

    /** The extremes of a cosine of {@code phase} whose values at the ends of {@code x} are those of {@code f}. */
    private static Interval cos(Interval phase, DoubleUnaryOperator f, Interval x) {
        if (!(phase.magnitude() < 1e8) || phase.width() >= 6.28) {
            return new Interval(-1, 1);
        }
        Interval ends = Interval.of(f.applyAsDouble(x.lower())).hull(Interval.of(f.applyAsDouble(x.upper())));
        double low = Math.max(-1, down(ends.lower(), LIBRARY_STEPS));
        double high = Math.min(1, up(ends.upper(), LIBRARY_STEPS));
        boolean top = holdsMultiple(phase, 0);
        boolean bottom = holdsMultiple(phase, Math.PI);
        return new Interval(bottom ? -1 : low, top ? 1 : high);
    }

    /** Whether start + 2πk may lie in x for an integer k; errs toward yes. */
    private static boolean holdsMultiple(Interval x, double start) {
        double margin = 1e-14 * (1 + x.magnitude());
        double k = Math.ceil((x.lower() - start - margin) / (2 * Math.PI));
        return start + 2 * Math.PI * k <= x.upper() + margin;
    }

    /** tan x. */
    public static Interval tan(Interval x) {
        if (!(x.magnitude() < 1e8) || x.width() >= 3.14) {
            return Interval.ENTIRE;
        }
        Interval doubled = x.times(2);
        if (holdsMultiple(doubled, Math.PI)) {
            return Interval.ENTIRE;
        }
        return rising(Math::tan, x, LIBRARY_STEPS, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
    }

    /** 1 for x > 0, 0 for x < 0. */
    public static Interval step(Interval x) {
        return new Interval(x.lower() >= 0 ? 1 : 0, x.upper() < 0 ? 0 : 1);
    }

    /** x^n for an integer n. */
    public static Interval power(Interval x, int n) {
        if (n == 0) {
            return Interval.of(1);
        }
        if (n < 0) {
            return Interval.of(1).over(power(x, -n));
        }
        if (n % 2 == 0) {
            return rising(t -> Math.pow(t, n), x.abs(), LIBRARY_STEPS, 0, Double.POSITIVE_INFINITY);
        }
        return rising(t -> Math.pow(t, n), x, LIBRARY_STEPS, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
    }

    /** x^y for x ≥ 0: monotone in each of the two, so that the extremes are at the corners. */
    public static Interval power(Interval x, Interval y) {
        if (y.isPoint() && y.lower() == Math.rint(y.lower()) && Math.abs(y.lower()) <= 1000) {
            return power(x, (int) y.lower());
        }
        Interval base = within(x, 0, Double.POSITIVE_INFINITY);
        if (base == null
                || x.lower() < 0 && !y.isPoint()
                || y.isPoint() && y.lower() == Math.rint(y.lower()) && x.lower() < 0) {
            return Interval.ENTIRE;
        }
        double low = Double.POSITIVE_INFINITY;
        double high = 0;
        for (double a : new double[] {base.lower(), base.upper()}) {
            for (double b : new double[] {y.lower(), y.upper()}) {
                double corner = Math.pow(a, b);
                if (Double.isNaN(corner)) {
                    return new Interval(0, Double.POSITIVE_INFINITY);
                }
                low = Math.min(low, corner);
                high = Math.max(high, corner);
            }
        }
        if (base.lower() == 0 && y.contains(0)) {
            low = 0;
            high = Double.POSITIVE_INFINITY; // 0^y jumps at y = 0
        }
        return new Interval(Math.max(0, down(low, LIBRARY_STEPS)), up(high, LIBRARY_STEPS));
    }
}
