package org.wellwright.project.entry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.units.UnitSystem;

class QuantityTextTest {
    @Test
    void keepsADigitForDigitNumberWithoutUnit() {
        assertThat(QuantityText.parse(" 0.5200 ", "cm^-1", UnitSystem.SPECTROSCOPIC)
                        .text())
                .isEqualTo("0.5200");
        assertThat(QuantityText.parse("0.5200 cm^-1", "cm^-1", UnitSystem.SPECTROSCOPIC)
                        .text())
                .isEqualTo("0.5200");
    }

    /** 1 eV = 8065.543937… cm⁻¹ (CODATA 2022, eV-inverse meter relationship 8.065 543 937... x 10^5 m^-1, exact). */
    @Test
    void convertsElectronvoltsIntoAFieldOfWavenumbers() {
        assertThat(QuantityText.parse("1.2 eV", "cm^-1", UnitSystem.SPECTROSCOPIC)
                        .value())
                .isCloseTo(1.2 * 8065.543937, within(1e-5));
    }

    @ParameterizedTest
    @CsvSource({"1.2 nm, cm^-1", "1.2 eV, angstrom", "1.2 eW, eV", "3 eV, ''", "'', eV", "1 2, eV"})
    void refusesAUnitThatDoesNotFit(String text, String unit) {
        assertThatThrownBy(() -> QuantityText.parse(text, unit, UnitSystem.SPECTROSCOPIC))
                .isInstanceOf(InvalidModelException.class);
    }

    @Test
    void namesTheUnitThatWouldFit() {
        assertThatThrownBy(() -> QuantityText.parse("1.2 nm", "cm^-1", UnitSystem.SPECTROSCOPIC))
                .hasMessageContaining("does not fit here")
                .hasMessageContaining("cm^-1");
    }

    @Test
    void readsInverseLengthsBesideWavenumbers() {
        assertThat(QuantityText.parse("2 nm^-1", "angstrom^-1", UnitSystem.SPECTROSCOPIC)
                        .value())
                .isCloseTo(0.2, within(1e-15));
    }
}
