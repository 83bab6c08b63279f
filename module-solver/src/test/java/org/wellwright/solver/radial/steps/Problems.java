package org.wellwright.solver.radial.steps;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.Interval;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.RadialChannel;
import org.wellwright.solver.radial.RadialProblem;

/** Problems for the tests of the second method. */
final class Problems {
    private Problems() {}

    /** V from a formula, one channel. */
    static RadialProblem formula(String text, double kinetic, int orbital) {
        ChannelFacts channel = ChannelFacts.ofOrbital(orbital);
        return RadialProblem.single(kinetic, orbital, FormulaText.parse(text).bind(new double[0], channel));
    }

    /** V from a function of which nothing else is known; edges are jumps. */
    static TermEvaluator unknown(DoubleUnaryOperator v, double... edges) {
        return new Function("function", v, OriginBehaviour.UNKNOWN, TailBehaviour.UNKNOWN, jumps(edges));
    }

    /** A well or barrier of constant height between two radii. */
    static TermEvaluator shell(double height, double from, double to) {
        List<BreakPoint> edges = from > 0 ? jumps(from, to) : jumps(to);
        DoubleUnaryOperator v = r -> r >= from && r < to ? height : 0;
        return new Function("shell", v, OriginBehaviour.FINITE, TailBehaviour.ZERO, edges);
    }

    /** One channel of V with an inner and an outer hard wall. */
    static RadialProblem walled(TermEvaluator v, double kinetic, int orbital, double inner, double outer) {
        return new RadialProblem(kinetic, List.of(RadialChannel.of(orbital)), v, List.of(), inner, outer);
    }

    private static List<BreakPoint> jumps(double... radii) {
        return java.util.Arrays.stream(radii)
                .mapToObj(r -> new BreakPoint(r, BreakPoint.Kind.JUMP, Double.NaN, List.of()))
                .toList();
    }

    private record Function(
            String canonical,
            DoubleUnaryOperator v,
            OriginBehaviour origin,
            TailBehaviour tail,
            List<BreakPoint> breakPoints)
            implements TermEvaluator {
        @Override
        public int parameterCount() {
            return 0;
        }

        @Override
        public double value(double r) {
            return v.applyAsDouble(r);
        }

        @Override
        public double slope(double r) {
            throw new UnsupportedOperationException("the second method needs V alone");
        }

        @Override
        public double parameterDerivative(int parameter, double r) {
            throw new UnsupportedOperationException("the second method needs V alone");
        }

        @Override
        public Interval enclose(double from, double to) {
            return Interval.ENTIRE;
        }

        @Override
        public double roundingBound(double r) {
            return 0;
        }
    }
}
