package org.wellwright.project.report;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DigitsTest {
    @ParameterizedTest
    @CsvSource({
        "1.4401964, 0.0013, 1.4402, 1.4402 ± 0.0013",
        "-12.3456, 0.2, -12.35, -12.35 ± 0.20",
        "9.4, 0.096, 9.400, 9.400 ± 0.096",
        "9.4, 0.0996, 9.40, 9.40 ± 0.10",
        "22720, 1100, 2.27e4, (2.27 ± 0.11)e4",
        "0.000000123456, 0.000000000078, 1.23456e-7, (1.23456 ± 0.00078)e-7",
        "600.2459, 0.15, 600.25, 600.25 ± 0.15",
    })
    void followTheUncertaintyToItsSecondDigit(double value, double sigma, String alone, String both) {
        assertThat(Digits.of(value, sigma)).isEqualTo(alone);
        assertThat(Digits.plusMinus(value, sigma)).isEqualTo(both);
    }

    @Test
    void withoutUncertaintyAllDigitsStand() {
        assertThat(Digits.of(0.1 + 0.2, 0)).isEqualTo("0.30000000000000004");
        assertThat(Digits.plusMinus(3, 0)).isEqualTo("3");
        assertThat(Digits.of(Double.NaN, 1)).isEqualTo("–");
        assertThat(Digits.of(Double.POSITIVE_INFINITY, 1)).isEqualTo("∞");
    }

    @Test
    void neverClaimMoreThanADoubleHolds() {
        assertThat(Digits.of(1.0 / 3, 1e-30)).isEqualTo("0.33333333333333331");
    }

    @Test
    void significantDigitsWithoutIdleZeros() {
        assertThat(Digits.significant(0.5, 3)).isEqualTo("0.5");
        assertThat(Digits.significant(28450.4, 4)).isEqualTo("28450");
        assertThat(Digits.significant(2.8e-13, 2)).isEqualTo("2.8e-13");
        assertThat(Digits.significant(0, 2)).isEqualTo("0");
    }
}
