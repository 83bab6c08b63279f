package org.wellwright.solver.service.internal;

import java.util.ArrayList;
import java.util.List;
import org.openide.util.Lookup;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.FitRequest;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.fit.ModelComparer;
import org.wellwright.solver.fit.ModelFit;
import org.wellwright.solver.fit.SpectrumSource;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.service.FitService;
import org.wellwright.solver.service.SolveRequest;
import org.wellwright.solver.service.SolverService;

/** Comparison and fit on the solver that the Lookup knows. */
@ServiceProvider(service = FitService.class)
public final class DefaultFitService implements FitService {
    /** For the Lookup. */
    public DefaultFitService() {}

    @Override
    public Comparison compare(ModelDocument document, SolveMonitor monitor) {
        return ModelComparer.compare(document, source(), monitor);
    }

    @Override
    public FitResult fit(FitRequest request, SolveMonitor monitor) {
        return ModelFit.fit(request, source(), monitor);
    }

    private static SpectrumSource source() {
        SolverService solver = Lookup.getDefault().lookup(SolverService.class);
        if (solver == null) {
            throw new IllegalStateException("no solver is registered");
        }
        return (wanted, monitor) -> solve(solver, wanted, monitor);
    }

    private static List<Spectrum> solve(
            SolverService solver, List<SpectrumSource.Wanted> wanted, SolveMonitor monitor) {
        List<SolveRequest> requests = new ArrayList<>();
        for (SpectrumSource.Wanted one : wanted) {
            requests.add(SolveRequest.of(one.problem(), one.search()));
        }
        return solver.solveAll(requests, monitor);
    }
}
