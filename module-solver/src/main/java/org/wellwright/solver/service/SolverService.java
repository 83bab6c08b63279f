package org.wellwright.solver.service;

import java.util.List;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

/**
 * The solver as the rest of the application sees it: {@code Lookup.getDefault().lookup(SolverService.class)}. Another
 * module may register its own. Thread-safe.
 */
public interface SolverService {
    /** Identifier for options and run records. */
    String id();

    /** Name on screen. */
    String displayName();

    /** Name and version of the method, for run records. */
    String version();

    /**
     * Solves one problem; equal requests give equal bits on one machine.
     *
     * @throws org.wellwright.solver.InvalidModelException if the problem has no answer; see
     *     {@link org.wellwright.solver.radial.RadialSolver#solve}
     * @throws org.wellwright.solver.SolverException if nothing could be computed, or the second method disputes a digit
     * @throws java.util.concurrent.CancellationException if the monitor says so
     */
    Spectrum solve(SolveRequest request, SolveMonitor monitor);

    /**
     * Solves independent problems on all cores; the i-th result belongs to the i-th request. Fails as {@link #solve}
     * does, with the first fault in order.
     */
    List<Spectrum> solveAll(List<SolveRequest> requests, SolveMonitor monitor);
}
