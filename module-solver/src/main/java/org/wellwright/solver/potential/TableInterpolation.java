package org.wellwright.solver.potential;

import java.util.Objects;

/**
 * How a table is interpolated.
 *
 * @param quantity what is interpolated
 * @param abscissa against what
 * @param spline with which piecewise cubic
 */
public record TableInterpolation(Quantity quantity, Abscissa abscissa, Spline spline) {
    /** V(r) in r by the natural cubic spline. */
    public static final TableInterpolation STANDARD =
            new TableInterpolation(Quantity.POTENTIAL, Abscissa.RADIUS, Spline.NATURAL);

    /** What is interpolated. */
    public enum Quantity {
        /** V. */
        POTENTIAL,
        /** r²V, for curves that vary over many orders near the origin. */
        RADIUS_SQUARED_TIMES_POTENTIAL
    }

    /** The variable of the cubics. */
    public enum Abscissa {
        /** r. */
        RADIUS,
        /** 1/r. */
        INVERSE_RADIUS
    }

    /** The piecewise cubic. */
    public enum Spline {
        /** Twice continuously differentiable, second derivative zero at both ends. */
        NATURAL,
        /**
         * Twice continuously differentiable, slopes at the ends those of the cubic through the four outermost knots.
         */
        CLAMPED,
        /** Continuously differentiable, without wiggles between knots (Fritsch and Butland 1984). */
        MONOTONE
    }

    /** Checks that nothing is missing. */
    public TableInterpolation {
        Objects.requireNonNull(quantity, "quantity");
        Objects.requireNonNull(abscissa, "abscissa");
        Objects.requireNonNull(spline, "spline");
    }
}
