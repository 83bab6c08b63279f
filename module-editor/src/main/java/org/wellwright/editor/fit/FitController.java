package org.wellwright.editor.fit;

import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.function.Consumer;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.fit.FitRequest;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.service.FitService;

/**
 * Runs a fit of one project off the event thread and keeps its result until it is accepted or discarded. Its methods
 * are called on one thread; the view is told through {@code ui}.
 */
final class FitController {
    private final ProjectSession session;
    private final FitService service;
    private final Executor worker;
    private final Executor ui;
    private final Consumer<FitViewModel> view;
    private final FitWatcher watcher;
    private FitViewModel shown = FitViewModel.idle();
    private AtomicBoolean cancelled = new AtomicBoolean();
    private FitResult result;
    private String digest = "";

    /** What is told of the progress besides the view: the platform's status line. */
    interface FitWatcher {
        /** Nobody. */
        FitWatcher NONE = new FitWatcher() {
            @Override
            public void started(String model, Runnable cancel) {}

            @Override
            public void progress(double fraction, String what) {}

            @Override
            public void ended() {}

            @Override
            public void accepted(ProjectSession session, String digest, FitResult result) {}
        };

        void started(String model, Runnable cancel);

        void progress(double fraction, String what);

        void ended();

        /** A fit was put into its project. */
        void accepted(ProjectSession session, String digest, FitResult result);
    }

    FitController(
            ProjectSession session,
            FitService service,
            Executor worker,
            Executor ui,
            Consumer<FitViewModel> view,
            FitWatcher watcher) {
        this.session = session;
        this.service = service;
        this.worker = worker;
        this.ui = ui;
        this.view = view;
        this.watcher = watcher;
    }

    FitViewModel shown() {
        return shown;
    }

    /** Whether the project is no longer the one that the result belongs to. */
    boolean outdated() {
        return result != null && !session.project().digest().equals(digest);
    }

    /** Starts a fit of the project as it is now. */
    void run(String model) {
        if (shown.state() == FitViewModel.State.RUNNING) {
            return;
        }
        Project project = session.project();
        String of = project.digest();
        AtomicBoolean stop = new AtomicBoolean();
        cancelled = stop;
        result = null;
        watcher.started(model, () -> stop.set(true));
        show(FitViewModel.running(model, 0, "starting"));
        worker.execute(() -> work(project, of, model, stop));
    }

    private void work(Project project, String of, String model, AtomicBoolean stop) {
        Monitor monitor = new Monitor(model, stop);
        try {
            FitResult fitted = service.fit(FitRequest.of(project.document(), model), monitor);
            ui.execute(() -> {
                result = fitted;
                digest = of;
                end(FitViewModel.done(project.document(), fitted));
            });
        } catch (CancellationException e) {
            ui.execute(() ->
                    end(FitViewModel.failed(model, new Problem("the fit was cancelled", "", "nothing was changed"))));
        } catch (WellwrightException e) {
            ui.execute(() -> end(FitViewModel.failed(model, e.problem())));
        } catch (IllegalArgumentException | IllegalStateException | ArithmeticException e) {
            // A fault of the program, which the user cannot mend; the log has its trace.
            Logger.getLogger(FitController.class.getName()).log(Level.WARNING, "fit of " + model, e);
            ui.execute(() -> end(FitViewModel.failed(
                    model,
                    new Problem("the fit failed inside the program: " + e.getMessage(), "", "nothing was changed"))));
        }
    }

    void cancel() {
        cancelled.set(true);
    }

    /** Puts the fitted values into the project, as one step; refused if the project has changed since. */
    Optional<Problem> accept() {
        if (result == null) {
            return Optional.of(new Problem("there is no fit to accept", "", "run one first"));
        }
        FitResult accepted = result;
        boolean done = session.editIf(
                digest, "Accept the fit of " + accepted.model(), project -> project.withDocument(accepted.document()));
        if (!done && outdated()) {
            return Optional.of(new Problem("the project has changed since this fit was started", "", "run it again"));
        }
        watcher.accepted(session, digest, accepted);
        result = null;
        show(FitViewModel.idle());
        return Optional.empty();
    }

    void discard() {
        result = null;
        show(FitViewModel.idle());
    }

    private void end(FitViewModel last) {
        watcher.ended();
        show(last);
    }

    private void show(FitViewModel next) {
        shown = next;
        view.accept(next);
    }

    private final class Monitor implements SolveMonitor {
        private final String model;
        private final AtomicBoolean stop;
        private long told;

        Monitor(String model, AtomicBoolean stop) {
            this.model = model;
            this.stop = stop;
        }

        @Override
        public void progress(double fraction, String what) {
            long now = System.nanoTime();
            synchronized (this) {
                if (now - told < 50_000_000 && fraction < 1) {
                    return;
                }
                told = now;
            }
            watcher.progress(fraction, what);
            ui.execute(() -> {
                if (shown.state() == FitViewModel.State.RUNNING) {
                    show(FitViewModel.running(model, fraction, what));
                }
            });
        }

        @Override
        public boolean cancelled() {
            return stop.get();
        }
    }
}
