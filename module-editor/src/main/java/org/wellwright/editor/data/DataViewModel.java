package org.wellwright.editor.data;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.editor.edit.Faults;
import org.wellwright.project.entry.MeasuredText;
import org.wellwright.project.entry.TransformText;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelNames;
import org.wellwright.solver.model.LevelSums;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Transform;

/**
 * What the window of measured data shows.
 *
 * @param rows the data in order, then a row that is being filled
 * @param summary how many values there are, and how many count
 */
record DataViewModel(List<Row> rows, String summary) {
    /**
     * One value.
     *
     * @param index its index; −1 for the row that is being filled
     * @param id its identifier
     * @param used "yes" or "no"
     * @param levels the combination of levels; numerator / denominator of a ratio
     * @param quantity what was measured
     * @param value the value with its uncertainty
     * @param unit its unit
     * @param groups the ids of its groups
     * @param source where it comes from
     * @param remark why it does not count, or a remark
     * @param levelProblem what is wrong with the levels; empty if nothing
     * @param valueProblem what is wrong with the value; empty if nothing
     * @param unitProblem what is wrong with the unit; empty if nothing
     * @param groupProblem what is wrong with the groups; empty if nothing
     */
    record Row(
            int index,
            String id,
            String used,
            String levels,
            String quantity,
            String value,
            String unit,
            String groups,
            String source,
            String remark,
            String levelProblem,
            String valueProblem,
            String unitProblem,
            String groupProblem) {

        boolean draft() {
            return index < 0;
        }

        static Row draft(String levels, String quantity, String value, String unit, String groups, String source) {
            return new Row(-1, "", "yes", levels, quantity, value, unit, groups, source, "", "", "", "", "");
        }
    }

    DataViewModel {
        rows = List.copyOf(rows);
    }

    static DataViewModel of(ModelDocument document, Row draft) {
        Faults faults = Faults.of(document);
        LevelNames names = LevelNames.of(document);
        List<Row> rows = new ArrayList<>();
        int used = 0;
        for (int i = 0; i < document.data().size(); i++) {
            Datum datum = document.data().get(i);
            used += datum.used() ? 1 : 0;
            rows.add(row(i, datum, names, faults));
        }
        rows.add(draft);
        int count = document.data().size();
        String summary = count == 0 ? "" : "%d value%s, %d of them used".formatted(count, count == 1 ? "" : "s", used);
        return new DataViewModel(rows, summary);
    }

    private static Row row(int index, Datum datum, LevelNames names, Faults faults) {
        String at = "/data/" + index;
        String levels = LevelSums.text(datum.levels(), names);
        if (!datum.denominator().isEmpty()) {
            levels = "(" + levels + ") / (" + LevelSums.text(datum.denominator(), names) + ")";
        }
        return new Row(
                index,
                datum.id(),
                datum.used() ? "yes" : "no",
                levels,
                QuantityNames.text(datum),
                MeasuredText.format(datum.value(), datum.sigmaMinus(), datum.sigmaPlus(), datum.limit()),
                datum.unit(),
                String.join(", ", datum.groups()),
                datum.source(),
                datum.reason(),
                joined(faults.at(at + "/levels"), faults.at(at + "/denominator")),
                joined(faults.at(at + "/value"), faults.at(at + "/sigma")),
                faults.at(at + "/unit"),
                faults.at(at + "/groups"));
    }

    private static String joined(String one, String other) {
        return one.isEmpty() ? other : other.isEmpty() ? one : one + " · " + other;
    }

    /** The names of all quantities, for a list to choose from. */
    static List<String> quantities() {
        List<String> names = new ArrayList<>();
        for (Transform transform : Transform.values()) {
            names.add(TransformText.title(transform));
        }
        return names;
    }
}
