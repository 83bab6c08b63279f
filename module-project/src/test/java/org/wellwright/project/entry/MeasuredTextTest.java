package org.wellwright.project.entry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.units.ExactNumber;

/** The forms of a measured value; digits in parentheses by JCGM 100:2008, 7.2.2. */
class MeasuredTextTest {
    @ParameterizedTest
    @CsvSource({
        "1.23456(12), 1.23456, 0.00012, ''",
        "100.02147(35) eV, 100.02147, 0.00035, eV",
        "16956.17025(8) cm^-1, 16956.17025, 0.00008, cm^-1",
        "1.2(3)e4, 1.2e4, 3000, ''",
        "120(15), 120, 15, ''",
        "12.3(1.5), 12.3, 1.5, ''",
        "1.23456 ± 0.00012, 1.23456, 0.00012, ''",
        "1.5 +/- 0.25 MeV, 1.5, 0.25, MeV",
        "-1.5+-2e-3, -1.5, 2e-3, ''",
        "(1.5 ± 0.25)e3 cm^-1, 1500, 250, cm^-1",
        "−4.25(5), -4.25, 0.05, ''",
        "7.5(2)e-7, 7.5e-7, 2e-8, ''",
    })
    void readsValueAndUncertainty(String text, String value, String sigma, String unit) {
        MeasuredText read = MeasuredText.parse(text);
        assertThat(read.value().decimal()).isEqualByComparingTo(value);
        assertThat(read.sigmaPlus().decimal()).isEqualByComparingTo(sigma);
        assertThat(read.sigmaMinus()).isEqualTo(read.sigmaPlus());
        assertThat(read.unit()).isEqualTo(unit);
        assertThat(read.limit()).isEqualTo(Datum.Limit.NONE);
    }

    @Test
    void keepsTheTwoSidesApart() {
        MeasuredText read = MeasuredText.parse("12.3 +0.4 -0.2 eV");
        assertThat(read.sigmaPlus().text()).isEqualTo("0.4");
        assertThat(read.sigmaMinus().text()).isEqualTo("0.2");
        assertThat(read.unit()).isEqualTo("eV");
    }

    @Test
    void readsLimits() {
        assertThat(MeasuredText.parse("< 3.5 keV").limit()).isEqualTo(Datum.Limit.UPPER);
        assertThat(MeasuredText.parse(">=2").limit()).isEqualTo(Datum.Limit.LOWER);
        assertThat(MeasuredText.parse("< 3.5 keV").sigmaPlus()).isNull();
    }

    @Test
    void keepsDigitsAsTyped() {
        assertThat(MeasuredText.parse("0.5200").value().text()).isEqualTo("0.5200");
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "abc", "1,25", "1.2(", "1.2()", "1.2(0)", "1.2 ± 0", "± 3", "1.2(a)"})
    void refusesWhatIsNoMeasuredValue(String text) {
        assertThatThrownBy(() -> MeasuredText.parse(text)).isInstanceOf(InvalidModelException.class);
    }

    @ParameterizedTest
    @CsvSource({
        "1.23456, 0.00012, 1.23456(12)",
        "1.2e4, 3000, 1.2(3)e4",
        "1.5, 0.25, 1.5 ± 0.25",
        "2, 0.5, 2 ± 0.5",
        "100, 5, 100(5)",
        "1.00001, 1, 1.00001 ± 1",
    })
    void printsTheShortForm(String value, String sigma, String text) {
        ExactNumber s = new ExactNumber(sigma);
        assertThat(MeasuredText.format(new ExactNumber(value), s, s, Datum.Limit.NONE))
                .isEqualTo(text);
        MeasuredText back = MeasuredText.parse(text);
        assertThat(back.value().text()).isEqualTo(value);
        assertThat(back.sigmaPlus().decimal()).isEqualByComparingTo(sigma);
    }
}
