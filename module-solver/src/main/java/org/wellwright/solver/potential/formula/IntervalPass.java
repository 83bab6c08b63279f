package org.wellwright.solver.potential.formula;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.potential.Interval;
import org.wellwright.solver.potential.IntervalFunctions;
import org.wellwright.solver.potential.TailBehaviour;

/**
 * Encloses V over a range of radii: the natural extension of the formula, cut down where the enclosed slope allows it
 * to the values at both ends (monotone V) or to the mean-value form V(m) + V′([a, b])·([a, b] − m) (Moore 1966).
 */
final class IntervalPass {
    private static final Interval TWO_OVER_ROOT_PI =
            new Interval(Math.nextDown(1.1283791670955126), Math.nextUp(1.1283791670955126));

    private static final int MAX_SPLITS = 150;
    private static final double NEAR = 0.005;

    private final Graph graph;
    private final Interval[] value;
    private final Interval[] slope;
    private final int root;

    private IntervalPass(Program program, Interval r, int last) {
        this.graph = program.graph();
        int n = last + 1;
        this.root = last;
        this.value = new Interval[n];
        this.slope = new Interval[n];
        for (int i = 0; i < n; i++) {
            if (!program.varies(i)) {
                value[i] = Interval.around(program.constant(i), program.errorOf(i));
                slope[i] = Interval.ZERO;
            } else if (graph.operation(i) == Operation.RADIUS) {
                value[i] = r;
                slope[i] = Interval.of(1);
            } else {
                int left = graph.left(i);
                int right = graph.operation(i).arity() == 2 ? graph.right(i) : left;
                value[i] = apply(graph.operation(i), value[left], value[right], left == right);
                slope[i] = slope(i, left, right);
            }
        }
    }

    /** The natural extension up to node {@code last}, for the search of break points. */
    static IntervalPass upTo(Program program, Interval r, int last) {
        return new IntervalPass(program, r, last);
    }

    Interval value(int node) {
        return value[node];
    }

    Interval slope(int node) {
        return slope[node];
    }

    /** A part of the range, what is known of V there, and whether splitting it could still help. */
    private record Part(double from, double to, Interval bounds, boolean open) {}

    /**
     * Bounds of V over a range. The parts that decide the bounds are split until the bounds are near values that V
     * takes, or the effort is spent.
     */
    static Interval enclose(BoundFormula formula, double from, double to) {
        List<Part> parts = new ArrayList<>();
        parts.add(part(formula, from, to));
        Interval taken = taken(formula, from, to);
        for (int split = 0; split < MAX_SPLITS; split++) {
            int lowest = 0;
            int highest = 0;
            for (int i = 1; i < parts.size(); i++) {
                lowest = parts.get(i).bounds.lower() < parts.get(lowest).bounds.lower() ? i : lowest;
                highest =
                        parts.get(i).bounds.upper() > parts.get(highest).bounds.upper() ? i : highest;
            }
            double allowed = NEAR * taken.width();
            boolean lowOpen = parts.get(lowest).open
                    && !(taken.lower() - parts.get(lowest).bounds.lower() <= allowed);
            boolean highOpen =
                    parts.get(highest).open && !(parts.get(highest).bounds.upper() - taken.upper() <= allowed);
            if (!lowOpen && !highOpen) {
                break;
            }
            Part worst = parts.remove(lowOpen ? lowest : highest);
            double middle = middle(worst.from, worst.to);
            parts.add(part(formula, worst.from, middle));
            parts.add(part(formula, middle, worst.to));
            taken = taken.hull(at(formula, middle));
        }
        Interval hull = parts.get(0).bounds;
        for (Part part : parts) {
            hull = hull.hull(part.bounds);
        }
        return hull;
    }

    private static double middle(double from, double to) {
        return to == Double.POSITIVE_INFINITY
                ? 2 * from
                : to > 4 * from ? Math.sqrt(from) * Math.sqrt(to) : from + (to - from) / 2;
    }

    private static Interval taken(BoundFormula formula, double from, double to) {
        return at(formula, from).hull(at(formula, to == Double.POSITIVE_INFINITY ? 2 * from : to));
    }

    private static Part part(BoundFormula formula, double from, double to) {
        Program program = formula.program();
        IntervalPass pass = new IntervalPass(program, new Interval(from, to), program.root());
        Interval bounds = pass.value[pass.root];
        Interval slope = pass.slope[pass.root];
        Interval first = at(formula, from);
        if (from == to) {
            return new Part(from, to, bounds.meet(first), false);
        }
        boolean endless = to == Double.POSITIVE_INFINITY;
        if (slope.lower() >= 0 || slope.upper() <= 0) {
            Interval last = endless ? atInfinity(formula.tail(), formula.value(from)) : at(formula, to);
            return new Part(from, to, bounds.meet(first.hull(last)), false);
        }
        if (slope.isBounded() && !endless) {
            double middle = from + (to - from) / 2;
            Interval away = new Interval(from, to).minus(Interval.of(middle));
            bounds = bounds.meet(at(formula, middle).plus(slope.times(away)));
        }
        double middle = middle(from, to);
        return new Part(from, to, bounds, from < middle && middle < to);
    }

    private static Interval at(BoundFormula formula, double r) {
        return Interval.around(formula.value(r), formula.roundingBound(r));
    }

    /** The limit, widened by far more than its own rounding. */
    private static Interval atInfinity(TailBehaviour tail, double near) {
        if (!tail.known()) {
            return Interval.ENTIRE;
        }
        if (tail.rises()) {
            return new Interval(Double.MAX_VALUE, Double.POSITIVE_INFINITY);
        }
        if (tail.falls()) {
            return new Interval(Double.NEGATIVE_INFINITY, -Double.MAX_VALUE);
        }
        return Interval.around(tail.limit(), 1e-10 * (Math.abs(tail.limit()) + Math.abs(near)));
    }

    static Interval apply(Operation operation, Interval a, Interval b, boolean same) {
        return switch (operation) {
            case ADD -> a.plus(b);
            case SUBTRACT -> a.minus(b);
            case MULTIPLY -> same ? IntervalFunctions.power(a, 2) : a.times(b);
            case DIVIDE -> a.over(b);
            case NEGATE -> a.negate();
            case POWER -> IntervalFunctions.power(a, b);
            case EXP -> IntervalFunctions.exp(a);
            case EXPM1 -> IntervalFunctions.expm1(a);
            case LN -> IntervalFunctions.ln(a);
            case LOG1P -> IntervalFunctions.log1p(a);
            case SQRT -> IntervalFunctions.sqrt(a);
            case SIN -> IntervalFunctions.sin(a);
            case COS -> IntervalFunctions.cos(a);
            case TAN -> IntervalFunctions.tan(a);
            case ASIN -> IntervalFunctions.asin(a);
            case ACOS -> IntervalFunctions.acos(a);
            case ATAN -> IntervalFunctions.atan(a);
            case SINH -> IntervalFunctions.sinh(a);
            case COSH -> IntervalFunctions.cosh(a);
            case TANH -> IntervalFunctions.tanh(a);
            case ERF -> IntervalFunctions.erf(a);
            case ERFC -> IntervalFunctions.erfc(a);
            case ABS -> a.abs();
            case STEP -> IntervalFunctions.step(a);
            case DAMP -> SpecialFunctions.damp((int) a.lower(), b);
            case SPHERICAL_BESSEL -> SpecialFunctions.sphericalBessel((int) a.lower(), b);
            case MIN -> a.min(b);
            case MAX -> a.max(b);
            default -> throw new IllegalArgumentException(operation + " has no operands");
        };
    }

    /** The enclosed slope of node i; every number where it jumps. */
    private Interval slope(int i, int left, int right) {
        Operation operation = graph.operation(i);
        Interval a = value[left];
        Interval b = value[right];
        Interval da = slope[left];
        Interval db = slope[right];
        Interval v = value[i];
        return switch (operation) {
            case ADD -> da.plus(db);
            case SUBTRACT -> da.minus(db);
            case MULTIPLY -> left == right ? a.times(da).times(2) : da.times(b).plus(a.times(db));
            case DIVIDE -> da.minus(v.times(db)).over(b);
            case NEGATE -> da.negate();
            case POWER -> powerSlope(a, b, v, da, db);
            case MIN, MAX -> {
                Interval difference = operation == Operation.MIN ? a.minus(b) : b.minus(a);
                yield difference.upper() < 0 ? da : difference.lower() > 0 ? db : da.hull(db);
            }
            case DAMP -> SpecialFunctions.dampSlope((int) a.lower(), b).times(db);
            case SPHERICAL_BESSEL ->
                SpecialFunctions.sphericalBesselSlope((int) a.lower(), b).times(db);
            case STEP -> a.contains(0) ? Interval.ENTIRE : Interval.ZERO;
            default -> da.lower() == 0 && da.upper() == 0 ? Interval.ZERO : da.times(partial(operation, a, v));
        };
    }

    private static Interval powerSlope(Interval a, Interval b, Interval v, Interval da, Interval db) {
        boolean integer = b.isPoint() && b.lower() == Math.rint(b.lower());
        if (a.lower() < 0 && !integer) {
            return Interval.ENTIRE;
        }
        Interval first =
                b.times(IntervalFunctions.power(a, b.minus(Interval.of(1)))).times(da);
        return db.lower() == 0 && db.upper() == 0
                ? first
                : first.plus(v.times(IntervalFunctions.ln(a)).times(db));
    }

    private static Interval partial(Operation operation, Interval a, Interval v) {
        Interval one = Interval.of(1);
        return switch (operation) {
            case EXP -> v;
            case EXPM1 -> IntervalFunctions.exp(a);
            case LN -> positive(a) ? one.over(a) : Interval.ENTIRE;
            case LOG1P -> positive(one.plus(a)) ? one.over(one.plus(a)) : Interval.ENTIRE;
            case SQRT -> positive(a) ? Interval.of(0.5).over(v) : Interval.ENTIRE;
            case SIN -> IntervalFunctions.cos(a);
            case COS -> IntervalFunctions.sin(a).negate();
            case TAN -> v.isBounded() ? one.plus(IntervalFunctions.power(v, 2)) : Interval.ENTIRE;
            case ASIN -> arc(a);
            case ACOS -> arc(a).negate();
            case ATAN -> one.over(one.plus(IntervalFunctions.power(a, 2)));
            case SINH -> IntervalFunctions.cosh(a);
            case COSH -> IntervalFunctions.sinh(a);
            case TANH -> one.over(IntervalFunctions.power(IntervalFunctions.cosh(a), 2));
            case ERF ->
                IntervalFunctions.exp(IntervalFunctions.power(a, 2).negate()).times(TWO_OVER_ROOT_PI);
            case ERFC ->
                IntervalFunctions.exp(IntervalFunctions.power(a, 2).negate())
                        .times(TWO_OVER_ROOT_PI)
                        .negate();
            case ABS -> a.lower() >= 0 ? one : a.upper() <= 0 ? Interval.of(-1) : new Interval(-1, 1);
            default -> Interval.ENTIRE;
        };
    }

    private static boolean positive(Interval x) {
        return x.lower() > 0;
    }

    private static Interval arc(Interval a) {
        Interval one = Interval.of(1);
        return a.lower() > -1 && a.upper() < 1
                ? one.over(IntervalFunctions.sqrt(one.minus(IntervalFunctions.power(a, 2))))
                : Interval.ENTIRE;
    }
}
