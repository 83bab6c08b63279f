package org.wellwright.solver.potential;

import java.util.List;

/**
 * A radius at which a term is not smooth; it becomes an element edge of every mesh.
 *
 * @param radius where, in the problem's length unit, > 0
 * @param kind what is not smooth there
 * @param jump V(radius⁺) − V(radius⁻) in the problem's energy unit; 0 unless the kind is JUMP
 * @param radiusGradient d radius/d p_j for each parameter of the term, in the term's order; empty when the radius does
 *     not move with any of them
 */
public record BreakPoint(double radius, Kind kind, double jump, List<Double> radiusGradient) {
    /** What is not smooth: the value, the slope, or a higher derivative. */
    public enum Kind {
        /** V itself jumps. */
        JUMP,
        /** V is continuous, dV/dr jumps. */
        KINK,
        /** A higher derivative jumps (spline knot). */
        KNOT
    }

    /** Copies the gradient. */
    public BreakPoint {
        radiusGradient = List.copyOf(radiusGradient);
    }
}
