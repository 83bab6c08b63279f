package org.wellwright.project;

import java.util.List;

/**
 * A table that is written as a CSV file beside a report: all digits, units in the heading or in a column.
 *
 * @param file name of the file, ending in .csv
 * @param header headings
 * @param rows cells, as many as headings
 */
public record ReportTable(String file, List<String> header, List<List<String>> rows) {
    /** Copies the lists. */
    public ReportTable {
        header = List.copyOf(header);
        rows = rows.stream().map(List::copyOf).toList();
    }
}
