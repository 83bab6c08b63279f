package org.wellwright.solver;

import java.util.Objects;

/** Root of all faults that a user can mend; carries the {@link Problem} in three parts. */
public class WellwrightException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient Problem problem;

    /** A fault with no deeper cause. */
    public WellwrightException(Problem problem) {
        this(problem, null);
    }

    /** A fault with the exception that showed it. */
    public WellwrightException(Problem problem, Throwable cause) {
        super(Objects.requireNonNull(problem, "problem").sentence(), cause);
        this.problem = problem;
    }

    /** What, where and how to mend. */
    public Problem problem() {
        return problem == null ? new Problem(getMessage(), "", "") : problem;
    }
}
