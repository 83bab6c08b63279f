package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.IntToDoubleFunction;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.Assembly;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.ModelError;
import org.wellwright.solver.model.PoolNumber;
import org.wellwright.solver.model.Weighting;

/**
 * Turns the end of a search into a {@link FitResult}: parameters with σ, rows, predictions with propagated σ, remarks.
 */
final class FitReport {
    private final FitRequest request;
    private final Assembly assembly;
    private final DataModel model;
    private final FitObjective.Setup setup;
    private final Reweighting search;
    private final SolvedPoints solved;
    private final List<Problem> remarks;
    private final double[] x;
    private final double[] values;
    private final double[][] covariance;

    FitReport(
            FitRequest request,
            Assembly assembly,
            DataModel model,
            FitObjective.Setup setup,
            Reweighting search,
            SolvedPoints solved,
            List<Problem> remarks) {
        this.request = request;
        this.assembly = assembly;
        this.model = model;
        this.setup = setup;
        this.search = search;
        this.solved = solved;
        this.remarks = remarks;
        this.x = search.point();
        this.values = setup.poolValues(x);
        this.covariance = search.linearization().covariance();
        for (double[] row : covariance) {
            for (int j = 0; j < row.length; j++) {
                row[j] *= search.covarianceFactor();
            }
        }
    }

    FitResult result() {
        LevelTable table = solved.at(values, ModelFit.everything(request));
        remarks.addAll(table.doubts());
        List<Quantity> quantities = setup.data().stream()
                .map(datum -> model.quantity(datum, table, values))
                .toList();
        double[] sigmas = new double[quantities.size()];
        for (int i = 0; i < sigmas.length; i++) {
            sigmas[i] = quantities.get(i).found() ? sigma(quantities.get(i)::derivative) : Double.NaN;
        }
        double scale = search.weights().scale();
        if (!(scale > 0)) {
            remarks.add(new Problem(
                    "the scatter of the data gives no sigma: there are as many free numbers as data",
                    "",
                    "add data or state their sigmas"));
        }
        Weights shown = scale > 0 ? search.weights() : search.weights().withScale(1);
        List<ResidualRow> rows = RowReport.rows(setup, shown, quantities, x, sigmas);
        return new FitResult(
                fittedDocument(),
                request.model(),
                parameters(),
                groupErrors(),
                Covariance.of(names(), covariance),
                quality(rows),
                request.document().weighting(),
                scale,
                modelErrors(),
                rows,
                predictions(table),
                search.iterations(),
                search.converged(),
                remarks);
    }

    /** √(gᵀ C g) over the variables that the covariance is of; group errors do not act on a prediction. */
    private double sigma(IntToDoubleFunction derivative) {
        double sum = 0;
        List<Integer> columns = search.columns();
        for (int a = 0; a < columns.size(); a++) {
            for (int b = 0; b < columns.size(); b++) {
                if (columns.get(a) < setup.free().size()
                        && columns.get(b) < setup.free().size()) {
                    sum += derivative.applyAsDouble(setup.free().get(columns.get(a)))
                            * covariance[a][b]
                            * derivative.applyAsDouble(setup.free().get(columns.get(b)));
                }
            }
        }
        return Math.sqrt(Math.max(0, sum));
    }

    private double sigmaOf(int variable) {
        int column = search.columns().indexOf(variable);
        return column < 0 ? Double.NaN : Math.sqrt(covariance[column][column]);
    }

    private List<String> names() {
        List<String> names = new ArrayList<>();
        for (int j : search.columns()) {
            boolean number = j < setup.free().size();
            names.add(
                    number
                            ? setup.number(j).name()
                            : setup.groups().group(j - setup.free().size()).id());
        }
        return names;
    }

    private List<FittedParameter> parameters() {
        boolean[] used = LevelTable.dependencies(assembly, ModelFit.everything(request), values);
        List<FittedParameter> parameters = new ArrayList<>();
        List<PoolNumber> numbers = assembly.pool().numbers();
        for (int i = 0; i < numbers.size(); i++) {
            PoolNumber number = numbers.get(i);
            int variable = setup.free().indexOf(i);
            if (!used[i] && variable < 0) {
                continue;
            }
            if (variable < 0 && number.setting().free()) {
                remarks.add(new Problem(
                        "'%s' is free, but no used datum depends on it: it was left as it is".formatted(number.name()),
                        "",
                        "fix it or add a datum"));
            }
            int bound = variable < 0 ? 0 : search.minimum().bound(variable);
            if (bound != 0) {
                remarks.add(new Problem(
                        "'%s' ended at its %s bound".formatted(number.name(), bound < 0 ? "lower" : "upper"),
                        "",
                        "widen the bound or fix it; its sigma has no meaning there"));
            }
            String parameter =
                    request.document().parameters().get(number.parameter()).name();
            parameters.add(new FittedParameter(
                    number.name(),
                    parameter,
                    values[i],
                    variable < 0 ? 0 : sigmaOf(variable),
                    number.unit(),
                    variable >= 0,
                    bound < 0
                            ? FittedParameter.Bound.LOWER
                            : bound > 0 ? FittedParameter.Bound.UPPER : FittedParameter.Bound.NONE));
        }
        return parameters;
    }

    private List<GroupError> groupErrors() {
        List<GroupError> errors = new ArrayList<>();
        for (int k = 0; k < setup.groups().count(); k++) {
            int variable = setup.free().size() + k;
            errors.add(new GroupError(
                    setup.groups().group(k).id(),
                    x[variable],
                    sigmaOf(variable),
                    setup.groups().group(k).unit()));
        }
        return errors;
    }

    private List<ModelErrorEstimate> modelErrors() {
        List<ModelErrorEstimate> errors = new ArrayList<>();
        List<ModelError.Part> parts = assembly.model().error().parts();
        for (int k = 0; k < parts.size(); k++) {
            ModelError.Part part = parts.get(k);
            errors.add(new ModelErrorEstimate(
                    part.group(), part.measure(), search.weights().modelSigma(k), part.unit(), part.fitted()));
        }
        return errors;
    }

    private FitQuality quality(List<ResidualRow> rows) {
        double sum = 0;
        int counted = setup.rows().size();
        for (int i = 0; i < search.minimum().evaluation().residuals().length; i++) {
            double residual = search.minimum().evaluation().residual(i);
            double stated = i < counted ? residual * search.searchedScale() : residual;
            sum += stated * stated;
        }
        int observations = counted + setup.priors().size() + setup.knownGroups().size();
        boolean missing = request.document().weighting() == Weighting.MISSING;
        return new FitQuality(
                sum, observations, setup.variables(), missing ? Double.NaN : RowReport.logLikelihood(rows));
    }

    private List<Prediction> predictions(LevelTable table) {
        List<Prediction> predictions = new ArrayList<>();
        for (LevelKey key : request.predict()) {
            LevelTable.Entry entry = table.entry(key);
            if (!entry.found()) {
                predictions.add(new Prediction(key, Double.NaN, Double.NaN, Double.NaN, entry.problem()));
                continue;
            }
            double[] gradient = new double[values.length];
            entry.gradient().addTo(gradient, 1);
            predictions.add(new Prediction(key, entry.energy(), sigma(i -> gradient[i]), entry.halfWidth(), null));
        }
        return predictions;
    }

    /** The document with the fitted numbers, everything else digit for digit as typed. */
    private ModelDocument fittedDocument() {
        double[] moved = new double[values.length];
        Arrays.fill(moved, Double.NaN);
        for (int i : setup.free()) {
            moved[i] = values[i];
        }
        ModelDocument document =
                request.document().withParameters(assembly.pool().withValues(moved));
        List<ModelError.Part> parts = new ArrayList<>();
        boolean changed = false;
        for (int k = 0; k < assembly.model().error().parts().size(); k++) {
            ModelError.Part part = assembly.model().error().parts().get(k);
            double fitted = search.weights().modelSigma(k);
            boolean moves = part.fitted() && fitted > 0;
            changed |= moves;
            parts.add(moves ? part.withValue(fitted) : part);
        }
        if (!changed) {
            return document;
        }
        List<Model> models = document.models().stream()
                .map(other -> other.name().equals(request.model()) ? other.withError(new ModelError(parts)) : other)
                .toList();
        return document.withModels(models);
    }
}
