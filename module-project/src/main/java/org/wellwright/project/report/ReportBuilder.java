package org.wellwright.project.report;

import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FittedModel;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectResults;
import org.wellwright.project.ProjectSolver;
import org.wellwright.project.ReportInput;
import org.wellwright.project.SolveScope;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.FitRequest;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.fit.ModelComparison;
import org.wellwright.solver.fit.ResidualRow;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.service.FitService;
import org.wellwright.solver.service.SolverService;

/** Does the whole job for a report: fits every model, solves it at its own best values, ranks the models. */
public final class ReportBuilder {
    /** Levels predicted for each channel of the report. */
    private static final int MOST_PREDICTIONS = 60;

    private final SolverService solver;
    private final FitService fits;

    /** A builder that uses these services. */
    public ReportBuilder(SolverService solver, FitService fits) {
        this.solver = solver;
        this.fits = fits;
    }

    /**
     * Everything a report needs. A model that cannot be fitted is kept with the reason.
     *
     * @param file name of the project's file
     * @throws java.util.concurrent.CancellationException if the monitor says so
     */
    public ReportInput build(Project project, String file, SolveMonitor monitor) {
        ModelDocument document = project.document();
        List<FittedModel> fitted = new ArrayList<>();
        for (Model model : document.models()) {
            fitted.add(fit(document, model, monitor));
        }
        fitted.sort(Comparator.comparingInt(ReportBuilder::unpredicted).thenComparingDouble(ReportBuilder::criterion));
        Comparison comparison =
                fitted.stream().anyMatch(model -> model.fit() != null) ? comparison(document, fitted) : null;
        List<SolvedModel> solved = new ArrayList<>();
        for (Model model : document.models()) {
            ModelDocument best = document;
            for (FittedModel candidate : fitted) {
                if (candidate.model().equals(model.name()) && candidate.fit() != null) {
                    best = candidate.fit().document();
                }
            }
            solved.add(new ProjectSolver(best, solver).solve(model, SolveScope.USUAL, monitor));
        }
        FigureInput results = ProjectResults.of(project, solved, comparison);
        return new ReportInput(project, file, fitted, results, origin());
    }

    private FittedModel fit(ModelDocument document, Model model, SolveMonitor monitor) {
        if (document.data().isEmpty()) {
            return new FittedModel(model.name(), null, new Problem("there are no data", "", ""));
        }
        List<LevelKey> predict = new ArrayList<>();
        for (ProjectSolver.Wanted channel : new ProjectSolver(document, solver).wanted(model, SolveScope.USUAL)) {
            for (int index = 0; index < channel.count() && predict.size() < MOST_PREDICTIONS; index++) {
                predict.add(new LevelKey(channel.system(), channel.curve(), channel.channel(), index));
            }
        }
        try {
            FitResult fit =
                    fits.fit(new FitRequest(document, model.name(), predict, FitRequest.STANDARD_ITERATIONS), monitor);
            return fit.converged()
                    ? new FittedModel(model.name(), fit, null)
                    : new FittedModel(
                            model.name(),
                            null,
                            new Problem("the fit did not converge", "", "start from better values"));
        } catch (WellwrightException e) {
            return new FittedModel(model.name(), null, e.problem());
        }
    }

    /** Used data that a model does not predict; a model without a fit comes after all others. */
    private static int unpredicted(FittedModel model) {
        if (model.fit() == null) {
            return Integer.MAX_VALUE;
        }
        return (int) model.fit().rows().stream()
                .filter(row -> row.used() && !Double.isFinite(row.predicted()))
                .count();
    }

    private static double criterion(FittedModel model) {
        return model.fit() == null
                ? Double.POSITIVE_INFINITY
                : model.fit().quality().criterion();
    }

    /** The fits side by side. */
    private static Comparison comparison(ModelDocument document, List<FittedModel> fitted) {
        List<ModelComparison> models = new ArrayList<>();
        Set<String> common = null;
        for (FittedModel model : fitted) {
            if (model.fit() == null) {
                continue;
            }
            FitResult fit = model.fit();
            models.add(new ModelComparison(
                    model.model(),
                    models.size() + 1,
                    fit.quality(),
                    fit.quality().criterion(),
                    fit.rows(),
                    worst(fit.rows()),
                    fit.groupErrors(),
                    fit.remarks()));
            Set<String> predicted = new LinkedHashSet<>();
            fit.rows().stream()
                    .filter(row -> row.used() && Double.isFinite(row.predicted()))
                    .forEach(row -> predicted.add(row.datum()));
            if (common == null) {
                common = predicted;
            } else {
                common.retainAll(predicted);
            }
        }
        return new Comparison(document.weighting(), models, common == null ? 0 : common.size());
    }

    private static String worst(List<ResidualRow> rows) {
        ResidualRow worst = null;
        for (ResidualRow row : rows) {
            boolean counts = row.used() && Double.isFinite(row.residual());
            if (counts && (worst == null || Math.abs(row.residual()) > Math.abs(worst.residual()))) {
                worst = row;
            }
        }
        return worst == null ? "" : worst.datum();
    }

    private ReportInput.Origin origin() {
        return new ReportInput.Origin(
                Version.text(),
                solver.displayName() + ", " + solver.version(),
                Instant.now().truncatedTo(ChronoUnit.SECONDS).toString(),
                "Java " + System.getProperty("java.version") + ", " + System.getProperty("os.name") + " "
                        + System.getProperty("os.arch"));
    }
}
