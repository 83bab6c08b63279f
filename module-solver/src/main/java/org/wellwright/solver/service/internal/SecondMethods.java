package org.wellwright.solver.service.internal;

import java.util.Optional;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialSolver;
import org.wellwright.solver.radial.steps.LogDerivativeSolver;
import org.wellwright.solver.radial.steps.PerturbedStepSolver;

/** The methods that confirm the primary one, independent of it down to their own scan of V. */
final class SecondMethods {
    private SecondMethods() {}

    /**
     * The method for a problem: constant-reference perturbation for one channel, log-derivative propagation for
     * several.
     */
    static Optional<RadialSolver> of(RadialProblem problem) {
        return Optional.of(problem.channels().size() == 1 ? new PerturbedStepSolver() : new LogDerivativeSolver());
    }
}
