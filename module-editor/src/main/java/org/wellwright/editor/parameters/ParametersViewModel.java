package org.wellwright.editor.parameters;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.editor.edit.Faults;
import org.wellwright.editor.edit.ParameterEdits;
import org.wellwright.project.entry.MeasuredText;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.units.ExactNumber;

/**
 * What the window of parameters shows.
 *
 * @param rows one per number of the pool, and one per tied parameter
 * @param summary how many numbers there are, and how many a fit may change
 */
record ParametersViewModel(List<Row> rows, String summary) {
    static final String FREE = "free";
    static final String FIXED = "fixed";
    static final String TIED = "tied";

    /**
     * One number.
     *
     * @param parameter index of its parameter
     * @param entry its index in the parameter
     * @param several whether the parameter has several numbers
     * @param name the parameter's name
     * @param place what it is the number of: "l = 1"; empty if it holds everywhere
     * @param value its value, or "= formula"
     * @param unit the parameter's unit
     * @param status free, fixed or tied
     * @param lower lower bound; may be empty
     * @param upper upper bound; may be empty
     * @param prior what is known from elsewhere, as 0.52(2); may be empty
     * @param convention what exactly it is; may be empty
     * @param problem what is wrong with it; empty if nothing
     */
    record Row(
            int parameter,
            int entry,
            boolean several,
            String name,
            String place,
            String value,
            String unit,
            String status,
            String lower,
            String upper,
            String prior,
            String convention,
            String problem) {
        boolean tied() {
            return status.equals(TIED);
        }
    }

    ParametersViewModel {
        rows = List.copyOf(rows);
    }

    static ParametersViewModel of(ModelDocument document) {
        Faults faults = Faults.of(document);
        List<Row> rows = new ArrayList<>();
        for (int i = 0; i < document.parameters().size(); i++) {
            rows(document.parameters().get(i), i, faults.at("/parameters/" + i), rows);
        }
        long free = rows.stream().filter(row -> row.status().equals(FREE)).count();
        String summary = "%d number%s, %d free".formatted(rows.size(), rows.size() == 1 ? "" : "s", free);
        return new ParametersViewModel(rows, summary);
    }

    private static void rows(Parameter parameter, int index, String problem, List<Row> into) {
        if (parameter.shape() instanceof ParameterShape.Tied tied) {
            into.add(new Row(
                    index,
                    0,
                    false,
                    parameter.name(),
                    "",
                    "= " + tied.formula(),
                    parameter.unit(),
                    TIED,
                    "",
                    "",
                    "",
                    parameter.convention(),
                    problem));
            return;
        }
        List<String> places = places(parameter.shape());
        List<Setting> settings = ParameterEdits.settings(parameter.shape());
        for (int entry = 0; entry < settings.size(); entry++) {
            Setting setting = settings.get(entry);
            into.add(new Row(
                    index,
                    entry,
                    settings.size() > 1,
                    parameter.name(),
                    places.get(entry),
                    setting.value().text(),
                    parameter.unit(),
                    setting.free() ? FREE : FIXED,
                    text(setting.lower()),
                    text(setting.upper()),
                    setting.prior() == null
                            ? ""
                            : MeasuredText.format(
                                    setting.prior().value(),
                                    setting.prior().sigma(),
                                    setting.prior().sigma(),
                                    Datum.Limit.NONE),
                    parameter.convention(),
                    problem));
        }
    }

    static List<String> places(ParameterShape shape) {
        List<String> places = new ArrayList<>();
        Setting others = null;
        if (shape instanceof ParameterShape.ByOrbital by) {
            by.entries().forEach(entry -> places.add("l = " + entry.orbital()));
            others = by.others();
        } else if (shape instanceof ParameterShape.ByTotal by) {
            by.entries()
                    .forEach(
                            entry -> places.add("l = %d, j = %s".formatted(entry.orbital(), half(entry.twiceTotal()))));
            others = by.others();
        } else if (shape instanceof ParameterShape.BySystem by) {
            by.entries().forEach(entry -> places.add(entry.system()));
            others = by.others();
        } else if (shape instanceof ParameterShape.MassScaled scaled) {
            places.add("%s, mass^%s".formatted(scaled.reference(), ExactNumber.of(scaled.exponent())));
        } else {
            places.add("");
        }
        if (others != null) {
            places.add("others");
        }
        return places;
    }

    private static String half(int twice) {
        return twice % 2 == 0 ? Integer.toString(twice / 2) : twice + "/2";
    }

    private static String text(ExactNumber number) {
        return number == null ? "" : number.text();
    }
}
