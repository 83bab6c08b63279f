package org.wellwright.solver.potential.formula;

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

    private static final int MAX_SPLITS = 8;
    private static final double NEAR = 1.01;

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

    static Interval enclose(BoundFormula formula, double from, double to) {
        return enclose(formula, from, to, MAX_SPLITS);
    }

    /** Splits the range where V is not surely monotone, until the bounds are near values that V takes. */
    private static Interval enclose(BoundFormula formula, double from, double to, int splits) {
        Program program = formula.program();
        IntervalPass pass = new IntervalPass(program, new Interval(from, to), program.root());
        Interval bounds = pass.value[pass.root];
        Interval slope = pass.slope[pass.root];
        Interval first = at(formula, from);
        if (from == to) {
            return bounds.meet(first);
        }
        boolean endless = to == Double.POSITIVE_INFINITY;
        Interval ends = first.hull(endless ? atInfinity(formula.tail(), formula.value(from)) : at(formula, to));
        if (slope.lower() >= 0 || slope.upper() <= 0) {
            return bounds.meet(ends);
        }
        double middle = endless ? 2 * from : from + (to - from) / 2;
        if (slope.isBounded() && !endless) {
            Interval away = new Interval(from, to).minus(Interval.of(middle));
            bounds = bounds.meet(at(formula, middle).plus(slope.times(away)));
        }
        boolean near = bounds.width() <= NEAR * ends.hull(at(formula, middle)).width();
        if (splits == 0 || near || !(from < middle && middle < to)) {
            return bounds;
        }
        Interval parts = enclose(formula, from, middle, splits - 1).hull(enclose(formula, middle, to, splits - 1));
        return bounds.meet(parts);
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
            case SPHERICAL_BESSEL -> SpecialFunctions.sphericalBesselSlope((int) a.lower(), b).times(db);
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
