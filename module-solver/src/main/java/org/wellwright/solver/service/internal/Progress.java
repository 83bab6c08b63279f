package org.wellwright.solver.service.internal;

import java.util.concurrent.atomic.AtomicInteger;
import org.wellwright.solver.radial.SolveMonitor;

/** Progress of a group of solves: how many are done; stops all when one has failed. */
final class Progress implements SolveMonitor {
    private final SolveMonitor outer;
    private final int total;
    private final AtomicInteger done = new AtomicInteger();
    private volatile boolean stopped;

    Progress(SolveMonitor outer, int total) {
        this.outer = outer;
        this.total = total;
    }

    void finished() {
        int now = done.incrementAndGet();
        outer.progress((double) now / total, "%d of %d channels solved".formatted(now, total));
    }

    void stop() {
        stopped = true;
    }

    @Override
    public void progress(double fraction, String what) {
        // Only whole problems are reported; parts of several at once would run to and fro.
    }

    @Override
    public boolean cancelled() {
        return stopped || outer.cancelled();
    }
}
