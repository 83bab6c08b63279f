package org.wellwright.solver.potential.family;

import java.util.List;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.Formula;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.potential.formula.InfixLanguage;

/**
 * A family that is computed by its own formula, in the symbols of its parameters. Derivatives, bounds, behaviour at
 * both ends and break points come from the formula.
 */
abstract class FormulaFamily extends BuiltInFamily {
    private volatile Formula parsed;

    FormulaFamily(Description description, FamilyParameter... parameters) {
        super(description, parameters);
    }

    /** Refuses values outside the family's domain. */
    abstract void check(double[] values);

    @Override
    final TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        check(values);
        return finished(parsed().bind(values, channel), values);
    }

    /** The evaluator from that of the formula. */
    TermEvaluator finished(TermEvaluator formula, double[] values) {
        return formula;
    }

    private Formula parsed() {
        if (parsed == null) {
            List<String> symbols =
                    parameters().stream().map(FamilyParameter::symbol).toList();
            Formula formula = new InfixLanguage().parse(formula(), symbols);
            if (!formula.names().equals(symbols)) {
                throw new IllegalStateException(
                        "the formula of %s has the names %s, not %s".formatted(id(), formula.names(), symbols));
            }
            parsed = formula;
        }
        return parsed;
    }
}
