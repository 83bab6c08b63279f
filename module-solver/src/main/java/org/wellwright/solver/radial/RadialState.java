package org.wellwright.solver.radial;

import java.util.function.DoubleUnaryOperator;

/**
 * The reduced radial functions u_c(r) of one bound level, one per channel, with ∫ Σ_c u_c² dr = 1. Immutable,
 * thread-safe.
 *
 * <p>Beyond {@link #outerRadius()} u is below what the level's bounds can see; values there follow the decay and may be
 * 0.
 */
public interface RadialState {
    /** The problem it solves. */
    RadialProblem problem();

    /** The level it belongs to. */
    Level level();

    /** u_c(r), length^(−1/2). */
    double value(int channel, double r);

    /** du_c/dr, length^(−3/2). */
    double slope(int channel, double r);

    /** Where u starts: 0, a wall, or the radius below which it is negligible. */
    double innerRadius();

    /** Where the mesh ends. */
    double outerRadius();

    /** Edges of the mesh elements in ascending order (a copy); u is a polynomial (or r^s times one) in each. */
    double[] elementEdges();

    /**
     * ∫ weight(r) Σ_c u_c(r)² dr; the weight may be singular at 0 as long as the integral exists, ~r^k with k >
     * −(2l+3).
     */
    double expectation(DoubleUnaryOperator weight);

    /** ∫ weight(r) u_c(r) v_d(r) dr with a state v of this or another problem, whatever its mesh. */
    double overlap(int channel, RadialState other, int otherChannel, DoubleUnaryOperator weight);

    /** ⟨T⟩ = κ ∫ Σ (u′² + λ u²/r²) dr. */
    double kineticEnergy();

    /** dE/dp of everything in the problem, by Hellmann and Feynman, moving edges included. */
    EnergyGradient gradient();

    /**
     * Solves (H − E) w = f − ⟨u|f⟩ u with ⟨u|w⟩ = 0 on the level's own mesh.
     *
     * @param source f_c(r)
     * @return w with the same operations; its {@link #level()} is that of u, it is not normalised
     */
    RadialState response(SourceFunction source);

    /** A function per channel. */
    @FunctionalInterface
    interface SourceFunction {
        /** f_c(r). */
        double value(int channel, double r);
    }
}
