package org.wellwright.solver.potential.formula;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;

class ScaledTest {
    private static void close(Scaled x, double expected) {
        assertThat(x.toDouble()).isCloseTo(expected, within(8 * Math.ulp(expected)));
    }

    @Test
    void agreesWithDoublesInTheirRange() {
        Random random = new Random(5);
        for (int i = 0; i < 10_000; i++) {
            double a = (random.nextBoolean() ? 1 : -1) * Math.pow(10, 20 * random.nextDouble() - 10);
            double b = Math.pow(10, 20 * random.nextDouble() - 10);
            Scaled x = Scaled.of(a);
            Scaled y = Scaled.of(b);
            assertThat(x.toDouble()).isEqualTo(a);
            assertThat(x.plus(y).toDouble()).isEqualTo(a + b);
            assertThat(x.minus(y).toDouble()).isEqualTo(a - b);
            assertThat(x.times(y).toDouble()).isEqualTo(a * b);
            assertThat(x.over(y).toDouble()).isEqualTo(a / b);
            assertThat(y.sqrt().toDouble()).isEqualTo(Math.sqrt(b));
            close(y.ln(), Math.log(b));
            assertThat(x.compare(y)).isEqualTo(Double.compare(a, b));
            double z = 600 * random.nextDouble() - 300;
            close(Scaled.of(z).exp(), Math.exp(z));
        }
    }

    @Test
    void goesBeyondDoubles() {
        Scaled huge = Scaled.of(5_000).exp();
        assertThat(huge.toDouble()).isEqualTo(Double.POSITIVE_INFINITY);
        close(huge.times(Scaled.of(-4_999).exp()), Math.E);
        close(huge.over(Scaled.of(4_998).exp()).ln(), 2);
        close(huge.ln(), 5_000);
        close(huge.sqrt().over(Scaled.of(2_500).exp()), 1);
        close(huge.power(Scaled.of(-2)).times(huge).times(huge), 1);
        close(Scaled.of(1e-200).power(Scaled.of(2.5)).ln(), -500 * Math.log(10));
    }

    @Test
    void denormalsKeepTheirDigits() {
        assertThat(Scaled.of(3e-320).toDouble()).isEqualTo(3e-320);
        assertThat(Scaled.of(3e-320).times(1e300).toDouble()).isEqualTo(3e-320 * 0x1p200 * (1e300 * 0x1p-200));
    }

    @Test
    void whatIsUndefinedIsNotANumber() {
        assertThat(Scaled.ONE.over(Scaled.ZERO).toDouble()).isNaN();
        assertThat(Scaled.of(-1).ln().toDouble()).isNaN();
        assertThat(Scaled.of(-2).power(Scaled.of(0.5)).toDouble()).isNaN();
        Scaled beyond = Scaled.of(1e18).exp();
        assertThat(beyond.over(beyond.times(beyond)).toDouble()).isNaN();
        assertThat(Scaled.of(1e300).exp().over(Scaled.of(1e300)).toDouble()).isEqualTo(Double.POSITIVE_INFINITY);
    }
}
