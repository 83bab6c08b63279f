package org.wellwright.solver.angular;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.Arrays;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** Against published and independently computed values; the files name their sources. */
class AngularReferenceTest {
    @ParameterizedTest(name = "{0}")
    @CsvFileSource(resources = "angular.csv", numLinesToSkip = 1)
    void agreesWithPublishedValues(String id, String function, String arguments, BigDecimal value) {
        assertThat(evaluate(function, arguments)).as(id).isCloseTo(value.doubleValue(), within(4e-15));
        if (function.endsWith("J") || function.equals("clebschGordan")) {
            assertThat(exact(function, arguments).decimal().subtract(value).abs())
                    .as(id)
                    .isLessThan(new BigDecimal("1e-25"));
        }
    }

    @ParameterizedTest(name = "{0} {1}")
    @CsvFileSource(resources = "large.csv", numLinesToSkip = 3)
    void agreesWithExactArithmeticAtLargeQuantumNumbers(String function, String arguments, BigDecimal value) {
        double size = Math.abs(value.doubleValue());
        if (function.equals("smallD")) {
            // Oscillating values are known to 2j rounding errors of the largest one, 1; decaying ones relative to
            // themselves.
            assertThat(evaluate(function, arguments))
                    .isCloseTo(value.doubleValue(), within(Math.min(3e-14, 3e-13 * size)));
            return;
        }
        assertThat(evaluate(function, arguments))
                .isCloseTo(value.doubleValue(), within(function.equals("nineJ") ? 2e-17 : 4e-15 * size));
        assertThat(exact(function, arguments).decimal().subtract(value).abs().doubleValue())
                .isLessThan(1e-23 * size);
    }

    @ParameterizedTest
    @CsvFileSource(resources = "polar.csv", numLinesToSkip = 3)
    void polarPartAgreesWithHighPrecision(int l, int m, double theta, double value) {
        double found = SphericalHarmonics.polar(l, m, Math.cos(theta), Math.sin(theta));
        // cos θ and sin θ carry half an ulp each, which l and m multiply.
        double tolerance = 2e-16 * (20 + 2 * l) * Math.max(1, 1 / Math.sin(theta)) * Math.min(1, Math.abs(value) * 10);
        assertThat(found).isCloseTo(value, within(tolerance));
    }

    private static double evaluate(String function, String arguments) {
        double[] a = numbers(arguments);
        return switch (function) {
            case "threeJ" -> Coupling.threeJ(d(a[0]), d(a[1]), d(a[2]), d(a[3]), d(a[4]), d(a[5]));
            case "sixJ" -> Coupling.sixJ(d(a[0]), d(a[1]), d(a[2]), d(a[3]), d(a[4]), d(a[5]));
            case "nineJ" ->
                Coupling.nineJ(d(a[0]), d(a[1]), d(a[2]), d(a[3]), d(a[4]), d(a[5]), d(a[6]), d(a[7]), d(a[8]));
            case "clebschGordan" -> Coupling.clebschGordan(d(a[0]), d(a[1]), d(a[2]), d(a[3]), d(a[4]), d(a[5]));
            case "gaunt" -> Coupling.gaunt((int) a[0], (int) a[1], (int) a[2], (int) a[3], (int) a[4], (int) a[5]);
            case "smallD" -> Rotations.smallD(d(a[0]), d(a[1]), d(a[2]), a[3]);
            case "bigDReal" ->
                Rotations.bigD(d(a[0]), d(a[1]), d(a[2]), a[3], a[4], a[5]).getReal();
            case "harmonicReal" ->
                SphericalHarmonics.complex((int) a[0], (int) a[1], a[2], a[3]).getReal();
            case "harmonicImaginary" ->
                SphericalHarmonics.complex((int) a[0], (int) a[1], a[2], a[3]).getImaginary();
            case "spinOrbit" -> SpinOperators.spinOrbit((int) a[0], d(a[1]), d(a[2]));
            case "tensor" -> SpinOperators.tensor((int) a[0], (int) a[1], d(a[2]), d(a[3]));
            default -> throw new AssertionError("no function " + function);
        };
    }

    private static RootOfRational exact(String function, String arguments) {
        double[] a = numbers(arguments);
        return switch (function) {
            case "threeJ" -> ExactCoupling.threeJ(d(a[0]), d(a[1]), d(a[2]), d(a[3]), d(a[4]), d(a[5]));
            case "sixJ" -> ExactCoupling.sixJ(d(a[0]), d(a[1]), d(a[2]), d(a[3]), d(a[4]), d(a[5]));
            case "nineJ" ->
                ExactCoupling.nineJ(d(a[0]), d(a[1]), d(a[2]), d(a[3]), d(a[4]), d(a[5]), d(a[6]), d(a[7]), d(a[8]));
            case "clebschGordan" -> ExactCoupling.clebschGordan(d(a[0]), d(a[1]), d(a[2]), d(a[3]), d(a[4]), d(a[5]));
            default -> throw new AssertionError("no exact function " + function);
        };
    }

    private static double[] numbers(String arguments) {
        return Arrays.stream(arguments.split(" "))
                .mapToDouble(Double::parseDouble)
                .toArray();
    }

    private static int d(double quantumNumber) {
        return (int) Math.round(2 * quantumNumber);
    }
}
