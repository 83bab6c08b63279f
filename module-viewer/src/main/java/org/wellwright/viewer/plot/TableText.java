package org.wellwright.viewer.plot;

import java.util.List;
import java.util.Objects;

/**
 * A table as text.
 *
 * @param columns its columns
 * @param rows its rows, each with one cell per column
 */
public record TableText(List<Column> columns, List<List<Cell>> rows) {
    /**
     * A column.
     *
     * @param title its head
     * @param number whether it holds numbers, which are aligned right
     */
    public record Column(String title, boolean number) {}

    /**
     * A cell.
     *
     * @param text what it shows
     * @param hint what it says when pointed at: all digits; may be empty
     */
    public record Cell(String text, String hint) {
        /** Checks that both are there. */
        public Cell {
            Objects.requireNonNull(text, "text");
            Objects.requireNonNull(hint, "hint");
        }

        /** A cell without a hint. */
        public static Cell of(String text) {
            return new Cell(text, "");
        }

        /**
         * A number rounded to the second digit of its uncertainty, or to eight digits without one; all digits in the
         * hint.
         */
        public static Cell of(double value, double sigma) {
            if (!Double.isFinite(value)) {
                return of("–");
            }
            String text = sigma > 0 && sigma < Double.MAX_VALUE
                    ? Ticks.label(value, Math.pow(10, Math.floor(Math.log10(sigma) + 1e-9) - 1))
                    : Ticks.number(value, 8);
            return new Cell(text, Double.toString(value));
        }
    }

    /** Copies the lists and checks that the rows are as wide as the head. */
    public TableText {
        columns = List.copyOf(columns);
        rows = rows.stream().map(List::copyOf).toList();
        for (List<Cell> row : rows) {
            if (row.size() != columns.size()) {
                throw new IllegalArgumentException(
                        "a row has %d cells for %d columns".formatted(row.size(), columns.size()));
            }
        }
    }
}
