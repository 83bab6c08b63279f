package org.wellwright.solver.potential.formula;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;

/** Behaviour at both ends, worked out by hand. */
class BehaviourTest {
    private static TermEvaluator bound(String text) {
        return FormulaText.parse(text).bind(Map.of("a", 2.0, "n", 1.5), ChannelFacts.ofOrbital(1));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "-1/r                       | 0   | -1   | -1   | true",
                "-a/r+3/r^2                 | 3   | -1   | -2   | true",
                "r^2                        | 0   | 0    | 0    | true",
                "-2*exp(-0.3*r)/r           | 0   | -1   | -2   | true",
                "4*((1/r)^12-(1/r)^6)       | 0   | -12  | 4    | true",
                "a*r^(-n)                   | 0   | -1.5 | 2    | true",
                "1/r-1/tanh(r)              | 0   | 0    | 0    | true",
                "(1-exp(-r))/r^2            | 0   | -1   | 1    | true",
                "1/(exp(r)-1)               | 0   | -1   | 1    | true",
                "sin(2*r)/r^3               | 2   | 0    | 0    | true",
                "cos(r)/r^2-1/r             | 1   | -1   | -1   | true",
                "ln(r)                      | 0   | 0    | 0    | true",
                "-exp(-1/r)/r^5             | 0   | 0    | 0    | true",
                "-erf(r)/r                  | 0   | 0    | 0    | true",
                "1/sqrt(r)                  | 0   | -0.5 | 1    | true",
                "atan(r)/r^2                | 0   | -1   | 1    | true",
                "step(r-1)/r                | 0   | 0    | 0    | true",
                "max(1/r,2/r^3)             | 0   | -3   | 2    | true",
                "abs(-1/r)                  | 0   | -1   | 1    | true",
                "sinh(r)/r^2+asin(r)        | 0   | -1   | 1    | true",
                "1/r^2*(1+r)^3              | 1   | -1   | 3    | true",
                "-tanh(1/r)/r               | 0   | -1   | -1   | true",
                "acos(r)/r                  | 0   | -1   | 1.5707963267948966 | true",
            })
    void originIsFound(String text, double inverseSquare, double power, double coefficient, boolean known) {
        OriginBehaviour origin = bound(text).origin();
        assertThat(origin.known()).isEqualTo(known);
        assertThat(origin.inverseSquare()).isCloseTo(inverseSquare, within(1e-14));
        assertThat(origin.power()).isCloseTo(power, within(1e-14));
        assertThat(origin.coefficient()).isCloseTo(coefficient, within(1e-14));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "-1/r                       | 0   | -1        | -1",
                "-1/r+3                     | 3   | -1        | -1",
                "r^2-1/r                    | 0   | 2         | 1",
                "-r                         | 0   | 1         | -1",
                "ln(r)                      | 0   | 0         | 1",
                "-ln(1+r)                   | 0   | 0         | -1",
                "exp(-r)                    | 0   | -Infinity | 0",
                "5+exp(-r^2)*r^7            | 5   | -Infinity | 0",
                "cosh(r)/r                  | 0   | Infinity  | 1",
                "-exp(r)+r^3                | 0   | Infinity  | -1",
                "4*((1/r)^12-(1/r)^6)       | 0   | -6        | -4",
                "exp((r-7)/0.6)/(1+exp((r-7)/0.6))^2 | 0 | -Infinity | 0",
                "-1/(1+exp((r-7)/0.6))      | 0   | -Infinity | 0",
                "1-1/(1+exp((r-7)/0.6))     | 1   | -Infinity | 0",
                "sqrt(1+r^2)-r              | 0   | -1        | 0.5",
                "tanh(r)                    | 1   | -Infinity | 0",
                "atan(r)                    | 1.5707963267948966 | -1 | -1",
                "-erf(r)/r                  | 0   | -1        | -1",
                "r^0.1                      | 0   | 0.1       | 1",
                "exp(-r)*exp(r)             | 1   | -Infinity | 0",
                "exp(-1/r)                  | 1   | -1        | -1",
                "sin(1/r)                   | 0   | -1        | 1",
                "exp(-r)*sin(r)             | 0   | -Infinity | 0",
                "step(3-r)                  | 0   | -Infinity | 0",
                "min(r,4)                   | 4   | -Infinity | 0",
                "(r^2+1)/(2*r^2-1)          | 0.5 | -2        | 0.75",
                "exp(-a*ln(r))              | 0   | -2        | 1",
                "r^(-a)                     | 0   | -2        | 1",
                "sinh(r)/cosh(r)            | 1   | -Infinity | 0",
                "tanh(1000+1/r)             | 1   | -Infinity | 0",
                "tanh(-1e3-exp(-r))         | -1  | -Infinity | 0",
            })
    void tailIsFound(String text, double limit, double power, double coefficient) {
        TailBehaviour tail = bound(text).tail();
        assertThat(tail.known()).isTrue();
        assertThat(tail.limit()).isCloseTo(limit, within(1e-14));
        assertThat(tail.power()).isEqualTo(power, within(1e-14));
        assertThat(tail.coefficient()).isCloseTo(coefficient, within(1e-14));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {"sin(r)", "sin(r)/r", "ln(r)/r", "sqrt(1-r)", "exp(sin(r))", "1/ln(r)", "tan(r)"})
    void tailThatCannotBeToldIsUnknown(String text) {
        assertThat(bound(text).tail().known()).isFalse();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {"sin(1/r)/r", "exp(1/r)", "ln(r)/r", "sqrt(r-1)"})
    void originThatCannotBeToldIsUnknown(String text) {
        assertThat(bound(text).origin().known()).isFalse();
    }
}
