package org.wellwright.solver.observable;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class StandardAirTest {
    @Test
    void indexAgreesWithAnotherPublishedFormula() {
        // Edlen (1966), Metrologia 2, 71: 10^8 (n - 1) = 8342.13 + 2406030/(130 - s^2) + 15997/(38.9 - s^2); value from
        // memory.
        // The two fits differ by up to 2e-9 between 230 nm and 1 um.
        for (double wavelength = 230; wavelength < 1000; wavelength += 7) {
            double s = 1e6 / (wavelength * wavelength);
            double edlen = 1 + 1e-8 * (8342.13 + 2406030 / (130 - s) + 15997 / (38.9 - s));
            assertThat(StandardAir.index(wavelength)).isCloseTo(edlen, within(5e-9));
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {210, 300, 589, 1000, 1600})
    void slopeAgreesWithDifferences(double wavelength) {
        double h = 1e-2;
        double difference = (StandardAir.index(wavelength + h) - StandardAir.index(wavelength - h)) / (2 * h);
        assertThat(StandardAir.indexSlope(wavelength))
                .isCloseTo(difference, within(1e-5 * Math.abs(difference) + 3e-14));
    }

    @Test
    void rangeIsThatOfTheFormulaAndTheConvention() {
        assertThat(StandardAir.covers(199)).isFalse();
        assertThat(StandardAir.covers(200)).isTrue();
        assertThat(StandardAir.covers(1690)).isTrue();
        assertThat(StandardAir.covers(1700)).isFalse();
    }
}
