package org.wellwright.solver.potential;

import java.util.List;

/**
 * Radii beyond which a term is infinite. {@code model.Assembly} makes them the walls of the radial problem (the
 * tightest of all terms); the evaluator's own {@code value} stays finite there.
 *
 * @param inner u = 0 for r ≤ inner; 0 for none
 * @param outer u = 0 for r ≥ outer; +∞ for none
 * @param innerGradient d inner/d p_j for each parameter of the term; empty if it does not move
 * @param outerGradient d outer/d p_j; empty if it does not move
 */
public record HardWalls(double inner, double outer, List<Double> innerGradient, List<Double> outerGradient) {
    /** No walls. */
    public static final HardWalls NONE = new HardWalls(0, Double.POSITIVE_INFINITY, List.of(), List.of());

    /** Checks the order and copies the gradients. */
    public HardWalls {
        if (!(inner >= 0) || !(outer > inner)) {
            throw new IllegalArgumentException("walls need 0 <= inner < outer, got %s, %s".formatted(inner, outer));
        }
        innerGradient = List.copyOf(innerGradient);
        outerGradient = List.copyOf(outerGradient);
    }
}
