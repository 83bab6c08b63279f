package org.wellwright.editor.edit;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.entry.QuantityText;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterPool;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.Names;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/**
 * Arguments of terms as text: the name of a parameter, a number, or a number with its unit; empty for "not restricted".
 */
public final class ArgumentText {
    private ArgumentText() {}

    /** The text of an argument. */
    public static String text(Argument argument) {
        if (argument instanceof Argument.Named named) {
            return named.parameter();
        }
        Argument.Literal literal = (Argument.Literal) argument;
        if (Double.isInfinite(literal.value())) {
            return "";
        }
        String number = ExactNumber.of(literal.value()).text();
        return literal.unit().isEmpty() ? number : number + " " + literal.unit();
    }

    /**
     * Reads an argument.
     *
     * @param text what was typed
     * @param expected the dimension of its place
     * @param empty what an empty text stands for; null if it stands for nothing
     * @throws InvalidModelException if the parameter does not exist, or the unit does not fit
     */
    public static Argument parse(String text, Dimension expected, Argument empty, ModelDocument document) {
        String plain = text.strip();
        if (plain.isEmpty() && empty != null) {
            return empty;
        }
        if (plain.matches("\\p{L}[\\p{L}\\p{N}_]*")) {
            return named(plain, expected, document);
        }
        UnitSystem units = UnitSystem.named(document.units());
        String own = units.unitText(expected);
        double value = QuantityText.parse(plain, own, units).value();
        String unit = plain.replaceFirst("^[+\\-\u2212]?[\\d.]+(?:[eE][+-]?\\d+)?", "")
                .strip();
        if (unit.isEmpty()) {
            return new Argument.Literal(value, "");
        }
        double typed = QuantityText.parse(plain.substring(0, plain.length() - unit.length()), "", units)
                .value();
        return new Argument.Literal(typed, unit);
    }

    private static Argument named(String name, Dimension expected, ModelDocument document) {
        List<String> known = new ArrayList<>();
        UnitSystem units = UnitSystem.named(document.units());
        for (Parameter parameter : document.parameters()) {
            known.add(parameter.name());
            if (parameter.name().equals(name)) {
                requireFit(parameter, expected, units);
                return Argument.named(name);
            }
        }
        if (ParameterPool.SYSTEM_NAMES.contains(name)) {
            return Argument.named(name);
        }
        known.addAll(ParameterPool.SYSTEM_NAMES);
        throw new InvalidModelException(
                "there is no parameter '%s'".formatted(Names.shortened(name)),
                "",
                "add it to the parameters first, or " + Names.remedy(name, known));
    }

    private static void requireFit(Parameter parameter, Dimension expected, UnitSystem units) {
        if (!UnitExpression.parse(parameter.unit()).fits(units, expected)) {
            String wanted = units.unitText(expected);
            throw new InvalidModelException(
                    "the unit of '%s' (%s) does not fit here"
                            .formatted(parameter.name(), parameter.unit().isEmpty() ? "none" : parameter.unit()),
                    "",
                    wanted.isEmpty() ? "use a pure number" : "use a parameter with a unit like '%s'".formatted(wanted));
        }
    }
}
