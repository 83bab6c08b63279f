package org.wellwright.project.report;

import java.util.List;

/** Small pieces of HTML with everything from outside escaped. */
final class Html {
    private Html() {}

    /** Text as HTML. */
    static String text(String text) {
        StringBuilder out = new StringBuilder(text.length() + 16);
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '<' -> out.append("&lt;");
                case '>' -> out.append("&gt;");
                case '&' -> out.append("&amp;");
                case '"' -> out.append("&quot;");
                default -> out.append(c);
            }
        }
        return out.toString();
    }

    /** Text with blank lines between paragraphs. */
    static String paragraphs(String text) {
        StringBuilder out = new StringBuilder();
        for (String paragraph : text.strip().split("\\R\\s*\\R")) {
            if (!paragraph.isBlank()) {
                out.append("<p>")
                        .append(text(paragraph).replace("\n", "<br>\n"))
                        .append("</p>\n");
            }
        }
        return out.toString();
    }

    /** A table; cells are text, those that look like numbers stand to the right. */
    static String table(List<String> header, List<List<String>> rows) {
        return table("", header, rows);
    }

    /** A table with a caption. */
    static String table(String caption, List<String> header, List<List<String>> rows) {
        StringBuilder out = new StringBuilder("<table>\n");
        if (!caption.isEmpty()) {
            out.append("<caption>").append(text(caption)).append("</caption>\n");
        }
        out.append("<thead><tr>");
        for (int c = 0; c < header.size(); c++) {
            out.append(number(rows, c) ? "<th scope=\"col\" class=\"n\">" : "<th scope=\"col\">")
                    .append(text(header.get(c)))
                    .append("</th>");
        }
        out.append("</tr></thead>\n<tbody>\n");
        for (List<String> row : rows) {
            out.append("<tr>");
            for (int c = 0; c < row.size(); c++) {
                out.append(number(rows, c) ? "<td class=\"n\">" : "<td>")
                        .append(text(row.get(c)))
                        .append("</td>");
            }
            out.append("</tr>\n");
        }
        return out.append("</tbody></table>\n").toString();
    }

    /** Whether all cells of a column are empty or look like numbers. */
    private static boolean number(List<List<String>> rows, int column) {
        boolean any = false;
        for (List<String> row : rows) {
            String cell = row.get(column);
            if (!Digits.number(cell)) {
                return false;
            }
            any |= !cell.isEmpty();
        }
        return any;
    }
}
