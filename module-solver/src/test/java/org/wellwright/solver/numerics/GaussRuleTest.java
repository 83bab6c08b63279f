package org.wellwright.solver.numerics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class GaussRuleTest {
    /** Abramowitz and Stegun (1964), table 25.4: nodes and weights of n = 10 and 20 on [−1, 1]. */
    @ParameterizedTest
    @CsvSource({
        "10, 9, 0.973906528517171720078, 0.066671344308688137594",
        "10, 5, 0.148874338981631210885, 0.295524224714752870174",
        "20, 19, 0.993128599185094924786, 0.017614007139152118312",
        "20, 10, 0.076526521133497333755, 0.152753387130725850698"
    })
    void agreesWithTheHandbook(int size, int index, double node, double weight) {
        GaussRule rule = GaussRule.legendre(size);
        assertThat(2 * rule.node(index) - 1).isCloseTo(node, within(3e-16));
        assertThat(2 * rule.weight(index)).isCloseTo(weight, within(2e-16 * weight + 1e-17));
    }

    /** The recurrence of the polynomials costs some β roundings. */
    @ParameterizedTest
    @ValueSource(doubles = {-0.9, -0.5, 0, 0.25, 1, 2, 7.3, 60, 400})
    void integratesPowersExactly(double beta) {
        int size = 24;
        GaussRule rule = GaussRule.jacobi(size, beta);
        for (int power = 0; power < 2 * size; power++) {
            double sum = 0;
            for (int i = 0; i < size; i++) {
                sum += rule.weight(i) * Math.pow(rule.node(i), power);
            }
            double exact = 1 / (beta + power + 1);
            assertThat(sum).as("t^%d", power).isCloseTo(exact, within((4e-14 + 4e-16 * Math.abs(beta)) * exact));
        }
    }

    @Test
    void refusesAWeightThatCannotBeIntegrated() {
        assertThatThrownBy(() -> GaussRule.jacobi(8, -1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("-1.0");
    }
}
