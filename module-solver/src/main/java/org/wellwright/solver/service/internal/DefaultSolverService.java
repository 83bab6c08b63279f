package org.wellwright.solver.service.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ForkJoinPool;
import java.util.concurrent.Future;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.SolverException;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.radial.spectral.SpectralElementSolver;
import org.wellwright.solver.service.SolveRequest;
import org.wellwright.solver.service.SolverService;

/**
 * The solver that ships: hp spectral elements, every count confirmed by the second method. Problems with the same
 * common potential share its values; each result has the bits that it would have alone.
 */
@ServiceProvider(service = SolverService.class, position = 100)
public final class DefaultSolverService implements SolverService {
    @Override
    public String id() {
        return "spectral-elements";
    }

    @Override
    public String displayName() {
        return "Spectral elements";
    }

    @Override
    public String version() {
        return "spectral elements 1";
    }

    @Override
    public Spectrum solve(SolveRequest request, SolveMonitor monitor) {
        return solve(new SpectralElementSolver(), request, monitor);
    }

    private Spectrum solve(SpectralElementSolver primary, SolveRequest request, SolveMonitor monitor) {
        Spectrum spectrum = primary.solve(request.problem(), request.search(), monitor);
        return new CrossCheck(SecondMethods.of(request.problem())).check(spectrum, request.verify(), monitor);
    }

    @Override
    public List<Spectrum> solveAll(List<SolveRequest> requests, SolveMonitor monitor) {
        if (requests.size() <= 1) {
            List<Spectrum> results = new ArrayList<>(1);
            requests.forEach(request -> results.add(solve(request, monitor)));
            return List.copyOf(results);
        }
        List<SpectralElementSolver> primaries = SharedSolvers.of(requests);
        Progress progress = new Progress(monitor, requests.size());
        List<Future<Spectrum>> running = new ArrayList<>(requests.size());
        for (int i = 0; i < requests.size(); i++) {
            SolveRequest request = requests.get(i);
            SpectralElementSolver primary = primaries.get(i);
            running.add(ForkJoinPool.commonPool().submit(() -> {
                Spectrum spectrum = solve(primary, request, progress);
                progress.finished();
                return spectrum;
            }));
        }
        List<Spectrum> results = new ArrayList<>(requests.size());
        RuntimeException first = null;
        for (Future<Spectrum> one : running) {
            try {
                results.add(one.get());
            } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
                first = first == null ? new CancellationException("interrupted") : first;
                progress.stop();
            } catch (ExecutionException e) {
                first = first == null ? unwrapped(e) : first;
                progress.stop();
            }
        }
        if (first != null) {
            throw first;
        }
        return List.copyOf(results);
    }

    private static RuntimeException unwrapped(ExecutionException e) {
        Throwable cause = e.getCause();
        while (cause != null && cause.getCause() != null && !(cause instanceof WellwrightException)) {
            cause = cause.getCause();
        }
        if (cause instanceof RuntimeException known) {
            return known;
        }
        return new SolverException("the calculation failed: " + cause, "", "report this problem");
    }
}
