package org.wellwright.solver.radial;

/** What a long calculation tells its caller, and how the caller stops it. Called from the working thread. */
public interface SolveMonitor {
    /** Tells nobody, never cancels. */
    SolveMonitor NONE = new SolveMonitor() {
        @Override
        public void progress(double fraction, String what) {}

        @Override
        public boolean cancelled() {
            return false;
        }
    };

    /** Fraction done, 0 to 1, and what is being done. */
    void progress(double fraction, String what);

    /** Whether to stop; asked at least every 50 ms of work. */
    boolean cancelled();
}
