package org.wellwright.project.file;

import java.util.Map;

/**
 * A parsed JSON text with the line on which each object, array and member begins.
 *
 * @param root the value
 * @param lines line from 1, by JSON pointer (RFC 6901)
 */
record JsonDocument(JsonValue root, Map<String, Integer> lines) {
    /** The line of a pointer, or of the nearest place around it that has one. */
    int line(String pointer) {
        String place = pointer;
        while (true) {
            Integer line = lines.get(place);
            if (line != null) {
                return line;
            }
            int slash = place.lastIndexOf('/');
            if (slash < 0) {
                return 1;
            }
            place = place.substring(0, slash);
        }
    }

    /** A key as a step of a JSON pointer: '~' and '/' are escaped. */
    static String step(String key) {
        return key.replace("~", "~0").replace("/", "~1");
    }
}
