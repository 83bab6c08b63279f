package org.wellwright.project.command.json;

import java.util.Locale;
import org.wellwright.project.report.Words;
import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.Covariance;
import org.wellwright.solver.fit.FitQuality;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.fit.GroupError;
import org.wellwright.solver.fit.ResidualRow;
import org.wellwright.solver.model.ModelDocument;

/** Comparisons and fits as JSON. */
public final class FitJson {
    private FitJson() {}

    /** A finished fit: parameters with σ, group errors, correlations, quality, every datum. */
    public static String write(FitResult fit) {
        return JsonText.object(out -> {
            out.text("model", fit.model())
                    .flag("converged", fit.converged())
                    .whole("iterations", fit.iterations())
                    .text("weighting", word(fit.mode()))
                    .number("sigmaScale", fit.sigmaScale());
            quality(out, fit.quality());
            out.items(
                    "parameters",
                    fit.parameters(),
                    (item, parameter) -> item.text("name", parameter.name())
                            .number("value", parameter.value())
                            .number("sigma", parameter.sigma())
                            .text("unit", parameter.unit())
                            .flag("free", parameter.free())
                            .text("bound", word(parameter.bound())));
            out.items("groups", fit.groupErrors(), FitJson::group);
            out.items(
                    "modelErrors",
                    fit.modelErrors(),
                    (item, error) -> item.text("group", error.group())
                            .text("measure", word(error.measure()))
                            .number("value", error.value())
                            .text("unit", error.unit())
                            .flag("fitted", error.fitted()));
            Covariance covariance = fit.covariance();
            out.nested("correlations", item -> {
                item.texts("names", covariance.names());
                item.rows("matrix", covariance.size(), covariance::correlation);
            });
            out.items("rows", fit.rows(), (item, row) -> row(item, row, fit.document()));
            out.texts(
                    "remarks",
                    fit.remarks().stream().map(remark -> remark.sentence()).toList());
        });
    }

    /** All models beside the data, best first. */
    public static String write(Comparison comparison, ModelDocument document) {
        return JsonText.object(out -> {
            out.text("weighting", word(comparison.mode())).whole("commonData", comparison.commonData());
            out.items("models", comparison.models(), (item, model) -> {
                item.whole("rank", model.rank()).text("model", model.model());
                quality(item, model.quality());
                item.number("commonCriterion", model.commonCriterion()).text("worstDatum", model.worstDatum());
                item.items("groups", model.groupErrors(), FitJson::group);
                item.items("rows", model.rows(), (rows, row) -> row(rows, row, document));
                item.texts(
                        "problems",
                        model.problems().stream()
                                .map(problem -> problem.sentence())
                                .toList());
            });
        });
    }

    private static void quality(JsonText out, FitQuality quality) {
        out.number("chiSquare", quality.chiSquare())
                .whole("degreesOfFreedom", quality.degreesOfFreedom())
                .number("reducedChiSquare", quality.reducedChiSquare())
                .number("criterion", quality.criterion())
                .number("logLikelihood", quality.logLikelihood());
    }

    private static void group(JsonText out, GroupError error) {
        out.text("group", error.group())
                .number("value", error.value())
                .number("sigma", error.sigma())
                .text("unit", error.unit());
    }

    private static void row(JsonText out, ResidualRow row, ModelDocument document) {
        out.text("datum", row.datum())
                .text("levels", Words.levels(document, row.datum()))
                .number("measured", row.measured())
                .number("sigma", row.sigma())
                .number("calculated", row.predicted())
                .number("calculatedSigma", row.predictedSigma())
                .number("groupShift", row.groupShift())
                .number("residual", row.residual())
                .text("unit", row.unit())
                .flag("used", row.used());
        if (row.problem() != null) {
            out.text("problem", row.problem().sentence());
        }
    }

    private static String word(Enum<?> constant) {
        return constant.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
