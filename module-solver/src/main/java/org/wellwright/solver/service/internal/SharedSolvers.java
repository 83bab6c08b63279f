package org.wellwright.solver.service.internal;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.wellwright.solver.radial.spectral.SpectralElementSolver;
import org.wellwright.solver.service.SolveRequest;

/** Gives problems with the same common potential the same solver, so that V is computed once for all of them. */
final class SharedSolvers {
    private SharedSolvers() {}

    static List<SpectralElementSolver> of(List<SolveRequest> requests) {
        Map<String, SpectralElementSolver> byPotential = new HashMap<>();
        List<SpectralElementSolver> solvers = new ArrayList<>(requests.size());
        for (SolveRequest request : requests) {
            solvers.add(byPotential.computeIfAbsent(
                    request.problem().common().canonical(), text -> SpectralElementSolver.sharing(request.problem())));
        }
        return solvers;
    }
}
