package org.wellwright.solver.potential.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.Stream;
import org.apache.commons.math3.analysis.interpolation.SplineInterpolator;
import org.apache.commons.math3.analysis.polynomials.PolynomialSplineFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.EvaluatorLaws;
import org.wellwright.solver.potential.InnerContinuation;
import org.wellwright.solver.potential.Interval;
import org.wellwright.solver.potential.OuterContinuation;
import org.wellwright.solver.potential.TableInterpolation;
import org.wellwright.solver.potential.TableInterpolation.Abscissa;
import org.wellwright.solver.potential.TableInterpolation.Quantity;
import org.wellwright.solver.potential.TableInterpolation.Spline;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.potential.table.TabulatedPotential.Inner;
import org.wellwright.solver.potential.table.TabulatedPotential.Outer;

class TabulatedPotentialTest {
    private static final Inner POWER = new Inner(InnerContinuation.Kind.POWER, 9);
    private static final Inner EXPONENTIAL = new Inner(InnerContinuation.Kind.EXPONENTIAL, 2.5);
    private static final Inner WALL = new Inner(InnerContinuation.Kind.WALL, 0);
    private static final Outer CONSTANT = new Outer(OuterContinuation.Kind.CONSTANT, 0.01, 0, 1);
    private static final Outer TAIL = new Outer(OuterContinuation.Kind.POWER, 0, -3, 6);
    private static final Outer JOINED = new Outer(OuterContinuation.Kind.JOINED_POWER, 0, -3, 6);

    private static double morse(double r) {
        double y = Math.exp(-1.1 * (r - 2));
        return 0.8 * y * (y - 2);
    }

    private static double[] radii(int n) {
        double[] radii = new double[n];
        for (int i = 0; i < n; i++) {
            radii[i] = 1.1 * Math.pow(8, (double) i / (n - 1));
        }
        return radii;
    }

    private static double[] sampled(double[] radii, DoubleUnaryOperator f) {
        double[] values = new double[radii.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = f.applyAsDouble(radii[i]);
        }
        return values;
    }

    static Stream<TableInterpolation> interpolations() {
        List<TableInterpolation> all = new ArrayList<>();
        for (Quantity quantity : Quantity.values()) {
            for (Abscissa abscissa : Abscissa.values()) {
                for (Spline spline : Spline.values()) {
                    all.add(new TableInterpolation(quantity, abscissa, spline));
                }
            }
        }
        return all.stream();
    }

    /** A table by its parameters: values, steepness, limit, coefficient, exponent. */
    private static TabulatedPotential table(
            double[] radii, double[] p, TableInterpolation interpolation, Inner inner, Outer outer) {
        int n = radii.length;
        double[] values = java.util.Arrays.copyOf(p, n);
        return TabulatedPotential.of(
                radii,
                values,
                interpolation,
                new Inner(inner.kind(), p[n]),
                new Outer(outer.kind(), p[n + 1], p[n + 2], p[n + 3]));
    }

    private static double[] parameters(double[] values, Inner inner, Outer outer) {
        double[] p = java.util.Arrays.copyOf(values, values.length + 4);
        p[values.length] = inner.steepness();
        p[values.length + 1] = outer.limit();
        p[values.length + 2] = outer.coefficient();
        p[values.length + 3] = outer.exponent();
        return p;
    }

    @ParameterizedTest
    @MethodSource("interpolations")
    void obeysTheLaws(TableInterpolation interpolation) {
        Random random = new Random(interpolation.hashCode() % 1000);
        double[] radii = radii(9);
        double[] values = sampled(radii, r -> morse(r) + 0.05 * Math.sin(7 * r));
        for (Inner inner : List.of(WALL, POWER, EXPONENTIAL)) {
            for (Outer outer : List.of(CONSTANT, TAIL, JOINED)) {
                double[] p = parameters(values, inner, outer);
                TermEvaluator v = table(radii, p, interpolation, inner, outer);
                double low = inner == WALL ? 1.11 : 0.6;
                EvaluatorLaws.derivativesAgreeWithDifferences(
                        q -> table(radii, q, interpolation, inner, outer), p, low, 15, 12, random);
                EvaluatorLaws.enclosuresContainSamples(v, 0.5, 30, 100, 20, random);
                EvaluatorLaws.blocksHaveTheBitsOfSingleValues(v, 0.5, 30, random);
                EvaluatorLaws.behavioursHold(v);
            }
        }
    }

    @ParameterizedTest
    @MethodSource("interpolations")
    void goesThroughItsKnotsAndIsSmoothThere(TableInterpolation interpolation) {
        double[] radii = radii(12);
        double[] values = sampled(radii, TabulatedPotentialTest::morse);
        TermEvaluator v = TabulatedPotential.of(radii, values, interpolation, POWER, JOINED);
        for (int i = 0; i < radii.length; i++) {
            assertThat(v.value(radii[i])).isCloseTo(values[i], within(1e-13));
        }
        for (int i = 0; i + 1 < radii.length; i++) {
            double below = v.slope(radii[i] * (1 - 1e-12));
            double above = v.slope(radii[i] * (1 + 1e-12));
            assertThat(above).as("slope at knot %d", i).isCloseTo(below, within(1e-9 * (1 + Math.abs(below))));
        }
        double last = radii[11];
        assertThat(v.value(last * (1 + 1e-12))).isCloseTo(values[11], within(1e-12));
    }

    @Test
    void theNaturalSplineIsThatOfCommonsMath() {
        double[] radii = radii(25);
        double[] values = sampled(radii, TabulatedPotentialTest::morse);
        PolynomialSplineFunction reference = new SplineInterpolator().interpolate(radii, values);
        TermEvaluator v = TabulatedPotential.of(radii, values, TableInterpolation.STANDARD, POWER, TAIL);
        for (double r = 1.1; r < 8.8; r += 0.01) {
            assertThat(v.value(r)).isCloseTo(reference.value(r), within(1e-13));
        }
    }

    @ParameterizedTest
    @EnumSource(Abscissa.class)
    void theClampedSplineReproducesCubics(Abscissa abscissa) {
        DoubleUnaryOperator cubic = r -> {
            double x = abscissa == Abscissa.RADIUS ? r : 1 / r;
            return 1 - 2 * x + 0.3 * x * x * x;
        };
        double[] radii = radii(7);
        TermEvaluator v = TabulatedPotential.of(
                radii,
                sampled(radii, cubic),
                new TableInterpolation(Quantity.POTENTIAL, abscissa, Spline.CLAMPED),
                POWER,
                TAIL);
        for (double r = 1.1; r < 8.8; r += 0.01) {
            assertThat(v.value(r)).isCloseTo(cubic.applyAsDouble(r), within(1e-12));
        }
    }

    @Test
    void theErrorOfTheClampedSplineFallsAsTheFourthPower() {
        TableInterpolation clamped = new TableInterpolation(Quantity.POTENTIAL, Abscissa.RADIUS, Spline.CLAMPED);
        double coarse = largestError(TabulatedPotential.of(
                radii(21), sampled(radii(21), TabulatedPotentialTest::morse), clamped, POWER, TAIL));
        double fine = largestError(TabulatedPotential.of(
                radii(41), sampled(radii(41), TabulatedPotentialTest::morse), clamped, POWER, TAIL));
        assertThat(coarse / fine).isBetween(12.0, 24.0);
    }

    private static double largestError(TermEvaluator v) {
        double largest = 0;
        for (double r = 1.5; r < 6; r += 0.01) {
            largest = Math.max(largest, Math.abs(v.value(r) - morse(r)));
        }
        return largest;
    }

    @Test
    void theMonotoneCubicDoesNotOvershoot() {
        double[] radii = {1, 2, 3, 4, 5, 6};
        double[] values = {5, 5, 5, 0, 0, -1};
        TermEvaluator v = TabulatedPotential.of(
                radii,
                values,
                new TableInterpolation(Quantity.POTENTIAL, Abscissa.RADIUS, Spline.MONOTONE),
                WALL,
                CONSTANT);
        for (double r = 1; r <= 6; r += 0.001) {
            assertThat(v.value(r)).isBetween(-1.0 - 1e-15, 5.0 + 1e-15);
        }
        assertThat(v.value(4.5)).isZero();
    }

    @Test
    void continuationsAreWhatTheySay() {
        double[] radii = radii(15);
        TabulatedPotential power = TabulatedPotential.of(
                radii,
                sampled(radii, r -> 2 + 7 / Math.pow(r, 9)),
                new TableInterpolation(Quantity.POTENTIAL, Abscissa.INVERSE_RADIUS, Spline.CLAMPED),
                POWER,
                TAIL);
        TabulatedPotential.Continuations c = power.continuations();
        double r = 0.7;
        assertThat(power.value(r))
                .isCloseTo(c.innerConstant() + c.innerAmplitude() / Math.pow(r, 9), within(1e-9 * power.value(r)));
        assertThat(power.value(20)).isEqualTo(-3 / Math.pow(20, 6));
        TabulatedPotential exponential = TabulatedPotential.of(
                radii, sampled(radii, TabulatedPotentialTest::morse), TableInterpolation.STANDARD, EXPONENTIAL, JOINED);
        c = exponential.continuations();
        assertThat(exponential.value(r))
                .isCloseTo(c.innerConstant() + c.innerAmplitude() * Math.exp(-2.5 * r), within(1e-12));
        assertThat(exponential.value(1e9)).isEqualTo(c.outerLimit());
    }

    @Test
    void knotsAreBreakPointsAndAnOpenEndJumps() {
        double[] radii = radii(6);
        double[] values = sampled(radii, TabulatedPotentialTest::morse);
        List<BreakPoint> points = TabulatedPotential.of(radii, values, TableInterpolation.STANDARD, WALL, CONSTANT)
                .breakPoints();
        assertThat(points)
                .extracting(BreakPoint::radius)
                .containsExactly(radii[1], radii[2], radii[3], radii[4], radii[5]);
        assertThat(points.get(4).kind()).isEqualTo(BreakPoint.Kind.JUMP);
        assertThat(points.get(4).jump()).isCloseTo(0.01 - values[5], within(1e-15));
        assertThat(points.get(0).kind()).isEqualTo(BreakPoint.Kind.KNOT);
        TabulatedPotential joined = TabulatedPotential.of(radii, values, TableInterpolation.STANDARD, POWER, JOINED);
        assertThat(joined.breakPoints()).hasSize(6);
        assertThat(joined.breakPoints().get(5).kind()).isEqualTo(BreakPoint.Kind.KINK);
        assertThat(joined.walls().inner()).isZero();
        assertThat(TabulatedPotential.of(radii, values, TableInterpolation.STANDARD, WALL, CONSTANT)
                        .walls()
                        .inner())
                .isEqualTo(radii[0]);
    }

    @ParameterizedTest
    @MethodSource("interpolations")
    void enclosuresAreSharp(TableInterpolation interpolation) {
        double[] radii = radii(12);
        TermEvaluator v = TabulatedPotential.of(
                radii, sampled(radii, TabulatedPotentialTest::morse), interpolation, POWER, JOINED);
        Random random = new Random(2);
        for (int i = 0; i < 200; i++) {
            double a = 0.8 + 9 * random.nextDouble();
            double b = a + 2 * random.nextDouble();
            double least = Double.POSITIVE_INFINITY;
            double most = Double.NEGATIVE_INFINITY;
            for (int k = 0; k <= 2_000; k++) {
                double value = v.value(a + (b - a) * k / 2_000);
                least = Math.min(least, value);
                most = Math.max(most, value);
            }
            Interval bounds = v.enclose(a, b);
            assertThat(bounds.lower()).isCloseTo(least, within(1e-5 * (most - least) + 1e-12));
            assertThat(bounds.upper()).isCloseTo(most, within(1e-5 * (most - least) + 1e-12));
        }
    }

    @Test
    void badTablesNameThePoint() {
        double[] r = {1, 2, 2, 3};
        assertThatThrownBy(() -> TabulatedPotential.of(r, new double[4], TableInterpolation.STANDARD, POWER, TAIL))
                .isInstanceOf(InvalidModelException.class)
                .hasMessage(
                        "table, point 3: the radius 2.0 does not lie above the one before, 2.0; sort the points and remove doubles");
        assertThatThrownBy(() -> TabulatedPotential.of(
                        new double[] {0, 1, 2, 3}, new double[4], TableInterpolation.STANDARD, POWER, TAIL))
                .hasMessageStartingWith("table, point 1: the radius must be positive");
        assertThatThrownBy(() -> TabulatedPotential.of(
                        new double[] {1, 2, 3, 4},
                        new double[] {0, Double.NaN, 0, 0},
                        TableInterpolation.STANDARD,
                        POWER,
                        TAIL))
                .hasMessageStartingWith("table, point 2: the value must be finite");
        assertThatThrownBy(() -> TabulatedPotential.of(
                        new double[] {1, 2, 3}, new double[3], TableInterpolation.STANDARD, POWER, TAIL))
                .hasMessageContaining("at least 4 points");
        assertThatThrownBy(() -> TabulatedPotential.of(
                        new double[] {1, 2, 3, 4},
                        new double[4],
                        TableInterpolation.STANDARD,
                        new Inner(InnerContinuation.Kind.POWER, 0),
                        TAIL))
                .hasMessageContaining("steepness");
        assertThatThrownBy(() -> TabulatedPotential.of(
                        new double[] {1, 2, 3, 4},
                        new double[4],
                        TableInterpolation.STANDARD,
                        POWER,
                        new Outer(OuterContinuation.Kind.POWER, 0, 1, -2)))
                .hasMessageContaining("positive exponent");
    }
}
