package org.wellwright.solver.potential;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import java.util.function.Function;

/** What every evaluator must obey, whatever computes it. */
public final class EvaluatorLaws {
    private EvaluatorLaws() {}

    /**
     * dV/dr and ∂V/∂p agree with extrapolated central differences to 1e-9 of the largest over 1,000 seeded radii in
     * [low, high], away from break points.
     *
     * @param family evaluators by parameter values
     * @param values where to differentiate
     */
    public static void derivativesAgreeWithDifferences(
            Function<double[], TermEvaluator> family,
            double[] values,
            double low,
            double high,
            int points,
            Random random) {
        TermEvaluator v = family.apply(values);
        for (int j = -1; j < v.parameterCount(); j++) {
            double[] exact = new double[points];
            double[] difference = new double[points];
            double largest = 0;
            for (int i = 0; i < 1_000; i++) {
                double r = low * Math.pow(high / low, random.nextDouble());
                largest = Math.max(largest, Math.abs(j < 0 ? v.slope(r) : v.parameterDerivative(j, r)));
            }
            for (int i = 0; i < points; i++) {
                double r = low * Math.pow(high / low, random.nextDouble());
                if (r < v.walls().inner() || r > v.walls().outer()) {
                    continue;
                }
                double room = Math.min(0.1 * r, 0.4 * distanceToBreak(v, r));
                if (room < 1e-3 * r) {
                    continue;
                }
                exact[i] = j < 0 ? v.slope(r) : v.parameterDerivative(j, r);
                difference[i] =
                        j < 0 ? derivative(v::value, r, room, 7) : parameterDifference(family, values, j, r, room);
            }
            assertThat(largest).isFinite();
            for (int i = 0; i < points; i++) {
                assertThat(exact[i])
                        .as("derivative %d of %s, point %d", j, v.canonical(), i)
                        .isCloseTo(difference[i], org.assertj.core.api.Assertions.within(1e-9 * largest));
            }
        }
    }

    private static double parameterDifference(
            Function<double[], TermEvaluator> family, double[] values, int j, double r, double room) {
        double size = values[j] == 0 ? 1 : Math.abs(values[j]);
        // A moving break point must not reach r.
        double step = 0.05 * size;
        for (BreakPoint point : edges(family.apply(values))) {
            double speed = point.radiusGradient().isEmpty()
                    ? 0
                    : Math.abs(point.radiusGradient().get(j));
            step = speed == 0 ? step : Math.min(step, 0.3 * Math.abs(point.radius() - r) / speed);
        }
        return derivative(
                p -> {
                    double[] changed = values.clone();
                    changed[j] = p;
                    return family.apply(changed).value(r);
                },
                values[j],
                step,
                5);
    }

    /** Break points and walls. */
    private static List<BreakPoint> edges(TermEvaluator v) {
        List<BreakPoint> edges = new ArrayList<>(v.breakPoints());
        HardWalls walls = v.walls();
        if (walls.inner() > 0) {
            edges.add(new BreakPoint(walls.inner(), BreakPoint.Kind.KNOT, 0, walls.innerGradient()));
        }
        if (walls.outer() < Double.POSITIVE_INFINITY) {
            edges.add(new BreakPoint(walls.outer(), BreakPoint.Kind.KNOT, 0, walls.outerGradient()));
        }
        return edges;
    }

    private static double distanceToBreak(TermEvaluator v, double r) {
        double least = Double.POSITIVE_INFINITY;
        for (BreakPoint point : edges(v)) {
            least = Math.min(least, Math.abs(point.radius() - r));
        }
        return least;
    }

    /**
     * Central differences with halved steps, extrapolated (Ridders 1982); the entry with the smallest change is taken.
     */
    public static double derivative(DoubleUnaryOperator f, double x, double step, int n) {
        double[][] table = new double[n][n];
        double best = Double.NaN;
        double error = Double.POSITIVE_INFINITY;
        double h = step;
        for (int i = 0; i < n; i++) {
            double plus = x + h;
            double minus = x - h;
            table[i][0] = (f.applyAsDouble(plus) - f.applyAsDouble(minus)) / (plus - minus);
            for (int k = 1; k <= i; k++) {
                double factor = Math.pow(4, k);
                table[i][k] = (factor * table[i][k - 1] - table[i - 1][k - 1]) / (factor - 1);
                double change =
                        Math.max(Math.abs(table[i][k] - table[i][k - 1]), Math.abs(table[i][k] - table[i - 1][k - 1]));
                if (change <= error) {
                    error = change;
                    best = table[i][k];
                }
            }
            h /= 2;
        }
        return best;
    }

    /** enclose(a, b) contains V at sampled radii of [a, b], for seeded intervals from tiny to half-infinite. */
    public static void enclosuresContainSamples(
            TermEvaluator v, double low, double high, int intervals, int samples, Random random) {
        for (int i = 0; i < intervals; i++) {
            double a = low * Math.pow(high / low, random.nextDouble());
            double b = i % 10 == 0 ? Double.POSITIVE_INFINITY : a * (1 + Math.pow(10, -6 + 7 * random.nextDouble()));
            Interval bounds = v.enclose(a, b);
            for (int k = 0; k < samples; k++) {
                double r = k == 0
                        ? a
                        : b == Double.POSITIVE_INFINITY
                                ? a * Math.pow(10, 4 * random.nextDouble())
                                : a + (b - a) * random.nextDouble();
                double value = v.value(r);
                double allowed = v.roundingBound(r);
                if (Double.isNaN(value) || allowed == Double.POSITIVE_INFINITY) {
                    continue;
                }
                assertThat(value + allowed >= bounds.lower() && value - allowed <= bounds.upper())
                        .as("%s on [%s, %s]: V(%s) = %s in %s", v.canonical(), a, b, r, value, bounds)
                        .isTrue();
            }
        }
    }

    /** values(…) gives the bits of value(…). */
    public static void blocksHaveTheBitsOfSingleValues(TermEvaluator v, double low, double high, Random random) {
        for (int n : new int[] {1, 7, 128, 300}) {
            double[] radii =
                    random.doubles(n).map(x -> low * Math.pow(high / low, x)).toArray();
            double[] into = new double[n];
            v.values(radii, into, n);
            for (int i = 0; i < n; i++) {
                assertThat(Double.doubleToLongBits(into[i]))
                        .as("%s at %s: %s", v.canonical(), radii[i], into[i])
                        .isEqualTo(Double.doubleToLongBits(v.value(radii[i])));
            }
        }
    }

    /** The leading behaviours hold at a very small and a very large radius. */
    public static void behavioursHold(TermEvaluator v) {
        OriginBehaviour origin = v.origin();
        if (origin.known() && (origin.inverseSquare() != 0 || origin.coefficient() != 0)) {
            double r = 1e-8;
            double lead = origin.inverseSquare() / (r * r) + origin.coefficient() * Math.pow(r, origin.power());
            assertThat(v.value(r) / lead)
                    .as("%s near the origin, %s", v.canonical(), origin)
                    .isCloseTo(1, org.assertj.core.api.Assertions.within(1e-3));
        }
        TailBehaviour tail = v.tail();
        List<BreakPoint> breaks = v.breakPoints();
        double far = 1e6 * (breaks.isEmpty() ? 1 : breaks.get(breaks.size() - 1).radius());
        if (tail.known() && !tail.rises() && !tail.falls()) {
            double left = v.value(far) - tail.limit();
            double lead = tail.coefficient() == 0 ? 0 : tail.coefficient() * Math.pow(far, tail.power());
            double allowed = 1e-3 * Math.abs(lead) + 1e-13 * Math.abs(tail.limit()) + v.roundingBound(far) + 1e-280;
            assertThat(Math.abs(left - lead))
                    .as("%s far out, %s: %s", v.canonical(), tail, left)
                    .isLessThanOrEqualTo(allowed);
        } else if (tail.known()) {
            double near = v.value(far / 10);
            double gain = v.value(far) == near ? near : v.value(far) - near; // both may overflow
            assertThat(gain > 0).as("%s far out, %s", v.canonical(), tail).isEqualTo(tail.rises());
        }
    }
}
