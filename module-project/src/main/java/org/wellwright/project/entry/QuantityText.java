package org.wellwright.project.entry;

import java.math.BigDecimal;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/** Numbers typed into a field that has a unit: "0.52", or "1.2 eV" in a field of cm⁻¹. */
public final class QuantityText {
    private QuantityText() {}

    /**
     * The number in the field's unit. A number without a unit, or with the field's own, keeps every digit as typed;
     * another unit is converted with one rounding.
     *
     * @param text what was typed
     * @param fieldUnit unit expression of the field; empty for a pure number
     * @param system the project's units, which say whether energies and inverse lengths may stand for each other
     * @throws InvalidModelException if there is no number, or its unit does not fit
     */
    public static ExactNumber parse(String text, String fieldUnit, UnitSystem system) {
        Typed typed = Typed.split(text);
        if (typed.rest().isEmpty() || typed.rest().equals(fieldUnit.strip())) {
            return typed.number();
        }
        double factor = factor(typed.rest(), fieldUnit, system);
        if (!Double.isFinite(typed.number().value() * factor)) {
            throw new InvalidModelException(
                    "'%s' is too large in %s".formatted(text.strip(), fieldUnit), "", "check the unit");
        }
        return times(typed.number(), factor);
    }

    /** A number times the factor between two units; a power of ten changes no digit. */
    public static ExactNumber times(ExactNumber number, double factor) {
        if (factor == 1) {
            return number;
        }
        BigDecimal product = number.decimal().multiply(new BigDecimal(Double.toString(factor)));
        return ExactNumber.of(product.doubleValue());
    }

    /**
     * What a number in one unit is multiplied by to get it in another.
     *
     * @throws InvalidModelException if a unit is not known or the two do not fit
     */
    public static double factor(String from, String to, UnitSystem system) {
        UnitExpression own = UnitExpression.parse(from);
        UnitExpression wanted = UnitExpression.parse(to);
        Dimension dimension = wanted.dimension();
        if (!own.fits(system, dimension)) {
            throw new InvalidModelException(
                    "the unit '%s' does not fit here".formatted(Typed.shortened(from)),
                    "",
                    wanted.pure() ? "leave it out: the number is pure" : "use a unit like '%s'".formatted(to));
        }
        return own.factorTo(system, dimension) / wanted.factorTo(system, dimension);
    }
}
