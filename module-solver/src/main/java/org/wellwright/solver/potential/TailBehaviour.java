package org.wellwright.solver.potential;

/**
 * How a potential ends at r → ∞: V(r) = limit + coefficient·r^power + smaller.
 *
 * <p>With power below 0 V tends to {@code limit}; power = −∞ means faster than any power (then coefficient is 0). With
 * power above 0 V tends to ±∞ by the sign of {@code coefficient}; power = +∞ means faster than any power. A logarithm
 * has power 0 and the sign of its coefficient.
 *
 * @param limit the limit, energy; 0 when there is none
 * @param power exponent of the leading deviation
 * @param coefficient its coefficient, energy·length^(−power); only its sign counts for power ±∞ or 0
 * @param known false when the behaviour could not be derived and a solver must look for itself
 */
public record TailBehaviour(double limit, double power, double coefficient, boolean known) {
    /** Exactly zero, or zero faster than any power. */
    public static final TailBehaviour ZERO = new TailBehaviour(0, Double.NEGATIVE_INFINITY, 0, true);

    /** Nothing is known. */
    public static final TailBehaviour UNKNOWN = new TailBehaviour(0, Double.NEGATIVE_INFINITY, 0, false);

    /** A constant. */
    public static TailBehaviour constant(double limit) {
        return new TailBehaviour(limit, Double.NEGATIVE_INFINITY, 0, true);
    }

    /** c·r^q, q ≠ 0. */
    public static TailBehaviour power(double power, double coefficient) {
        return coefficient == 0 ? ZERO : new TailBehaviour(0, power, coefficient, true);
    }

    /** Whether V tends to +∞: every level is bound and the series has no end. */
    public boolean rises() {
        return known && coefficient > 0 && power >= 0;
    }

    /** Whether V tends to −∞: nothing is bound. */
    public boolean falls() {
        return known && coefficient < 0 && power >= 0;
    }

    /** Whether V tends to a finite limit. */
    private boolean hasLimit() {
        return coefficient == 0 || power < 0;
    }

    /** The behaviour of the sum of two potentials. */
    public TailBehaviour plus(TailBehaviour other) {
        boolean both = known && other.known;
        double sumOfLimits = hasLimit() && other.hasLimit() ? limit + other.limit : 0;
        if (power == other.power) {
            double sum = coefficient + other.coefficient;
            boolean cancelled = sum == 0 && coefficient != 0;
            return new TailBehaviour(sumOfLimits, sum == 0 ? Double.NEGATIVE_INFINITY : power, sum, both && !cancelled);
        }
        TailBehaviour lead = power > other.power ? this : other;
        return new TailBehaviour(sumOfLimits, lead.power, lead.coefficient, both);
    }

    /** The behaviour of {@code factor} times the potential. */
    public TailBehaviour times(double factor) {
        return factor == 0 ? ZERO : new TailBehaviour(limit * factor, power, coefficient * factor, known);
    }
}
