package org.wellwright.solver.radial.steps;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.ChannelTerm;
import org.wellwright.solver.radial.RadialProblem;

/**
 * V(r) of an uncoupled problem as this method sees it: every term and the channel's threshold in one sum. Counts its
 * evaluations; used by one thread.
 */
final class ScalarPotential implements SampledPotential {
    private final List<TermEvaluator> terms = new ArrayList<>();
    private final double shift;
    private final double[] breaks;
    private final OriginBehaviour origin;
    private final TailBehaviour tail;
    private double[] scratch = new double[32];
    private double cutRadius = Double.POSITIVE_INFINITY;
    private double cutValue;
    private long evaluations;

    ScalarPotential(RadialProblem problem) {
        terms.add(problem.common());
        for (ChannelTerm term : problem.rest()) {
            terms.add(term.potential());
        }
        shift = problem.channels().get(0).threshold();
        TreeSet<Double> radii = new TreeSet<>();
        OriginBehaviour start = OriginBehaviour.FINITE;
        TailBehaviour end = TailBehaviour.constant(shift);
        for (TermEvaluator term : terms) {
            for (BreakPoint point : term.breakPoints()) {
                if (point.radius() > problem.innerWall() && point.radius() < problem.outerWall()) {
                    radii.add(point.radius());
                }
            }
            start = start.plus(term.origin());
            end = end.plus(term.tail());
        }
        breaks = new double[radii.size()];
        int n = 0;
        for (double radius : radii) {
            breaks[n++] = radius;
        }
        origin = start;
        tail = end;
    }

    @Override
    public void values(double[] radii, double[] into, int count) {
        evaluations += count;
        if (scratch.length < count) {
            scratch = new double[count];
        }
        terms.get(0).values(radii, into, count);
        for (int t = 1; t < terms.size(); t++) {
            terms.get(t).values(radii, scratch, count);
            for (int i = 0; i < count; i++) {
                into[i] += scratch[i];
            }
        }
        for (int i = 0; i < count; i++) {
            into[i] = radii[i] > cutRadius ? cutValue : into[i] + shift;
        }
    }

    @Override
    public double value(double radius) {
        double[] into = new double[1];
        values(new double[] {radius}, into, 1);
        return into[0];
    }

    @Override
    public void cutAt(double radius, double value) {
        cutRadius = radius;
        cutValue = value;
    }

    /** A bound on the rounding inside V(radius), energy. */
    @Override
    public double roundingBound(double radius) {
        double sum = 0;
        for (TermEvaluator term : terms) {
            sum += term.roundingBound(radius);
        }
        return radius > cutRadius ? 0 : sum;
    }

    /** First break point above {@code radius}, +∞ if there is none. */
    double breakAbove(double radius) {
        for (double point : breaks) {
            if (point > radius) {
                return point;
            }
        }
        return radius < cutRadius ? cutRadius : Double.POSITIVE_INFINITY;
    }

    /** Last break point below {@code radius}, 0 if there is none. */
    double breakBelow(double radius) {
        for (int i = breaks.length - 1; i >= 0; i--) {
            if (breaks[i] < radius) {
                return breaks[i];
            }
        }
        return 0;
    }

    @Override
    public double[] breaks() {
        return breaks;
    }

    OriginBehaviour origin() {
        return origin;
    }

    @Override
    public TailBehaviour tail() {
        return tail;
    }

    long evaluations() {
        return evaluations;
    }
}
