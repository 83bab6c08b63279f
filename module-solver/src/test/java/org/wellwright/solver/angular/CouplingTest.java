package org.wellwright.solver.angular;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;

class CouplingTest {
    @Test
    void columnsOfClebschGordanAreOrthonormal() {
        Random random = new Random(20240501);
        for (int trial = 0; trial < 120; trial++) {
            int j1 = random.nextInt(121);
            int j2 = random.nextInt(121);
            int total = Math.abs(j1 - j2) + 2 * random.nextInt(Math.min(j1, j2) + 1);
            int other = Math.abs(j1 - j2) + 2 * random.nextInt(Math.min(j1, j2) + 1);
            int m = Math.min(total, other) - 2 * random.nextInt(Math.min(total, other) + 1);
            double sum = 0;
            for (int m1 = -j1; m1 <= j1; m1 += 2) {
                sum += Coupling.clebschGordan(j1, m1, j2, m - m1, total, m)
                        * Coupling.clebschGordan(j1, m1, j2, m - m1, other, m);
            }
            assertThat(sum).as("%d %d %d %d", j1, j2, total, other).isCloseTo(total == other ? 1 : 0, within(1e-13));
        }
    }

    @Test
    void sixJIsOrthogonal() {
        Random random = new Random(20240502);
        for (int trial = 0; trial < 40; trial++) {
            int a = random.nextInt(121);
            int b = random.nextInt(121);
            int d = random.nextInt(121);
            int e = (a + b + d) % 2 + 2 * random.nextInt(60);
            int low = Math.max(Math.abs(a - e), Math.abs(b - d));
            int high = Math.min(a + e, b + d);
            if (high < low) {
                continue;
            }
            int f = low + 2 * random.nextInt((high - low) / 2 + 1);
            int g = low + 2 * random.nextInt((high - low) / 2 + 1);
            double sum = 0;
            for (int x = Math.abs(a - b); x <= a + b; x += 2) {
                sum += (x + 1.0) * (f + 1) * Coupling.sixJ(a, b, x, d, e, f) * Coupling.sixJ(a, b, x, d, e, g);
            }
            assertThat(sum).as("%d %d %d %d, %d %d", a, b, d, e, f, g).isCloseTo(f == g ? 1 : 0, within(1e-13));
        }
    }

    @Test
    void exactEqualsFloatingToAHundred() {
        Random random = new Random(20240503);
        int compared = 0;
        for (int trial = 0; trial < 4000; trial++) {
            int j1 = random.nextInt(201);
            int j2 = random.nextInt(201);
            int j3 = Math.abs(j1 - j2) + 2 * random.nextInt(Math.min(j1, j2) + 1);
            int m1 = j1 - 2 * random.nextInt(j1 + 1);
            int m2 = j2 - 2 * random.nextInt(j2 + 1);
            if (j3 > 200 || Math.abs(m1 + m2) > j3) {
                continue;
            }
            double exact = ExactCoupling.threeJ(j1, j2, j3, m1, m2, -m1 - m2).value();
            assertThat(Coupling.threeJ(j1, j2, j3, m1, m2, -m1 - m2)).isCloseTo(exact, within(4e-15 * Math.abs(exact)));
            compared++;
        }
        assertThat(compared).isGreaterThan(500);
    }

    @Test
    void nineJWithAZeroIsASixJ() {
        // Edmonds (1957), eq. 6.4.14: {a b e; c d e; f f 0} = (−1)^{b+c+e+f} {a b e; d c f} / √((2e+1)(2f+1))
        int a = 31;
        int b = 24;
        int e = 17;
        int c = 20;
        int d = 33;
        int f = 15;
        double expected = ((b + c + e + f) / 2 % 2 == 0 ? 1 : -1)
                * Coupling.sixJ(a, b, e, d, c, f)
                / Math.sqrt((e + 1.0) * (f + 1.0));
        assertThat(expected).isNotZero();
        assertThat(Coupling.nineJ(a, b, e, c, d, e, f, f, 0)).isCloseTo(expected, within(1e-17));
        assertThat(ExactCoupling.nineJ(a, b, e, c, d, e, f, f, 0).value()).isCloseTo(expected, within(1e-17));
    }

    @Test
    void forbiddenCoefficientsAreZero() {
        assertThat(Coupling.threeJ(2, 2, 6, 0, 0, 0)).isZero();
        assertThat(Coupling.threeJ(2, 2, 2, 0, 0, 0)).isZero();
        assertThat(Coupling.threeJ(2, 2, 4, 2, 2, 0)).isZero();
        assertThat(Coupling.threeJ(2, 2, 4, 4, -4, 0)).isZero();
        assertThat(Coupling.sixJ(2, 2, 2, 2, 2, 6)).isZero();
        assertThat(ExactCoupling.nineJ(2, 2, 2, 2, 2, 2, 2, 2, 8)).isEqualTo(RootOfRational.ZERO);
    }

    @Test
    void refusesNegativeAndTooLargeNamingTheValue() {
        assertThatThrownBy(() -> Coupling.threeJ(-2, 2, 2, 0, 0, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("-2");
        assertThatThrownBy(() -> Coupling.sixJ(2, 2, 2, 2, 2, 5000))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("5000");
    }

    @Test
    void exactValuesAreReadable() {
        assertThat(ExactCoupling.threeJ(4, 4, 4, 0, 0, 0)).hasToString("-sqrt(2/35)");
        assertThat(ExactCoupling.sixJ(2, 2, 2, 2, 2, 2)).hasToString("1/6");
        assertThat(ExactCoupling.clebschGordan(2, 2, 1, -1, 1, 1)
                        .times(ExactCoupling.clebschGordan(2, 2, 1, -1, 1, 1))
                        .square())
                .isEqualTo(new BigFraction(4, 9));
    }

    @Test
    void gauntVanishesUnlessProjectionsSumToZero() {
        assertThat(Coupling.gaunt(2, 1, 2, 1, 2, 0)).isZero();
        // ∫ Y_10 Y_10 Y_20 dΩ = 1/√(5π), from the integrals of cos²θ (3cos²θ − 1).
        assertThat(Coupling.gaunt(1, 0, 1, 0, 2, 0)).isCloseTo(1 / Math.sqrt(5 * Math.PI), within(1e-16));
    }
}
