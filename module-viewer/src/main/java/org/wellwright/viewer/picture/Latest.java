package org.wellwright.viewer.picture;

import java.util.Objects;
import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.concurrent.atomic.AtomicReference;

/**
 * Runs one job at a time on an executor; of the jobs that come in meanwhile only the newest is kept. A job that runs is
 * finished, so that a stream of jobs faster than they can be done still shows results. Thread-safe.
 */
public final class Latest {
    private final Executor executor;
    private final AtomicReference<Runnable> next = new AtomicReference<>();
    private final AtomicBoolean running = new AtomicBoolean();

    /** Jobs run on this executor. */
    public Latest(Executor executor) {
        this.executor = Objects.requireNonNull(executor, "executor");
    }

    /** Puts a job in the place of one that has not started. */
    public void run(Runnable job) {
        next.set(Objects.requireNonNull(job, "job"));
        start();
    }

    private void start() {
        if (next.get() != null && running.compareAndSet(false, true)) {
            executor.execute(this::work);
        }
    }

    private void work() {
        try {
            Runnable job = next.getAndSet(null);
            if (job != null) {
                job.run();
            }
        } finally {
            running.set(false);
        }
        start();
    }
}
