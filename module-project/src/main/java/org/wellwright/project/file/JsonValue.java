package org.wellwright.project.file;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;

/** A JSON value that keeps the order of its keys and the spelling of its numbers. Immutable. */
public sealed interface JsonValue {
    /** What it is, in the words of a message: "an object", "a number". */
    String kind();

    /**
     * An object.
     *
     * @param members its members in the order of the file
     */
    record JsonObject(Map<String, JsonValue> members) implements JsonValue {
        /** Copies the members and keeps their order. */
        public JsonObject {
            members = Collections.unmodifiableMap(new LinkedHashMap<>(members));
        }

        @Override
        public String kind() {
            return "an object";
        }
    }

    /**
     * An array.
     *
     * @param items its items
     */
    record JsonArray(List<JsonValue> items) implements JsonValue {
        /** Copies the items. */
        public JsonArray {
            items = List.copyOf(items);
        }

        @Override
        public String kind() {
            return "an array";
        }
    }

    /**
     * A text.
     *
     * @param value the text
     */
    record JsonText(String value) implements JsonValue {
        /** Checks that there is one. */
        public JsonText {
            Objects.requireNonNull(value, "value");
        }

        @Override
        public String kind() {
            return "a text";
        }
    }

    /**
     * A number.
     *
     * @param text its spelling in the grammar of RFC 8259, section 6
     */
    record JsonNumber(String text) implements JsonValue {
        /** Checks that there is one. */
        public JsonNumber {
            Objects.requireNonNull(text, "text");
        }

        /**
         * The shortest spelling of a finite double that reads back to the same bits; whole numbers below 10⁷ without a
         * decimal point.
         */
        public static JsonNumber of(double value) {
            if (!Double.isFinite(value)) {
                throw new IllegalArgumentException("JSON has no spelling for " + value);
            }
            boolean whole = value == Math.rint(value) && Math.abs(value) < 1e7 && !(value == 0 && 1 / value < 0);
            return new JsonNumber(whole ? Long.toString((long) value) : Double.toString(value));
        }

        /** A whole number. */
        public static JsonNumber of(long value) {
            return new JsonNumber(Long.toString(value));
        }

        @Override
        public String kind() {
            return "a number";
        }
    }

    /** True, false and null. */
    enum JsonLiteral implements JsonValue {
        /** true. */
        TRUE,
        /** false. */
        FALSE,
        /** null. */
        NULL;

        /** The literal of a truth value. */
        public static JsonLiteral of(boolean value) {
            return value ? TRUE : FALSE;
        }

        @Override
        public String kind() {
            return this == NULL ? "null" : "true or false";
        }
    }
}
