package org.wellwright.project.file;

import java.util.LinkedHashMap;
import java.util.Map;
import org.wellwright.project.file.JsonValue.JsonLiteral;
import org.wellwright.project.file.JsonValue.JsonNumber;
import org.wellwright.project.file.JsonValue.JsonObject;
import org.wellwright.project.file.JsonValue.JsonText;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.units.ExactNumber;

/**
 * What stands for a parameter of a term: a name of the pool, a number, or {"value": number, "unit": text}; null is "no
 * limit".
 */
final class Arguments {
    private Arguments() {}

    /** The argument under a key, or what to take without. */
    static Argument read(ObjectIn in, String key, Argument otherwise) {
        if (!in.has(key)) {
            return otherwise;
        }
        return read(in, key, "/" + key, in.value(key));
    }

    /** An argument that must be a value of its own: a name, a number or an object. */
    static Argument read(ObjectIn in, String key, String step, JsonValue value) {
        if (value instanceof JsonText text) {
            return in.make(() -> Argument.named(text.value()));
        }
        if (value instanceof JsonNumber number) {
            return literal(in, step, number, "");
        }
        if (value instanceof JsonObject object
                && object.members().get("value") instanceof JsonNumber number
                && object.members().size() <= 2) {
            if (object.members().get("unit") instanceof JsonText unit) {
                return literal(in, step, number, unit.value());
            }
            if (object.members().size() == 1) {
                return literal(in, step, number, "");
            }
        }
        throw in.fault(
                key,
                "'" + key + "' is " + value.kind() + " where a parameter's name or a number is expected",
                "write \"name\", a number, or {\"value\": number, \"unit\": \"unit\"}");
    }

    private static Argument literal(ObjectIn in, String step, JsonNumber number, String unit) {
        ExactNumber exact = in.make(() -> new ExactNumber(number.text()));
        in.spelled(step, exact);
        return new Argument.Literal(exact.value(), unit);
    }

    /** Writes an argument under a key unless it is the default. */
    static void write(ObjectOut out, String key, Argument value, Argument unless) {
        out.put(key, value.equals(unless) ? null : json(out, "/" + key, value));
    }

    /** An argument as JSON. */
    static JsonValue json(ObjectOut out, String step, Argument value) {
        if (value instanceof Argument.Named named) {
            return new JsonText(named.parameter());
        }
        Argument.Literal literal = (Argument.Literal) value;
        if (Double.isInfinite(literal.value())) {
            return JsonLiteral.NULL;
        }
        JsonNumber number = out.real(step, literal.value());
        if (literal.unit().isEmpty()) {
            return number;
        }
        Map<String, JsonValue> members = new LinkedHashMap<>();
        members.put("value", number);
        members.put("unit", new JsonText(literal.unit()));
        return new JsonObject(members);
    }
}
