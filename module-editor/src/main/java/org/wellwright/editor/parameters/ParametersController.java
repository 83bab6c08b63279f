package org.wellwright.editor.parameters;

import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import java.util.function.BiFunction;
import java.util.function.UnaryOperator;
import org.wellwright.editor.edit.ParameterEdits;
import org.wellwright.editor.parts.Entry;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.entry.MeasuredText;
import org.wellwright.project.entry.QuantityText;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.model.Prior;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.potential.FormulaFault;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.UnitSystem;

/** Turns what is typed and dragged in the window of parameters into edits of its project. */
final class ParametersController {
    private final ProjectSession session;

    ParametersController(ProjectSession session) {
        this.session = session;
    }

    Optional<Problem> rename(ParametersViewModel.Row row, String text) {
        return edit("Rename " + row.name(), document -> ParameterEdits.rename(document, row.parameter(), text));
    }

    /** A number, with or without a unit; or "= formula", which ties the parameter to others. */
    Optional<Problem> setValue(ParametersViewModel.Row row, String text) {
        String plain = text.strip();
        if (plain.startsWith("=")) {
            return tie(row, plain.substring(1).strip());
        }
        return edit("Change " + row.name(), document -> {
            Parameter parameter = document.parameters().get(row.parameter());
            ExactNumber value = QuantityText.parse(plain, parameter.unit(), units(document));
            if (row.tied()) {
                return ParameterEdits.withShape(
                        document, row.parameter(), new ParameterShape.Scalar(Setting.fixed(value)));
            }
            requireWithin(ParameterEdits.setting(parameter, row.entry()), value);
            return ParameterEdits.withSetting(document, row.parameter(), row.entry(), s -> s.withValue(value));
        });
    }

    private Optional<Problem> tie(ParametersViewModel.Row row, String formula) {
        Optional<FormulaFault> fault = FormulaText.fault(formula);
        if (fault.isPresent()) {
            return Optional.of(fault.get().problem());
        }
        return edit(
                "Tie " + row.name(),
                document -> ParameterEdits.withShape(document, row.parameter(), new ParameterShape.Tied(formula)));
    }

    Optional<Problem> setUnit(ParametersViewModel.Row row, String text) {
        return edit(
                "Change the unit of " + row.name(),
                document -> ParameterEdits.withUnit(document, row.parameter(), text));
    }

    Optional<Problem> setStatus(ParametersViewModel.Row row, String status) {
        if (status.equals(ParametersViewModel.TIED)) {
            return row.tied()
                    ? Optional.empty()
                    : Optional.of(new Problem(
                            "a tied parameter needs its formula", "", "type it as the value, as '= 2 * a'"));
        }
        boolean free = status.equals(ParametersViewModel.FREE);
        return edit((free ? "Free " : "Fix ") + row.name(), document -> {
            if (row.tied()) {
                Setting setting = new Setting(ExactNumber.ONE, free, null, null, null);
                return ParameterEdits.withShape(document, row.parameter(), new ParameterShape.Scalar(setting));
            }
            return ParameterEdits.withSetting(document, row.parameter(), row.entry(), s -> s.withFree(free));
        });
    }

    Optional<Problem> setLower(ParametersViewModel.Row row, String text) {
        return bounds(row, text, (setting, bound) -> setting.withBounds(bound, setting.upper()));
    }

    Optional<Problem> setUpper(ParametersViewModel.Row row, String text) {
        return bounds(row, text, (setting, bound) -> setting.withBounds(setting.lower(), bound));
    }

    private Optional<Problem> bounds(
            ParametersViewModel.Row row, String text, BiFunction<Setting, ExactNumber, Setting> change) {
        return edit("Change the bounds of " + row.name(), document -> {
            String unit = document.parameters().get(row.parameter()).unit();
            ExactNumber bound = text.isBlank() ? null : QuantityText.parse(text, unit, units(document));
            return ParameterEdits.withSetting(document, row.parameter(), row.entry(), s -> change.apply(s, bound));
        });
    }

    /** A value with its uncertainty, as 0.52(2) or 0.52 ± 0.02; nothing for none. */
    Optional<Problem> setPrior(ParametersViewModel.Row row, String text) {
        return edit("Change what is known of " + row.name(), document -> {
            String unit = document.parameters().get(row.parameter()).unit();
            Prior prior = text.isBlank() ? null : prior(text, unit, units(document));
            return ParameterEdits.withSetting(document, row.parameter(), row.entry(), s -> s.withPrior(prior));
        });
    }

    private static Prior prior(String text, String unit, UnitSystem units) {
        MeasuredText measured = MeasuredText.parse(text);
        if (measured.sigmaPlus() == null || !measured.sigmaPlus().equals(measured.sigmaMinus())) {
            throw new InvalidModelException(
                    "a value known from elsewhere needs one uncertainty", "", "write 0.52(2) or 0.52 ± 0.02");
        }
        String typed = measured.unit();
        if (typed.isEmpty() || typed.equals(unit)) {
            return new Prior(measured.value(), measured.sigmaPlus());
        }
        double factor = QuantityText.factor(typed, unit, units);
        return new Prior(
                QuantityText.times(measured.value(), factor), QuantityText.times(measured.sigmaPlus(), factor));
    }

    Optional<Problem> setConvention(ParametersViewModel.Row row, String text) {
        return edit(
                "Change the meaning of " + row.name(),
                document -> ParameterEdits.withConvention(document, row.parameter(), text));
    }

    /** Another dependence on where it is used; the first number is taken over. */
    Optional<Problem> setShape(int parameter, ParameterShape shape) {
        return edit(
                "Change what a parameter depends on", document -> ParameterEdits.withShape(document, parameter, shape));
    }

    /** A new parameter behind the selected one; tells its row. */
    int add(int afterRow) {
        List<ParametersViewModel.Row> rows = rows();
        int index = afterRow < 0 || afterRow >= rows.size()
                ? document().parameters().size()
                : rows.get(afterRow).parameter() + 1;
        edit("Add a parameter", document -> ParameterEdits.add(document, index));
        return rowOf(index);
    }

    int duplicate(int row) {
        int index = rows().get(row).parameter();
        edit("Duplicate a parameter", document -> ParameterEdits.duplicate(document, index));
        return rowOf(index + 1);
    }

    Optional<Problem> remove(List<Integer> selected) {
        TreeSet<Integer> indices = new TreeSet<>();
        List<ParametersViewModel.Row> rows = rows();
        selected.forEach(row -> indices.add(rows.get(row).parameter()));
        return edit(indices.size() == 1 ? "Remove a parameter" : "Remove parameters", document -> {
            ModelDocument next = document;
            for (int index : indices.descendingSet()) {
                next = ParameterEdits.remove(next, index);
            }
            return next;
        });
    }

    /** Moves a parameter up (−1) or down (1); tells its new row. */
    int move(int row, int by) {
        int index = rows().get(row).parameter();
        int to = index + by;
        if (to < 0 || to >= document().parameters().size()) {
            return row;
        }
        edit("Move a parameter", document -> ParameterEdits.move(document, index, to));
        return rowOf(to);
    }

    /** One move of a slider; all moves up to {@link #endSlide} are one step. */
    void slide(int parameter, int entry, String name, double value, double step) {
        ExactNumber rounded = SliderScale.rounded(value, step);
        session.edit(
                "Change " + name,
                List.of("slide", parameter, entry),
                project -> project.withDocument(ParameterEdits.withSetting(
                        project.document(),
                        parameter,
                        entry,
                        setting -> setting.withValue(clamped(rounded, setting)))));
    }

    void endSlide() {
        session.endGesture();
    }

    private static ExactNumber clamped(ExactNumber value, Setting setting) {
        if (setting.lower() != null && value.value() < setting.lower().value()) {
            return setting.lower();
        }
        return setting.upper() != null && value.value() > setting.upper().value() ? setting.upper() : value;
    }

    private static void requireWithin(Setting setting, ExactNumber value) {
        boolean below =
                setting.lower() != null && value.value() < setting.lower().value();
        boolean above =
                setting.upper() != null && value.value() > setting.upper().value();
        if (below || above) {
            throw new InvalidModelException(
                    "%s lies %s"
                            .formatted(
                                    value,
                                    below
                                            ? "below the lower bound " + setting.lower()
                                            : "above the upper bound " + setting.upper()),
                    "",
                    "change the bound first");
        }
    }

    private ModelDocument document() {
        return session.project().document();
    }

    private List<ParametersViewModel.Row> rows() {
        return ParametersViewModel.of(document()).rows();
    }

    private int rowOf(int parameter) {
        List<ParametersViewModel.Row> rows = rows();
        for (int i = 0; i < rows.size(); i++) {
            if (rows.get(i).parameter() == parameter) {
                return i;
            }
        }
        return -1;
    }

    private static UnitSystem units(ModelDocument document) {
        return UnitSystem.named(document.units());
    }

    private Optional<Problem> edit(String label, UnaryOperator<ModelDocument> change) {
        UnaryOperator<Project> whole = project -> project.withDocument(change.apply(project.document()));
        return Entry.attempt(() -> session.edit(label, whole));
    }
}
