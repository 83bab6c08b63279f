package org.wellwright.solver.model;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.InnerContinuation;
import org.wellwright.solver.potential.OuterContinuation;
import org.wellwright.solver.potential.TableKnot;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.potential.table.TabulatedPotential;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/** Puts the numbers of a table, from its own units or the pool, into the unit system. */
final class TableBinding {
    private final TermBinder binder;
    private final TableTerm term;
    private final Place place;
    private final double[] values;
    private final double lengthFactor;
    private final double energyFactor;
    private boolean dependent;

    TableBinding(TermBinder binder, UnitSystem units, TableTerm term, Place place, double[] values) {
        this.binder = binder;
        this.term = term;
        this.place = place;
        this.values = values;
        this.lengthFactor = factor(term.radiusUnit(), units, Dimension.LENGTH);
        this.energyFactor = factor(term.valueUnit(), units, Dimension.ENERGY);
    }

    /** The evaluator: its parameters are the values at the knots, then steepness, limit, coefficient, exponent. */
    BoundTerm bind() {
        int count = term.knots().size();
        double[] radii = new double[count];
        double[] heights = new double[count];
        List<PoolValue> parameters = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            TableKnot knot = term.knots().get(i);
            radii[i] = knot.radius() * lengthFactor;
            PoolValue height = number(knot.value(), Dimension.ENERGY, PoolValue.constant(energyFactor));
            heights[i] = height.value();
            parameters.add(height);
        }
        boolean exponential = term.inner().kind() == InnerContinuation.Kind.EXPONENTIAL;
        PoolValue steepness = number(
                term.inner().steepness(),
                exponential ? Dimension.LENGTH.power(-1) : Dimension.NONE,
                PoolValue.constant(exponential ? 1 / lengthFactor : 1));
        OuterContinuation outer = term.outer();
        PoolValue limit = number(outer.limit(), Dimension.ENERGY, PoolValue.constant(energyFactor));
        PoolValue exponent = number(outer.exponent(), Dimension.NONE, PoolValue.constant(1));
        PoolValue coefficient = coefficient(outer, exponent);
        parameters.addAll(List.of(steepness, limit, coefficient, exponent));
        TabulatedPotential table = TabulatedPotential.of(
                radii,
                heights,
                term.interpolation(),
                new TabulatedPotential.Inner(term.inner().kind(), steepness.value()),
                new TabulatedPotential.Outer(outer.kind(), limit.value(), coefficient.value(), exponent.value()));
        return new BoundTerm(table, parameters, dependent);
    }

    /**
     * The tail's coefficient, energy·length^n: a number in the table's units scales with the exponent n, a parameter
     * has its own unit.
     */
    private PoolValue coefficient(OuterContinuation outer, PoolValue exponent) {
        double n = exponent.value();
        if (outer.coefficient() instanceof Argument.Named || !unitless(outer.coefficient())) {
            if (n != Math.rint(n) || n > 40) {
                throw new InvalidModelException(
                        "a tail of exponent %s needs its coefficient as a number in the table's units".formatted(n),
                        "",
                        "type the number, or make the exponent an integer");
            }
            Dimension dimension = Dimension.ENERGY.times(Dimension.LENGTH.power((int) n));
            return number(outer.coefficient(), dimension, PoolValue.constant(1));
        }
        double scale = Math.pow(lengthFactor, n);
        PoolValue factor = PoolValue.chained(energyFactor * scale, new PoolValue[] {exponent}, new double[] {
            energyFactor * scale * Math.log(lengthFactor)
        });
        return number(outer.coefficient(), Dimension.NONE, factor);
    }

    private static boolean unitless(Argument argument) {
        return argument instanceof Argument.Literal literal && literal.unit().isEmpty();
    }

    /** A parameter or a number with a unit in the unit system; a bare number times {@code bare}. */
    private PoolValue number(Argument argument, Dimension dimension, PoolValue bare) {
        dependent |= binder.dependsOnChannel(argument);
        return unitless(argument)
                ? bare.times(((Argument.Literal) argument).value())
                : binder.argument(argument, place, dimension, values);
    }

    private static double factor(String unit, UnitSystem units, Dimension dimension) {
        return unit.isEmpty() ? 1 : UnitExpression.parse(unit).factorTo(units, dimension);
    }
}
