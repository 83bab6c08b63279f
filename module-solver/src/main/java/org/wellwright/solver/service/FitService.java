package org.wellwright.solver.service;

import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.FitRequest;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.radial.SolveMonitor;

/**
 * Comparison and fit as the rest of the application sees them: {@code Lookup.getDefault().lookup(FitService.class)}.
 * Solves through the registered {@link SolverService}. Thread-safe; equal requests give equal bits on one machine.
 */
public interface FitService {
    /**
     * Puts every model of a document beside its data.
     *
     * @throws org.wellwright.solver.InvalidModelException if the document is faulty; a fault of one model alone is kept
     *     with it
     * @throws java.util.concurrent.CancellationException if the monitor says so
     */
    Comparison compare(ModelDocument document, SolveMonitor monitor);

    /**
     * Fits one model to the used data by least squares.
     *
     * @throws org.wellwright.solver.InvalidModelException if the document is faulty, a used datum names a missing
     *     level, or there are more free numbers than data and priors; says what to add
     * @throws org.wellwright.solver.SolverException if the fit cannot go on
     * @throws java.util.concurrent.CancellationException if the monitor says so
     */
    FitResult fit(FitRequest request, SolveMonitor monitor);
}
