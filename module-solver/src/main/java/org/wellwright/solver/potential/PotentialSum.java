package org.wellwright.solver.potential;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;

/**
 * The sum of several terms, added in their order. Its parameters are those of the first term, then those of the second,
 * and so on.
 */
public final class PotentialSum implements TermEvaluator {
    private final List<TermEvaluator> terms;
    private final int[] starts;

    private PotentialSum(List<TermEvaluator> terms) {
        this.terms = List.copyOf(terms);
        this.starts = new int[terms.size() + 1];
        for (int i = 0; i < terms.size(); i++) {
            starts[i + 1] = starts[i] + terms.get(i).parameterCount();
        }
    }

    /** The sum; of no terms it is zero, of one term it is that term. */
    public static TermEvaluator of(List<? extends TermEvaluator> terms) {
        return terms.size() == 1 ? terms.get(0) : new PotentialSum(List.copyOf(terms));
    }

    /** The terms in order. */
    public List<TermEvaluator> terms() {
        return terms;
    }

    /** Index of the first parameter of term {@code i} among all. */
    public int firstParameter(int i) {
        return starts[i];
    }

    @Override
    public String canonical() {
        StringBuilder text = new StringBuilder("sum(");
        for (int i = 0; i < terms.size(); i++) {
            text.append(i == 0 ? "" : ",").append(terms.get(i).canonical());
        }
        return text.append(')').toString();
    }

    @Override
    public int parameterCount() {
        return starts[terms.size()];
    }

    @Override
    public double value(double r) {
        double sum = 0;
        for (TermEvaluator term : terms) {
            sum += term.value(r);
        }
        return sum;
    }

    @Override
    public void values(double[] radii, double[] into, int count) {
        double[] one = new double[count];
        for (int i = 0; i < count; i++) {
            into[i] = 0;
        }
        for (TermEvaluator term : terms) {
            term.values(radii, one, count);
            for (int i = 0; i < count; i++) {
                into[i] += one[i];
            }
        }
    }

    @Override
    public double slope(double r) {
        double sum = 0;
        for (TermEvaluator term : terms) {
            sum += term.slope(r);
        }
        return sum;
    }

    @Override
    public double parameterDerivative(int parameter, double r) {
        int i = 0;
        while (parameter >= starts[i + 1]) {
            i++;
        }
        return terms.get(i).parameterDerivative(parameter - starts[i], r);
    }

    @Override
    public List<BreakPoint> breakPoints() {
        List<BreakPoint> points = new ArrayList<>();
        for (int i = 0; i < terms.size(); i++) {
            for (BreakPoint point : terms.get(i).breakPoints()) {
                points.add(new BreakPoint(
                        point.radius(), point.kind(), point.jump(), placed(point.radiusGradient(), starts[i])));
            }
        }
        points.sort(Comparator.comparingDouble(BreakPoint::radius));
        return List.copyOf(points);
    }

    private List<Double> placed(List<Double> gradient, int start) {
        if (gradient.isEmpty()) {
            return gradient;
        }
        List<Double> all = new ArrayList<>(Collections.nCopies(parameterCount(), 0.0));
        for (int j = 0; j < gradient.size(); j++) {
            all.set(start + j, gradient.get(j));
        }
        return all;
    }

    @Override
    public Interval enclose(double from, double to) {
        Interval sum = Interval.ZERO;
        for (TermEvaluator term : terms) {
            sum = sum.plus(term.enclose(from, to));
        }
        return sum;
    }

    @Override
    public double roundingBound(double r) {
        double sum = 0;
        double bound = 0;
        for (TermEvaluator term : terms) {
            sum += term.value(r);
            bound += term.roundingBound(r) + Rounding.UNIT * Math.abs(sum);
        }
        return bound * Rounding.SLACK;
    }

    @Override
    public OriginBehaviour origin() {
        OriginBehaviour sum = OriginBehaviour.FINITE;
        for (TermEvaluator term : terms) {
            sum = sum.plus(term.origin());
        }
        return sum;
    }

    @Override
    public TailBehaviour tail() {
        TailBehaviour sum = TailBehaviour.ZERO;
        for (TermEvaluator term : terms) {
            sum = sum.plus(term.tail());
        }
        return sum;
    }

    @Override
    public HardWalls walls() {
        HardWalls tightest = HardWalls.NONE;
        for (int i = 0; i < terms.size(); i++) {
            HardWalls walls = terms.get(i).walls();
            boolean in = walls.inner() > tightest.inner();
            boolean out = walls.outer() < tightest.outer();
            tightest = new HardWalls(
                    in ? walls.inner() : tightest.inner(),
                    out ? walls.outer() : tightest.outer(),
                    in ? placed(walls.innerGradient(), starts[i]) : tightest.innerGradient(),
                    out ? placed(walls.outerGradient(), starts[i]) : tightest.outerGradient());
        }
        return tightest;
    }
}
