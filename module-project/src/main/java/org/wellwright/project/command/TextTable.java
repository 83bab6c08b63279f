package org.wellwright.project.command;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.report.Digits;

/** Columns of text with two spaces between them; numbers to the right. */
final class TextTable {
    private final List<String> header;
    private final List<List<String>> rows = new ArrayList<>();

    TextTable(String... header) {
        this.header = List.of(header);
    }

    TextTable row(List<String> cells) {
        rows.add(List.copyOf(cells));
        return this;
    }

    @Override
    public String toString() {
        int columns = header.size();
        int[] widths = new int[columns];
        boolean[] numbers = new boolean[columns];
        for (int c = 0; c < columns; c++) {
            widths[c] = header.get(c).length();
            numbers[c] = !rows.isEmpty();
            for (List<String> row : rows) {
                String cell = row.get(c);
                widths[c] = Math.max(widths[c], cell.length());
                numbers[c] &= Digits.number(cell);
            }
        }
        StringBuilder text = new StringBuilder();
        line(text, header, widths, numbers);
        for (List<String> row : rows) {
            line(text, row, widths, numbers);
        }
        return text.toString();
    }

    private static void line(StringBuilder text, List<String> cells, int[] widths, boolean[] numbers) {
        int start = text.length();
        for (int c = 0; c < widths.length; c++) {
            String pad = " ".repeat(widths[c] - cells.get(c).length());
            text.append(c == 0 ? "" : "  ").append(numbers[c] ? pad + cells.get(c) : cells.get(c) + pad);
        }
        int end = text.length();
        while (end > start && text.charAt(end - 1) == ' ') {
            end--;
        }
        text.setLength(end);
        text.append('\n');
    }
}
