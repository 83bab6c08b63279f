package org.wellwright.solver.observable;

import java.util.List;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.ChannelTerm;
import org.wellwright.solver.radial.EnergyGradient;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialState;

/**
 * ⟨r^k⟩ of a level in one channel and its derivatives by everything in the problem.
 *
 * <p>d⟨r^k⟩/dp = −2 ⟨w| ∂H/∂p |u⟩, where (H − E) w = r^k u − ⟨r^k⟩ u with ⟨u|w⟩ = 0 (Dalgarno and Lewis 1955, Proc. R.
 * Soc. A 233, 70): one inhomogeneous equation per level, however many parameters there are.
 */
public final class RadialMoment {
    private RadialMoment() {}

    /**
     * ⟨r^k⟩, length^k.
     *
     * @param power k, above −(2l + 3)
     */
    public static double value(RadialState state, int power) {
        return state.expectation(r -> Math.pow(r, power));
    }

    /**
     * d⟨r^k⟩/dp for every p of the problem, in the shape of an energy's gradient; thresholds and the energy's zero do
     * not change it.
     *
     * @throws IllegalArgumentException if the problem has more than one channel
     */
    public static EnergyGradient gradient(RadialState state, int power) {
        RadialProblem problem = state.problem();
        if (problem.channels().size() != 1) {
            throw new IllegalArgumentException("a radial moment's gradient needs a single channel");
        }
        RadialState response = state.response((channel, r) -> Math.pow(r, power) * state.value(channel, r));
        double[] common = elements(problem.common(), state, response);
        List<ChannelTerm> terms = problem.rest();
        double[][] rest = new double[terms.size()][];
        for (int i = 0; i < rest.length; i++) {
            rest[i] = elements(terms.get(i).potential(), state, response);
        }
        // T u = (E − V) u, and w is orthogonal to u.
        double potential = state.overlap(0, response, 0, r -> potential(problem, r));
        double kinetic = 2 * potential / problem.kinetic();
        return new EnergyGradient(
                kinetic, common, rest, new double[] {0}, wall(state, response, true), wall(state, response, false));
    }

    private static double potential(RadialProblem problem, double r) {
        double sum = problem.common().value(r);
        for (ChannelTerm term : problem.rest()) {
            sum += term.potential().value(r);
        }
        return sum;
    }

    /** −2 ⟨w|∂V/∂p_j|u⟩ for each parameter of a term, its moving jumps included. */
    private static double[] elements(TermEvaluator term, RadialState state, RadialState response) {
        double[] elements = new double[term.parameterCount()];
        for (int j = 0; j < elements.length; j++) {
            int parameter = j;
            elements[j] = -2 * state.overlap(0, response, 0, r -> term.parameterDerivative(parameter, r));
        }
        for (BreakPoint point : term.breakPoints()) {
            if (point.jump() == 0 || point.radiusGradient().isEmpty()) {
                continue;
            }
            double density = state.value(0, point.radius()) * response.value(0, point.radius());
            for (int j = 0; j < elements.length; j++) {
                elements[j] +=
                        2 * point.jump() * density * point.radiusGradient().get(j);
            }
        }
        return elements;
    }

    private static double wall(RadialState state, RadialState response, boolean inner) {
        RadialProblem problem = state.problem();
        double radius = inner ? problem.innerWall() : problem.outerWall();
        boolean there = inner ? radius > 0 && state.innerRadius() == radius : state.outerRadius() == radius;
        if (!there) {
            return 0;
        }
        double slopes = state.slope(0, radius) * response.slope(0, radius);
        return (inner ? -2 : 2) * problem.kinetic() * slopes;
    }
}
