package org.wellwright.solver.angular;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class SpinOperatorsTest {
    /**
     * The closed forms for two spins ½ in the triplet (Bethe and Salpeter 1957, sec. 12, and handbooks of nuclear
     * physics; from memory).
     */
    @Test
    void tensorHasTheClosedFormsOfTheTriplet() {
        for (int l = 1; l <= 12; l++) {
            assertThat(SpinOperators.tensor(l, l, 2, 2 * l)).isCloseTo(2, within(1e-13));
            assertThat(SpinOperators.tensor(l, l, 2, 2 * l + 2)).isCloseTo(-2.0 * l / (2 * l + 3), within(1e-13));
            assertThat(SpinOperators.tensor(l, l, 2, 2 * l - 2)).isCloseTo(-2.0 * (l + 1) / (2 * l - 1), within(1e-13));
            double coupling = 6 * Math.sqrt(l * (l + 1.0)) / (2 * l + 1);
            assertThat(SpinOperators.tensor(l - 1, l + 1, 2, 2 * l)).isCloseTo(coupling, within(1e-13));
            assertThat(SpinOperators.tensor(l + 1, l - 1, 2, 2 * l)).isCloseTo(coupling, within(1e-13));
        }
    }

    @Test
    void tensorNeedsSpinOneAndEvenParity() {
        assertThat(SpinOperators.tensor(1, 1, 0, 2)).isZero();
        assertThat(SpinOperators.tensor(1, 1, 1, 3)).isZero();
        assertThat(SpinOperators.tensor(0, 0, 2, 2)).isZero();
        assertThat(SpinOperators.tensor(1, 2, 2, 4)).isZero();
    }

    @Test
    void scalarProductsAverageToZero() {
        double orbit = 0;
        for (int j = 1; j <= 5; j += 2) {
            orbit += SpinOperators.spinOrbit(1, 3, j) * (j + 1);
        }
        assertThat(orbit).isCloseTo(0, within(1e-14));
        assertThat(3 * SpinOperators.spinSpin(1, 1, 2) + SpinOperators.spinSpin(1, 1, 0))
                .isCloseTo(0, within(1e-15));
        assertThat(SpinOperators.spinSpin(1, 1, 2)).isEqualTo(0.25);
    }
}
