package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.List;
import org.openide.util.Lookup;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.service.SolveRequest;
import org.wellwright.solver.service.SolverService;

/** The solver that clients look up, as a source of spectra. */
final class RegisteredSolver implements SpectrumSource {
    private final SolverService solver = Lookup.getDefault().lookup(SolverService.class);

    @Override
    public List<Spectrum> solve(List<Wanted> wanted, SolveMonitor monitor) {
        List<SolveRequest> requests = new ArrayList<>();
        for (Wanted one : wanted) {
            requests.add(SolveRequest.of(one.problem(), one.search()));
        }
        return solver.solveAll(requests, monitor);
    }
}
