package org.wellwright.editor.data;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import org.wellwright.editor.data.DataViewModel.Row;
import org.wellwright.editor.edit.Lists;
import org.wellwright.editor.edit.References;
import org.wellwright.editor.edit.Units;
import org.wellwright.editor.parts.Entry;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.entry.DatumTable;
import org.wellwright.project.entry.DelimitedText;
import org.wellwright.project.entry.MeasuredText;
import org.wellwright.project.entry.TransformText;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelNames;
import org.wellwright.solver.model.LevelSums;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.model.Weighting;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.Names;
import org.wellwright.solver.units.UnitExpression;

/**
 * Turns what is typed and pasted in the window of measured data into edits of its project. Keeps the row that is being
 * filled.
 */
final class DataController {
    private final ProjectSession session;
    private Row draft;

    DataController(ProjectSession session) {
        this.session = session;
        this.draft = emptyDraft();
    }

    ModelDocument document() {
        return session.project().document();
    }

    Row draft() {
        return draft;
    }

    private Row emptyDraft() {
        List<Datum> data = document().data();
        Datum last = data.isEmpty() ? null : data.get(data.size() - 1);
        return Row.draft(
                "",
                last == null ? TransformText.title(Transform.NONE) : QuantityNames.text(last),
                "",
                last == null ? Units.of(document()).energy().symbol() : last.unit(),
                last == null ? "" : String.join(", ", last.groups()),
                last == null ? "" : last.source());
    }

    Optional<Problem> setUsed(Row row, String yes) {
        boolean used = yes.equals("yes");
        return datum(row, used ? "Use a value" : "Leave a value out", datum -> datum.withUsed(used));
    }

    /** Several rows at once. */
    void setUsed(List<Row> rows, boolean used) {
        Set<Integer> indices = new HashSet<>();
        rows.forEach(row -> indices.add(row.index()));
        edit(used ? "Use values" : "Leave values out", document -> {
            List<Datum> data = new ArrayList<>();
            for (int i = 0; i < document.data().size(); i++) {
                Datum datum = document.data().get(i);
                data.add(indices.contains(i) ? datum.withUsed(used) : datum);
            }
            return document.withData(data);
        });
    }

    Optional<Problem> setLevels(Row row, String text) {
        if (row.draft()) {
            return fill(text, draft.value(), draft.quantity(), draft.unit(), draft.groups(), draft.source());
        }
        return datum(row, "Change the levels of a value", datum -> levels(datum, text));
    }

    private Datum levels(Datum datum, String text) {
        LevelNames names = LevelNames.of(document());
        List<List<Datum.Contribution>> parts = ratio(text, names);
        boolean ratio = parts.size() == 2;
        if (ratio && datum.transform() != Transform.RATIO) {
            return datum.withTransform(Transform.RATIO, Datum.Detail.STANDARD, "")
                    .withLevels(parts.get(0), parts.get(1));
        }
        if (!ratio && datum.transform() == Transform.RATIO) {
            throw new InvalidModelException("a ratio needs two combinations", "", "write (3p - 3s) / (4p - 3s)");
        }
        return datum.withLevels(parts.get(0), ratio ? parts.get(1) : List.of());
    }

    /** One combination, or two of a ratio: "(…) / (…)". */
    private static List<List<Datum.Contribution>> ratio(String text, LevelNames names) {
        String plain = text.strip();
        int middle = plain.indexOf(") / (") >= 0 ? plain.indexOf(") / (") : plain.indexOf(")/(");
        if (plain.startsWith("(") && plain.endsWith(")") && middle > 0) {
            int under = plain.indexOf('(', middle);
            return List.of(
                    LevelSums.parse(plain.substring(1, middle), names),
                    LevelSums.parse(plain.substring(under + 1, plain.length() - 1), names));
        }
        return List.of(LevelSums.parse(plain, names));
    }

    /** Another quantity; its usual unit comes with it where the present one cannot stay. */
    Optional<Problem> setQuantity(Row row, String text) {
        if (row.draft()) {
            return fill(
                    draft.levels(),
                    draft.value(),
                    text,
                    usualUnit(QuantityNames.transform(text), draft.unit()),
                    draft.groups(),
                    draft.source());
        }
        return datum(row, "Change the quantity of a value", datum -> {
            Transform transform = QuantityNames.transform(text);
            return datum.withTransform(transform, QuantityNames.detail(text), usualUnit(transform, datum.unit()));
        });
    }

    private String usualUnit(Transform transform, String present) {
        var units = Units.of(document());
        return switch (transform) {
            case VACUUM_WAVELENGTH, AIR_WAVELENGTH, RADIUS ->
                fits(present, Dimension.LENGTH)
                        ? present
                        : transform == Transform.RADIUS ? units.length().symbol() : TransformText.usualUnit(transform);
            case FREQUENCY -> frequency(present) ? present : TransformText.usualUnit(transform);
            case ABSOLUTE_MASS ->
                fits(present, Dimension.MASS) ? present : units.mass().symbol();
            case RATIO -> "";
            case RATE -> "1/s";
            case NONE, PHOTON_EMISSION, PHOTON_ABSORPTION, WIDTH ->
                fits(present, Dimension.ENERGY) ? present : units.energy().symbol();
        };
    }

    private boolean fits(String unit, Dimension dimension) {
        try {
            return !unit.isEmpty() && UnitExpression.parse(unit).fits(Units.of(document()), dimension);
        } catch (InvalidModelException e) {
            return false;
        }
    }

    private static boolean frequency(String unit) {
        try {
            return UnitExpression.parse(unit).frequency();
        } catch (InvalidModelException e) {
            return false;
        }
    }

    /** A value with its uncertainty, and a unit if it is another one. */
    Optional<Problem> setValue(Row row, String text) {
        if (row.draft()) {
            return fill(draft.levels(), text, draft.quantity(), draft.unit(), draft.groups(), draft.source());
        }
        return datum(row, "Change a value", datum -> {
            MeasuredText measured = MeasuredText.parse(text);
            String unit = measured.unit().isEmpty() ? datum.unit() : unit(measured.unit(), datum.transform());
            return datum.withValue(
                    measured.value(), measured.sigmaMinus(), measured.sigmaPlus(), measured.limit(), unit);
        });
    }

    Optional<Problem> setUnit(Row row, String text) {
        if (row.draft()) {
            return fill(draft.levels(), draft.value(), draft.quantity(), text.strip(), draft.groups(), draft.source());
        }
        return datum(
                row,
                "Change the unit of a value",
                datum -> datum.withValue(
                        datum.value(),
                        datum.sigmaMinus(),
                        datum.sigmaPlus(),
                        datum.limit(),
                        unit(text, datum.transform())));
    }

    /** Rates have units of their own, which {@link UnitExpression} does not know. */
    private static String unit(String text, Transform transform) {
        return transform == Transform.RATE
                ? text.strip()
                : UnitExpression.parse(text).text();
    }

    Optional<Problem> setGroups(Row row, String text) {
        if (row.draft()) {
            return Entry.attempt(() -> {
                groups(text);
                draft = Row.draft(
                        draft.levels(), draft.quantity(), draft.value(), draft.unit(), text.strip(), draft.source());
            });
        }
        return datum(row, "Change the groups of a value", datum -> datum.withGroups(groups(text)));
    }

    private List<String> groups(String text) {
        List<String> known = document().groups().stream().map(DataGroup::id).toList();
        List<String> groups = new ArrayList<>();
        for (String part : text.split("[,;]")) {
            String group = part.strip();
            if (!group.isEmpty() && !known.contains(group)) {
                throw new InvalidModelException(
                        "there is no data group '%s'".formatted(Names.shortened(group)),
                        "",
                        known.isEmpty() ? "add it under Groups first" : Names.remedy(group, known));
            }
            if (!group.isEmpty() && !groups.contains(group)) {
                groups.add(group);
            }
        }
        return groups;
    }

    Optional<Problem> setSource(Row row, String text) {
        if (row.draft()) {
            draft = Row.draft(
                    draft.levels(), draft.quantity(), draft.value(), draft.unit(), draft.groups(), text.strip());
            return Optional.empty();
        }
        return datum(row, "Change the source of a value", datum -> datum.withSource(text.strip()));
    }

    Optional<Problem> setRemark(Row row, String text) {
        return datum(row, "Change a remark", datum -> datum.withReason(text.strip()));
    }

    Optional<Problem> setId(Row row, String text) {
        return edit("Rename a value", document -> {
            String id = text.strip();
            for (int i = 0; i < document.data().size(); i++) {
                if (i != row.index() && document.data().get(i).id().equals(id)) {
                    throw new InvalidModelException(
                            "there is a value '%s' already".formatted(Names.shortened(id)), "", "choose another id");
                }
            }
            return document.withData(Lists.with(document.data(), row.index(), datum -> datum.withId(id)));
        });
    }

    /**
     * Takes up a cell of the row that is being filled; as soon as levels and value are there, it becomes a value of the
     * project.
     */
    private Optional<Problem> fill(
            String levels, String value, String quantity, String unit, String groups, String source) {
        return Entry.attempt(() -> {
            Transform transform = QuantityNames.transform(quantity);
            List<List<Datum.Contribution>> parts =
                    levels.isBlank() ? List.of() : ratio(levels, LevelNames.of(document()));
            MeasuredText measured = value.isBlank() ? null : MeasuredText.parse(value);
            String own = measured == null || measured.unit().isEmpty() ? unit : measured.unit();
            if (!own.isBlank()) {
                unit(own, transform);
            }
            draft = Row.draft(levels.strip(), quantity, value.strip(), own, groups, source);
            if (parts.isEmpty() || measured == null) {
                return;
            }
            boolean ratio = parts.size() == 2;
            Set<String> ids = new HashSet<>();
            document().data().forEach(datum -> ids.add(datum.id()));
            Datum datum = new Datum(
                    DatumTable.freeId(ids),
                    parts.get(0),
                    ratio ? parts.get(1) : List.of(),
                    ratio ? Transform.RATIO : transform,
                    QuantityNames.detail(quantity),
                    measured.value(),
                    ratio ? "" : own,
                    measured.sigmaMinus(),
                    measured.sigmaPlus(),
                    measured.limit(),
                    groups(groups),
                    source,
                    true,
                    "");
            session.edit(
                    "Add a value",
                    project -> project.withDocument(project.document()
                            .withData(Lists.added(project.document().data(), datum))));
            draft = emptyDraft();
        });
    }

    void duplicate(List<Integer> rows) {
        edit(rows.size() == 1 ? "Duplicate a value" : "Duplicate values", document -> {
            List<Datum> data = new ArrayList<>(document.data());
            Set<String> ids = new HashSet<>();
            data.forEach(datum -> ids.add(datum.id()));
            int at = rows.get(rows.size() - 1) + 1;
            for (int row : rows) {
                String id = DatumTable.freeId(ids);
                ids.add(id);
                data.add(at++, document.data().get(row).withId(id));
            }
            return document.withData(data);
        });
    }

    void remove(List<Integer> rows) {
        edit(rows.size() == 1 ? "Remove a value" : "Remove values", document -> {
            List<Datum> data = new ArrayList<>(document.data());
            for (int row : new TreeSet<>(rows).descendingSet()) {
                data.remove(row);
            }
            return document.withData(data);
        });
    }

    /** Moves a value up (−1) or down (1); tells its new row. */
    int move(int row, int by) {
        int to = row + by;
        if (to < 0 || to >= document().data().size()) {
            return row;
        }
        edit("Move a value", document -> document.withData(Lists.moved(document.data(), row, to)));
        return to;
    }

    /** What pasted text holds, as its columns seem to say. */
    List<DatumTable.Outcome> read(String text) {
        DelimitedText table = DelimitedText.parse(text);
        return new DatumTable(DatumTable.guess(table), defaults()).read(table, document());
    }

    /** What stands for what pasted rows do not say: the quantity and unit of the last value. */
    DatumTable.Defaults defaults() {
        Row like = emptyDraft();
        Transform transform = QuantityNames.transform(like.quantity());
        return transform == Transform.RATIO
                ? DatumTable.Defaults.of(document())
                : new DatumTable.Defaults(transform, like.unit(), List.of(), "");
    }

    /** Adds values behind a row, as one step; at the end for −1. Ids that are taken by now are replaced. */
    void add(List<Datum> values, int afterRow, String label) {
        edit(label, document -> {
            List<Datum> data = new ArrayList<>(document.data());
            Set<String> ids = new HashSet<>();
            data.forEach(datum -> ids.add(datum.id()));
            int at = afterRow < 0 ? data.size() : Math.min(afterRow + 1, data.size());
            for (Datum value : values) {
                Datum own = ids.contains(value.id()) ? value.withId(DatumTable.freeId(ids)) : value;
                ids.add(own.id());
                data.add(at++, own);
            }
            return document.withData(data);
        });
    }

    void setWeighting(Weighting weighting) {
        edit("Change what uncertainties mean", document -> document.withWeighting(weighting));
    }

    /**
     * Other data groups, as one step.
     *
     * @param originals the id each group had before; null for a new one
     */
    Optional<Problem> setGroups(List<DataGroup> groups, List<String> originals) {
        return edit("Change the data groups", document -> {
            ModelDocument next = document;
            for (int i = 0; i < groups.size(); i++) {
                String old = originals.get(i);
                if (old != null && !old.equals(groups.get(i).id())) {
                    next = References.renameGroup(next, old, groups.get(i).id());
                }
            }
            Set<String> ids = new HashSet<>();
            groups.forEach(group -> ids.add(group.id()));
            List<Datum> data = new ArrayList<>();
            for (Datum datum : next.data()) {
                data.add(datum.withGroups(
                        datum.groups().stream().filter(ids::contains).toList()));
            }
            return next.withData(data).withGroups(groups);
        });
    }

    /** Whether a text looks like more than one cell. */
    static boolean table(String text) {
        return text.strip().indexOf('\n') >= 0
                || text.indexOf('\t') >= 0
                || text.toLowerCase(Locale.ROOT).contains(",");
    }

    private Optional<Problem> datum(Row row, String label, UnaryOperator<Datum> change) {
        if (row.draft()) {
            return Optional.of(new Problem("this row is not complete yet", "", "fill in levels and value first"));
        }
        return edit(label, document -> document.withData(Lists.with(document.data(), row.index(), change)));
    }

    private Optional<Problem> edit(String label, Function<ModelDocument, ModelDocument> change) {
        return Entry.attempt(
                () -> session.edit(label, project -> project.withDocument(change.apply(project.document()))));
    }
}
