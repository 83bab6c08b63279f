package org.wellwright.solver.potential.formula;

import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.formula.PowerLogSeries.Order;
import org.wellwright.solver.potential.formula.PowerLogSeries.Term;

/** Finds how a formula starts at the origin and ends at infinity, from the leading terms of its parts. */
final class AsymptotePass {
    private AsymptotePass() {}

    /** V at r → 0, with t = 1/r. */
    static OriginBehaviour origin(Program program) {
        Asymptote v = run(program, -1);
        if (v == null || v.trend() > 0) {
            return OriginBehaviour.UNKNOWN;
        }
        PowerLogSeries series = v.plain();
        double inverseSquare = 0;
        Term lead = null;
        for (Term term : series.terms()) {
            boolean square =
                    Math.abs(term.order().power() - 2) <= 1e-12 && term.order().logs() == 0;
            if (square) {
                inverseSquare = term.coefficient();
            } else if (term.order().power() > 1e-12 && lead == null) {
                lead = term;
            }
        }
        if (lead != null && lead.order().power() > 2 + 1e-12) {
            inverseSquare = 0; // what a stronger core hides
        }
        boolean hidden = series.remainder().power() > 1e-12;
        if (lead == null) {
            return new OriginBehaviour(inverseSquare, 0, 0, !hidden);
        }
        return new OriginBehaviour(
                inverseSquare,
                -lead.order().power(),
                lead.coefficient(),
                !hidden && lead.order().logs() == 0);
    }

    /** V at r → ∞, with t = r. */
    static TailBehaviour tail(Program program) {
        Asymptote v = run(program, 1);
        if (v == null) {
            return TailBehaviour.UNKNOWN;
        }
        if (v.trend() > 0) {
            Integer sign = v.sign();
            return sign == null ? TailBehaviour.UNKNOWN : new TailBehaviour(0, Double.POSITIVE_INFINITY, sign, true);
        }
        PowerLogSeries series = v.plain();
        double limit = 0;
        Term lead = null;
        for (Term term : series.terms()) {
            if (term.order().compareTo(Order.CONSTANT) == 0) {
                limit = term.coefficient();
            } else if (lead == null) {
                lead = term;
            }
        }
        if (lead != null && lead.order().compareTo(Order.CONSTANT) > 0) {
            double power =
                    Math.abs(lead.order().power()) <= 1e-12 ? 0 : lead.order().power();
            return new TailBehaviour(0, power, lead.coefficient(), true);
        }
        if (series.remainder().compareTo(Order.CONSTANT) >= 0) {
            return TailBehaviour.UNKNOWN;
        }
        if (lead == null) {
            return new TailBehaviour(
                    limit, Double.NEGATIVE_INFINITY, 0, series.remainder().isNone());
        }
        boolean plain = lead.order().logs() == 0 && lead.order().power() < -1e-12;
        return new TailBehaviour(limit, lead.order().power(), lead.coefficient(), plain);
    }

    /** The root's leading behaviour for r = t^power; null if unknown. */
    private static Asymptote run(Program program, int power) {
        Graph graph = program.graph();
        Asymptote[] x = new Asymptote[program.size()];
        for (int i = 0; i < x.length; i++) {
            if (!program.varies(i)) {
                x[i] = Asymptote.constant(program.constant(i));
            } else if (graph.operation(i) == Operation.RADIUS) {
                x[i] = Asymptote.of(PowerLogSeries.term(1, power, 0));
            } else {
                Asymptote a = x[graph.left(i)];
                Asymptote b = graph.operation(i).arity() == 2 ? x[graph.right(i)] : a;
                x[i] = a == null || b == null ? null : apply(program, i, a, b);
            }
        }
        return x[program.root()];
    }

    private static Asymptote apply(Program program, int node, Asymptote a, Asymptote b) {
        Graph graph = program.graph();
        return switch (graph.operation(node)) {
            case ADD -> a.plus(b);
            case SUBTRACT -> a.plus(b.negate());
            case MULTIPLY -> a.times(b);
            case DIVIDE -> times(a, b.power(-1));
            case NEGATE -> a.negate();
            case POWER ->
                program.varies(graph.right(node))
                        ? exp(times(b, a.ln()))
                        : a.power(program.constant(graph.right(node)));
            case EXP -> a.exp();
            case EXPM1 -> minusOne(a);
            case LN -> a.ln();
            case LOG1P -> Asymptote.constant(1).plus(a).ln();
            case SQRT -> a.power(0.5);
            case SIN -> sine(a, 0);
            case COS -> sine(a, 1);
            case TAN ->
                Double.isNaN(a.limit()) ? null : times(sine(a, 0), sine(a, 1).power(-1));
            case ASIN -> Math.abs(a.limit()) < 1 ? a.compose(Taylor.asin(a.limit())) : null;
            case ACOS ->
                Math.abs(a.limit()) < 1
                        ? Asymptote.constant(Math.PI / 2)
                                .plus(a.compose(Taylor.asin(a.limit())).negate())
                        : null;
            case ATAN -> atan(a);
            case SINH -> hyperbolic(a, -1);
            case COSH -> hyperbolic(a, 1);
            case TANH ->
                Math.abs(a.limit()) < 300 ? times(hyperbolic(a, -1), inverse(hyperbolic(a, 1))) : saturated(a, -1, 1);
            case ERF -> Double.isNaN(a.limit()) ? saturated(a, -1, 1) : a.compose(Taylor.erf(a.limit()));
            case ERFC ->
                Double.isNaN(a.limit())
                        ? saturated(a, 2, 0)
                        : Asymptote.constant(1)
                                .plus(a.compose(Taylor.erf(a.limit())).negate());
            case DAMP -> damp(a, b);
            case SPHERICAL_BESSEL -> sphericalBessel(a, b);
            case ABS -> a.sign() == null ? null : a.sign() < 0 ? a.negate() : a;
            case STEP -> a.sign() == null ? null : Asymptote.constant(a.sign() < 0 ? 0 : 1);
            case MIN -> larger(a, b) == null ? null : larger(a, b) > 0 ? b : a;
            case MAX -> larger(a, b) == null ? null : larger(a, b) > 0 ? a : b;
            default -> null;
        };
    }

    private static Asymptote times(Asymptote a, Asymptote b) {
        return a == null || b == null ? null : a.times(b);
    }

    private static Asymptote inverse(Asymptote a) {
        return a == null ? null : a.power(-1);
    }

    private static Asymptote exp(Asymptote a) {
        return a == null ? null : a.exp();
    }

    private static Asymptote minusOne(Asymptote a) {
        Asymptote e = a.exp();
        return e == null ? null : e.plus(Asymptote.constant(-1));
    }

    private static Asymptote sine(Asymptote a, int shift) {
        return Double.isNaN(a.limit()) ? Asymptote.BOUNDED : a.compose(Taylor.sine(a.limit(), shift));
    }

    private static Asymptote hyperbolic(Asymptote a, int sign) {
        Asymptote plus = a.exp();
        Asymptote minus = a.negate().exp();
        if (plus == null || minus == null) {
            return null;
        }
        return plus.plus(sign > 0 ? minus : minus.negate()).times(Asymptote.constant(0.5));
    }

    private static Asymptote atan(Asymptote a) {
        if (!Double.isNaN(a.limit())) {
            return a.compose(Taylor.atan(a.limit()));
        }
        Integer sign = a.sign();
        Asymptote inverse = a.power(-1);
        if (sign == null || inverse == null || Double.isNaN(inverse.limit())) {
            return Asymptote.BOUNDED;
        }
        return Asymptote.constant(sign * Math.PI / 2)
                .plus(inverse.compose(Taylor.atan(0)).negate());
    }

    /** A function that reaches its limits exponentially fast, of an argument that grows without limit. */
    private static Asymptote saturated(Asymptote a, double below, double above) {
        boolean grows = Math.abs(a.limit()) >= 300
                || a.trend() > 0
                || a.series().hasLead() && a.series().lead().order().power() > 1e-12;
        if (!grows || a.sign() == null) {
            return Asymptote.BOUNDED;
        }
        return Asymptote.of(
                PowerLogSeries.constant(a.sign() < 0 ? below : above).inexact());
    }

    private static Asymptote damp(Asymptote order, Asymptote x) {
        int n = (int) order.limit();
        if (Double.isNaN(x.limit())) {
            return x.sign() == null || x.sign() < 0 ? null : saturated(x, Double.NaN, 1);
        }
        return x.limit() == 0 ? times(x.power(n + 1.0), x.compose(Taylor.damp(n))) : null;
    }

    private static Asymptote sphericalBessel(Asymptote order, Asymptote x) {
        int n = (int) order.limit();
        if (Double.isNaN(x.limit())) {
            return times(Asymptote.BOUNDED, x.power(-1));
        }
        return x.limit() == 0 ? times(x.power(n), x.compose(Taylor.sphericalBessel(n))) : null;
    }

    private static Integer larger(Asymptote a, Asymptote b) {
        return a.plus(b.negate()).sign();
    }
}
