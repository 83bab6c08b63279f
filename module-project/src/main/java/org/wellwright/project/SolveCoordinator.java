package org.wellwright.project;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.ModelComparer;
import org.wellwright.solver.fit.SpectrumSource;
import org.wellwright.solver.model.Assembly;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.service.SolveRequest;

/**
 * Keeps the solution of a session up to date: after every change that touches the document it solves again and
 * publishes a {@link ProjectSolution} in the session's Lookup.
 *
 * <p>Only one snapshot is worked on at a time, always the newest. Work on a snapshot that has been overtaken is
 * finished if it takes less than {@link #PATIENCE_NANOS}, so that a slow hand does not starve the views; after that it
 * is left, and of its solves only those stop that the newest snapshot does not need. Thread-safe.
 */
public final class SolveCoordinator implements AutoCloseable {
    /** How long overtaken work may go on, ns. */
    public static final long PATIENCE_NANOS = 300_000_000L;

    private static final Logger LOG = Logger.getLogger(SolveCoordinator.class.getName());

    private final ProjectSession session;
    private final SolveCache cache;
    private final Executor worker;
    private final Observer observer;
    private final Runnable listener = this::changed;
    private final AtomicBoolean working = new AtomicBoolean();
    private volatile boolean closed;
    private volatile Project settled;
    private volatile Project stopped;
    private ProjectSolution published;
    private long runs;

    /** Who wants to know how work goes. Called by the working thread. */
    public interface Observer {
        /** Nobody. */
        Observer NONE = coordinator -> SolveMonitor.NONE;

        /** Work on a snapshot starts; the monitor hears how far it is and may stop it. */
        SolveMonitor started(SolveCoordinator coordinator);

        /** Work on a snapshot has ended, with or without a solution. */
        default void ended(SolveCoordinator coordinator) {}
    }

    /**
     * A coordinator; nothing happens before {@link #start}.
     *
     * @param worker runs the work on snapshots, one at a time, and waits in it
     */
    public SolveCoordinator(ProjectSession session, SolveCache cache, Executor worker, Observer observer) {
        this.session = Objects.requireNonNull(session, "session");
        this.cache = Objects.requireNonNull(cache, "cache");
        this.worker = Objects.requireNonNull(worker, "worker");
        this.observer = Objects.requireNonNull(observer, "observer");
    }

    /** Solves the present snapshot and then every change. */
    public void start() {
        session.addListener(listener);
        changed();
    }

    /** The session it works for. */
    public ProjectSession session() {
        return session;
    }

    /** Solves again even if nothing has changed, with another solver for instance. */
    public void again() {
        settled = null;
        stopped = null;
        changed();
    }

    /** Stops work on the present snapshot; the next change starts again. */
    public void stop() {
        stopped = session.project();
        cache.retain(Set.of());
    }

    @Override
    public void close() {
        closed = true;
        session.removeListener(listener);
        cache.retain(Set.of());
        synchronized (this) {
            publish(null);
        }
    }

    private void changed() {
        if (!closed && !upToDate(session.project()) && working.compareAndSet(false, true)) {
            worker.execute(this::work);
        }
    }

    private boolean upToDate(Project project) {
        return same(project, settled) || same(project, stopped);
    }

    /** Whether two snapshots give the same results. */
    private static boolean same(Project one, Project other) {
        return other != null
                && one.title().equals(other.title())
                && one.document().equals(other.document());
    }

    private void work() {
        try {
            while (!closed && !upToDate(session.project())) {
                solve(session.project());
            }
        } finally {
            working.set(false);
        }
        // A change between the last look and here would be lost.
        changed();
    }

    private void solve(Project project) {
        long start = System.nanoTime();
        Watch watch = new Watch(project, start, observer.started(this));
        try {
            settle(project, results(project, watch), start);
        } catch (CancellationException e) {
            cache.retain(closed ? Set.of() : wanted(session.project().document()));
        } catch (RuntimeException e) {
            // The outermost wrapper of background work: a fault of the program must not end in silence or be tried for
            // ever.
            LOG.log(Level.WARNING, "solving the project failed", e);
            Problem problem = new Problem("the calculation failed: " + e, "", "report this problem");
            settle(project, new Results(nothing(project), problem), start);
        } finally {
            observer.ended(this);
        }
    }

    private record Results(FigureInput input, Problem problem) {}

    private Results results(Project project, SolveMonitor monitor) {
        ModelDocument document = project.document();
        ProjectSolver solver = new ProjectSolver(document, cache);
        List<SolvedModel> models = new ArrayList<>();
        for (Model model : document.models()) {
            models.add(solver.solve(model, SolveScope.USUAL, monitor));
        }
        try {
            Comparison comparison =
                    document.data().isEmpty() || document.models().isEmpty()
                            ? null
                            : ModelComparer.compare(document, this::spectra, monitor);
            return new Results(ProjectResults.of(project, models, comparison), null);
        } catch (WellwrightException e) {
            return new Results(ProjectResults.of(project, models, null), e.problem());
        }
    }

    private List<Spectrum> spectra(List<SpectrumSource.Wanted> wanted, SolveMonitor monitor) {
        List<SolveRequest> requests = new ArrayList<>();
        wanted.forEach(one -> requests.add(SolveRequest.of(one.problem(), one.search())));
        return cache.solveAll(requests, monitor);
    }

    private static FigureInput nothing(Project project) {
        return new FigureInput(
                project.title(), project.digest(), project.document(), List.of(), List.of(), null, List.of());
    }

    private synchronized void settle(Project project, Results results, long start) {
        settled = project;
        if (!closed) {
            runs++;
            publish(new ProjectSolution(runs, project, results.input(), results.problem(), System.nanoTime() - start));
        }
    }

    private void publish(ProjectSolution next) {
        ProjectSolution before = published;
        published = next;
        if (next != null) {
            session.content().add(next);
        }
        if (before != null) {
            session.content().remove(before);
        }
    }

    /** What the newest snapshot needs, as far as it can be assembled. */
    private Set<SolveCache.Key> wanted(ModelDocument document) {
        Set<SolveCache.Key> keys = new HashSet<>();
        ProjectSolver solver = new ProjectSolver(document, cache);
        for (Model model : document.models()) {
            try {
                Assembly assembly = Assembly.of(document, model.name());
                for (ProjectSolver.Wanted one : solver.wanted(model, SolveScope.USUAL)) {
                    RadialProblem problem = assembly.problem(one.system(), one.curve(), one.channel())
                            .problem();
                    keys.add(cache.key(SolveRequest.of(problem, LevelSearch.first(one.count()))));
                }
            } catch (WellwrightException e) {
                // The next round meets the same fault and reports it.
                continue;
            }
        }
        return keys;
    }

    /** Tells the observer how far work is, and stops it when it is no longer wanted. */
    private final class Watch implements SolveMonitor {
        private final Project project;
        private final long start;
        private final SolveMonitor outer;

        Watch(Project project, long start, SolveMonitor outer) {
            this.project = project;
            this.start = start;
            this.outer = outer;
        }

        @Override
        public void progress(double fraction, String what) {
            outer.progress(fraction, what);
        }

        @Override
        public boolean cancelled() {
            if (outer.cancelled()) {
                stop();
                return true;
            }
            Project now = session.project();
            boolean overtaken = now != project && !same(now, project);
            return closed || same(now, stopped) || overtaken && System.nanoTime() - start > PATIENCE_NANOS;
        }
    }
}
