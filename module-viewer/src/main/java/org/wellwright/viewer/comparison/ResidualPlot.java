package org.wellwright.viewer.comparison;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.fit.ModelComparison;
import org.wellwright.solver.fit.ResidualRow;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.viewer.plot.AxisSpec;
import org.wellwright.viewer.plot.DatumText;
import org.wellwright.viewer.plot.LevelText;
import org.wellwright.viewer.plot.Ticks;

/**
 * What the picture of residuals shows: one row per datum, one mark per model.
 *
 * @param subtitle the project
 * @param models the models, in the order of the document
 * @param rows the data, top row first
 * @param axis the axis of residuals, in places of {@link #place}
 * @param linear whether places are residuals; otherwise asinh of them, which keeps σ near 0 and orders of magnitude far
 *     out
 */
record ResidualPlot(String subtitle, List<Entry> models, List<Row> rows, AxisSpec axis, boolean linear) {
    private static final double LINEAR_TO = 8;

    /** Shown on both sides at least. */
    private static final double MARGIN_SIGMAS = 2.5;

    /** One model in the legend. */
    record Entry(String model, String text, int series) {}

    /**
     * One datum.
     *
     * @param datum its id
     * @param label its name
     * @param level the first level that it combines
     * @param used whether it counts
     * @param selected whether one of its levels is selected
     * @param residuals one per model, in σ; NaN where there is none
     */
    record Row(String datum, String label, LevelKey level, boolean used, boolean selected, List<Double> residuals) {
        Row {
            residuals = List.copyOf(residuals);
        }
    }

    ResidualPlot {
        models = List.copyOf(models);
        rows = List.copyOf(rows);
    }

    static ResidualPlot of(FigureInput input, FigureSelection selection) {
        LevelText names = LevelText.of(input.document());
        List<Entry> entries = new ArrayList<>();
        List<Map<String, ResidualRow>> found = new ArrayList<>();
        for (int i = 0; i < input.models().size(); i++) {
            SolvedModel model = input.models().get(i);
            ModelComparison compared = input.compared(model.model());
            if (compared != null) {
                double reduced = compared.quality().reducedChiSquare();
                String note = Double.isNaN(reduced) ? "" : "  χ²/ν = " + Ticks.number(reduced, 3);
                entries.add(new Entry(model.model(), model.model() + note, i));
                Map<String, ResidualRow> byDatum = new HashMap<>();
                compared.rows().forEach(row -> byDatum.put(row.datum(), row));
                found.add(byDatum);
            }
        }
        List<Row> rows = new ArrayList<>();
        double lowest = -MARGIN_SIGMAS;
        double highest = MARGIN_SIGMAS;
        for (Datum datum : input.document().data()) {
            List<Double> residuals = new ArrayList<>();
            for (Map<String, ResidualRow> byDatum : found) {
                ResidualRow row = byDatum.get(datum.id());
                double residual = row == null ? Double.NaN : row.residual();
                residuals.add(residual);
                lowest = Double.isFinite(residual) ? Math.min(lowest, residual) : lowest;
                highest = Double.isFinite(residual) ? Math.max(highest, residual) : highest;
            }
            boolean selected =
                    datum.levels().stream().anyMatch(part -> selection.levels().contains(part.level()));
            rows.add(new Row(
                    datum.id(),
                    DatumText.of(datum, names),
                    datum.levels().get(0).level(),
                    datum.used(),
                    selected,
                    residuals));
        }
        boolean linear = Math.max(-lowest, highest) <= LINEAR_TO;
        return new ResidualPlot(input.title(), entries, rows, axis(lowest, highest, linear), linear);
    }

    /** Horizontal place of a residual. */
    double place(double residual) {
        return linear ? residual : asinh(residual);
    }

    private static AxisSpec axis(double lowest, double highest, boolean linear) {
        String label = "(measured − calculated)/σ";
        if (linear) {
            double margin = 0.06 * (highest - lowest);
            return AxisSpec.of(label, lowest - margin, highest + margin);
        }
        List<AxisSpec.Tick> ticks = new ArrayList<>();
        ticks.add(new AxisSpec.Tick(0, "0"));
        int decades = (int) Math.ceil(Math.log10(Math.max(-lowest, highest)));
        for (int decade = 0; decade <= decades; decade += decades > 4 ? 2 : 1) {
            double value = Math.pow(10, decade);
            ticks.add(new AxisSpec.Tick(asinh(value), Ticks.number(value, 1)));
            ticks.add(new AxisSpec.Tick(-asinh(value), Ticks.number(-value, 1)));
        }
        double margin = 0.04 * (asinh(highest) - asinh(lowest));
        return new AxisSpec(label, asinh(lowest) - margin, asinh(highest) + margin, ticks, true);
    }

    private static double asinh(double x) {
        return Math.signum(x) * Math.log(Math.abs(x) + Math.hypot(x, 1));
    }
}
