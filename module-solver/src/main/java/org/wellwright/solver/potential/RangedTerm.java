package org.wellwright.solver.potential;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Objects;

/**
 * scale · V(r) for from ≤ r ≤ to, 0 elsewhere. Its parameters are those of the inner term, then scale, from, to; the
 * last two act through the gradients of their break points alone.
 */
public final class RangedTerm implements TermEvaluator {
    private final TermEvaluator inner;
    private final double scale;
    private final double from;
    private final double to;

    /**
     * A term in its range.
     *
     * @param from where it starts, ≥ 0
     * @param to where it ends, +∞ for no end
     * @throws IllegalArgumentException unless {@code scale} is finite and 0 ≤ from < to
     */
    public RangedTerm(TermEvaluator inner, double scale, double from, double to) {
        this.inner = Objects.requireNonNull(inner, "inner");
        if (!Double.isFinite(scale) || !(from >= 0) || !(to > from)) {
            throw new IllegalArgumentException(
                    "a range needs a finite scale and 0 <= from < to, got %s, %s, %s".formatted(scale, from, to));
        }
        this.scale = scale;
        this.from = from;
        this.to = to;
    }

    @Override
    public String canonical() {
        return "ranged(" + Double.toHexString(scale) + ',' + Double.toHexString(from) + ',' + Double.toHexString(to)
                + ',' + inner.canonical() + ')';
    }

    @Override
    public int parameterCount() {
        return inner.parameterCount() + 3;
    }

    private boolean inside(double r) {
        return from <= r && r <= to;
    }

    @Override
    public double value(double r) {
        return inside(r) ? scale * inner.value(r) : 0;
    }

    @Override
    public void values(double[] radii, double[] into, int count) {
        inner.values(radii, into, count);
        for (int i = 0; i < count; i++) {
            into[i] = inside(radii[i]) ? scale * into[i] : 0;
        }
    }

    @Override
    public double slope(double r) {
        return inside(r) ? scale * inner.slope(r) : 0;
    }

    @Override
    public double parameterDerivative(int parameter, double r) {
        int own = parameter - inner.parameterCount();
        if (!inside(r) || own > 0) {
            return 0;
        }
        return own == 0 ? inner.value(r) : scale * inner.parameterDerivative(parameter, r);
    }

    @Override
    public List<BreakPoint> breakPoints() {
        List<BreakPoint> points = new ArrayList<>();
        int count = parameterCount();
        if (from > 0) {
            points.add(edge(from, scale * inner.value(Math.nextUp(from)), count - 2));
        }
        for (BreakPoint point : inner.breakPoints()) {
            if (from < point.radius() && point.radius() < to) {
                points.add(new BreakPoint(
                        point.radius(), point.kind(), scale * point.jump(), padded(point.radiusGradient())));
            }
        }
        if (to < Double.POSITIVE_INFINITY) {
            points.add(edge(to, -(scale * inner.value(Math.nextDown(to))), count - 1));
        }
        points.sort(Comparator.comparingDouble(BreakPoint::radius));
        return List.copyOf(points);
    }

    private BreakPoint edge(double radius, double jump, int parameter) {
        List<Double> gradient = new ArrayList<>(parameterCount());
        for (int j = 0; j < parameterCount(); j++) {
            gradient.add(j == parameter ? 1.0 : 0.0);
        }
        return new BreakPoint(radius, jump == 0 ? BreakPoint.Kind.KINK : BreakPoint.Kind.JUMP, jump, gradient);
    }

    private List<Double> padded(List<Double> gradient) {
        if (gradient.isEmpty()) {
            return gradient;
        }
        List<Double> longer = new ArrayList<>(gradient);
        longer.addAll(List.of(0.0, 0.0, 0.0));
        return longer;
    }

    @Override
    public Interval enclose(double a, double b) {
        double low = Math.max(a, from);
        double high = Math.min(b, to);
        if (low > high) {
            return Interval.ZERO;
        }
        Interval inRange = scale == 0 ? Interval.ZERO : inner.enclose(low, high).times(scale);
        return a < from || b > to ? inRange.hull(Interval.ZERO) : inRange;
    }

    @Override
    public double roundingBound(double r) {
        if (!inside(r)) {
            return 0;
        }
        double product = Math.abs(scale) * inner.roundingBound(r);
        return scale == 1
                ? product
                : (product + Rounding.UNIT * Math.abs(scale * inner.value(r))) * Rounding.SLACK + Double.MIN_VALUE;
    }

    @Override
    public OriginBehaviour origin() {
        return from > 0 ? OriginBehaviour.FINITE : inner.origin().times(scale);
    }

    @Override
    public TailBehaviour tail() {
        return to < Double.POSITIVE_INFINITY ? TailBehaviour.ZERO : inner.tail().times(scale);
    }

    @Override
    public HardWalls walls() {
        HardWalls walls = inner.walls();
        return new HardWalls(
                walls.inner(), walls.outer(), padded(walls.innerGradient()), padded(walls.outerGradient()));
    }
}
