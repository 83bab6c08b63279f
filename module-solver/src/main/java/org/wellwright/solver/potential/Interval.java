package org.wellwright.solver.potential;

/**
 * A closed interval [lower, upper] of real numbers; ends may be infinite, never NaN.
 *
 * @param lower lower end
 * @param upper upper end, at least {@code lower}
 */
public record Interval(double lower, double upper) {
    /** Every real number: what is returned when nothing better is known. */
    public static final Interval ENTIRE = new Interval(Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);

    /** Checks the order of the ends. */
    public Interval {
        if (!(lower <= upper)) {
            throw new IllegalArgumentException(
                    "an interval needs lower <= upper, got [%s, %s]".formatted(lower, upper));
        }
    }

    /** The interval that holds one number. */
    public static Interval of(double value) {
        return new Interval(value, value);
    }

    /** Whether {@code value} lies in the interval. */
    public boolean contains(double value) {
        return lower <= value && value <= upper;
    }

    /** Upper minus lower end. */
    public double width() {
        return upper - lower;
    }
}
