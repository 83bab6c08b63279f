package org.wellwright.solver.potential;

/**
 * How a potential starts at r → 0⁺: V(r) = inverseSquare/r² + coefficient·r^power + less singular terms.
 *
 * @param inverseSquare coefficient of r⁻², energy·length²; joins the centrifugal term
 * @param power exponent of the most singular remaining part; below −2 for a core that dominates the centrifugal term; 0
 *     if V is finite or logarithmic
 * @param coefficient its coefficient; 0 if V is finite or logarithmic
 * @param known false when the behaviour could not be derived and a solver must look for itself
 */
public record OriginBehaviour(double inverseSquare, double power, double coefficient, boolean known) {
    /** Finite (or logarithmic) at the origin. */
    public static final OriginBehaviour FINITE = new OriginBehaviour(0, 0, 0, true);

    /** Nothing is known. */
    public static final OriginBehaviour UNKNOWN = new OriginBehaviour(0, 0, 0, false);

    /** c·r^q as a behaviour. */
    public static OriginBehaviour power(double power, double coefficient) {
        if (coefficient == 0 || power >= 0) {
            return FINITE;
        }
        return power == -2
                ? new OriginBehaviour(coefficient, 0, 0, true)
                : new OriginBehaviour(0, power, coefficient, true);
    }

    /** The behaviour of the sum of two potentials. */
    public OriginBehaviour plus(OriginBehaviour other) {
        double square = inverseSquare + other.inverseSquare;
        boolean both = known && other.known;
        if (power == other.power) {
            double sum = coefficient + other.coefficient;
            // Equal leading parts that cancel leave something unknown behind.
            boolean cancelled = sum == 0 && coefficient != 0;
            return new OriginBehaviour(square, sum == 0 ? 0 : power, sum, both && !cancelled);
        }
        OriginBehaviour lead = power < other.power ? this : other;
        return new OriginBehaviour(square, lead.power, lead.coefficient, both);
    }

    /** The behaviour of {@code factor} times the potential. */
    public OriginBehaviour times(double factor) {
        return factor == 0 ? FINITE : new OriginBehaviour(inverseSquare * factor, power, coefficient * factor, known);
    }
}
