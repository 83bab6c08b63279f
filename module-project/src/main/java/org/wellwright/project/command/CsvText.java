package org.wellwright.project.command;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;

/** Rows as RFC 4180 text. */
final class CsvText {
    private CsvText() {}

    /** A header and rows; each cell is quoted where it must be. */
    static String of(List<String> header, List<List<String>> rows) {
        StringBuilder text = new StringBuilder();
        try (CSVPrinter printer = new CSVPrinter(text, CSVFormat.RFC4180)) {
            printer.printRecord(header);
            for (List<String> row : rows) {
                printer.printRecord(row);
            }
        } catch (IOException e) {
            throw new UncheckedIOException("a text in memory cannot fail", e);
        }
        return text.toString();
    }

    /** A number as it reads back to the same double; empty if it is not finite. */
    static String number(double value) {
        return Double.isFinite(value) ? Double.toString(value) : "";
    }
}
