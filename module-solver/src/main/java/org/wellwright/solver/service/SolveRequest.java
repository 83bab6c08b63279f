package org.wellwright.solver.service;

import java.util.Objects;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;

/**
 * One solve.
 *
 * @param problem what to solve
 * @param search which levels
 * @param verify whether the second method recomputes every level, not only the count
 */
public record SolveRequest(RadialProblem problem, LevelSearch search, boolean verify) {
    /** Checks that nothing is missing. */
    public SolveRequest {
        Objects.requireNonNull(problem, "problem");
        Objects.requireNonNull(search, "search");
    }

    /** A solve whose count is confirmed by the second method. */
    public static SolveRequest of(RadialProblem problem, LevelSearch search) {
        return new SolveRequest(problem, search, false);
    }
}
