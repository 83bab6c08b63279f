package org.wellwright.solver.angular;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.Test;

class SphericalHarmonicsTest {
    @Test
    void polarPartsOfOneOrderAreOrthonormal() {
        GaussIntegrator rule = new GaussIntegratorFactory().legendre(201, -1, 1);
        Random random = new Random(20240501);
        for (int trial = 0; trial < 60; trial++) {
            int m = random.nextInt(200);
            int first = m + random.nextInt(201 - m);
            int second = trial % 2 == 0 ? first : m + random.nextInt(201 - m);
            double integral = 2
                    * Math.PI
                    * rule.integrate(x -> SphericalHarmonics.polar(first, m, x, Math.sqrt((1 - x) * (1 + x)))
                            * SphericalHarmonics.polar(second, m, x, Math.sqrt((1 - x) * (1 + x))));
            assertThat(integral).as("l %d %d m %d", first, second, m).isCloseTo(first == second ? 1 : 0, within(1e-12));
        }
    }

    @Test
    void squaresOfAShellSumToItsUniformDensity() {
        // Unsöld (1927): Σ_m |Y_lm|² = (2l+1)/4π at every point.
        for (int l : new int[] {0, 1, 2, 7, 60, 200}) {
            double complex = 0;
            double real = 0;
            for (int m = -l; m <= l; m++) {
                double polar = SphericalHarmonics.polar(l, m, Math.cos(1.234), Math.sin(1.234));
                complex += polar * polar;
                double value = SphericalHarmonics.real(l, m, 1.234, 0.567);
                real += value * value;
            }
            assertThat(complex).isCloseTo((2 * l + 1) / (4 * Math.PI), within(2e-13 * (2 * l + 1)));
            assertThat(real).isCloseTo((2 * l + 1) / (4 * Math.PI), within(2e-13 * (2 * l + 1)));
        }
    }

    @Test
    void realOnesOfRankOneAreTheUnitVector() {
        double theta = 0.9;
        double phi = 2.1;
        double root = Math.sqrt(3 / (4 * Math.PI));
        assertThat(SphericalHarmonics.real(1, 1, theta, phi))
                .isCloseTo(root * Math.sin(theta) * Math.cos(phi), within(1e-15));
        assertThat(SphericalHarmonics.real(1, -1, theta, phi))
                .isCloseTo(root * Math.sin(theta) * Math.sin(phi), within(1e-15));
        assertThat(SphericalHarmonics.real(1, 0, theta, phi)).isCloseTo(root * Math.cos(theta), within(1e-15));
    }

    @Test
    void staysFiniteEverywhereToTwoHundred() {
        for (int l = 0; l <= 200; l += 25) {
            for (int m = -l; m <= l; m += 5) {
                for (double theta : new double[] {0, 1e-300, 1e-9, 0.5, Math.PI / 2, Math.PI - 1e-9, Math.PI}) {
                    double value = SphericalHarmonics.polar(l, m, Math.cos(theta), Math.sin(theta));
                    assertThat(Math.abs(value))
                            .isLessThanOrEqualTo(Math.sqrt((2 * l + 1) / (4 * Math.PI)) * (1 + 1e-12));
                }
            }
        }
        assertThat(SphericalHarmonics.polar(200, 0, 1, 0)).isCloseTo(Math.sqrt(401 / (4 * Math.PI)), within(1e-12));
        assertThat(SphericalHarmonics.polar(200, 3, 1, 0)).isZero();
    }

    @Test
    void refusesTooLargeAnOrderNamingIt() {
        assertThatThrownBy(() -> SphericalHarmonics.polar(2, -3, 1, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("m = -3");
    }
}
