package org.wellwright.project;

import java.util.Objects;
import org.wellwright.solver.Problem;

/**
 * What solving a snapshot of a project gave; it stands in the session's Lookup until the next replaces it. Compared by
 * identity, so that every one is seen.
 */
public final class ProjectSolution {
    private final long run;
    private final Project project;
    private final FigureInput results;
    private final Problem problem;
    private final long nanos;

    /**
     * A solution.
     *
     * @param run rises from one to the next
     * @param project the snapshot
     * @param results what there is to show
     * @param problem what is wrong with the project as a whole, or null
     * @param nanos how long it took, ns
     */
    public ProjectSolution(long run, Project project, FigureInput results, Problem problem, long nanos) {
        this.run = run;
        this.project = Objects.requireNonNull(project, "project");
        this.results = Objects.requireNonNull(results, "results");
        this.problem = problem;
        this.nanos = nanos;
    }

    /** Rises from one solution of a session to the next. */
    public long run() {
        return run;
    }

    /** The snapshot that was solved. */
    public Project project() {
        return project;
    }

    /** What there is to show. */
    public FigureInput results() {
        return results;
    }

    /** What is wrong with the project as a whole, or null. */
    public Problem problem() {
        return problem;
    }

    /** How long it took, ns. */
    public long nanos() {
        return nanos;
    }

    /** How many levels it holds. */
    public int levels() {
        int levels = 0;
        for (SolvedModel model : results.models()) {
            for (SolvedChannel channel : model.channels()) {
                levels += channel.spectrum().levels().size();
            }
        }
        return levels;
    }
}
