package org.wellwright.project.command.json;

import tools.jackson.core.JsonGenerator;
import tools.jackson.core.PrettyPrinter;

/** Members of the root and items of its lists on lines of their own, everything deeper on one line. */
final class LinePrinter implements PrettyPrinter {
    private int depth;

    @Override
    public void writeRootValueSeparator(JsonGenerator out) {}

    @Override
    public void writeStartObject(JsonGenerator out) {
        out.writeRaw('{');
        depth++;
    }

    @Override
    public void beforeObjectEntries(JsonGenerator out) {
        line(out, 1);
    }

    @Override
    public void writeEndObject(JsonGenerator out, int entries) {
        depth--;
        if (depth == 0) {
            out.writeRaw('\n');
        }
        out.writeRaw('}');
    }

    @Override
    public void writeObjectEntrySeparator(JsonGenerator out) {
        out.writeRaw(',');
        if (!line(out, 1)) {
            out.writeRaw(' ');
        }
    }

    @Override
    public void writeObjectNameValueSeparator(JsonGenerator out) {
        out.writeRaw(": ");
    }

    @Override
    public void writeStartArray(JsonGenerator out) {
        out.writeRaw('[');
        depth++;
    }

    @Override
    public void beforeArrayValues(JsonGenerator out) {
        line(out, 2);
    }

    @Override
    public void writeEndArray(JsonGenerator out, int values) {
        depth--;
        if (values > 0 && depth == 1) {
            out.writeRaw("\n  ");
        }
        out.writeRaw(']');
    }

    @Override
    public void writeArrayValueSeparator(JsonGenerator out) {
        out.writeRaw(',');
        if (!line(out, 2)) {
            out.writeRaw(' ');
        }
    }

    private boolean line(JsonGenerator out, int at) {
        if (depth != at) {
            return false;
        }
        out.writeRaw(at == 1 ? "\n  " : "\n    ");
        return true;
    }
}
