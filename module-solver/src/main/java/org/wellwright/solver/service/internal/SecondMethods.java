package org.wellwright.solver.service.internal;

import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialSolver;
import org.wellwright.solver.radial.steps.LogDerivativeSolver;
import org.wellwright.solver.radial.steps.PerturbedStepSolver;

/** The methods that confirm the primary one, independent of it down to their own scan of V. */
final class SecondMethods {
    private SecondMethods() {}

    /** Constant-reference perturbation for one channel, log-derivative propagation for several. */
    static RadialSolver of(RadialProblem problem) {
        return problem.channels().size() == 1 ? new PerturbedStepSolver() : new LogDerivativeSolver();
    }
}
