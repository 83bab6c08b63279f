package org.wellwright.solver.potential.family;

import java.util.List;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.Interval;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;

/**
 * A potential in closed form whose stationary radii are known, so that its extremes over an interval are those of a few
 * points: sharp up to the rounding bound.
 */
abstract class ClosedForm implements TermEvaluator {
    private static final double[] NONE = {};

    private final String family;

    /** The bound values. */
    final double[] p;

    ClosedForm(String family, double[] values) {
        this.family = family;
        this.p = values;
    }

    /** All radii in (0, ∞) where V stops rising or falling, in any order; none for a monotone V. */
    double[] stationaryRadii() {
        return NONE;
    }

    @Override
    public final String canonical() {
        StringBuilder text = new StringBuilder(family).append('(');
        for (int i = 0; i < p.length; i++) {
            text.append(i == 0 ? "" : ",").append(Double.toHexString(p[i]));
        }
        return text.append(')').toString();
    }

    @Override
    public final int parameterCount() {
        return p.length;
    }

    @Override
    public List<BreakPoint> breakPoints() {
        return List.of();
    }

    @Override
    public Interval enclose(double from, double to) {
        Interval hull = at(from).hull(to == Double.POSITIVE_INFINITY ? atInfinity() : at(to));
        for (double radius : stationaryRadii()) {
            // A computed radius may be off by some roundings; V there differs in second order only, below its rounding
            // bound.
            if (from < radius * (1 + 1e-14) && radius * (1 - 1e-14) < to) {
                hull = hull.hull(at(radius));
            }
        }
        return hull;
    }

    final Interval at(double r) {
        return Interval.around(value(r), roundingBound(r));
    }

    private Interval atInfinity() {
        TailBehaviour tail = tail();
        if (tail.rises()) {
            return new Interval(Double.MAX_VALUE, Double.POSITIVE_INFINITY);
        }
        if (tail.falls()) {
            return new Interval(Double.NEGATIVE_INFINITY, -Double.MAX_VALUE);
        }
        return tail.known() ? Interval.of(tail.limit()) : Interval.ENTIRE;
    }
}
