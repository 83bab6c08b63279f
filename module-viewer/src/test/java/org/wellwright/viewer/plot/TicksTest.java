package org.wellwright.viewer.plot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TicksTest {
    @ParameterizedTest
    @CsvSource({"10, 5, 2", "10, 4, 5", "1, 10, 0.1", "0.03, 3, 0.01", "7e-9, 4, 2e-9", "100, 1, 100"})
    void stepsAreOneTwoFive(double span, double pieces, double step) {
        assertThat(Ticks.step(span, pieces) / step).isCloseTo(1, within(1e-12));
    }

    @ParameterizedTest
    @CsvSource({
        "0.3, 0.1, 0.3",
        "-0.30000000000000004, 0.1, −0.3",
        "1e-17, 0.5, 0",
        "250000, 50000, 250000",
        "2e-9, 1e-9, 2×10⁻⁹",
        "2.5e-9, 5e-10, 2.5×10⁻⁹",
        "12000000, 2000000, 1.2×10⁷"
    })
    void labelsHaveTheDecimalsOfTheStep(double value, double step, String label) {
        assertThat(Ticks.label(value, step)).isEqualTo(label);
    }

    @ParameterizedTest
    @CsvSource({"0.123456, 3, 0.123", "1999.6, 3, 2000", "-5e-7, 2, −5×10⁻⁷", "0, 3, 0"})
    void numbersKeepSignificantDigits(double value, int digits, String text) {
        assertThat(Ticks.number(value, digits)).isEqualTo(text);
    }

    @Test
    void aPointIsAPointInEveryCountry() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            assertThat(new Ticks.Format(0.5).format(1.5)).isEqualTo("1.5");
        } finally {
            Locale.setDefault(before);
        }
    }
}
