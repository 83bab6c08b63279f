package org.wellwright.solver.potential;

import java.util.Objects;

/**
 * What a term puts in for one of its parameters: a parameter of the project's pool, or a number. {@code model.Assembly}
 * turns it into a value.
 */
public sealed interface Argument {
    /** The number 0. */
    Argument ZERO = new Literal(0, "");

    /** The number 1. */
    Argument ONE = new Literal(1, "");

    /** No limit: the far end of a range that is not restricted. */
    Argument UNBOUNDED = new Literal(Double.POSITIVE_INFINITY, "");

    /** A number in the unit of its place. */
    static Argument of(double value) {
        return new Literal(value, "");
    }

    /** A parameter of the pool. */
    static Argument named(String parameter) {
        return new Named(parameter);
    }

    /**
     * A parameter of the project's pool.
     *
     * @param parameter its name
     */
    record Named(String parameter) implements Argument {
        /** Checks that there is a name. */
        public Named {
            if (parameter.isBlank()) {
                throw new IllegalArgumentException("an argument needs the name of a parameter");
            }
        }
    }

    /**
     * A number.
     *
     * @param value the number as typed, in {@code unit}; not NaN
     * @param unit symbol of the unit ("eV", "a0^-1"); empty for the unit of its place: the project's unit system, or
     *     the table's own units
     */
    record Literal(double value, String unit) implements Argument {
        /** Checks the number. */
        public Literal {
            Objects.requireNonNull(unit, "unit");
            if (Double.isNaN(value)) {
                throw new IllegalArgumentException("an argument must be a number, got NaN");
            }
        }
    }
}
