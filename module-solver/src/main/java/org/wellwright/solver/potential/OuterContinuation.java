package org.wellwright.solver.potential;

import java.util.Objects;

/**
 * How a table goes on above its last knot r_N: V = limit + coefficient/rⁿ.
 *
 * @param kind the shape
 * @param limit the limit at r → ∞ in the table's value unit; V jumps at r_N where limit and table do not meet.
 *     {@link Kind#JOINED_POWER} ignores it
 * @param coefficient coefficient of r⁻ⁿ (negative for an attractive tail), value unit · (radius unit)ⁿ
 * @param exponent n > 0
 */
public record OuterContinuation(Kind kind, Argument limit, Argument coefficient, Argument exponent) {
    /** The shape. */
    public enum Kind {
        /** V = limit. */
        CONSTANT,
        /** limit + coefficient/rⁿ, all three stated. */
        POWER,
        /** limit + coefficient/rⁿ, coefficient and n stated, limit such that V is continuous. */
        JOINED_POWER
    }

    /** Checks that nothing is missing. */
    public OuterContinuation {
        Objects.requireNonNull(kind, "kind");
        Objects.requireNonNull(limit, "limit");
        Objects.requireNonNull(coefficient, "coefficient");
        Objects.requireNonNull(exponent, "exponent");
    }

    /** A constant. */
    public static OuterContinuation constant(Argument limit) {
        return new OuterContinuation(Kind.CONSTANT, limit, Argument.ZERO, Argument.ONE);
    }

    /** limit + coefficient/rⁿ with a stated limit. */
    public static OuterContinuation power(Argument limit, Argument coefficient, double n) {
        return new OuterContinuation(Kind.POWER, limit, coefficient, Argument.of(n));
    }

    /** limit + coefficient/rⁿ with the limit from continuity. */
    public static OuterContinuation joinedPower(Argument coefficient, double n) {
        return new OuterContinuation(Kind.JOINED_POWER, Argument.ZERO, coefficient, Argument.of(n));
    }
}
