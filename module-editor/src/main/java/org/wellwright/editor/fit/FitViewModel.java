package org.wellwright.editor.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.wellwright.editor.edit.Uncertain;
import org.wellwright.project.entry.TransformText;
import org.wellwright.solver.Problem;
import org.wellwright.solver.fit.Covariance;
import org.wellwright.solver.fit.FitQuality;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.fit.FittedParameter;
import org.wellwright.solver.fit.GroupError;
import org.wellwright.solver.fit.ModelErrorEstimate;
import org.wellwright.solver.fit.ResidualRow;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelNames;
import org.wellwright.solver.model.LevelSums;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.ParameterPool;
import org.wellwright.solver.model.PoolNumber;

/**
 * What the fit window shows.
 *
 * @param state what is going on
 * @param model the model that is or was fitted; empty if none
 * @param fraction how far it is, 0 to 1
 * @param doing what is being done, or how it ended, in a sentence
 * @param problem why it failed, or null
 * @param quality χ² and its like, one line each
 * @param parameters fitted numbers
 * @param residuals the data beside the fitted model
 * @param correlations the pairs that hang together most, strongest first
 * @param remarks what the user should know
 */
record FitViewModel(
        State state,
        String model,
        double fraction,
        String doing,
        Problem problem,
        List<String> quality,
        List<ParameterRow> parameters,
        List<DatumRow> residuals,
        List<CorrelationRow> correlations,
        List<String> remarks) {

    /** What is going on. */
    enum State {
        /** Nothing has been fitted. */
        IDLE,
        /** A fit runs. */
        RUNNING,
        /** A fit is there to be accepted or discarded. */
        DONE,
        /** A fit has failed or was cancelled. */
        FAILED
    }

    /** One number before and after the fit. */
    record ParameterRow(String name, String before, String after, String unit, String change, String note) {}

    /** One datum beside the fitted model. */
    record DatumRow(
            String id,
            String levels,
            String quantity,
            String measured,
            String predicted,
            String unit,
            String residual,
            boolean far,
            String problem) {}

    /** How strongly two fitted numbers hang together. */
    record CorrelationRow(String first, String second, String value) {}

    FitViewModel {
        quality = List.copyOf(quality);
        parameters = List.copyOf(parameters);
        residuals = List.copyOf(residuals);
        correlations = List.copyOf(correlations);
        remarks = List.copyOf(remarks);
    }

    static FitViewModel idle() {
        return new FitViewModel(State.IDLE, "", 0, "", null, List.of(), List.of(), List.of(), List.of(), List.of());
    }

    static FitViewModel running(String model, double fraction, String doing) {
        return new FitViewModel(
                State.RUNNING, model, fraction, doing, null, List.of(), List.of(), List.of(), List.of(), List.of());
    }

    static FitViewModel failed(String model, Problem problem) {
        return new FitViewModel(
                State.FAILED, model, 0, "", problem, List.of(), List.of(), List.of(), List.of(), List.of());
    }

    static FitViewModel done(ModelDocument before, FitResult result) {
        List<String> remarks = new ArrayList<>();
        result.remarks().forEach(remark -> remarks.add(remark.sentence()));
        result.rows().stream()
                .filter(row -> row.problem() != null)
                .forEach(row -> remarks.add(row.datum() + ": " + row.problem().sentence()));
        String doing =
                "%s after %d steps".formatted(result.converged() ? "A minimum" : "No minimum", result.iterations());
        return new FitViewModel(
                State.DONE,
                result.model(),
                1,
                doing,
                null,
                quality(result),
                parameters(before, result),
                residuals(result),
                correlations(result.covariance()),
                remarks);
    }

    private static List<String> quality(FitResult result) {
        FitQuality quality = result.quality();
        List<String> lines = new ArrayList<>();
        lines.add("χ² = %s, ν = %d".formatted(Uncertain.number(quality.chiSquare(), 5), quality.degreesOfFreedom()));
        if (quality.degreesOfFreedom() > 0) {
            lines.add("χ²/ν = " + Uncertain.number(quality.reducedChiSquare(), 4));
        }
        lines.add("χ² + 2k = " + Uncertain.number(quality.criterion(), 5));
        lines.add(
                switch (result.mode()) {
                    case KNOWN -> "σ as stated";
                    case KNOWN_UP_TO_SCALE ->
                        "σ times %s, from the scatter".formatted(Uncertain.number(result.sigmaScale(), 4));
                    case MISSING -> "σ from the scatter: %s".formatted(Uncertain.number(result.sigmaScale(), 4));
                });
        for (ModelErrorEstimate error : result.modelErrors()) {
            String group = error.group().isEmpty() ? "" : " of " + error.group();
            lines.add("σ of the model%s: %s %s%s"
                    .formatted(
                            group, Uncertain.number(error.value(), 3), error.unit(), error.fitted() ? " (fitted)" : "")
                    .strip());
        }
        return lines;
    }

    private static List<ParameterRow> parameters(ModelDocument before, FitResult result) {
        List<PoolNumber> numbers = ParameterPool.of(before).numbers();
        List<ParameterRow> rows = new ArrayList<>();
        for (FittedParameter fitted : result.parameters()) {
            double old = numbers.stream()
                    .filter(number -> number.name().equals(fitted.name()))
                    .mapToDouble(number -> number.setting().value().value())
                    .findFirst()
                    .orElse(Double.NaN);
            double moved = fitted.value() - old;
            String note = switch (fitted.bound()) {
                case NONE -> fitted.free() ? Double.isNaN(fitted.sigma()) ? "not determined by the data" : "" : "fixed";
                case LOWER -> "at its lower bound";
                case UPPER -> "at its upper bound";
            };
            rows.add(new ParameterRow(
                    fitted.name(),
                    Uncertain.number(old, 10),
                    Uncertain.text(fitted.value(), fitted.free() ? fitted.sigma() : 0),
                    fitted.unit(),
                    !fitted.free()
                            ? ""
                            : fitted.sigma() > 0
                                    ? "%+.1f σ".formatted(moved / fitted.sigma())
                                    : Uncertain.number(moved, 3),
                    note));
        }
        for (GroupError error : result.groupErrors()) {
            rows.add(new ParameterRow(
                    "error of " + error.group(),
                    "",
                    Uncertain.text(error.value(), error.sigma()),
                    error.unit(),
                    "",
                    "shared error of the group"));
        }
        return rows;
    }

    private static List<DatumRow> residuals(FitResult result) {
        LevelNames names = LevelNames.of(result.document());
        List<DatumRow> rows = new ArrayList<>();
        for (ResidualRow row : result.rows()) {
            Datum datum = result.document().data().stream()
                    .filter(each -> each.id().equals(row.datum()))
                    .findFirst()
                    .orElse(null);
            rows.add(new DatumRow(
                    row.datum(),
                    datum == null ? "" : LevelSums.text(datum.levels(), names),
                    datum == null ? "" : TransformText.title(datum.transform()),
                    datum == null
                            ? Uncertain.number(row.measured(), 10)
                            : datum.value().text(),
                    Uncertain.text(row.predicted() + row.groupShift(), row.predictedSigma()),
                    row.unit(),
                    row.used() || Double.isFinite(row.residual()) ? residual(row) : "",
                    row.used() && Math.abs(row.residual()) > 3,
                    row.problem() == null
                            ? row.used() ? "" : "not used"
                            : row.problem().sentence()));
        }
        return rows;
    }

    private static String residual(ResidualRow row) {
        return Double.isFinite(row.residual()) ? String.format(Locale.ROOT, "%+.2f", row.residual()) : "—";
    }

    private static List<CorrelationRow> correlations(Covariance covariance) {
        record Pair(int first, int second, double value) {}
        List<Pair> pairs = new ArrayList<>();
        for (int i = 0; i < covariance.size(); i++) {
            for (int j = 0; j < i; j++) {
                pairs.add(new Pair(j, i, covariance.correlation(i, j)));
            }
        }
        pairs.sort((a, b) -> Double.compare(Math.abs(b.value()), Math.abs(a.value())));
        return pairs.stream()
                .map(pair -> new CorrelationRow(
                        covariance.names().get(pair.first()),
                        covariance.names().get(pair.second()),
                        String.format(Locale.ROOT, "%+.3f", pair.value())))
                .toList();
    }
}
