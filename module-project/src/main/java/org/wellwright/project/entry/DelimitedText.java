package org.wellwright.project.entry;

import java.util.ArrayList;
import java.util.List;

/**
 * Rows of cells as spreadsheets and programs write them: separated by tabs, semicolons, commas or runs of blanks, cells
 * with separators in quotes (RFC 4180), comment lines with '#' left out. Immutable.
 *
 * @param separator what separates the cells; a blank stands for a run of them
 * @param rows the rows that are not empty, cells without blanks around them
 */
public record DelimitedText(char separator, List<Row> rows) {
    /** The separators that are understood. */
    public static final List<Character> SEPARATORS = List.of('\t', ';', ',', ' ');

    /**
     * One row.
     *
     * @param line its line in the text, from 1
     * @param cells its cells
     */
    public record Row(int line, List<String> cells) {
        /** Copies the cells. */
        public Row {
            cells = List.copyOf(cells);
        }

        /** The cell of a column from 0; empty where the row is shorter. */
        public String cell(int column) {
            return column >= 0 && column < cells.size() ? cells.get(column) : "";
        }
    }

    /** Copies the rows. */
    public DelimitedText {
        rows = List.copyOf(rows);
    }

    /**
     * Splits a text at the separator that fits it best: a tab if there is one, else the one that gives the same number
     * of cells in most rows.
     */
    public static DelimitedText parse(String text) {
        if (text.indexOf('\t') >= 0) {
            return parse(text, '\t');
        }
        DelimitedText best = parse(text, ';');
        for (char separator : new char[] {',', ' '}) {
            DelimitedText other = parse(text, separator);
            if (other.evenness() > best.evenness()) {
                best = other;
            }
        }
        return best;
    }

    /** Splits a text at one separator. */
    public static DelimitedText parse(String text, char separator) {
        List<Row> rows = new ArrayList<>();
        List<String> cells = new ArrayList<>();
        StringBuilder cell = new StringBuilder();
        String plain = text.startsWith("\uFEFF") ? text.substring(1) : text;
        boolean quoted = false;
        int line = 1;
        int startLine = 1;
        for (int at = 0; at <= plain.length(); at++) {
            char c = at < plain.length() ? plain.charAt(at) : '\n';
            boolean end = at == plain.length();
            if (quoted && !end) {
                if (c == '"' && at + 1 < plain.length() && plain.charAt(at + 1) == '"') {
                    cell.append('"');
                    at++;
                } else if (c == '"') {
                    quoted = false;
                } else {
                    line += c == '\n' ? 1 : 0;
                    cell.append(c);
                }
            } else if (c == '"' && cell.toString().isBlank()) {
                quoted = true;
                cell.setLength(0);
            } else if (c == separator || separator == ' ' && c == '\t') {
                if (separator != ' ' || !cell.toString().isBlank()) {
                    cells.add(cell.toString().strip());
                }
                cell.setLength(0);
            } else if (c == '\n') {
                if (separator != ' ' || !cell.toString().isBlank()) {
                    cells.add(cell.toString().strip());
                }
                cell.setLength(0);
                addRow(rows, cells, startLine);
                cells.clear();
                quoted = false;
                line++;
                startLine = line;
            } else if (c != '\r') {
                cell.append(c);
            }
        }
        return new DelimitedText(separator, rows);
    }

    /** The largest number of cells in a row. */
    public int columns() {
        return rows.stream().mapToInt(row -> row.cells().size()).max().orElse(0);
    }

    private static void addRow(List<Row> rows, List<String> cells, int line) {
        boolean blank = cells.stream().allMatch(String::isEmpty);
        if (!blank && !cells.get(0).startsWith("#")) {
            rows.add(new Row(line, cells));
        }
    }

    /** How many rows have the commonest number of cells, if that is more than one. */
    private long evenness() {
        long best = 0;
        for (int columns = 2; columns <= columns(); columns++) {
            int wanted = columns;
            best = Math.max(
                    best,
                    rows.stream().filter(row -> row.cells().size() == wanted).count());
        }
        return best;
    }
}
