package org.wellwright.solver.potential;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import org.apache.commons.math3.dfp.Dfp;
import org.apache.commons.math3.dfp.DfpField;
import org.apache.commons.math3.dfp.DfpMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** The reference is the arbitrary-precision arithmetic of Apache Commons Math at 40 digits. */
class IntervalFunctionsTest {
    private static final DfpField FIELD = new DfpField(40);

    private static Dfp expm1(Dfp x) {
        return x.abs().lessThan(FIELD.newDfp(1e-15))
                ? x.add(x.multiply(x).divide(2))
                : DfpMath.exp(x).subtract(1);
    }

    private static Dfp half(Dfp x, int sign) {
        Dfp e = DfpMath.exp(x);
        return e.add(FIELD.getOne().divide(e).multiply(sign)).divide(2);
    }

    static Stream<Arguments> functions() {
        UnaryOperator<Dfp> exp = DfpMath::exp;
        return Stream.of(
                row("exp", -30, 30, exp, IntervalFunctions::exp),
                row("expm1", -3, 3, IntervalFunctionsTest::expm1, IntervalFunctions::expm1),
                row("ln", 1e-3, 30, DfpMath::log, IntervalFunctions::ln),
                row("log1p", -0.9, 5, x -> DfpMath.log(x.add(1)), IntervalFunctions::log1p),
                row("sqrt", 0, 30, Dfp::sqrt, IntervalFunctions::sqrt),
                row("sin", -20, 20, DfpMath::sin, IntervalFunctions::sin),
                row("cos", -20, 20, DfpMath::cos, IntervalFunctions::cos),
                row("tan", -5, 5, DfpMath::tan, IntervalFunctions::tan),
                row("sinh", -5, 5, x -> half(x, -1), IntervalFunctions::sinh),
                row("cosh", -5, 5, x -> half(x, 1), IntervalFunctions::cosh),
                row("tanh", -5, 5, x -> half(x, -1).divide(half(x, 1)), IntervalFunctions::tanh),
                row("asin", -0.99, 0.99, DfpMath::asin, IntervalFunctions::asin),
                row("acos", -0.99, 0.99, DfpMath::acos, IntervalFunctions::acos),
                row("atan", -20, 20, DfpMath::atan, IntervalFunctions::atan),
                row(
                        "x^7",
                        -3,
                        3,
                        x -> x.multiply(x)
                                .multiply(x)
                                .multiply(x)
                                .multiply(x)
                                .multiply(x)
                                .multiply(x),
                        x -> IntervalFunctions.power(x, 7)),
                row("x^-2", 0.1, 3, x -> FIELD.getOne().divide(x.multiply(x)), x -> IntervalFunctions.power(x, -2)),
                row(
                        "x^0.75",
                        0.01,
                        9,
                        x -> x.sqrt().multiply(x.sqrt().sqrt()),
                        x -> IntervalFunctions.power(x, Interval.of(0.75))));
    }

    private static Arguments row(
            String name, double low, double high, UnaryOperator<Dfp> exact, UnaryOperator<Interval> function) {
        return Arguments.of(name, low, high, exact, function);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("functions")
    void containsTheExactValueAndIsTight(
            String name, double low, double high, UnaryOperator<Dfp> exact, UnaryOperator<Interval> function) {
        Random random = new Random(7);
        for (int i = 0; i < 400; i++) {
            double x = low + (high - low) * random.nextDouble();
            Interval point = function.apply(Interval.of(x));
            Dfp value = exact.apply(FIELD.newDfp(x));
            assertThat(FIELD.newDfp(point.lower()).greaterThan(value)
                            || FIELD.newDfp(point.upper()).lessThan(value))
                    .as("%s(%s) = %s in %s", name, x, value, point)
                    .isFalse();
            assertThat(point.width()).isLessThanOrEqualTo(20 * Math.ulp(value.toDouble()) + 1e-300);
            Interval wide = function.apply(new Interval(x, Math.min(high, x + random.nextDouble())));
            assertThat(wide.lower() <= point.upper() && wide.upper() >= point.lower())
                    .isTrue();
            double y = wideSample(x, high, random);
            Interval around = function.apply(new Interval(x, y));
            double inside = x + (y - x) * random.nextDouble();
            double sampled = exact.apply(FIELD.newDfp(inside)).toDouble();
            assertThat(sampled).isBetween(Math.nextDown(around.lower()), Math.nextUp(around.upper()));
        }
    }

    private static double wideSample(double x, double high, Random random) {
        return x + (high - x) * random.nextDouble();
    }

    @Test
    void errorFunctionsContainTabulatedValues() {
        // Abramowitz and Stegun (1964), table 7.1.
        assertThat(IntervalFunctions.erf(Interval.of(0.5)).lower()).isCloseTo(0.5204998778, within(5e-11));
        assertThat(IntervalFunctions.erf(Interval.of(1)).upper()).isCloseTo(0.8427007929, within(5e-11));
        assertThat(IntervalFunctions.erf(Interval.of(1)).width()).isBetween(1e-16, 1e-14);
        assertThat(IntervalFunctions.erfc(new Interval(0, 1)).upper()).isGreaterThanOrEqualTo(1);
        assertThat(IntervalFunctions.erf(Interval.ENTIRE)).isEqualTo(new Interval(-1, 1));
    }

    @Test
    void domainsAreCutOrGivenUp() {
        assertThat(IntervalFunctions.ln(new Interval(-1, 1)).lower()).isEqualTo(Double.NEGATIVE_INFINITY);
        assertThat(IntervalFunctions.ln(new Interval(-2, -1))).isEqualTo(Interval.ENTIRE);
        assertThat(IntervalFunctions.sqrt(new Interval(-4, 4)))
                .satisfies(x -> assertThat(x.lower()).isZero());
        assertThat(IntervalFunctions.tan(new Interval(1, 2))).isEqualTo(Interval.ENTIRE);
        assertThat(IntervalFunctions.sin(new Interval(0, 1e9))).isEqualTo(new Interval(-1, 1));
        assertThat(IntervalFunctions.power(new Interval(-1, 2), -1)).isEqualTo(Interval.ENTIRE);
        assertThat(IntervalFunctions.step(new Interval(-1, 1))).isEqualTo(new Interval(0, 1));
    }
}
