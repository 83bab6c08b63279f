package org.wellwright.project.window.live;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Iterator;
import java.util.Map;
import java.util.Set;
import org.openide.util.Lookup;
import org.openide.util.LookupEvent;
import org.openide.util.RequestProcessor;
import org.openide.windows.OnShowing;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.SolveCache;
import org.wellwright.project.SolveCoordinator;
import org.wellwright.solver.service.SolverService;

/**
 * Starts a coordinator for every project that was selected once, and ends it when the project is closed. Started when
 * the window is on screen.
 */
@OnShowing
public final class LiveSolves implements Runnable {
    private static final RequestProcessor SOLVES =
            new RequestProcessor("solves", Runtime.getRuntime().availableProcessors(), true);
    private static final RequestProcessor SNAPSHOTS = new RequestProcessor("snapshots", 4);

    private final Map<ProjectSession, SolveCoordinator> coordinators = new HashMap<>();
    private final SolveCache cache = new SolveCache(() -> Lookup.getDefault().lookup(SolverService.class), SOLVES);
    private OpenProjects projects;
    private Lookup.Result<ProjectSession> selected;
    private Lookup.Result<SolverService> solvers;

    /** For the window system. */
    public LiveSolves() {}

    @Override
    public void run() {
        projects = Lookup.getDefault().lookup(OpenProjects.class);
        if (projects == null) {
            return;
        }
        selected = projects.getLookup().lookupResult(ProjectSession.class);
        selected.addLookupListener((LookupEvent event) -> follow());
        solvers = Lookup.getDefault().lookupResult(SolverService.class);
        solvers.addLookupListener((LookupEvent event) -> again());
        follow();
    }

    private synchronized void follow() {
        Set<ProjectSession> open = new HashSet<>(projects.sessions());
        for (Iterator<Map.Entry<ProjectSession, SolveCoordinator>> all =
                        coordinators.entrySet().iterator();
                all.hasNext(); ) {
            Map.Entry<ProjectSession, SolveCoordinator> entry = all.next();
            if (!open.contains(entry.getKey())) {
                all.remove();
                entry.getValue().close();
            }
        }
        for (ProjectSession session : selected.allInstances()) {
            if (open.contains(session) && !coordinators.containsKey(session)) {
                SolveCoordinator coordinator = new SolveCoordinator(session, cache, SNAPSHOTS, new SolveProgress());
                coordinators.put(session, coordinator);
                coordinator.start();
            }
        }
    }

    private synchronized void again() {
        coordinators.values().forEach(SolveCoordinator::again);
    }
}
