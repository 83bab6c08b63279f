package org.wellwright.project.file;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.BiConsumer;
import java.util.function.Function;
import org.wellwright.project.FileTrace;
import org.wellwright.project.FileTrace.UnknownMember;
import org.wellwright.project.file.JsonValue.JsonArray;
import org.wellwright.project.file.JsonValue.JsonLiteral;
import org.wellwright.project.file.JsonValue.JsonNumber;
import org.wellwright.project.file.JsonValue.JsonObject;
import org.wellwright.project.file.JsonValue.JsonText;
import org.wellwright.solver.units.ExactNumber;

/**
 * One object of a project file while it is written: members in a fixed order, defaults left out, unknown members back
 * in their places.
 */
final class ObjectOut {
    private final FileTrace trace;
    private final String path;
    private final Map<String, JsonValue> members = new LinkedHashMap<>();
    private final Map<String, List<UnknownMember>> pending = new LinkedHashMap<>();

    ObjectOut(FileTrace trace, String path) {
        this.trace = trace;
        this.path = path;
        for (UnknownMember member : trace.unknown().getOrDefault(path, List.of())) {
            pending.computeIfAbsent(member.after(), k -> new ArrayList<>()).add(member);
        }
        flush("");
    }

    /** A member; null is left out. */
    ObjectOut put(String key, JsonValue value) {
        if (value != null) {
            members.put(key, value);
        }
        flush(key);
        return this;
    }

    /** A text, left out if it is the default. */
    ObjectOut text(String key, String value, String unless) {
        return put(key, value.equals(unless) ? null : new JsonText(value));
    }

    /** A text that is always written. */
    ObjectOut text(String key, String value) {
        return put(key, new JsonText(value));
    }

    /** A number as typed; null is left out. */
    ObjectOut number(String key, ExactNumber value) {
        return put(key, value == null ? null : spelled(value));
    }

    /** A number as typed, left out if its text is that of the default. */
    ObjectOut number(String key, ExactNumber value, ExactNumber unless) {
        return put(key, value.equals(unless) ? null : spelled(value));
    }

    /** A whole number, left out if it is the default. */
    ObjectOut integer(String key, int value, int unless) {
        return put(key, value == unless ? null : JsonNumber.of(value));
    }

    /** A truth value, left out if it is the default. */
    ObjectOut flag(String key, boolean value, boolean unless) {
        return put(key, value == unless ? null : JsonLiteral.of(value));
    }

    /** A word of an enumeration, left out if it is the default. */
    ObjectOut choice(String key, Enum<?> value, Enum<?> unless) {
        return put(key, value == unless ? null : new JsonText(ObjectIn.word(value)));
    }

    /** A double in the spelling that it had in the file, if it still has that value. */
    JsonNumber real(String step, double value) {
        String spelling = trace.spellings().get(path + step);
        return spelling != null && Double.parseDouble(spelling) == value
                ? new JsonNumber(spelling)
                : JsonNumber.of(value);
    }

    /** Texts; an empty list is left out. */
    ObjectOut texts(String key, List<String> values) {
        List<JsonValue> items = new ArrayList<>();
        values.forEach(value -> items.add(new JsonText(value)));
        return put(key, items.isEmpty() ? null : new JsonArray(items));
    }

    /** An object, left out if it has no members. */
    <T> ObjectOut object(String key, T value, BiConsumer<ObjectOut, T> write) {
        ObjectOut member = new ObjectOut(trace, path + "/" + key);
        write.accept(member, value);
        JsonObject done = member.done();
        return put(key, done.members().isEmpty() ? null : done);
    }

    /**
     * Objects; an empty list is left out.
     *
     * @param name names an item in the trace, or null to name it by its position
     */
    <T> ObjectOut items(String key, List<T> values, Function<T, String> name, BiConsumer<ObjectOut, T> write) {
        List<JsonValue> items = new ArrayList<>();
        for (T value : values) {
            String step = name == null ? Integer.toString(items.size()) : name.apply(value);
            ObjectOut item = new ObjectOut(trace, path + "/" + key + "/" + step);
            write.accept(item, value);
            items.add(item.done());
        }
        return put(key, items.isEmpty() ? null : new JsonArray(items));
    }

    /** The finished object. */
    JsonObject done() {
        for (String after : List.copyOf(pending.keySet())) {
            flush(after);
        }
        return new JsonObject(members);
    }

    /** A number in JSON's grammar with all its digits; only signs and zeros that JSON does not allow are changed. */
    static JsonNumber spelled(ExactNumber number) {
        String text = number.text();
        if (text.startsWith("+")) {
            text = text.substring(1);
        }
        boolean negative = text.startsWith("-");
        String digits = negative ? text.substring(1) : text;
        int mark = Math.max(digits.indexOf('e'), digits.indexOf('E'));
        String mantissa = mark < 0 ? digits : digits.substring(0, mark);
        String exponent = mark < 0 ? "" : digits.substring(mark);
        int point = mantissa.indexOf('.');
        String whole = point < 0 ? mantissa : mantissa.substring(0, point);
        String fraction = point < 0 ? "" : mantissa.substring(point + 1);
        int zeros = 0;
        while (zeros < whole.length() - 1 && whole.charAt(zeros) == '0') {
            zeros++;
        }
        String plain = whole.isEmpty() ? "0" : whole.substring(zeros);
        return new JsonNumber((negative ? "-" : "") + plain + (fraction.isEmpty() ? "" : "." + fraction) + exponent);
    }

    private void flush(String after) {
        List<UnknownMember> waiting = pending.remove(after);
        if (waiting != null) {
            for (UnknownMember member : waiting) {
                members.putIfAbsent(member.key(), JsonParsing.fragment(member.json()));
            }
        }
    }
}
