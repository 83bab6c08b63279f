package org.wellwright.solver.model;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyCatalogue;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.Formula;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.RangedTerm;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.potential.Term;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.UnitExpression;

/**
 * Puts the numbers of the pool, converted to the unit system, into terms. Keeps parsed formulas; otherwise immutable.
 */
final class TermBinder {
    private final ParameterPool pool;
    private final Map<String, Formula> formulas = new HashMap<>();

    TermBinder(ParameterPool pool) {
        this.pool = pool;
    }

    /**
     * A term in a place.
     *
     * @param angular matrix element of the term's angular operator
     * @param facts what the term may know of the channel
     */
    BoundTerm bind(Term term, Place place, ChannelFacts facts, double angular, double[] values) {
        BoundTerm shape = shape(term, place, facts, values);
        TermFrame frame = term.frame();
        PoolValue scale = argument(frame.scale(), place, Dimension.NONE, values);
        PoolValue from = argument(frame.from(), place, Dimension.LENGTH, values);
        PoolValue to = argument(frame.to(), place, Dimension.LENGTH, values);
        boolean dependent = shape.channelDependent()
                || dependsOnChannel(frame.scale())
                || dependsOnChannel(frame.from())
                || dependsOnChannel(frame.to());
        if (angular == 1
                && frame.scale().equals(Argument.ONE)
                && frame.from().equals(Argument.ZERO)
                && frame.to().equals(Argument.UNBOUNDED)) {
            return new BoundTerm(shape.evaluator(), shape.parameters(), dependent);
        }
        if (!(from.value() >= 0 && to.value() > from.value()) || !Double.isFinite(scale.value())) {
            throw new InvalidModelException(
                    "a range needs 0 <= from < to and a finite scale, got %s, %s, %s"
                            .formatted(from.value(), to.value(), scale.value()),
                    "",
                    "change the range of the term");
        }
        List<PoolValue> parameters = new ArrayList<>(shape.parameters());
        PoolValue factor = scale.times(angular);
        parameters.add(factor);
        parameters.add(from);
        parameters.add(to);
        TermEvaluator ranged = new RangedTerm(shape.evaluator(), factor.value(), from.value(), to.value());
        return new BoundTerm(ranged, parameters, dependent);
    }

    /** An argument in the unit system's unit of a dimension. */
    PoolValue argument(Argument argument, Place place, Dimension expected, double[] values) {
        if (argument instanceof Argument.Named named) {
            return pool.value(named.parameter(), place, values, expected);
        }
        Argument.Literal literal = (Argument.Literal) argument;
        if (literal.unit().isEmpty()) {
            return PoolValue.constant(literal.value());
        }
        return PoolValue.constant(
                literal.value() * UnitExpression.parse(literal.unit()).factorTo(pool.units(), expected));
    }

    /** Whether an argument differs from channel to channel. */
    boolean dependsOnChannel(Argument argument) {
        return argument instanceof Argument.Named named && pool.dependsOnChannel(named.parameter());
    }

    private BoundTerm shape(Term term, Place place, ChannelFacts facts, double[] values) {
        if (term instanceof FamilyTerm family) {
            return family(family, place, facts, values);
        }
        if (term instanceof FormulaTerm formula) {
            return formula(formula, place, facts, values);
        }
        return new TableBinding(this, pool.units(), (TableTerm) term, place, values).bind();
    }

    private BoundTerm family(FamilyTerm term, Place place, ChannelFacts facts, double[] values) {
        PotentialFamily family = FamilyCatalogue.require(term.family());
        boolean dependent = family.dependsOnChannel();
        List<PoolValue> parameters = new ArrayList<>();
        for (FamilyParameter parameter : family.parameters()) {
            Argument argument = term.arguments().get(parameter.name());
            if (argument == null) {
                throw new InvalidModelException(
                        "the family '%s' needs a value for '%s'".formatted(family.id(), parameter.name()),
                        "",
                        "give it a number or a parameter");
            }
            dependent |= dependsOnChannel(argument);
            parameters.add(argument(argument, place, parameter.dimension(), values));
        }
        return new BoundTerm(family.bind(numbers(parameters), facts), parameters, dependent);
    }

    private BoundTerm formula(FormulaTerm term, Place place, ChannelFacts facts, double[] values) {
        Formula formula = formulas.computeIfAbsent(term.text(), FormulaText::parse);
        boolean dependent = formula.dependsOnChannel();
        List<PoolValue> parameters = new ArrayList<>();
        for (String name : formula.names()) {
            Argument argument = term.argument(name);
            dependent |= dependsOnChannel(argument);
            parameters.add(formulaArgument(argument, place, values));
        }
        return new BoundTerm(formula.bind(numbers(parameters), facts), parameters, dependent);
    }

    private PoolValue formulaArgument(Argument argument, Place place, double[] values) {
        if (argument instanceof Argument.Named named) {
            return pool.formulaValue(named.parameter(), place, values);
        }
        Argument.Literal literal = (Argument.Literal) argument;
        UnitExpression unit = UnitExpression.parse(literal.unit());
        return PoolValue.constant(literal.value() * unit.factorTo(pool.units(), unit.dimension()));
    }

    private static double[] numbers(List<PoolValue> parameters) {
        double[] numbers = new double[parameters.size()];
        for (int i = 0; i < numbers.length; i++) {
            numbers[i] = parameters.get(i).value();
        }
        return numbers;
    }

    /** The same fault with the place of the term before it. */
    static InvalidModelException located(WellwrightException fault, String where) {
        String inner = fault.problem().where();
        return new InvalidModelException(
                fault.problem().what(),
                inner.isEmpty() ? where : where + ", " + inner,
                fault.problem().remedy());
    }
}
