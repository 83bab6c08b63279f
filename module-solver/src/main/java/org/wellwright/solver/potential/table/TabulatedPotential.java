package org.wellwright.solver.potential.table;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.HardWalls;
import org.wellwright.solver.potential.InnerContinuation;
import org.wellwright.solver.potential.Interval;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.OuterContinuation;
import org.wellwright.solver.potential.Rounding;
import org.wellwright.solver.potential.TableInterpolation;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;

/**
 * A tabulated potential: a piecewise cubic between the knots, continued below the first and above the last.
 *
 * <p>Its parameters are the N values at the knots, then the steepness of the inner continuation, then limit,
 * coefficient and exponent of the outer one. Between knots q(x) is a piecewise cubic, q = V or r²V, x = r or 1/r. Below
 * r₁: V = V₁ − V₁′(r₁/n)[(r₁/r)ⁿ − 1] or V₁ − (V₁′/c)[e^(−c(r − r₁)) − 1]. Above r_N: limit + coefficient/rⁿ.
 */
public final class TabulatedPotential implements TermEvaluator {
    private final double[] radii;
    private final double[] values;
    private final TableInterpolation interpolation;
    private final Inner inner;
    private final Outer outer;
    private final boolean squared;
    private final boolean inverse;
    private final PiecewiseCubic cubic;
    private final double firstSlope;
    private final double firstSlopeError;
    private final double tailConstant;
    private final List<BreakPoint> breakPoints;
    private final Interval[] pieceBounds;

    /**
     * The inner continuation in numbers.
     *
     * @param kind its shape
     * @param steepness n or c; 0 for the wall
     */
    public record Inner(InnerContinuation.Kind kind, double steepness) {}

    /**
     * The outer continuation in numbers.
     *
     * @param kind its shape
     * @param limit limit at infinity
     * @param coefficient coefficient of r⁻ⁿ
     * @param exponent n
     */
    public record Outer(OuterContinuation.Kind kind, double limit, double coefficient, double exponent) {}

    /**
     * What the continuations are.
     *
     * @param innerConstant a in a + b/rⁿ or a + b e^(−cr)
     * @param innerAmplitude b
     * @param outerLimit limit at infinity
     */
    public record Continuations(double innerConstant, double innerAmplitude, double outerLimit) {}

    private TabulatedPotential(
            double[] radii, double[] values, TableInterpolation interpolation, Inner inner, Outer outer) {
        this.radii = radii;
        this.values = values;
        this.interpolation = interpolation;
        this.inner = inner;
        this.outer = outer;
        this.squared = interpolation.quantity() == TableInterpolation.Quantity.RADIUS_SQUARED_TIMES_POTENTIAL;
        this.inverse = interpolation.abscissa() == TableInterpolation.Abscissa.INVERSE_RADIUS;
        int n = radii.length;
        double[] x = new double[n];
        double[] y = new double[n];
        double[] knotError = new double[n];
        double[] valueError = new double[n];
        for (int k = 0; k < n; k++) {
            int i = knot(k);
            x[k] = inverse ? 1 / radii[i] : radii[i];
            y[k] = squared ? radii[i] * radii[i] * values[i] : values[i];
            knotError[k] = inverse ? Rounding.UNIT * x[k] : 0;
            valueError[k] = squared ? 2.01 * Rounding.UNIT * Math.abs(y[k]) : 0;
        }
        this.cubic = new PiecewiseCubic(interpolation.spline(), x, y, knotError, valueError);
        this.firstSlope = slopeAtFirst(cubic.slopeAtKnot(knot(0)), y[knot(0)]);
        double r = radii[0];
        double scale = (squared ? 1 / (r * r) : 1) * (inverse ? 1 / (r * r) : 1);
        this.firstSlopeError = scale * cubic.slopeErrorAtKnot(knot(0))
                + 8 * Rounding.UNIT * (Math.abs(firstSlope) + 2 * Math.abs(values[0]) / r);
        this.tailConstant = outer.kind() == OuterContinuation.Kind.JOINED_POWER
                ? values[n - 1] - outer.coefficient() * Math.pow(radii[n - 1], -outer.exponent())
                : outer.limit();
        this.breakPoints = findBreakPoints();
        this.pieceBounds = new Interval[n - 1];
        for (int i = 0; i + 1 < n; i++) {
            pieceBounds[i] = encloseInPiece(radii[i], radii[i + 1]);
        }
    }

    /**
     * A table.
     *
     * @param radii radii of the knots, ascending, > 0, at least four; copied
     * @param values V at the knots; copied
     * @throws InvalidModelException if the numbers do not make a table; names the point
     */
    public static TabulatedPotential of(
            double[] radii, double[] values, TableInterpolation interpolation, Inner inner, Outer outer) {
        if (radii.length != values.length) {
            throw new IllegalArgumentException(
                    "a table needs as many values as radii, got %d and %d".formatted(values.length, radii.length));
        }
        if (radii.length < 4) {
            throw new InvalidModelException("a table needs at least 4 points, got " + radii.length, "", "add points");
        }
        for (int i = 0; i < radii.length; i++) {
            String place = "table, point " + (i + 1);
            if (!(radii[i] > 0) || radii[i] == Double.POSITIVE_INFINITY) {
                throw new InvalidModelException(
                        "the radius must be positive and finite, got " + radii[i], place, "change it");
            }
            if (i > 0 && !(radii[i] > radii[i - 1])) {
                throw new InvalidModelException(
                        "the radius %s does not lie above the one before, %s".formatted(radii[i], radii[i - 1]),
                        place,
                        "sort the points and remove doubles");
            }
            if (!Double.isFinite(values[i])) {
                throw new InvalidModelException("the value must be finite, got " + values[i], place, "change it");
            }
        }
        if (inner.kind() != InnerContinuation.Kind.WALL
                && (!Double.isFinite(inner.steepness()) || inner.steepness() == 0)) {
            throw new InvalidModelException(
                    "the steepness of the inner continuation must be a number other than 0, got " + inner.steepness(),
                    "table",
                    "change it");
        }
        if (!Double.isFinite(outer.limit())
                || !Double.isFinite(outer.coefficient())
                || !(outer.exponent() > 0)
                || outer.exponent() == Double.POSITIVE_INFINITY) {
            throw new InvalidModelException(
                    "the outer continuation needs finite numbers and a positive exponent, got %s + %s/r^%s"
                            .formatted(outer.limit(), outer.coefficient(), outer.exponent()),
                    "table",
                    "change it");
        }
        return new TabulatedPotential(radii.clone(), values.clone(), interpolation, inner, outer);
    }

    /** Index among the cubic's knots of the i-th radius, and the reverse. */
    private int knot(int i) {
        return inverse ? radii.length - 1 - i : i;
    }

    /** dV/dr at the first knot from dq/dx and q there. */
    private double slopeAtFirst(double qSlope, double q) {
        double r = radii[0];
        double dq = inverse ? -qSlope / (r * r) : qSlope;
        return squared ? (dq - 2 * q / r) / (r * r) : dq;
    }

    /** What the continuations have come to. */
    public Continuations continuations() {
        double r = radii[0];
        double s = inner.steepness();
        return switch (inner.kind()) {
            case WALL -> new Continuations(values[0], 0, tailConstant);
            case POWER ->
                new Continuations(values[0] + firstSlope * r / s, -firstSlope / s * Math.pow(r, s + 1), tailConstant);
            case EXPONENTIAL ->
                new Continuations(values[0] + firstSlope / s, -firstSlope / s * Math.exp(s * r), tailConstant);
        };
    }

    @Override
    public String canonical() {
        StringBuilder text = new StringBuilder("table(")
                .append(interpolation.quantity())
                .append(',')
                .append(interpolation.abscissa())
                .append(',')
                .append(interpolation.spline());
        text.append(',').append(inner.kind()).append(',').append(Double.toHexString(inner.steepness()));
        text.append(',').append(outer.kind()).append(',').append(Double.toHexString(outer.limit()));
        text.append(',')
                .append(Double.toHexString(outer.coefficient()))
                .append(',')
                .append(Double.toHexString(outer.exponent()));
        for (int i = 0; i < radii.length; i++) {
            text.append(';').append(Double.toHexString(radii[i])).append(' ').append(Double.toHexString(values[i]));
        }
        return text.append(')').toString();
    }

    @Override
    public int parameterCount() {
        return radii.length + 4;
    }

    private double last() {
        return radii[radii.length - 1];
    }

    private double abscissa(double r) {
        return inverse ? 1 / r : r;
    }

    @Override
    public double value(double r) {
        return value(r, 0);
    }

    private double value(double r, int hint) {
        if (r < radii[0]) {
            return innerValue(r);
        }
        if (r > last()) {
            return tailConstant + outerPower(r);
        }
        double x = abscissa(r);
        int piece = cubic.piece(x, hint);
        double q = cubic.value(piece, x - cubic.knot(piece));
        return squared ? q / (r * r) : q;
    }

    @Override
    public void values(double[] at, double[] into, int count) {
        int hint = 0;
        for (int i = 0; i < count; i++) {
            into[i] = value(at[i], hint);
            if (at[i] >= radii[0] && at[i] <= last()) {
                hint = cubic.piece(abscissa(at[i]), hint);
            }
        }
    }

    private double innerValue(double r) {
        return inner.kind() == InnerContinuation.Kind.WALL ? values[0] : values[0] - firstSlope * innerShape(r);
    }

    /** [(r₁/r)ⁿ − 1] r₁/n or [e^(−c(r − r₁)) − 1]/c: V = V₁ − V₁′ · shape. */
    private double innerShape(double r) {
        double s = inner.steepness();
        return switch (inner.kind()) {
            case WALL -> 0;
            case POWER -> Math.expm1(s * Math.log(radii[0] / r)) * radii[0] / s;
            case EXPONENTIAL -> Math.expm1(-s * (r - radii[0])) / s;
        };
    }

    private double innerShapeSlope(double r) {
        double s = inner.steepness();
        return switch (inner.kind()) {
            case WALL -> 0;
            case POWER -> -Math.pow(radii[0] / r, s + 1);
            case EXPONENTIAL -> -Math.exp(-s * (r - radii[0]));
        };
    }

    private double innerShapeDerivative(double r) {
        double s = inner.steepness();
        double log = Math.log(radii[0] / r);
        return switch (inner.kind()) {
            case WALL -> 0;
            case POWER -> (Math.exp(s * log) * log * radii[0] - innerShape(r)) / s;
            case EXPONENTIAL -> (-(r - radii[0]) * Math.exp(-s * (r - radii[0])) - innerShape(r)) / s;
        };
    }

    private double outerPower(double r) {
        return outer.kind() == OuterContinuation.Kind.CONSTANT
                ? 0
                : outer.coefficient() * Math.pow(r, -outer.exponent());
    }

    @Override
    public double slope(double r) {
        if (r < radii[0]) {
            return -firstSlope * innerShapeSlope(r);
        }
        if (r > last()) {
            return -outer.exponent() * outerPower(r) / r;
        }
        double x = abscissa(r);
        int piece = cubic.piece(x, 0);
        double s = x - cubic.knot(piece);
        double dq = cubic.slope(piece, s) * (inverse ? -x * x : 1);
        return squared ? (dq - 2 * cubic.value(piece, s) / r) / (r * r) : dq;
    }

    @Override
    public double parameterDerivative(int parameter, double r) {
        int n = radii.length;
        if (r < radii[0]) {
            if (parameter < n) {
                return (parameter == 0 ? 1 : 0)
                        - (inner.kind() == InnerContinuation.Kind.WALL
                                ? 0
                                : firstSlopeDerivative(parameter) * innerShape(r));
            }
            return parameter == n ? -firstSlope * innerShapeDerivative(r) : 0;
        }
        if (r > last()) {
            return outerDerivative(parameter, r);
        }
        if (parameter >= n) {
            return 0;
        }
        double x = abscissa(r);
        int piece = cubic.piece(x, 0);
        double dq = cubic.valueDerivative(piece, x - cubic.knot(piece), knot(parameter));
        return squared ? dq * (radii[parameter] / r) * (radii[parameter] / r) : dq;
    }

    private double firstSlopeDerivative(int parameter) {
        double r = radii[parameter];
        double weight = squared ? r * r : 1;
        double own = parameter == 0 ? weight : 0;
        return slopeAtFirst(cubic.slopeDerivative(knot(0), knot(parameter)) * weight, own);
    }

    private double outerDerivative(int parameter, double r) {
        int n = radii.length;
        boolean joined = outer.kind() == OuterContinuation.Kind.JOINED_POWER;
        double p = outer.exponent();
        if (parameter == n - 1 && joined) {
            return 1;
        }
        if (parameter == n + 1 && !joined) {
            return 1;
        }
        if (outer.kind() == OuterContinuation.Kind.CONSTANT || parameter < n + 2) {
            return 0;
        }
        double here = Math.pow(r, -p);
        double there = joined ? Math.pow(last(), -p) : 0;
        return parameter == n + 2
                ? here - there
                : -outer.coefficient() * (here * Math.log(r) - (joined ? there * Math.log(last()) : 0));
    }

    private List<BreakPoint> findBreakPoints() {
        List<BreakPoint> points = new ArrayList<>();
        for (int i = inner.kind() == InnerContinuation.Kind.WALL ? 1 : 0; i + 1 < radii.length; i++) {
            points.add(new BreakPoint(radii[i], BreakPoint.Kind.KNOT, 0, List.of()));
        }
        double jump = tailConstant + outerPower(last()) - values[values.length - 1];
        boolean jumps = Math.abs(jump)
                > 1e-13 * (Math.abs(tailConstant) + Math.abs(outerPower(last())) + Math.abs(values[values.length - 1]));
        points.add(new BreakPoint(
                last(), jumps ? BreakPoint.Kind.JUMP : BreakPoint.Kind.KINK, jumps ? jump : 0, List.of()));
        return List.copyOf(points);
    }

    @Override
    public List<BreakPoint> breakPoints() {
        return breakPoints;
    }

    @Override
    public HardWalls walls() {
        return inner.kind() == InnerContinuation.Kind.WALL
                ? new HardWalls(radii[0], Double.POSITIVE_INFINITY, List.of(), List.of())
                : HardWalls.NONE;
    }

    @Override
    public Interval enclose(double from, double to) {
        Interval hull = at(from);
        if (from < radii[0]) {
            hull = hull.hull(at(Math.min(Math.nextDown(radii[0]), to)));
        }
        if (to >= radii[0] && from <= last()) {
            double a = Math.max(from, radii[0]);
            double b = Math.min(to, last());
            int first = pieceOf(a);
            int end = pieceOf(b);
            if (first == end) {
                hull = hull.hull(encloseInPiece(a, b));
            } else {
                hull = hull.hull(encloseInPiece(a, radii[first + 1])).hull(encloseInPiece(radii[end], b));
                for (int i = first + 1; i < end; i++) {
                    hull = hull.hull(pieceBounds[i]);
                }
            }
        }
        if (to > last()) {
            double a = Math.max(from, Math.nextUp(last()));
            hull = hull.hull(at(a))
                    .hull(to == Double.POSITIVE_INFINITY ? Interval.around(tailConstant, tailError()) : at(to));
        }
        return hull;
    }

    private int pieceOf(double r) {
        int found = Arrays.binarySearch(radii, r);
        int i = found >= 0 ? found : -found - 2;
        return Math.max(0, Math.min(radii.length - 2, i));
    }

    /** Extremes of V on [a, b] inside one piece: its ends and where dV/dx = 0. */
    private Interval encloseInPiece(double a, double b) {
        Interval hull = at(a).hull(at(b));
        int piece = cubic.piece(abscissa((a + b) / 2), 0);
        double[] c = cubic.coefficients(piece);
        double low = Math.min(abscissa(a), abscissa(b)) - cubic.knot(piece);
        double high = Math.max(abscissa(a), abscissa(b)) - cubic.knot(piece);
        for (double s : CubicRoots.in(stationary(c, cubic.knot(piece)), low, high)) {
            double x = cubic.knot(piece) + s;
            hull = hull.hull(at(Math.max(a, Math.min(b, inverse ? 1 / x : x))));
        }
        return hull;
    }

    /** The polynomial in s that vanishes where V is stationary: q′, x q′ − 2q (V = q/x²) or x q′ + 2q (V = q x²). */
    private double[] stationary(double[] c, double x0) {
        if (!squared) {
            return new double[] {c[1], 2 * c[2], 3 * c[3]};
        }
        double f = inverse ? 2 : -2;
        return new double[] {
            x0 * c[1] + f * c[0],
            c[1] + 2 * x0 * c[2] + f * c[1],
            2 * c[2] + 3 * x0 * c[3] + f * c[2],
            3 * c[3] + f * c[3]
        };
    }

    private Interval at(double r) {
        return Interval.around(value(r), roundingBound(r));
    }

    private double tailError() {
        return outer.kind() == OuterContinuation.Kind.JOINED_POWER
                ? 4 * Rounding.UNIT * (Math.abs(values[values.length - 1]) + Math.abs(outerPower(last())))
                : 0;
    }

    @Override
    public double roundingBound(double r) {
        double u = Rounding.UNIT;
        if (r < radii[0]) {
            if (inner.kind() == InnerContinuation.Kind.WALL) {
                return 0;
            }
            double shape = Math.abs(innerShape(r));
            double s = Math.abs(inner.steepness());
            // The exponent carries 2 roundings and the library's; expm1 turns them into its slope.
            double exponent = inner.kind() == InnerContinuation.Kind.POWER
                    ? s * Math.abs(Math.log(radii[0] / r)) + s
                    : s * Math.abs(r - radii[0]);
            double shapeError = 4
                            * u
                            * exponent
                            * Math.abs(innerShapeSlope(r))
                            * (inner.kind() == InnerContinuation.Kind.POWER ? r : 1)
                            / s
                    + 6 * u * shape;
            double bound = firstSlopeError * shape
                    + Math.abs(firstSlope) * shapeError
                    + u * Math.abs(value(r))
                    + 2 * u * Math.abs(firstSlope) * shape;
            return bound <= Double.MAX_VALUE ? bound * Rounding.SLACK + Double.MIN_VALUE : Double.POSITIVE_INFINITY;
        }
        if (r > last()) {
            return (tailError() + 4 * u * Math.abs(outerPower(r)) + u * Math.abs(value(r))) * Rounding.SLACK
                    + Double.MIN_VALUE;
        }
        double x = abscissa(r);
        int piece = cubic.piece(x, 0);
        double s = x - cubic.knot(piece);
        double stepError = u * (Math.abs(s) + (inverse ? 2.01 * x : 0));
        double q = cubic.error(piece, s) + Math.abs(cubic.slope(piece, s)) * stepError * 1.01;
        double bound = squared ? (q + 2.1 * u * Math.abs(cubic.value(piece, s))) / (r * r) : q;
        return bound * Rounding.SLACK + Double.MIN_VALUE;
    }

    @Override
    public OriginBehaviour origin() {
        return inner.kind() == InnerContinuation.Kind.POWER
                ? OriginBehaviour.power(-inner.steepness(), continuations().innerAmplitude())
                : OriginBehaviour.FINITE;
    }

    @Override
    public TailBehaviour tail() {
        return outer.kind() == OuterContinuation.Kind.CONSTANT || outer.coefficient() == 0
                ? TailBehaviour.constant(tailConstant)
                : new TailBehaviour(tailConstant, -outer.exponent(), outer.coefficient(), true);
    }
}
