package org.wellwright.project.window.live;

import java.util.Locale;
import org.netbeans.api.progress.ProgressHandle;
import org.openide.awt.StatusDisplayer;
import org.openide.util.NbBundle.Messages;
import org.wellwright.project.ProjectSolution;
import org.wellwright.project.SolveCoordinator;
import org.wellwright.solver.radial.SolveMonitor;

/**
 * Shows work that takes longer than half a second as a bar with a cancel button; says in the status line how long the
 * last solve took.
 */
@Messages({
    "# {0} - name of the project",
    "MSG_Solving=Solving {0}",
    "# {0} - number of levels",
    "# {1} - time with unit",
    "MSG_Solved=Solved {0} levels in {1}",
    "# {0} - what is wrong",
    "MSG_NotSolved=Not solved: {0}"
})
final class SolveProgress implements SolveCoordinator.Observer {
    private static final long SHOWN_AFTER_NANOS = 500_000_000L;
    private static final int PARTS = 1000;

    private ProgressHandle handle;
    private long told;

    @Override
    public SolveMonitor started(SolveCoordinator coordinator) {
        long start = System.nanoTime();
        return new SolveMonitor() {
            private volatile boolean cancelled;
            private int done;

            @Override
            public void progress(double fraction, String what) {
                show(fraction, what);
            }

            @Override
            public boolean cancelled() {
                show(0, "");
                return cancelled;
            }

            private void show(double fraction, String what) {
                if (System.nanoTime() - start < SHOWN_AFTER_NANOS) {
                    return;
                }
                if (handle == null) {
                    handle = ProgressHandle.createHandle(
                            Bundle.MSG_Solving(coordinator.session().displayName()), () -> {
                                cancelled = true;
                                return true;
                            });
                    handle.start(PARTS);
                }
                if (!what.isEmpty()) {
                    // One part of the work after another counts from nothing, and the platform's bar cannot go back.
                    done = Math.max(done, Math.min(PARTS, (int) (fraction * PARTS)));
                    handle.progress(what, done);
                }
            }
        };
    }

    @Override
    public void ended(SolveCoordinator coordinator) {
        if (handle != null) {
            handle.finish();
            handle = null;
        }
        ProjectSolution solution = coordinator.session().getLookup().lookup(ProjectSolution.class);
        if (solution != null && solution.run() != told) {
            told = solution.run();
            String text = solution.problem() == null
                    ? Bundle.MSG_Solved(solution.levels(), time(solution.nanos()))
                    : Bundle.MSG_NotSolved(solution.problem().sentence());
            StatusDisplayer.getDefault().setStatusText(text);
        }
    }

    static String time(long nanos) {
        double millis = nanos / 1e6;
        return millis < 1000
                ? String.format(Locale.ROOT, "%.0f ms", millis)
                : String.format(Locale.ROOT, "%.1f s", millis / 1000);
    }
}
