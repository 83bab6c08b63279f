package org.wellwright.project.report;

import java.util.ArrayList;
import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.FittedModel;
import org.wellwright.project.ReportInput;
import org.wellwright.project.ReportSection;
import org.wellwright.project.ReportTable;
import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.ModelComparison;
import org.wellwright.solver.fit.ResidualRow;
import org.wellwright.solver.model.Weighting;

/** Which model holds: ranking and residuals, each model at its own best values. */
@ServiceProvider(service = ReportSection.class)
public final class ComparisonSection implements ReportSection {
    @Override
    public String id() {
        return "comparison";
    }

    @Override
    public String title() {
        return "Which model holds";
    }

    @Override
    public int position() {
        return 400;
    }

    @Override
    public String html(ReportInput input) {
        Comparison comparison = input.results().comparison();
        if (comparison == null || comparison.models().isEmpty()) {
            return "<p>There is nothing to compare.</p>\n";
        }
        List<List<String>> ranking = new ArrayList<>();
        for (ModelComparison model : comparison.models()) {
            double p = Significance.chiSquareTail(model.quality());
            ranking.add(List.of(
                    Integer.toString(model.rank()),
                    model.model(),
                    Digits.significant(model.quality().chiSquare(), 4),
                    Integer.toString(model.quality().degreesOfFreedom()),
                    Digits.significant(model.quality().reducedChiSquare(), 3),
                    comparison.mode() == Weighting.KNOWN ? Digits.significant(p, 2) : "–",
                    Digits.significant(model.quality().criterion(), 4),
                    model.worstDatum()));
        }
        StringBuilder out = new StringBuilder(
                Html.table(List.of("rank", "model", "χ²", "ν", "χ²/ν", "p", "χ² + 2k", "worst datum"), ranking));
        out.append(
                        "<p>χ² is the sum of the squared residuals over the data that count, the priors and the shared errors; ν is their number less that of the")
                .append(
                        " k adjusted numbers; p is the chance of a larger χ² if the model and the uncertainties hold. Models are ranked by χ² + 2k")
                .append(" (Akaike 1974); a model that predicts fewer of the data comes last. Uncertainties: ")
                .append(Html.text(Words.weighting(comparison.mode())))
                .append(".</p>\n");
        for (FittedModel model : input.fits()) {
            if (model.problem() != null) {
                out.append("<p class=\"warn\">")
                        .append(Html.text(model.model() + " was not fitted: "
                                + model.problem().sentence() + "."))
                        .append("</p>\n");
            }
        }
        return out.append(residuals(comparison, input)).toString();
    }

    private static String residuals(Comparison comparison, ReportInput input) {
        List<String> header = new ArrayList<>(List.of("datum", "levels"));
        comparison.models().forEach(model -> header.add(model.model()));
        List<List<String>> rows = new ArrayList<>();
        for (int i = 0; i < comparison.models().get(0).rows().size(); i++) {
            ResidualRow first = comparison.models().get(0).rows().get(i);
            List<String> cells = new ArrayList<>(List.of(
                    first.datum() + (first.used() ? "" : " (not used)"),
                    Words.levels(input.project().document(), first.datum())));
            for (ModelComparison model : comparison.models()) {
                cells.add(Digits.decimals(model.rows().get(i).residual(), 2));
            }
            rows.add(cells);
        }
        return Html.table("Residuals (measured − calculated)/σ", header, rows);
    }

    @Override
    public List<ReportTable> tables(ReportInput input) {
        Comparison comparison = input.results().comparison();
        if (comparison == null) {
            return List.of();
        }
        List<List<String>> ranking = new ArrayList<>();
        List<List<String>> residuals = new ArrayList<>();
        for (ModelComparison model : comparison.models()) {
            ranking.add(List.of(
                    Integer.toString(model.rank()),
                    model.model(),
                    Csv.number(model.quality().chiSquare()),
                    Integer.toString(model.quality().degreesOfFreedom()),
                    Csv.number(model.quality().criterion()),
                    model.worstDatum()));
            for (ResidualRow row : model.rows()) {
                residuals.add(List.of(
                        model.model(),
                        row.datum(),
                        Csv.number(row.measured()),
                        Csv.number(row.sigma()),
                        Csv.number(row.predicted()),
                        Csv.number(row.predictedSigma()),
                        Csv.number(row.groupShift()),
                        Csv.number(row.residual()),
                        row.unit(),
                        row.used() ? "yes" : "no"));
            }
        }
        return List.of(
                new ReportTable(
                        "ranking.csv",
                        List.of("rank", "model", "chiSquare", "degreesOfFreedom", "criterion", "worstDatum"),
                        ranking),
                new ReportTable(
                        "residuals.csv",
                        List.of(
                                "model",
                                "datum",
                                "measured",
                                "sigma",
                                "calculated",
                                "calculatedSigma",
                                "groupShift",
                                "residual",
                                "unit",
                                "used"),
                        residuals));
    }
}
