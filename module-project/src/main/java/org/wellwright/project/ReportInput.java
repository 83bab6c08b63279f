package org.wellwright.project;

import java.util.List;
import java.util.Objects;

/**
 * All that a report can say of a project.
 *
 * @param project the project
 * @param file name of its file
 * @param fits the models in the order of rank, each at its own best values
 * @param results levels, comparison and lines at those values
 * @param origin what made the report
 */
public record ReportInput(Project project, String file, List<FittedModel> fits, FigureInput results, Origin origin) {
    /**
     * What made a report.
     *
     * @param program version of this program
     * @param solver name and version of the solver
     * @param time when, UTC, ISO 8601
     * @param platform Java and operating system
     */
    public record Origin(String program, String solver, String time, String platform) {}

    /** Copies the list. */
    public ReportInput {
        Objects.requireNonNull(project, "project");
        Objects.requireNonNull(file, "file");
        Objects.requireNonNull(results, "results");
        Objects.requireNonNull(origin, "origin");
        fits = List.copyOf(fits);
    }
}
