package org.wellwright.project.file;

import java.nio.charset.StandardCharsets;

/** JSON texts of other files of a project. */
public final class Json {
    private Json() {}

    /**
     * The value of a text.
     *
     * @param place name for messages
     * @throws ProjectFileException if it is not one JSON value, or nested too deep
     */
    public static JsonValue parse(String text, String place) {
        return JsonParsing.parse(text.getBytes(StandardCharsets.UTF_8), place).root();
    }

    /** The text of a value on one line; equal values give equal texts. */
    public static String compact(JsonValue value) {
        return JsonWriting.compact(value);
    }
}
