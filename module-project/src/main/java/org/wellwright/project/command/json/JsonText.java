package org.wellwright.project.command.json;

import java.io.StringWriter;
import java.util.function.Consumer;
import tools.jackson.core.JsonGenerator;
import tools.jackson.core.ObjectWriteContext;
import tools.jackson.core.json.JsonFactory;

/** The streaming generator with what every listing needs: numbers that are not finite become null, items stand on lines of their own. */
final class JsonText {
    private final JsonGenerator out;

    private JsonText(JsonGenerator out) {
        this.out = out;
    }

    /** Writes one object. */
    static String object(Consumer<JsonText> members) {
        StringWriter text = new StringWriter(4096);
        try (JsonGenerator generator = new JsonFactory().createGenerator(ObjectWriteContext.empty(), text)) {
            generator.writeStartObject();
            members.accept(new JsonText(generator));
            generator.writeRaw('\n');
            generator.writeEndObject();
        }
        return text.append('\n').toString();
    }

    JsonText text(String name, String value) {
        if (value == null) {
            out.writeNullProperty(name);
        } else {
            out.writeStringProperty(name, value);
        }
        return this;
    }

    JsonText number(String name, double value) {
        if (Double.isFinite(value)) {
            out.writeNumberProperty(name, value);
        } else {
            out.writeNullProperty(name);
        }
        return this;
    }

    JsonText whole(String name, long value) {
        out.writeNumberProperty(name, value);
        return this;
    }

    JsonText flag(String name, boolean value) {
        out.writeBooleanProperty(name, value);
        return this;
    }

    /** An object on a line of its own. */
    JsonText nested(String name, Consumer<JsonText> members) {
        out.writeRaw(' ');
        out.writeName(name);
        out.writeStartObject();
        members.accept(this);
        out.writeEndObject();
        return this;
    }

    /** A list of objects, each on a line of its own. */
    <T> JsonText items(String name, Iterable<T> values, java.util.function.BiConsumer<JsonText, T> write) {
        out.writeName(name);
        out.writeStartArray();
        for (T value : values) {
            out.writeStartObject();
            write.accept(this, value);
            out.writeEndObject();
        }
        out.writeEndArray();
        return this;
    }

    /** A list of numbers. */
    JsonText numbers(String name, double... values) {
        out.writeName(name);
        out.writeStartArray();
        for (double value : values) {
            if (Double.isFinite(value)) {
                out.writeNumber(value);
            } else {
                out.writeNull();
            }
        }
        out.writeEndArray();
        return this;
    }

    /** A list of texts. */
    JsonText texts(String name, Iterable<String> values) {
        out.writeName(name);
        out.writeStartArray();
        for (String value : values) {
            out.writeString(value);
        }
        out.writeEndArray();
        return this;
    }
}
