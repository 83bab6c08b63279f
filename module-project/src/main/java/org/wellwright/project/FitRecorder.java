package org.wellwright.project;

import org.wellwright.solver.fit.FitResult;

/**
 * Writes accepted fits into the run history: {@code Lookup.getDefault().lookup(FitRecorder.class)}. Safe for use by any
 * thread.
 */
public interface FitRecorder {
    /**
     * Notes that a fit was accepted; returns at once. A project that is in no file has no history, and nothing is
     * written.
     *
     * @param digest {@link Project#digest} of the project that was fitted
     */
    void accepted(ProjectSession session, String digest, FitResult fit);
}
