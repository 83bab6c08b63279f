package org.wellwright.solver;

/**
 * Something typed by the user cannot be used: a formula, a unit, a particle, a parameter, a project record. Exit status
 * 2.
 */
public final class InvalidModelException extends WellwrightException {
    private static final long serialVersionUID = 1L;

    /** A fault of the input. */
    public InvalidModelException(Problem problem) {
        super(problem);
    }

    /** A fault of the input in three parts. */
    public InvalidModelException(String what, String where, String remedy) {
        super(new Problem(what, where, remedy));
    }
}
