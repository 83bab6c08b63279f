package org.wellwright.viewer.comparison;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.FigureInput;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.fit.ModelComparison;
import org.wellwright.solver.fit.ResidualRow;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.viewer.plot.DatumText;
import org.wellwright.viewer.plot.LevelText;
import org.wellwright.viewer.plot.TableText;
import org.wellwright.viewer.plot.TableText.Cell;
import org.wellwright.viewer.plot.TableText.Column;
import org.wellwright.viewer.plot.Ticks;

/**
 * The tables of the comparison: models by rank, data with what every model says.
 *
 * @param ranking one row per model, best first
 * @param ranked names of the models of {@code ranking}
 * @param data one row per datum
 * @param levels the levels of the data, row by row
 */
record ComparisonViewModel(TableText ranking, List<String> ranked, TableText data, List<List<LevelKey>> levels) {
    ComparisonViewModel {
        ranked = List.copyOf(ranked);
        levels = levels.stream().map(List::copyOf).toList();
    }

    static ComparisonViewModel of(FigureInput input) {
        List<ModelComparison> models =
                input.comparison() == null ? List.of() : input.comparison().models();
        return new ComparisonViewModel(
                ranking(models),
                models.stream().map(ModelComparison::model).toList(),
                data(input),
                input.document().data().stream()
                        .map(datum -> datum.levels().stream()
                                .map(Datum.Contribution::level)
                                .toList())
                        .toList());
    }

    private static TableText ranking(List<ModelComparison> models) {
        List<List<Cell>> rows = new ArrayList<>();
        for (ModelComparison model : models) {
            double reduced = model.quality().reducedChiSquare();
            String problem =
                    model.problems().isEmpty() ? "" : model.problems().get(0).sentence();
            rows.add(List.of(
                    Cell.of(Integer.toString(model.rank())),
                    Cell.of(model.model()),
                    new Cell(
                            Ticks.number(model.quality().chiSquare(), 4),
                            Double.toString(model.quality().chiSquare())),
                    Cell.of(Integer.toString(model.quality().degreesOfFreedom())),
                    Double.isNaN(reduced) ? Cell.of("–") : new Cell(Ticks.number(reduced, 4), Double.toString(reduced)),
                    Cell.of(model.worstDatum()),
                    new Cell(problem, problem)));
        }
        return new TableText(
                List.of(
                        new Column("Rank", true),
                        new Column("Model", false),
                        new Column("χ²", true),
                        new Column("ν", true),
                        new Column("χ²/ν", true),
                        new Column("Worst datum", false),
                        new Column("Not predicted", false)),
                rows);
    }

    private static TableText data(FigureInput input) {
        List<Column> columns = new ArrayList<>(List.of(
                new Column("Datum", false),
                new Column("What", false),
                new Column("Measured", true),
                new Column("σ", true),
                new Column("Unit", false)));
        List<ModelComparison> compared = new ArrayList<>();
        for (SolvedModel model : input.models()) {
            ModelComparison comparison = input.compared(model.model());
            if (comparison != null) {
                compared.add(comparison);
                columns.add(new Column(model.model(), true));
                columns.add(new Column("residual/σ", true));
            }
        }
        LevelText names = LevelText.of(input.document());
        List<List<Cell>> rows = new ArrayList<>();
        for (Datum datum : input.document().data()) {
            List<Cell> row = new ArrayList<>();
            row.add(Cell.of(datum.used() ? datum.id() : datum.id() + " (not counted)"));
            row.add(Cell.of(DatumText.of(datum, names)));
            row.add(Cell.of(datum.value().text()));
            row.add(Cell.of(sigma(datum)));
            row.add(Cell.of(datum.unit()));
            for (ModelComparison comparison : compared) {
                addCells(row, comparison, datum.id());
            }
            rows.add(row);
        }
        return new TableText(columns, rows);
    }

    private static void addCells(List<Cell> row, ModelComparison comparison, String datum) {
        for (ResidualRow residual : comparison.rows()) {
            if (residual.datum().equals(datum)) {
                if (residual.problem() != null) {
                    String why = residual.problem().sentence();
                    row.add(new Cell("–", why));
                    row.add(new Cell("–", why));
                } else {
                    row.add(Cell.of(residual.predicted() + residual.groupShift(), residual.sigma()));
                    row.add(
                            Double.isFinite(residual.residual())
                                    ? new Cell(
                                            Ticks.label(residual.residual(), 0.01),
                                            Double.toString(residual.residual()))
                                    : Cell.of("–"));
                }
                return;
            }
        }
        row.add(Cell.of("–"));
        row.add(Cell.of("–"));
    }

    private static String sigma(Datum datum) {
        if (datum.sigmaPlus() == null) {
            return "–";
        }
        return datum.sigmaPlus().equals(datum.sigmaMinus())
                ? datum.sigmaPlus().text()
                : "+" + datum.sigmaPlus().text() + " −" + datum.sigmaMinus().text();
    }
}
