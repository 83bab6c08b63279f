package org.wellwright.solver.service.internal;

import java.util.Optional;
import org.wellwright.solver.radial.RadialSolver;

/** The method that confirms the primary one. */
final class SecondMethods {
    private SecondMethods() {}

    static Optional<RadialSolver> available() {
        return Optional.empty();
    }
}
