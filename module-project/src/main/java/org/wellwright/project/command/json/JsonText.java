package org.wellwright.project.command.json;

import java.io.StringWriter;
import java.util.function.BiConsumer;
import java.util.function.Consumer;
import tools.jackson.core.JsonGenerator;
import tools.jackson.core.ObjectWriteContext;
import tools.jackson.core.PrettyPrinter;
import tools.jackson.core.json.JsonFactory;

/**
 * The streaming generator with what every listing needs: numbers that are not finite become null, items stand on lines
 * of their own.
 */
final class JsonText {
    private final JsonGenerator out;

    private JsonText(JsonGenerator out) {
        this.out = out;
    }

    /** Writes one object. */
    static String object(Consumer<JsonText> members) {
        StringWriter text = new StringWriter(4096);
        ObjectWriteContext context = new ObjectWriteContext.Base() {
            @Override
            public PrettyPrinter getPrettyPrinter() {
                return new LinePrinter();
            }

            @Override
            public boolean hasPrettyPrinter() {
                return true;
            }
        };
        try (JsonGenerator generator = new JsonFactory().createGenerator(context, text)) {
            generator.writeStartObject();
            members.accept(new JsonText(generator));
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

    /** An object. */
    JsonText nested(String name, Consumer<JsonText> members) {
        out.writeName(name);
        out.writeStartObject();
        members.accept(this);
        out.writeEndObject();
        return this;
    }

    /** A list of objects. */
    <T> JsonText items(String name, Iterable<T> values, BiConsumer<JsonText, T> write) {
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

    /** A square matrix as a list of rows. */
    JsonText rows(String name, int size, Entry entry) {
        out.writeName(name);
        out.writeStartArray();
        for (int row = 0; row < size; row++) {
            out.writeStartArray();
            for (int column = 0; column < size; column++) {
                out.writeNumber(entry.at(row, column));
            }
            out.writeEndArray();
        }
        out.writeEndArray();
        return this;
    }

    /** An element of a matrix. */
    interface Entry {
        double at(int row, int column);
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
