package org.wellwright.solver.radial;

/**
 * A method that finds the levels of a {@link RadialProblem}. Implementations are immutable and depend on nothing but
 * their arguments.
 */
public interface RadialSolver {
    /** Name of the method for reports. */
    String method();

    /**
     * Finds levels.
     *
     * @throws org.wellwright.solver.InvalidModelException if the problem has no answer: an endless series without a
     *     count, a fall to the centre (names l), V not finite at a radius
     * @throws org.wellwright.solver.SolverException if nothing could be computed
     * @throws java.util.concurrent.CancellationException if the monitor says so
     */
    Spectrum solve(RadialProblem problem, LevelSearch search, SolveMonitor monitor);

    /** Number of levels of the problem below an energy (below the lowest threshold). */
    int countBelow(RadialProblem problem, double energy);
}
