package org.wellwright.solver.potential.formula;

/**
 * A number m·2^e with an exponent of 64 bits, for intermediate results beyond the range of a double, as in e^z/(1 +
 * e^z)² far out. Its operations have the relative errors of those of a double.
 *
 * @param mantissa m, 1 ≤ |m| < 2, or 0, or NaN
 * @param exponent e; 0 if m is 0 or NaN
 */
record Scaled(double mantissa, long exponent) {
    static final Scaled ZERO = new Scaled(0, 0);
    static final Scaled ONE = new Scaled(1, 0);
    private static final Scaled NAN = new Scaled(Double.NaN, 0);
    private static final long LIMIT = 1L << 56;
    private static final double LN2 = 0x1.62e42fefa39efp-1;
    private static final double LN2_REST = 0x1.abc9e3b39803fp-56;

    static Scaled of(double x) {
        return Double.isInfinite(x) ? new Scaled(Math.signum(x), LIMIT) : of(x, 0);
    }

    /** x·2^shift. */
    private static Scaled of(double x, long shift) {
        if (x == 0) {
            return ZERO;
        }
        if (!(Math.abs(x) <= Double.MAX_VALUE)) {
            return NAN;
        }
        double y = Math.abs(x) < Double.MIN_NORMAL ? x * 0x1p60 : x;
        int e = Math.getExponent(y);
        long total = shift + e - (y == x ? 0 : 60);
        if (total > LIMIT) {
            return new Scaled(Math.signum(x), LIMIT);
        }
        return total < -LIMIT ? ZERO : new Scaled(Math.scalb(y, -e), total);
    }

    double toDouble() {
        return Math.scalb(mantissa, (int) Math.max(-5000, Math.min(5000, exponent)));
    }

    boolean isZero() {
        return mantissa == 0;
    }

    double signum() {
        return Math.signum(mantissa);
    }

    Scaled negate() {
        return new Scaled(-mantissa, exponent);
    }

    Scaled abs() {
        return new Scaled(Math.abs(mantissa), exponent);
    }

    Scaled plus(Scaled other) {
        if (isZero()) {
            return other;
        }
        if (other.isZero()) {
            return this;
        }
        long apart = exponent - other.exponent;
        if (apart > 200) {
            return this;
        }
        if (apart < -200) {
            return other;
        }
        return apart >= 0
                ? of(mantissa + Math.scalb(other.mantissa, (int) -apart), exponent)
                : of(Math.scalb(mantissa, (int) apart) + other.mantissa, other.exponent);
    }

    Scaled minus(Scaled other) {
        return plus(other.negate());
    }

    Scaled times(Scaled other) {
        return of(mantissa * other.mantissa, exponent + other.exponent);
    }

    /** Two numbers that are both beyond 2^(2^56) have no known quotient. */
    Scaled over(Scaled other) {
        boolean unknown = exponent >= LIMIT && other.exponent >= LIMIT;
        return unknown || other.isZero() ? NAN : of(mantissa / other.mantissa, exponent - other.exponent);
    }

    Scaled times(double factor) {
        return times(of(factor));
    }

    Scaled sqrt() {
        long even = exponent & ~1L;
        return isZero() ? ZERO : of(Math.sqrt(Math.scalb(mantissa, (int) (exponent - even))), even / 2);
    }

    /** e^x; at most 2^±(2^56). */
    Scaled exp() {
        double x = toDouble();
        if (Double.isNaN(x)) {
            return NAN;
        }
        double k = Math.rint(x / LN2);
        if (Math.abs(k) > 1e15) {
            return k > 0 ? new Scaled(1, LIMIT) : ZERO;
        }
        double rest = Math.fma(-k, LN2_REST, Math.fma(-k, LN2, x));
        return of(Math.exp(rest), (long) k);
    }

    /** ln x. */
    Scaled ln() {
        if (!(mantissa > 0)) {
            return NAN;
        }
        return Math.abs(exponent) < 1000 ? of(Math.log(toDouble())) : of(exponent * LN2 + Math.log(mantissa));
    }

    /** x^y for an integer y by repeated squaring, otherwise e^(y ln x). */
    Scaled power(Scaled y) {
        double n = y.toDouble();
        if (Real.isSmallInteger(n)) {
            Scaled result = ONE;
            Scaled square = this;
            for (int left = (int) Math.abs(n); left != 0; left >>= 1) {
                if ((left & 1) != 0) {
                    result = result.times(square);
                }
                square = square.times(square);
            }
            return n < 0 ? ONE.over(result) : result;
        }
        double x = toDouble();
        if (Math.abs(x) <= Double.MAX_VALUE && Math.abs(x) >= Double.MIN_NORMAL) {
            double direct = Math.pow(x, n);
            if (Math.abs(direct) <= Double.MAX_VALUE && Math.abs(direct) >= Double.MIN_NORMAL || Double.isNaN(direct)) {
                return of(direct);
            }
        }
        if (isZero()) {
            return n > 0 ? ZERO : NAN;
        }
        Scaled size = abs().ln().times(y).exp();
        if (mantissa > 0) {
            return size;
        }
        return n != Math.rint(n) ? NAN : n % 2 == 0 ? size : size.negate();
    }

    /** −1, 0, 1 as this is below, equal to, above the other; 0 if either is NaN. */
    int compare(Scaled other) {
        double sign = minus(other).mantissa;
        return sign > 0 ? 1 : sign < 0 ? -1 : 0;
    }
}
