package org.wellwright.project.entry;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelNames;
import org.wellwright.solver.model.LevelSums;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.Names;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/**
 * Reads rows of cells as measured data, row by row: a faulty row is reported and costs no other.
 *
 * @param columns what each column holds, in order
 * @param defaults what stands for columns that are not there
 */
public record DatumTable(List<DatumColumn> columns, Defaults defaults) {
    /**
     * What stands for columns that are not there.
     *
     * @param transform what was measured
     * @param unit its unit
     * @param groups ids of data groups
     * @param source where the values come from
     */
    public record Defaults(Transform transform, String unit, List<String> groups, String source) {
        /** Copies the list. */
        public Defaults {
            groups = List.copyOf(groups);
        }

        /** Energies in the project's unit. */
        public static Defaults of(ModelDocument document) {
            return new Defaults(
                    Transform.NONE, UnitSystem.named(document.units()).energy().symbol(), List.of(), "");
        }
    }

    /**
     * What became of a row.
     *
     * @param row the row
     * @param datum the datum, or null
     * @param column the column that is at fault, or −1
     * @param problem what is wrong, or null
     */
    public record Outcome(DelimitedText.Row row, Datum datum, int column, Problem problem) {}

    /** Copies the columns. */
    public DatumTable {
        columns = List.copyOf(columns);
    }

    /** Whether a row looks like headings: at least one cell names a column, and none is a number. */
    public static boolean heading(DelimitedText.Row row) {
        boolean named = false;
        for (String cell : row.cells()) {
            if (cell.matches(Typed.NUMBER + ".*") && DatumColumn.ofHeading(cell) == DatumColumn.NONE) {
                return false;
            }
            named |= DatumColumn.ofHeading(cell) != DatumColumn.NONE;
        }
        return named;
    }

    /**
     * What the columns of a table seem to hold: by its headings if the first row has them, else levels first, the value
     * in the first column of numbers, the uncertainty in the next.
     */
    public static List<DatumColumn> guess(DelimitedText table) {
        List<DatumColumn> columns = new ArrayList<>();
        if (table.rows().isEmpty()) {
            return columns;
        }
        DelimitedText.Row first = table.rows().get(0);
        if (heading(first)) {
            Set<DatumColumn> seen = new HashSet<>();
            for (String cell : first.cells()) {
                DatumColumn column = DatumColumn.ofHeading(cell);
                columns.add(seen.add(column) ? column : DatumColumn.NONE);
            }
            return columns;
        }
        List<DatumColumn> numbers = new ArrayList<>(List.of(DatumColumn.VALUE, DatumColumn.SIGMA));
        List<DatumColumn> texts = new ArrayList<>(List.of(DatumColumn.UNIT, DatumColumn.SOURCE));
        boolean levels = false;
        DelimitedText.Row longest = first;
        for (DelimitedText.Row row : table.rows()) {
            longest = row.cells().size() > longest.cells().size() ? row : longest;
        }
        for (String cell : longest.cells()) {
            if (!levels) {
                levels = true;
                columns.add(DatumColumn.LEVELS);
            } else if (cell.matches("[<>]?\\s*" + Typed.NUMBER + "(?:\\(.*|\\s*±.*)?")) {
                columns.add(numbers.isEmpty() ? DatumColumn.NONE : numbers.remove(0));
            } else {
                columns.add(texts.isEmpty() ? DatumColumn.NONE : texts.remove(0));
            }
        }
        return columns;
    }

    /** Reads the rows that follow the headings, if there are any. */
    public List<Outcome> read(DelimitedText table, ModelDocument document) {
        List<Outcome> outcomes = new ArrayList<>();
        Set<String> ids = new HashSet<>();
        document.data().forEach(datum -> ids.add(datum.id()));
        LevelNames names = LevelNames.of(document);
        String headingUnit = "";
        boolean first = true;
        for (DelimitedText.Row row : table.rows()) {
            if (first && heading(row)) {
                int value = columns.indexOf(DatumColumn.VALUE);
                headingUnit = value < 0 ? "" : DatumColumn.unitOfHeading(row.cell(value));
            } else {
                Outcome outcome = outcome(row, document, names, headingUnit, ids);
                if (outcome.datum() != null) {
                    ids.add(outcome.datum().id());
                }
                outcomes.add(outcome);
            }
            first = false;
        }
        return List.copyOf(outcomes);
    }

    /** An identifier that is not among those given: d1, d2, ... */
    public static String freeId(Set<String> taken) {
        int number = taken.size() + 1;
        while (taken.contains("d" + number)) {
            number++;
        }
        return "d" + number;
    }

    private Outcome outcome(
            DelimitedText.Row row, ModelDocument document, LevelNames names, String headingUnit, Set<String> ids) {
        Map<DatumColumn, String> cells = new EnumMap<>(DatumColumn.class);
        for (int i = 0; i < columns.size(); i++) {
            if (columns.get(i) != DatumColumn.NONE && !row.cell(i).isEmpty()) {
                cells.put(columns.get(i), row.cell(i));
            }
        }
        DatumColumn[] at = {DatumColumn.LEVELS};
        try {
            return new Outcome(row, datum(cells, document, names, headingUnit, ids, at), -1, null);
        } catch (InvalidModelException e) {
            return new Outcome(row, null, columns.indexOf(at[0]), placed(e.problem(), row));
        } catch (IllegalArgumentException e) {
            return new Outcome(row, null, columns.indexOf(at[0]), placed(new Problem(e.getMessage(), "", ""), row));
        }
    }

    private static Problem placed(Problem problem, DelimitedText.Row row) {
        String where = "line " + row.line() + (problem.where().isEmpty() ? "" : ", " + problem.where());
        return new Problem(problem.what(), where, problem.remedy());
    }

    /** {@code at} follows which column is being read, so that a fault can be shown in its cell. */
    private Datum datum(
            Map<DatumColumn, String> cells,
            ModelDocument document,
            LevelNames names,
            String headingUnit,
            Set<String> ids,
            DatumColumn[] at) {
        List<Datum.Contribution> levels = levels(cells, names, at);
        at[0] = DatumColumn.DENOMINATOR;
        String under = cells.getOrDefault(DatumColumn.DENOMINATOR, "");
        List<Datum.Contribution> denominator = under.isEmpty() ? List.of() : LevelSums.parse(under, names);
        at[0] = DatumColumn.TRANSFORM;
        Transform transform = cells.containsKey(DatumColumn.TRANSFORM)
                ? TransformText.parse(cells.get(DatumColumn.TRANSFORM))
                : denominator.isEmpty() ? defaults.transform() : Transform.RATIO;
        at[0] = DatumColumn.VALUE;
        MeasuredText measured = MeasuredText.parse(cells.getOrDefault(DatumColumn.VALUE, ""));
        ExactNumber minus = measured.sigmaMinus();
        ExactNumber plus = measured.sigmaPlus();
        if (minus == null && measured.limit() == Datum.Limit.NONE) {
            at[0] = DatumColumn.SIGMA;
            ExactNumber both = sigma(cells.get(DatumColumn.SIGMA), measured.value());
            at[0] = DatumColumn.SIGMA_MINUS;
            minus = cells.containsKey(DatumColumn.SIGMA_MINUS)
                    ? sigma(cells.get(DatumColumn.SIGMA_MINUS), measured.value())
                    : both;
            at[0] = DatumColumn.SIGMA_PLUS;
            plus = cells.containsKey(DatumColumn.SIGMA_PLUS)
                    ? sigma(cells.get(DatumColumn.SIGMA_PLUS), measured.value())
                    : both;
        }
        at[0] = DatumColumn.UNIT;
        String unit = unit(cells, measured, headingUnit, transform);
        at[0] = DatumColumn.GROUPS;
        List<String> groups = groups(cells.get(DatumColumn.GROUPS), document);
        at[0] = DatumColumn.USED;
        boolean used = used(cells.getOrDefault(DatumColumn.USED, "yes"));
        at[0] = DatumColumn.ID;
        String id = cells.getOrDefault(DatumColumn.ID, "");
        if (ids.contains(id)) {
            throw new InvalidModelException(
                    "there is a datum '%s' already".formatted(Names.shortened(id)), "", "give it another id");
        }
        at[0] = DatumColumn.VALUE;
        return new Datum(
                id.isEmpty() ? freeId(ids) : id,
                levels,
                denominator,
                transform,
                Datum.Detail.STANDARD,
                measured.value(),
                unit,
                minus,
                plus,
                measured.limit(),
                groups,
                cells.getOrDefault(DatumColumn.SOURCE, defaults.source()),
                used,
                cells.getOrDefault(DatumColumn.REASON, ""));
    }

    private static List<Datum.Contribution> levels(Map<DatumColumn, String> cells, LevelNames names, DatumColumn[] at) {
        String prefix = cells.containsKey(DatumColumn.SYSTEM) ? cells.get(DatumColumn.SYSTEM) + ": " : "";
        if (cells.containsKey(DatumColumn.LEVELS)) {
            at[0] = DatumColumn.LEVELS;
            String text = cells.get(DatumColumn.LEVELS);
            if (prefix.isEmpty() || text.contains(":")) {
                return LevelSums.parse(text, names);
            }
            at[0] = DatumColumn.SYSTEM;
            return LevelSums.parse(prefixed(text, prefix), names);
        }
        String upper = level(cells, DatumColumn.UPPER, DatumColumn.UPPER_V, DatumColumn.UPPER_J);
        String lower = level(cells, DatumColumn.LOWER, DatumColumn.LOWER_V, DatumColumn.LOWER_J);
        List<Datum.Contribution> sum = new ArrayList<>();
        if (!upper.isEmpty()) {
            at[0] = DatumColumn.UPPER;
            sum.add(new Datum.Contribution(ExactNumber.ONE, names.parse(prefix + upper)));
        }
        if (!lower.isEmpty()) {
            at[0] = DatumColumn.LOWER;
            ExactNumber sign = upper.isEmpty() ? ExactNumber.ONE : new ExactNumber("-1");
            sum.add(new Datum.Contribution(sign, names.parse(prefix + lower)));
        }
        if (sum.isEmpty()) {
            at[0] = DatumColumn.LEVELS;
            throw new InvalidModelException("no level is named", "", "fill in the levels, as 3p - 3s");
        }
        return sum;
    }

    private static String level(Map<DatumColumn, String> cells, DatumColumn whole, DatumColumn v, DatumColumn j) {
        if (cells.containsKey(whole)) {
            return cells.get(whole);
        }
        return cells.containsKey(v) && cells.containsKey(j) ? "v=" + cells.get(v) + " J=" + cells.get(j) : "";
    }

    /** Puts the system before each level of a line. */
    private static String prefixed(String text, String prefix) {
        return prefix
                + text.replaceAll(
                        "(\\s[-+\u2212]\\s|\\s*(?:->|→)\\s*)", "$1" + java.util.regex.Matcher.quoteReplacement(prefix));
    }

    private static ExactNumber sigma(String text, ExactNumber value) {
        if (text == null || text.equals("-")) {
            return null;
        }
        if (text.strip().endsWith("%")) {
            ExactNumber percent = Typed.split(
                            text.strip().substring(0, text.strip().length() - 1))
                    .number();
            return ExactNumber.of(Math.abs(value.value() * percent.value() / 100));
        }
        Typed typed = Typed.split(text);
        if (!typed.rest().isEmpty()) {
            throw new InvalidModelException(
                    "'%s' is not an uncertainty".formatted(Typed.shortened(text)),
                    "",
                    "write a number in the unit of the value");
        }
        if (typed.number().sign() <= 0) {
            throw new InvalidModelException(
                    "the uncertainty %s is not positive".formatted(typed.number()),
                    "",
                    "leave it out where it is not known");
        }
        return typed.number();
    }

    private String unit(
            Map<DatumColumn, String> cells, MeasuredText measured, String headingUnit, Transform transform) {
        String unit = measured.unit();
        if (unit.isEmpty()) {
            unit = cells.getOrDefault(DatumColumn.UNIT, headingUnit.isEmpty() ? defaults.unit() : headingUnit);
        }
        if (transform == Transform.RATIO
                && !cells.containsKey(DatumColumn.UNIT)
                && measured.unit().isEmpty()) {
            return "";
        }
        return UnitExpression.parse(unit).text();
    }

    private List<String> groups(String text, ModelDocument document) {
        if (text == null) {
            return defaults.groups();
        }
        Set<String> known = new HashSet<>();
        document.groups().stream().map(DataGroup::id).forEach(known::add);
        List<String> groups = new ArrayList<>();
        for (String part : text.split("[,;]")) {
            if (!part.isBlank()) {
                groups.add(known(part.strip(), known));
            }
        }
        return groups;
    }

    private static String known(String group, Set<String> known) {
        if (!known.contains(group)) {
            throw new InvalidModelException(
                    "there is no data group '%s'".formatted(Names.shortened(group)),
                    "",
                    known.isEmpty() ? "add the group first" : Names.remedy(group, known));
        }
        return group;
    }

    private static boolean used(String text) {
        return switch (text.toLowerCase(Locale.ROOT)) {
            case "yes", "y", "1", "true", "x", "used" -> true;
            case "no", "n", "0", "false", "-", "unused" -> false;
            default ->
                throw new InvalidModelException(
                        "'%s' says neither yes nor no".formatted(Typed.shortened(text)), "", "write yes or no");
        };
    }
}
