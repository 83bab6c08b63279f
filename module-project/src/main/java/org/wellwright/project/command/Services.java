package org.wellwright.project.command;

import org.openide.util.Lookup;
import org.wellwright.solver.service.FitService;
import org.wellwright.solver.service.SolverService;

/** The services that the command uses, as any other client finds them. */
final class Services {
    private Services() {}

    static SolverService solver() {
        return found(SolverService.class);
    }

    static FitService fit() {
        return found(FitService.class);
    }

    private static <T> T found(Class<T> type) {
        T service = Lookup.getDefault().lookup(type);
        if (service == null) {
            throw new UsageException("no " + type.getSimpleName() + " is installed", "put the solver's module back");
        }
        return service;
    }
}
