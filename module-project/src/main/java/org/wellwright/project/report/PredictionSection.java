package org.wellwright.project.report;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.FittedModel;
import org.wellwright.project.ReportInput;
import org.wellwright.project.ReportSection;
import org.wellwright.project.ReportTable;
import org.wellwright.solver.fit.Prediction;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.LevelNames;
import org.wellwright.solver.units.UnitSystem;

/** Levels of every model, measured or not, with the uncertainty that its parameters leave. */
@ServiceProvider(service = ReportSection.class)
public final class PredictionSection implements ReportSection {
    @Override
    public String id() {
        return "predictions";
    }

    @Override
    public String title() {
        return "Predicted levels";
    }

    @Override
    public int position() {
        return 600;
    }

    @Override
    public String html(ReportInput input) {
        List<FittedModel> fitted =
                input.fits().stream().filter(model -> model.fit() != null).toList();
        if (fitted.isEmpty() || fitted.get(0).fit().predictions().isEmpty()) {
            return "";
        }
        LevelNames names = LevelNames.of(input.project().document());
        UnitSystem units = UnitSystem.named(input.project().document().units());
        Set<LevelKey> measured = new HashSet<>();
        for (Datum datum : input.project().document().data()) {
            if (datum.used()) {
                datum.levels().forEach(contribution -> measured.add(contribution.level()));
            }
        }
        List<String> header = new ArrayList<>(List.of("level", "in the data"));
        fitted.forEach(model -> header.add(model.model()));
        List<List<String>> rows = new ArrayList<>();
        List<Prediction> first = fitted.get(0).fit().predictions();
        for (int i = 0; i < first.size(); i++) {
            LevelKey level = first.get(i).level();
            List<String> cells = new ArrayList<>(List.of(names.name(level), measured.contains(level) ? "yes" : ""));
            for (FittedModel model : fitted) {
                Prediction prediction = model.fit().predictions().get(i);
                cells.add(Digits.plusMinus(prediction.energy(), sigma(prediction)));
            }
            rows.add(cells);
        }
        return Html.table(
                        "Energies in " + units.energy().printed()
                                + ", ± the standard uncertainty from the fitted parameters",
                        header,
                        rows)
                + "<p>The uncertainty is that of the parameters if the model holds. Where surviving models differ by more, the difference between them"
                + " is the better guide. A dash stands for a level that the model does not bind.</p>\n";
    }

    private static double sigma(Prediction prediction) {
        return Math.max(prediction.parameterSigma(), prediction.numericalHalfWidth());
    }

    @Override
    public List<ReportTable> tables(ReportInput input) {
        LevelNames names = LevelNames.of(input.project().document());
        UnitSystem units = UnitSystem.named(input.project().document().units());
        List<List<String>> rows = new ArrayList<>();
        for (FittedModel model : input.fits()) {
            if (model.fit() == null) {
                continue;
            }
            for (Prediction prediction : model.fit().predictions()) {
                rows.add(List.of(
                        model.model(),
                        names.name(prediction.level()),
                        Csv.number(prediction.energy()),
                        Csv.number(prediction.parameterSigma()),
                        Csv.number(prediction.numericalHalfWidth()),
                        units.energy().symbol()));
            }
        }
        return List.of(new ReportTable(
                "predictions.csv",
                List.of("model", "level", "energy", "parameterSigma", "numericalHalfWidth", "unit"),
                rows));
    }
}
