package org.wellwright.solver.potential;

import java.util.List;

/**
 * Computes one central potential V(r; p) with its parameters bound to values, in the problem's own energy and length
 * unit.
 *
 * <p>Implementations are immutable and safe for use by several threads. A value that overflows or is undefined is
 * returned as it comes (±∞ or NaN); the solver checks what it samples and refuses with the radius. At a break point the
 * value from either side may be returned.
 */
public interface TermEvaluator {
    /**
     * Identity: two evaluators with equal texts compute the same bits. Numbers are written with
     * {@link Double#toHexString}.
     */
    String canonical();

    /** Number of parameters, 0 or more. */
    int parameterCount();

    /** V(r), r > 0. */
    double value(double r);

    /**
     * V at {@code count} radii: {@code into[i] = V(radii[i])}; override where a loop over the whole array is faster,
     * with the same bits.
     */
    default void values(double[] radii, double[] into, int count) {
        for (int i = 0; i < count; i++) {
            into[i] = value(radii[i]);
        }
    }

    /** dV/dr at r, away from break points. */
    double slope(double r);

    /** ∂V/∂p_j at r at fixed break points (moving edges are in {@link BreakPoint#radiusGradient}). */
    double parameterDerivative(int parameter, double r);

    /** Radii where V is not smooth, ascending; edges that move with different parameters may share one radius. */
    List<BreakPoint> breakPoints();

    /**
     * An interval that surely contains V(r) for all r in [from, to], 0 < from ≤ to ≤ ∞; {@link Interval#ENTIRE} if
     * unknown.
     */
    Interval enclose(double from, double to);

    /** A bound on |computed V(r) − exact V(r)| due to rounding inside {@link #value}, ≥ 0. */
    double roundingBound(double r);

    /** Behaviour at r → 0. */
    OriginBehaviour origin();

    /** Behaviour at r → ∞. */
    TailBehaviour tail();

    /** Radii beyond which V is infinite (hard sphere, hard outer wall); none as a rule. */
    default HardWalls walls() {
        return HardWalls.NONE;
    }
}
