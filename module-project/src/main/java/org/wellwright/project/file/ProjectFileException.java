package org.wellwright.project.file;

import java.util.List;
import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;

/**
 * A file that cannot be used: unreadable, not JSON, against the format, or naming what is not there. Each fault has its
 * place. Exit status 2.
 */
public final class ProjectFileException extends WellwrightException {
    private static final long serialVersionUID = 1L;

    private final transient List<Problem> problems;

    /** One fault. */
    public ProjectFileException(Problem problem) {
        this(problem, null);
    }

    /** One fault with the exception that showed it. */
    public ProjectFileException(Problem problem, Throwable cause) {
        super(problem, cause);
        this.problems = List.of(problem);
    }

    /**
     * Several faults.
     *
     * @param problems at least one
     */
    public ProjectFileException(List<Problem> problems) {
        super(problems.get(0));
        this.problems = List.copyOf(problems);
    }

    /** Every fault found, in the order of the file. */
    public List<Problem> problems() {
        return problems == null ? List.of(problem()) : problems;
    }
}
