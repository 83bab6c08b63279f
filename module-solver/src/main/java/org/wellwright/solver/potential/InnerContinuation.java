package org.wellwright.solver.potential;

import java.util.Objects;

/**
 * How a table goes on below its first knot r₁. Every kind but the wall joins the table with its value and slope, which
 * fix a and b.
 *
 * @param kind the shape
 * @param steepness n of the power (pure number) or c of the exponential (inverse of the table's radius unit); not 0; of
 *     no meaning for the wall
 */
public record InnerContinuation(Kind kind, Argument steepness) {
    /** An impenetrable wall at the first knot. */
    public static final InnerContinuation WALL = new InnerContinuation(Kind.WALL, Argument.ZERO);

    /** The shape. */
    public enum Kind {
        /** Impenetrable at the first knot. */
        WALL,
        /** a + b/rⁿ. */
        POWER,
        /** a + b·e^(−cr). */
        EXPONENTIAL
    }

    /** Checks that nothing is missing. */
    public InnerContinuation {
        Objects.requireNonNull(kind, "kind");
        Objects.requireNonNull(steepness, "steepness");
    }

    /** a + b/rⁿ. */
    public static InnerContinuation power(double n) {
        return new InnerContinuation(Kind.POWER, Argument.of(n));
    }

    /** a + b·e^(−cr). */
    public static InnerContinuation exponential(double c) {
        return new InnerContinuation(Kind.EXPONENTIAL, Argument.of(c));
    }
}
