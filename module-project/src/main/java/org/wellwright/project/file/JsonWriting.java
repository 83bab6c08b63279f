package org.wellwright.project.file;

import java.util.Map;
import org.wellwright.project.file.JsonValue.JsonArray;
import org.wellwright.project.file.JsonValue.JsonLiteral;
import org.wellwright.project.file.JsonValue.JsonNumber;
import org.wellwright.project.file.JsonValue.JsonObject;
import org.wellwright.project.file.JsonValue.JsonText;
import tools.jackson.core.io.JsonStringEncoder;

/**
 * Writes JSON values in one fixed layout: what fits a line of {@value #WIDTH} columns stands on one line, everything
 * else has one member or item a line, indented by two spaces; the text ends with a line feed. Equal values give equal
 * bytes.
 */
final class JsonWriting {
    private static final int WIDTH = 120;

    private final StringBuilder out = new StringBuilder();

    private JsonWriting() {}

    /** The text in the fixed layout. */
    static String pretty(JsonValue value) {
        JsonWriting writing = new JsonWriting();
        writing.write(value, 0, 0);
        return writing.out.append('\n').toString();
    }

    /** The text on one line. */
    static String compact(JsonValue value) {
        StringBuilder line = new StringBuilder();
        inline(value, line, Integer.MAX_VALUE);
        return line.toString();
    }

    private void write(JsonValue value, int indent, int used) {
        StringBuilder line = new StringBuilder();
        // The root and its direct members are always spread, so that a project grows line by line.
        if ((indent > 0 || !(value instanceof JsonObject)) && inline(value, line, WIDTH - indent - used)) {
            out.append(line);
        } else if (value instanceof JsonObject object) {
            out.append('{');
            String separator = "\n";
            for (Map.Entry<String, JsonValue> member : object.members().entrySet()) {
                out.append(separator).append(" ".repeat(indent + 2));
                String key = quoted(member.getKey()) + ": ";
                out.append(key);
                write(member.getValue(), indent + 2, key.length());
                separator = ",\n";
            }
            out.append('\n').append(" ".repeat(indent)).append('}');
        } else if (value instanceof JsonArray array) {
            out.append('[');
            String separator = "\n";
            for (JsonValue item : array.items()) {
                out.append(separator).append(" ".repeat(indent + 2));
                write(item, indent + 2, 0);
                separator = ",\n";
            }
            out.append('\n').append(" ".repeat(indent)).append(']');
        } else {
            inline(value, out, Integer.MAX_VALUE);
        }
    }

    /** Appends the value on one line; false as soon as it is longer than the room. */
    private static boolean inline(JsonValue value, StringBuilder line, int room) {
        if (value instanceof JsonObject object) {
            line.append('{');
            String separator = "";
            for (Map.Entry<String, JsonValue> member : object.members().entrySet()) {
                line.append(separator).append(quoted(member.getKey())).append(": ");
                if (!inline(member.getValue(), line, room)) {
                    return false;
                }
                separator = ", ";
            }
            line.append('}');
        } else if (value instanceof JsonArray array) {
            line.append('[');
            String separator = "";
            for (JsonValue item : array.items()) {
                line.append(separator);
                if (!inline(item, line, room)) {
                    return false;
                }
                separator = ", ";
            }
            line.append(']');
        } else if (value instanceof JsonText text) {
            line.append(quoted(text.value()));
        } else if (value instanceof JsonNumber number) {
            line.append(number.text());
        } else if (value instanceof JsonLiteral literal) {
            line.append(
                    switch (literal) {
                        case TRUE -> "true";
                        case FALSE -> "false";
                        case NULL -> "null";
                    });
        }
        return line.length() <= room;
    }

    private static String quoted(String text) {
        char[] escaped = JsonStringEncoder.getInstance().quoteAsCharArray(text);
        return new StringBuilder(escaped.length + 2)
                .append('"')
                .append(escaped)
                .append('"')
                .toString();
    }
}
