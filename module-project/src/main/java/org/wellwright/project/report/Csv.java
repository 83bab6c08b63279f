package org.wellwright.project.report;

import java.util.List;

/** Rows as RFC 4180 text. */
public final class Csv {
    private Csv() {}

    /** A header and rows; a cell with a comma, quote or line break is quoted. */
    public static String of(List<String> header, List<List<String>> rows) {
        StringBuilder text = new StringBuilder();
        line(text, header);
        rows.forEach(row -> line(text, row));
        return text.toString();
    }

    /** A number as it reads back to the same double; empty if it is not finite. */
    public static String number(double value) {
        return Double.isFinite(value) ? Double.toString(value) : "";
    }

    private static void line(StringBuilder text, List<String> cells) {
        for (int i = 0; i < cells.size(); i++) {
            String cell = cells.get(i);
            boolean quoted = cell.indexOf(',') >= 0
                    || cell.indexOf('"') >= 0
                    || cell.indexOf('\n') >= 0
                    || cell.indexOf('\r') >= 0;
            text.append(i == 0 ? "" : ",").append(quoted ? '"' + cell.replace("\"", "\"\"") + '"' : cell);
        }
        text.append("\r\n");
    }
}
