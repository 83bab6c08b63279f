package org.wellwright.solver.fit;

import java.util.List;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

/** Whatever solves radial problems for a fit. */
@FunctionalInterface
public interface SpectrumSource {
    /**
     * One problem with the levels wanted of it.
     *
     * @param problem what to solve
     * @param search which levels
     */
    record Wanted(RadialProblem problem, LevelSearch search) {}

    /**
     * Solves all; the i-th spectrum, with its states, belongs to the i-th problem.
     *
     * @throws org.wellwright.solver.WellwrightException if a problem has no answer
     * @throws java.util.concurrent.CancellationException if the monitor says so
     */
    List<Spectrum> solve(List<Wanted> wanted, SolveMonitor monitor);
}
