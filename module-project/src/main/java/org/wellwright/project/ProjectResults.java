package org.wellwright.project;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.ModelComparison;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.service.FitService;
import org.wellwright.solver.service.SolverService;

/** Puts together what figures show of a project. */
public final class ProjectResults {
    private ProjectResults() {}

    /**
     * Solves and compares all models at the values that the document holds.
     *
     * @throws org.wellwright.solver.InvalidModelException if the document is faulty
     * @throws java.util.concurrent.CancellationException if the monitor says so
     */
    public static FigureInput of(
            Project project, SolveScope scope, SolverService solver, FitService fits, SolveMonitor monitor) {
        ModelDocument document = project.document();
        ProjectSolver channels = new ProjectSolver(document, solver);
        List<SolvedModel> models = new ArrayList<>();
        for (Model model : document.models()) {
            models.add(channels.solve(model, scope, monitor));
        }
        Comparison comparison = document.data().isEmpty() ? null : fits.compare(document, monitor);
        return of(project, models, comparison);
    }

    /**
     * Puts solved models and their comparison together; measured levels are completed with the model of the best rank.
     *
     * @param comparison how the models agree with the data, or null
     */
    public static FigureInput of(Project project, List<SolvedModel> models, Comparison comparison) {
        ModelDocument document = project.document();
        List<MeasuredLevel> measured = List.of();
        List<SpectralLine> lines = List.of();
        if (comparison != null && !comparison.models().isEmpty()) {
            MeasuredLevels levels = new MeasuredLevels(document);
            ModelComparison best = comparison.models().get(0);
            for (SolvedModel solved : models) {
                if (solved.model().equals(best.model())) {
                    measured = levels.levels(best, solved);
                }
            }
            lines = levels.lines(comparison.models(), models);
        }
        return new FigureInput(project.title(), project.digest(), document, models, measured, comparison, lines);
    }
}
