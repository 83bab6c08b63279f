package org.wellwright.solver.potential;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Random;
import org.junit.jupiter.api.Test;

class IntervalTest {
    private static final MathContext PRECISE = new MathContext(80);
    private final Random random = new Random(20260101);

    private double number() {
        double size = Math.pow(10, 12 * random.nextDouble() - 6);
        return switch (random.nextInt(6)) {
            case 0 -> random.nextInt(7) - 3;
            case 1 -> 0;
            default -> random.nextBoolean() ? size : -size;
        };
    }

    private Interval interval() {
        double a = number();
        double b = random.nextInt(4) == 0 ? a : number();
        return new Interval(Math.min(a, b), Math.max(a, b));
    }

    private double inside(Interval x) {
        double t = random.nextDouble();
        return Math.max(x.lower(), Math.min(x.upper(), x.lower() + t * (x.upper() - x.lower())));
    }

    private static boolean contains(Interval x, BigDecimal exact) {
        boolean above = x.lower() == Double.NEGATIVE_INFINITY || new BigDecimal(x.lower()).compareTo(exact) <= 0;
        return above && (x.upper() == Double.POSITIVE_INFINITY || new BigDecimal(x.upper()).compareTo(exact) >= 0);
    }

    @Test
    void basicOperationsContainTheExactResult() {
        for (int i = 0; i < 100_000; i++) {
            Interval x = interval();
            Interval y = interval();
            double a = inside(x);
            double b = inside(y);
            BigDecimal p = new BigDecimal(a);
            BigDecimal q = new BigDecimal(b);
            assertThat(contains(x.plus(y), p.add(q))).as("%s + %s", x, y).isTrue();
            assertThat(contains(x.minus(y), p.subtract(q))).as("%s - %s", x, y).isTrue();
            assertThat(contains(x.times(y), p.multiply(q))).as("%s * %s", x, y).isTrue();
            assertThat(contains(x.times(b), p.multiply(q))).as("%s * %s", x, b).isTrue();
            if (b != 0) {
                assertThat(contains(x.over(y), p.divide(q, PRECISE)))
                        .as("%s / %s", x, y)
                        .isTrue();
            }
        }
    }

    @Test
    void exactResultsAreNotWidened() {
        assertThat(Interval.of(1).plus(Interval.of(2))).isEqualTo(Interval.of(3));
        assertThat(Interval.of(6).over(Interval.of(2))).isEqualTo(Interval.of(3));
        assertThat(new Interval(-1, 2).times(Interval.of(4))).isEqualTo(new Interval(-4, 8));
        assertThat(Interval.of(0.1).plus(Interval.of(0.2)).width()).isLessThanOrEqualTo(Math.ulp(0.3));
    }

    @Test
    void infiniteEndsKeepTheirMeaning() {
        Interval far = new Interval(2, Double.POSITIVE_INFINITY);
        assertThat(Interval.of(1).over(far)).isEqualTo(new Interval(0, 0.5));
        assertThat(far.times(Interval.ZERO)).isEqualTo(Interval.ZERO);
        assertThat(far.minus(far)).isEqualTo(Interval.ENTIRE);
        assertThat(Interval.of(1).over(new Interval(0, 4))).isEqualTo(new Interval(0.25, Double.POSITIVE_INFINITY));
        assertThat(Interval.of(1).over(new Interval(-1, 4))).isEqualTo(Interval.ENTIRE);
        assertThat(new Interval(-3, 2).abs()).isEqualTo(new Interval(0, 3));
    }

    @Test
    void overflowIsRoundedOutward() {
        Interval huge = new Interval(1e200, 1e200);
        assertThat(huge.times(huge)).isEqualTo(new Interval(Double.MAX_VALUE, Double.POSITIVE_INFINITY));
        assertThat(Interval.around(Double.POSITIVE_INFINITY, 0).lower()).isEqualTo(Double.MAX_VALUE);
        assertThat(Interval.around(Double.NaN, 1)).isEqualTo(Interval.ENTIRE);
    }

    @Test
    void rejectsEndsOutOfOrder() {
        assertThatThrownBy(() -> new Interval(2, 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("[2.0, 1.0]");
        assertThatThrownBy(() -> new Interval(Double.NaN, 1)).isInstanceOf(IllegalArgumentException.class);
    }
}
