package org.wellwright.solver;

/** The science failed: no convergence, a digit disputed. Exit status 1. */
public final class SolverException extends WellwrightException {
    private static final long serialVersionUID = 1L;

    /** A failure of the calculation in three parts. */
    public SolverException(String what, String where, String remedy) {
        super(new Problem(what, where, remedy));
    }
}
