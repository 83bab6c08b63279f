package org.wellwright.project.file;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;
import java.util.function.IntFunction;
import java.util.function.Supplier;
import org.wellwright.project.FileTrace;
import org.wellwright.project.FileTrace.UnknownMember;
import org.wellwright.project.file.JsonValue.JsonArray;
import org.wellwright.project.file.JsonValue.JsonLiteral;
import org.wellwright.project.file.JsonValue.JsonNumber;
import org.wellwright.project.file.JsonValue.JsonObject;
import org.wellwright.project.file.JsonValue.JsonText;
import org.wellwright.solver.units.ExactNumber;

/**
 * One object of a project file while it is read. Asking for a member of the wrong type notes a fault with pointer and
 * line. A member that is null counts as absent.
 */
final class ObjectIn {
    private final Reading reading;
    private final JsonObject object;
    private final String pointer;
    private final String path;
    private final String name;

    /** What all objects of one file share. */
    static final class Reading {
        private final Faults faults;
        private final Map<String, List<UnknownMember>> unknown = new HashMap<>();
        private final Map<String, String> spellings = new HashMap<>();
        private final List<String> unknownPointers = new ArrayList<>();

        Reading(Faults faults) {
            this.faults = faults;
        }

        FileTrace trace() {
            return new FileTrace(unknown, spellings);
        }

        /** Pointers of the members that are kept but not used. */
        List<String> unknownPointers() {
            return List.copyOf(unknownPointers);
        }
    }

    private ObjectIn(Reading reading, JsonObject object, String pointer, String path, String name) {
        this.name = name;
        this.reading = reading;
        this.object = object;
        this.pointer = pointer;
        this.path = path;
    }

    /** The root object. */
    static ObjectIn root(Reading reading, JsonValue value) {
        if (value instanceof JsonObject object) {
            return new ObjectIn(reading, object, "", "", "");
        }
        throw reading.faults.note(
                "",
                "a project file holds an object, this holds " + value.kind(),
                "start it with {\"format\": \"wellwright-project\"");
    }

    /** Says which keys are known; the others are kept as they are. */
    ObjectIn knowing(String... keys) {
        Set<String> known = Set.of(keys);
        String after = "";
        for (Map.Entry<String, JsonValue> member : object.members().entrySet()) {
            String key = member.getKey();
            if (known.contains(key)) {
                after = key;
            } else {
                reading.unknown
                        .computeIfAbsent(path, p -> new ArrayList<>())
                        .add(new UnknownMember(key, after, JsonWriting.compact(member.getValue())));
                reading.unknownPointers.add(pointer + "/" + JsonDocument.step(key));
            }
        }
        return this;
    }

    /** Whether there is a member that is not null. */
    boolean has(String key) {
        JsonValue value = object.members().get(key);
        return value != null && value != JsonLiteral.NULL;
    }

    /** The member, or null. */
    JsonValue value(String key) {
        return has(key) ? object.members().get(key) : null;
    }

    /** Notes a fault of the object itself. */
    Faults.Noted fault(String what, String remedy) {
        return reading.faults.note(pointer, what, remedy);
    }

    /** Notes a fault of a member. */
    Faults.Noted fault(String key, String what, String remedy) {
        return reading.faults.note(has(key) ? pointer + "/" + JsonDocument.step(key) : pointer, what, remedy);
    }

    /** A text that must be there. */
    String text(String key) {
        String text = text(key, null);
        if (text == null) {
            throw missing(key, "a text");
        }
        return text;
    }

    /** A text, or what to take without. */
    String text(String key, String otherwise) {
        JsonValue value = value(key);
        if (value == null) {
            return otherwise;
        }
        if (value instanceof JsonText text) {
            return text.value();
        }
        throw wrong(key, "a text", value);
    }

    /** A number that must be there. */
    ExactNumber number(String key) {
        ExactNumber number = number(key, null);
        if (number == null) {
            throw missing(key, "a number");
        }
        return number;
    }

    /** A number as it is spelled, or what to take without. */
    ExactNumber number(String key, ExactNumber otherwise) {
        JsonValue value = value(key);
        if (value == null) {
            return otherwise;
        }
        if (value instanceof JsonNumber number) {
            try {
                return new ExactNumber(number.text());
            } catch (IllegalArgumentException e) {
                throw fault(key, e.getMessage(), "write a decimal number");
            }
        }
        throw wrong(key, "a number", value);
    }

    /** A number as a double; its spelling goes into the trace. */
    double real(String key, double otherwise) {
        ExactNumber number = number(key, null);
        if (number == null) {
            return otherwise;
        }
        spelled("/" + JsonDocument.step(key), number);
        return number.value();
    }

    /** Keeps the spelling of a number that the model holds as a double, unless it is the usual one. */
    void spelled(String step, ExactNumber number) {
        if (!JsonNumber.of(number.value()).text().equals(number.text())) {
            reading.spellings.put(path + step, number.text());
        }
    }

    /** A whole number, or what to take without. */
    int integer(String key, int otherwise) {
        ExactNumber number = number(key, null);
        if (number == null) {
            return otherwise;
        }
        double value = number.value();
        if (value != Math.rint(value) || Math.abs(value) > 1e9) {
            throw fault(key, "'" + key + "' must be a whole number, got " + number, "");
        }
        return (int) value;
    }

    /** A whole number that must be there. */
    int integer(String key) {
        number(key);
        return integer(key, 0);
    }

    /** A truth value, or what to take without. */
    boolean flag(String key, boolean otherwise) {
        JsonValue value = value(key);
        if (value == null) {
            return otherwise;
        }
        if (value instanceof JsonLiteral literal && literal != JsonLiteral.NULL) {
            return literal == JsonLiteral.TRUE;
        }
        throw wrong(key, "true or false", value);
    }

    /** One of an enumeration's words, or what to take without. */
    <E extends Enum<E>> E choice(String key, Class<E> type, E otherwise) {
        String word = text(key, null);
        if (word == null) {
            return otherwise;
        }
        List<String> words = new ArrayList<>();
        for (E constant : type.getEnumConstants()) {
            if (word(constant).equals(word)) {
                return constant;
            }
            words.add(word(constant));
        }
        throw fault(key, "'" + key + "' is '" + word + "'", "use one of " + String.join(", ", words));
    }

    /** The word of an enumeration constant in files: lower case with hyphens. */
    static String word(Enum<?> constant) {
        return constant.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** A list of texts; empty without. */
    List<String> texts(String key) {
        List<String> texts = new ArrayList<>();
        int position = 0;
        for (JsonValue item : list(key)) {
            if (!(item instanceof JsonText text)) {
                throw reading.faults.note(
                        pointer + "/" + JsonDocument.step(key) + "/" + position,
                        "a text is expected here, not " + item.kind(),
                        "");
            }
            texts.add(text.value());
            position++;
        }
        return texts;
    }

    /** A list of anything; empty without. */
    List<JsonValue> list(String key) {
        JsonValue value = value(key);
        if (value == null) {
            return List.of();
        }
        if (value instanceof JsonArray array) {
            return array.items();
        }
        throw wrong(key, "an array", value);
    }

    /** What a list calls this item: its identity, or what stands for it. */
    String name() {
        return name;
    }

    /** A list of objects named by their position; empty without. */
    <T> List<T> items(String key, Function<ObjectIn, T> read) {
        return items(key, "", Integer::toString, read);
    }

    /**
     * A list of objects; empty without. An item with a fault is left out, the fault is noted and the next item is read.
     *
     * @param identity the key whose text names an item
     * @param unnamed the name of an item without that key, by its position
     */
    <T> List<T> items(String key, String identity, IntFunction<String> unnamed, Function<ObjectIn, T> read) {
        List<T> items = new ArrayList<>();
        int position = 0;
        for (JsonValue item : list(key)) {
            String place = pointer + "/" + JsonDocument.step(key) + "/" + position;
            try {
                if (!(item instanceof JsonObject member)) {
                    throw reading.faults.note(place, "an object is expected here, not " + item.kind(), "");
                }
                String given = member.members().get(identity) instanceof JsonText text
                        ? text.value()
                        : unnamed.apply(position);
                items.add(read.apply(new ObjectIn(reading, member, place, path + "/" + key + "/" + given, given)));
            } catch (Faults.Noted noted) {
                // The fault is in the list already; the next item may have another.
            }
            position++;
        }
        return items;
    }

    /** An object, or null without. */
    ObjectIn object(String key) {
        JsonValue value = value(key);
        if (value == null) {
            return null;
        }
        if (value instanceof JsonObject member) {
            return new ObjectIn(reading, member, pointer + "/" + JsonDocument.step(key), path + "/" + key, key);
        }
        throw wrong(key, "an object", value);
    }

    /** An object that must be there. */
    ObjectIn required(String key) {
        ObjectIn member = object(key);
        if (member == null) {
            throw missing(key, "an object");
        }
        return member;
    }

    /** The members of an object with free keys, in order; empty without. */
    Map<String, JsonValue> members(String key) {
        JsonValue value = value(key);
        if (value == null) {
            return Map.of();
        }
        if (value instanceof JsonObject member) {
            return new LinkedHashMap<>(member.members());
        }
        throw wrong(key, "an object", value);
    }

    /** Makes a record; what its constructor refuses becomes a fault of this object. */
    <T> T make(Supplier<T> maker) {
        try {
            return maker.get();
        } catch (IllegalArgumentException e) {
            throw fault(e.getMessage(), "");
        }
    }

    private Faults.Noted missing(String key, String type) {
        return fault("'" + key + "' is missing", "add \"" + key + "\": " + type);
    }

    private Faults.Noted wrong(String key, String type, JsonValue value) {
        return fault(key, "'" + key + "' must be " + type + ", not " + value.kind(), "");
    }
}
