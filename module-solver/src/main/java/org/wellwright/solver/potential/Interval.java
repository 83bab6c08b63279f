package org.wellwright.solver.potential;

/**
 * A closed interval [lower, upper] of real numbers with outward-rounded arithmetic; ends may be infinite, never NaN.
 *
 * <p>Every operation returns an interval that surely contains f(x, y) for all real x, y of its operands where f is
 * defined (Moore 1966). The four basic operations and the square root are widened only where the rounded end is not
 * exact. Library functions are widened by two units in the last place, the hyperbolic ones by four; their documented
 * errors are one and two and a half. Elementary functions are in {@link IntervalFunctions}.
 *
 * @param lower lower end
 * @param upper upper end, at least {@code lower}
 */
public record Interval(double lower, double upper) {
    /** Every real number: what is returned when nothing better is known. */
    public static final Interval ENTIRE = new Interval(Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);

    /** The number 0. */
    public static final Interval ZERO = new Interval(0, 0);

    /** Checks the order of the ends; a negative zero becomes 0. */
    public Interval {
        if (!(lower <= upper)) {
            throw new IllegalArgumentException(
                    "an interval needs lower <= upper, got [%s, %s]".formatted(lower, upper));
        }
        lower += 0.0; // makes −0 a 0
        upper += 0.0;
    }

    /** The interval that holds one number. */
    public static Interval of(double value) {
        return new Interval(value, value);
    }

    /**
     * [value − radius, value + radius] rounded outward; every number if {@code value} or {@code radius} is NaN or
     * {@code radius} infinite.
     */
    public static Interval around(double value, double radius) {
        if (Double.isNaN(value) || !(radius < Double.POSITIVE_INFINITY)) {
            return ENTIRE;
        }
        if (Double.isInfinite(value)) {
            return value > 0
                    ? new Interval(Double.MAX_VALUE, Double.POSITIVE_INFINITY)
                    : new Interval(Double.NEGATIVE_INFINITY, -Double.MAX_VALUE);
        }
        return radius == 0 ? of(value) : new Interval(Math.nextDown(value - radius), Math.nextUp(value + radius));
    }

    /** Whether {@code value} lies in the interval. */
    public boolean contains(double value) {
        return lower <= value && value <= upper;
    }

    /** Upper minus lower end. */
    public double width() {
        return upper - lower;
    }

    /** Whether both ends are finite. */
    public boolean isBounded() {
        return lower > Double.NEGATIVE_INFINITY && upper < Double.POSITIVE_INFINITY;
    }

    /** Whether it holds one number only. */
    public boolean isPoint() {
        return lower == upper;
    }

    /** Largest |x| in it. */
    public double magnitude() {
        return Math.max(Math.abs(lower), Math.abs(upper));
    }

    /** The smallest interval that contains both. */
    public Interval hull(Interval other) {
        return new Interval(Math.min(lower, other.lower), Math.max(upper, other.upper));
    }

    /** What both contain; this interval if they are disjoint (which two enclosures of one value never are). */
    public Interval meet(Interval other) {
        double low = Math.max(lower, other.lower);
        double high = Math.min(upper, other.upper);
        return low <= high ? new Interval(low, high) : this;
    }

    /** −x. */
    public Interval negate() {
        return new Interval(-upper, -lower);
    }

    /** x + y. */
    public Interval plus(Interval other) {
        return new Interval(sumDown(lower, other.lower), -sumDown(-upper, -other.upper));
    }

    /** x − y. */
    public Interval minus(Interval other) {
        return new Interval(sumDown(lower, -other.upper), -sumDown(-upper, other.lower));
    }

    /** x · y. */
    public Interval times(Interval other) {
        double a = lower;
        double b = upper;
        double c = other.lower;
        double d = other.upper;
        double low = Math.min(
                Math.min(productDown(a, c), productDown(a, d)), Math.min(productDown(b, c), productDown(b, d)));
        double high = Math.max(
                Math.max(-productDown(-a, c), -productDown(-a, d)), Math.max(-productDown(-b, c), -productDown(-b, d)));
        return new Interval(low, high);
    }

    /** x · y for a number y. */
    public Interval times(double factor) {
        return factor >= 0
                ? new Interval(productDown(lower, factor), -productDown(-upper, factor))
                : new Interval(productDown(upper, factor), -productDown(-lower, factor));
    }

    /** x / y; where 0 is an inner point of y every number, where it is an end a half line. */
    public Interval over(Interval other) {
        if (other.lower == 0 && other.upper == 0) {
            return ENTIRE;
        }
        if (other.lower < 0 && other.upper > 0) {
            return lower == 0 && upper == 0 ? ZERO : ENTIRE;
        }
        return other.contains(0) ? times(other.reciprocalOfSign()) : quotient(other);
    }

    private Interval quotient(Interval other) {
        double a = lower;
        double b = upper;
        double c = other.lower;
        double d = other.upper;
        double low = Math.min(
                Math.min(quotientDown(a, c), quotientDown(a, d)), Math.min(quotientDown(b, c), quotientDown(b, d)));
        double high = Math.max(
                Math.max(-quotientDown(-a, c), -quotientDown(-a, d)),
                Math.max(-quotientDown(-b, c), -quotientDown(-b, d)));
        return new Interval(low, high);
    }

    /** 1/x for an interval of one sign, ends at 0 allowed. */
    private Interval reciprocalOfSign() {
        if (lower >= 0) {
            double low = upper == Double.POSITIVE_INFINITY ? 0 : quotientDown(1, upper);
            double high = lower == 0 ? Double.POSITIVE_INFINITY : -quotientDown(-1, lower);
            return new Interval(low, high);
        }
        return negate().reciprocalOfSign().negate();
    }

    /** |x|. */
    public Interval abs() {
        if (lower >= 0) {
            return this;
        }
        return upper <= 0 ? negate() : new Interval(0, Math.max(-lower, upper));
    }

    /** The smaller of x and y. */
    public Interval min(Interval other) {
        return new Interval(Math.min(lower, other.lower), Math.min(upper, other.upper));
    }

    /** The larger of x and y. */
    public Interval max(Interval other) {
        return new Interval(Math.max(lower, other.lower), Math.max(upper, other.upper));
    }

    /** Largest double ≤ a + b; −∞ where the sum is not defined. */
    private static double sumDown(double a, double b) {
        double s = a + b;
        if (Double.isNaN(s)) {
            return Double.NEGATIVE_INFINITY;
        }
        if (Double.isInfinite(s)) {
            return Double.isInfinite(a) || Double.isInfinite(b) ? s : Math.nextDown(s);
        }
        double t = s - a;
        double error = (a - (s - t)) + (b - t);
        return error < 0 || Double.isNaN(error) ? Math.nextDown(s) : s;
    }

    /** Largest double ≤ a·b, with 0·∞ = 0. */
    private static double productDown(double a, double b) {
        if (a == 0 || b == 0) {
            return 0;
        }
        double p = a * b;
        if (Double.isInfinite(p)) {
            return Double.isInfinite(a) || Double.isInfinite(b) ? p : Math.nextDown(p);
        }
        // Below 1e-290 the remainder itself may underflow.
        return Math.abs(p) < 1e-290 || Math.fma(a, b, -p) < 0 ? Math.nextDown(p) : p;
    }

    /** A double ≤ a/b for b ≠ 0. */
    private static double quotientDown(double a, double b) {
        if (a == 0) {
            return 0;
        }
        double q = a / b;
        if (Double.isNaN(q)) {
            return 0; // ∞/∞: another corner gives the extreme
        }
        if (Double.isInfinite(a)) {
            return q;
        }
        if (Double.isInfinite(b)) {
            return 0;
        }
        if (Math.abs(q) < 1e-290 || Double.isInfinite(q) || Math.abs(a) < 1e-290) {
            return Math.nextDown(q);
        }
        double remainder = Math.fma(-q, b, a);
        return remainder == 0 || (remainder > 0) == (b > 0) ? q : Math.nextDown(q);
    }
}
