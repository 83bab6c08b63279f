package org.wellwright.project;

import java.util.ArrayList;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.Executor;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.function.Supplier;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.radial.LevelOutcome;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialState;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.service.SolveRequest;
import org.wellwright.solver.service.SolverService;

/**
 * A solver that remembers: solves are keyed by the digest of their problem, the solver and the search, so that an undo
 * or a note costs none. A request for fewer levels than are known is answered from those.
 *
 * <p>Every key is solved as a task of its own. A caller that stops waiting does not stop the task: that is what
 * {@link #retain} is for. Thread-safe.
 */
public final class SolveCache implements SolverService {
    /** Finished solves that are kept, the oldest unused go first. */
    private static final int KEPT = 600;

    private static final long LOOK_MILLIS = 5;

    private final Supplier<SolverService> solver;
    private final Executor executor;
    private final Map<Key, Task> tasks = new LinkedHashMap<>(64, 0.75f, true);

    /**
     * A cache.
     *
     * @param solver the solver in use, asked at every request
     * @param executor runs the solves
     */
    public SolveCache(Supplier<SolverService> solver, Executor executor) {
        this.solver = solver;
        this.executor = executor;
    }

    /**
     * What a solve depends on, but for the number of levels.
     *
     * @param solver identity and version of the solver
     * @param digest digest of the problem
     * @param below limit of the search
     * @param tolerance tolerance of the search
     * @param verify whether the second method recomputes every level
     */
    public record Key(String solver, String digest, double below, double tolerance, boolean verify) {}

    /** One solve, running or done. */
    private static final class Task extends FutureTask<Spectrum> {
        private final int count;

        Task(SolverService solver, SolveRequest request, int count) {
            super(() -> solver.solve(request, new Interrupted()));
            this.count = count;
        }
    }

    /** Stops when the task's thread is interrupted, which {@link FutureTask#cancel} does. */
    private static final class Interrupted implements SolveMonitor {
        @Override
        public void progress(double fraction, String what) {}

        @Override
        public boolean cancelled() {
            return Thread.currentThread().isInterrupted();
        }
    }

    /** The key of a request with the solver in use. */
    public Key key(SolveRequest request) {
        SolverService now = solver.get();
        LevelSearch search = request.search();
        return new Key(
                now.id() + " " + now.version(),
                request.problem().digest(),
                search.below(),
                search.tolerance(),
                request.verify());
    }

    @Override
    public String id() {
        return solver.get().id();
    }

    @Override
    public String displayName() {
        return solver.get().displayName();
    }

    @Override
    public String version() {
        return solver.get().version();
    }

    @Override
    public Spectrum solve(SolveRequest request, SolveMonitor monitor) {
        return solveAll(List.of(request), monitor).get(0);
    }

    @Override
    public List<Spectrum> solveAll(List<SolveRequest> requests, SolveMonitor monitor) {
        List<Task> started = new ArrayList<>();
        for (SolveRequest request : requests) {
            started.add(task(request));
        }
        List<Spectrum> spectra = new ArrayList<>();
        for (int i = 0; i < requests.size(); i++) {
            spectra.add(first(await(started.get(i), monitor), requests.get(i).search()));
            monitor.progress((i + 1.0) / requests.size(), "%d of %d channels solved".formatted(i + 1, requests.size()));
        }
        return List.copyOf(spectra);
    }

    /** Stops what is running for other keys. */
    public void retain(Set<Key> wanted) {
        synchronized (tasks) {
            for (Iterator<Map.Entry<Key, Task>> all = tasks.entrySet().iterator(); all.hasNext(); ) {
                Map.Entry<Key, Task> entry = all.next();
                if (!entry.getValue().isDone() && !wanted.contains(entry.getKey())) {
                    all.remove();
                    entry.getValue().cancel(true);
                }
            }
        }
    }

    private Task task(SolveRequest request) {
        Key key = key(request);
        int count = request.search().count();
        Task task;
        synchronized (tasks) {
            Task known = tasks.get(key);
            if (known != null && !known.isCancelled() && known.count >= count) {
                return known;
            }
            task = new Task(solver.get(), request, count);
            tasks.put(key, task);
            forget();
        }
        executor.execute(task);
        return task;
    }

    private void forget() {
        Iterator<Task> oldest = tasks.values().iterator();
        while (tasks.size() > KEPT && oldest.hasNext()) {
            if (oldest.next().isDone()) {
                oldest.remove();
            }
        }
    }

    private static Spectrum await(Task task, SolveMonitor monitor) {
        while (true) {
            try {
                return task.get(LOOK_MILLIS, TimeUnit.MILLISECONDS);
            } catch (TimeoutException notYet) {
                if (monitor.cancelled()) {
                    throw new CancellationException("nobody waits any more");
                }
            } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
                throw new CancellationException("interrupted");
            } catch (ExecutionException e) {
                throw unwrapped(e);
            }
        }
    }

    private static RuntimeException unwrapped(ExecutionException e) {
        if (e.getCause() instanceof WellwrightException known) {
            return known;
        }
        if (e.getCause() instanceof CancellationException stopped) {
            return stopped;
        }
        return new IllegalStateException("the solver failed", e.getCause());
    }

    /** The first levels of a spectrum that may hold more. */
    private static Spectrum first(Spectrum spectrum, LevelSearch search) {
        List<LevelOutcome> outcomes = spectrum.outcomes();
        if (outcomes.size() <= search.count()) {
            return spectrum;
        }
        List<LevelOutcome> wanted = outcomes.subList(0, search.count());
        List<RadialState> states = new ArrayList<>();
        for (LevelOutcome outcome : wanted) {
            spectrum.position(outcome.index()).ifPresent(position -> states.add(spectrum.state(outcome.index())));
        }
        return new Spectrum(
                spectrum.problem(),
                search,
                wanted,
                states,
                spectrum.completeness(),
                spectrum.searchedBelow(),
                spectrum.message(),
                spectrum.effort());
    }
}
