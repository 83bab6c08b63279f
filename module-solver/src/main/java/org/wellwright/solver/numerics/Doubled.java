package org.wellwright.solver.numerics;

/**
 * A number as the unevaluated sum of two doubles, some 31 digits: enough to make tables that are right to the last bit
 * of a double. Source: Dekker (1971); Knuth, volume 2, section 4.2.2.
 *
 * @param high the number rounded to double
 * @param low what rounding left
 */
record Doubled(double high, double low) {
    static Doubled of(double value) {
        return new Doubled(value, 0);
    }

    private static Doubled quickSum(double a, double b) {
        double s = a + b;
        return new Doubled(s, b - (s - a));
    }

    Doubled plus(Doubled other) {
        double s = high + other.high;
        double v = s - high;
        double error = (high - (s - v)) + (other.high - v);
        return quickSum(s, error + low + other.low);
    }

    Doubled negate() {
        return new Doubled(-high, -low);
    }

    Doubled minus(Doubled other) {
        return plus(other.negate());
    }

    Doubled times(Doubled other) {
        double p = high * other.high;
        double error = Math.fma(high, other.high, -p);
        return quickSum(p, error + high * other.low + low * other.high);
    }

    Doubled over(Doubled other) {
        double q = high / other.high;
        Doubled rest = minus(other.times(of(q)));
        return quickSum(q, rest.value() / other.high);
    }

    double value() {
        return high + low;
    }
}
