package org.wellwright.project.report;

import java.util.ArrayList;
import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.FittedModel;
import org.wellwright.project.ReportInput;
import org.wellwright.project.ReportSection;
import org.wellwright.project.ReportTable;
import org.wellwright.solver.fit.Covariance;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.fit.FittedParameter;
import org.wellwright.solver.fit.GroupError;
import org.wellwright.solver.fit.ModelErrorEstimate;
import org.wellwright.solver.model.Parameter;

/** The fitted parameters with their uncertainties and correlations. */
@ServiceProvider(service = ReportSection.class)
public final class FitSection implements ReportSection {
    @Override
    public String id() {
        return "fit";
    }

    @Override
    public String title() {
        return "Fitted parameters";
    }

    @Override
    public int position() {
        return 500;
    }

    @Override
    public String html(ReportInput input) {
        StringBuilder out = new StringBuilder();
        for (FittedModel model : input.fits()) {
            if (model.fit() == null) {
                continue;
            }
            FitResult fit = model.fit();
            out.append("<h3>").append(Html.text(model.model())).append("</h3>\n");
            out.append(Html.table(List.of("parameter", "value ± σ", "unit", "", "convention"), rows(fit)));
            out.append("<p>").append(Html.text(Words.quality(fit))).append(".</p>\n");
            fit.remarks()
                    .forEach(remark -> out.append("<p class=\"warn\">")
                            .append(Html.text(remark.sentence()))
                            .append(".</p>\n"));
            out.append(correlations(fit.covariance()));
        }
        return out.toString();
    }

    private static List<List<String>> rows(FitResult fit) {
        List<List<String>> rows = new ArrayList<>();
        for (FittedParameter parameter : fit.parameters()) {
            String value = parameter.free()
                    ? Digits.plusMinus(parameter.value(), parameter.sigma())
                    : Digits.plain(parameter.value());
            rows.add(List.of(
                    parameter.name(),
                    value,
                    parameter.unit(),
                    Words.state(parameter),
                    convention(fit, parameter.parameter())));
        }
        for (GroupError error : fit.groupErrors()) {
            rows.add(List.of(
                    "shift of " + error.group(),
                    Digits.plusMinus(error.value(), error.sigma()),
                    error.unit(),
                    "shared error",
                    ""));
        }
        for (ModelErrorEstimate error : fit.modelErrors()) {
            String of = error.group().isEmpty() ? "" : " of " + error.group();
            rows.add(List.of(
                    "σ_mod" + of,
                    Digits.significant(error.value(), 2),
                    error.unit(),
                    error.fitted() ? "fitted" : "fixed",
                    ""));
        }
        return rows;
    }

    private static String convention(FitResult fit, String name) {
        for (Parameter parameter : fit.document().parameters()) {
            if (parameter.name().equals(name)) {
                return parameter.convention();
            }
        }
        return "";
    }

    private static String correlations(Covariance covariance) {
        if (covariance.size() < 2) {
            return "";
        }
        List<String> header = new ArrayList<>(List.of(""));
        header.addAll(covariance.names().subList(0, covariance.size() - 1));
        List<List<String>> rows = new ArrayList<>();
        for (int i = 1; i < covariance.size(); i++) {
            List<String> cells = new ArrayList<>(List.of(covariance.names().get(i)));
            for (int j = 0; j < covariance.size() - 1; j++) {
                cells.add(j < i ? Digits.decimals(covariance.correlation(i, j), 3) : "");
            }
            rows.add(cells);
        }
        return Html.table("Correlations", header, rows);
    }

    @Override
    public List<ReportTable> tables(ReportInput input) {
        List<List<String>> rows = new ArrayList<>();
        List<List<String>> correlations = new ArrayList<>();
        for (FittedModel model : input.fits()) {
            if (model.fit() == null) {
                continue;
            }
            for (FittedParameter parameter : model.fit().parameters()) {
                rows.add(List.of(
                        model.model(),
                        parameter.name(),
                        Csv.number(parameter.value()),
                        Csv.number(parameter.sigma()),
                        parameter.unit(),
                        Words.state(parameter)));
            }
            for (GroupError error : model.fit().groupErrors()) {
                rows.add(List.of(
                        model.model(),
                        "shift of " + error.group(),
                        Csv.number(error.value()),
                        Csv.number(error.sigma()),
                        error.unit(),
                        "shared error"));
            }
            Covariance covariance = model.fit().covariance();
            for (int i = 0; i < covariance.size(); i++) {
                for (int j = 0; j <= i; j++) {
                    correlations.add(List.of(
                            model.model(),
                            covariance.names().get(i),
                            covariance.names().get(j),
                            Csv.number(covariance.at(i, j)),
                            Csv.number(covariance.correlation(i, j))));
                }
            }
        }
        return List.of(
                new ReportTable(
                        "parameters.csv", List.of("model", "parameter", "value", "sigma", "unit", "state"), rows),
                new ReportTable(
                        "covariance.csv",
                        List.of("model", "first", "second", "covariance", "correlation"),
                        correlations));
    }
}
