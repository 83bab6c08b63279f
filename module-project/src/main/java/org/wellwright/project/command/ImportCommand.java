package org.wellwright.project.command;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import org.wellwright.project.Project;
import org.wellwright.project.entry.DatumColumn;
import org.wellwright.project.entry.DatumTable;
import org.wellwright.project.entry.DelimitedText;
import org.wellwright.project.entry.TransformText;
import org.wellwright.project.file.ProjectFileException;
import org.wellwright.project.file.ProjectLock;
import org.wellwright.project.file.SafeFile;
import org.wellwright.project.report.Csv;
import org.wellwright.project.report.Words;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.ModelCheck;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.units.Names;
import org.wellwright.solver.units.UnitExpression;

/** {@code import}: measured data from a table. */
final class ImportCommand implements Command {
    @Override
    public Syntax syntax() {
        return new Syntax(
                        "import",
                        "Reads measured data from a table; shows them, or adds them with --write.",
                        "PROJECT",
                        "FILE.csv")
                .option(
                        "columns",
                        "MAP",
                        "what the columns hold, by number or heading:\nlevels=1,value=3,sigma=4 or upper=up,lower=low,value=wavelength\n(without it as the headings say)")
                .option("quantity", "NAME", "what was measured (energy, vacuum wavelength, air wavelength, …)")
                .option("unit", "UNIT", "unit of values in a column without one")
                .option("source", "TEXT", "where the values come from")
                .flag("write", "add the data to the project")
                .result("table|csv");
    }

    @Override
    public int run(Input input, Console console) {
        Input.Format format = input.format();
        if (format == Input.Format.JSON) {
            throw new UsageException("--format is 'json'", "use table or csv");
        }
        Path file = ProjectArgument.path(input);
        if (!input.has("write")) {
            Project project = ProjectArgument.read(file);
            print(input, format, read(input, project), project, console);
            return 0;
        }
        try (ProjectLock lock = ProjectLock.take(file)) {
            Project project = ProjectArgument.read(file);
            List<Datum> data = read(input, project);
            lock.save(project.withDocument(with(project.document(), data)));
            print(input, format, data, project, console);
        }
        return 0;
    }

    private static ModelDocument with(ModelDocument document, List<Datum> added) {
        List<Datum> all = new ArrayList<>(document.data());
        all.addAll(added);
        return document.withData(all);
    }

    private static List<Datum> read(Input input, Project project) {
        Path source = ProjectArgument.path(input.positionals().get(1));
        ModelDocument document = project.document();
        DelimitedText table = DelimitedText.parse(text(source));
        if (table.rows().isEmpty()) {
            throw new ProjectFileException(
                    new Problem("the table has no rows", source.toString(), "is it the file you meant?"));
        }
        List<DatumColumn> columns = columns(input.value("columns"), table);
        List<Problem> faults = new ArrayList<>();
        List<Datum> data = new ArrayList<>();
        for (DatumTable.Outcome outcome : new DatumTable(columns, defaults(input, document)).read(table, document)) {
            if (outcome.problem() == null) {
                data.add(outcome.datum());
            } else {
                Problem problem = outcome.problem();
                faults.add(new Problem(problem.what(), source + " " + problem.where(), problem.remedy()));
            }
        }
        if (faults.isEmpty()) {
            int first = document.data().size();
            for (Problem problem : ModelCheck.problems(with(document, data))) {
                faults.add(new Problem(problem.what(), source + " " + place(problem.where(), first), problem.remedy()));
            }
        }
        if (!faults.isEmpty()) {
            throw new ProjectFileException(faults.subList(0, Math.min(20, faults.size())));
        }
        return data;
    }

    /** "/data/7/unit" as "row 3, unit", counted from the first imported datum. */
    private static String place(String pointer, int first) {
        String[] steps = pointer.split("/", 4);
        if (steps.length < 3 || !steps[1].equals("data")) {
            return pointer;
        }
        int position = Integer.parseInt(steps[2].replaceAll("\\D.*", "")) - first + 1;
        return "row " + position + (steps.length == 4 ? ", " + steps[3] : "");
    }

    private static DatumTable.Defaults defaults(Input input, ModelDocument document) {
        DatumTable.Defaults usual = DatumTable.Defaults.of(document);
        Transform transform = input.has("quantity") ? TransformText.parse(input.value("quantity")) : usual.transform();
        String unit =
                input.has("unit") ? UnitExpression.parse(input.value("unit")).text() : usual.unit();
        return new DatumTable.Defaults(transform, unit, List.of(), input.has("source") ? input.value("source") : "");
    }

    private static List<DatumColumn> columns(String map, DelimitedText table) {
        if (map == null) {
            List<DatumColumn> guess = DatumTable.guess(table);
            if (!guess.contains(DatumColumn.VALUE)) {
                throw new UsageException(
                        "the table does not say which column holds the values",
                        "add --columns levels=1,value=2,sigma=3");
            }
            return guess;
        }
        List<DatumColumn> columns = new ArrayList<>(Collections.nCopies(table.columns(), DatumColumn.NONE));
        DelimitedText.Row heading = table.rows().get(0);
        for (String part : map.split(",", -1)) {
            int equals = part.indexOf('=');
            if (equals < 1) {
                throw new UsageException(
                        "--columns has '" + Names.shortened(part) + "'", "write FIELD=COLUMN, such as value=3");
            }
            DatumColumn field = field(part.substring(0, equals).strip());
            int column = column(part.substring(equals + 1).strip(), heading, table.columns());
            if (columns.get(column) != DatumColumn.NONE || columns.contains(field)) {
                throw new UsageException(
                        "--columns names '" + Names.shortened(part) + "' beside another for the same",
                        "give each field one column");
            }
            columns.set(column, field);
        }
        return columns;
    }

    private static DatumColumn field(String name) {
        DatumColumn field = DatumColumn.ofHeading(name);
        if (field == DatumColumn.NONE) {
            List<String> names = new ArrayList<>();
            for (DatumColumn column : DatumColumn.values()) {
                if (column != DatumColumn.NONE) {
                    names.add(column.title());
                }
            }
            throw new UsageException(
                    "--columns has no field '" + Names.shortened(name) + "'", Names.remedy(name, names));
        }
        return field;
    }

    /** A column by its number from 1 or by its heading. */
    private static int column(String name, DelimitedText.Row heading, int columns) {
        if (!name.isEmpty() && name.chars().allMatch(Character::isDigit)) {
            return Input.whole("--columns", name, 1, columns) - 1;
        }
        for (int i = 0; i < heading.cells().size(); i++) {
            if (heading.cell(i).toLowerCase(Locale.ROOT).equals(name.toLowerCase(Locale.ROOT))) {
                return i;
            }
        }
        throw new UsageException(
                "the table has no column '" + Names.shortened(name) + "'", Names.remedy(name, heading.cells()));
    }

    private static String text(Path source) {
        byte[] bytes = SafeFile.read(source);
        try {
            return StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes))
                    .toString();
        } catch (CharacterCodingException e) {
            throw new ProjectFileException(
                    new Problem("the file is not UTF-8 text", source.toString(), "save the table as UTF-8"), e);
        }
    }

    private static void print(Input input, Input.Format format, List<Datum> data, Project project, Console console) {
        ModelDocument shown = with(project.document(), data);
        List<String> header = List.of("datum", "levels", "quantity", "value", "sigma", "unit", "groups");
        List<List<String>> rows = new ArrayList<>();
        for (Datum datum : data) {
            rows.add(List.of(
                    datum.id(),
                    Words.levels(shown, datum.id()),
                    Words.transform(datum.transform()),
                    datum.value().text(),
                    datum.sigmaPlus() == null ? "" : datum.sigmaPlus().text(),
                    datum.unit(),
                    String.join(" ", datum.groups())));
        }
        if (format == Input.Format.CSV) {
            console.result(input, Csv.of(header, rows));
            return;
        }
        TextTable table = new TextTable(header.toArray(new String[0]));
        rows.forEach(table::row);
        console.result(input, table.toString());
    }
}
