package org.wellwright.solver.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wellwright.solver.InvalidModelException;

class UnitExpressionTest {
    private static final Dimension STRENGTH = Dimension.ENERGY.times(Dimension.LENGTH);
    private static final Dimension TENSION = Dimension.ENERGY.times(Dimension.LENGTH.power(-1));

    @ParameterizedTest
    @CsvSource({
        "eV nm, 1, 1, 0, 1",
        "eV·nm, 1, 1, 0, 1",
        "eV*nm, 1, 1, 0, 1",
        "eV angstrom, 1, 1, 0, 0.1",
        "1/angstrom, 0, -1, 0, 10",
        "angstrom^-1, 0, -1, 0, 10",
        "Å⁻¹, 0, -1, 0, 10",
        "eV/nm^2, 1, -2, 0, 1",
        "meV nm^2, 1, 2, 0, 0.001",
        "keV, 1, 0, 0, 1000",
        "µm, 0, 1, 0, 1000"
    })
    void readsProductsAndPowers(String text, int energy, int length, int mass, double factor) {
        UnitExpression unit = UnitExpression.parse(text);
        Dimension dimension = new Dimension(energy, length, mass);
        assertThat(unit.dimension()).isEqualTo(dimension);
        assertThat(unit.factorTo(UnitSystem.EV_NM, dimension)).isEqualTo(factor);
    }

    @Test
    void wavenumbersInACompoundAreEnergiesUnlessItHasOne() {
        assertThat(UnitExpression.parse("cm^-1/angstrom^2").dimension()).isEqualTo(new Dimension(1, -2, 0));
        assertThat(UnitExpression.parse("cm^-1 angstrom^6").dimension()).isEqualTo(new Dimension(1, 6, 0));
        assertThat(UnitExpression.parse("eV cm^-1").dimension()).isEqualTo(new Dimension(1, -1, 0));
    }

    @Test
    void readsWavenumberAsEnergyOrInverseLengthWhicheverFits() {
        UnitExpression unit = UnitExpression.parse("cm^-1");
        assertThat(unit.factorTo(UnitSystem.SPECTROSCOPIC, Dimension.ENERGY)).isEqualTo(1);
        assertThat(unit.factorTo(UnitSystem.EV_NM, Dimension.LENGTH.power(-1))).isEqualTo(1e-7);
        assertThat(UnitExpression.parse("cm^-1 angstrom^2")
                        .factorTo(UnitSystem.SPECTROSCOPIC, STRENGTH.times(Dimension.LENGTH)))
                .isEqualTo(1);
    }

    @Test
    void wavenumberOfOneElectronvoltAgreesWithThePublishedConversion() {
        // 8065.543 937... cm^-1 per eV, exact since 2019: 1/(hc) from the defining constants.
        assertThat(UnitExpression.parse("eV").factorTo(UnitSystem.SPECTROSCOPIC, Dimension.ENERGY))
                .isCloseTo(8065.543937349212, within(1e-12));
    }

    @Test
    void readsMassesAsEnergies() {
        assertThat(UnitExpression.parse("MeV").factorTo(UnitSystem.MEV_FM, Dimension.MASS))
                .isEqualTo(1);
        assertThat(UnitExpression.parse("GeV/c^2").factorTo(UnitSystem.MEV_FM, Dimension.MASS))
                .isEqualTo(1000);
    }

    @Test
    void readsPowersOfElectronvoltsWithNaturalUnits() {
        UnitExpression tension = UnitExpression.parse("GeV^2");
        assertThat(tension.factorTo(UnitSystem.GEV, TENSION)).isEqualTo(1);
        // 1/(hbar c) = 5.0677 GeV^-1 fm^-1 (CODATA 2022: hbar c = 197.326 980 4 MeV fm)
        assertThat(tension.factorTo(UnitSystem.GEV_FM, TENSION)).isCloseTo(1 / 0.1973269804, within(3e-9));
        assertThat(UnitExpression.parse("").factorTo(UnitSystem.GEV, STRENGTH)).isEqualTo(1);
    }

    @Test
    void refusesPureNumberForAStrengthOutsideNaturalUnits() {
        assertThatThrownBy(() -> UnitExpression.parse("").factorTo(UnitSystem.GEV_FM, STRENGTH))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("use a unit like 'GeV fm'");
    }

    @ParameterizedTest
    @CsvSource({
        "ev, eV",
        "evnm, nm",
        "Angstrm, angstrom",
        "hartre, hartree",
        "mev, meV",
    })
    void unknownUnitNamesTheNearest(String text, String near) {
        assertThatThrownBy(() -> UnitExpression.parse(text))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("the unit '" + text + "' is not known")
                .hasMessageContaining(near);
    }

    @ParameterizedTest
    @CsvSource({"eV//nm, 3", "/nm, 1", "eV^, 3", "eV (qq, 4"})
    void malformedUnitNamesTheColumn(String text, int column) {
        assertThatThrownBy(() -> UnitExpression.parse(text))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("column " + column);
    }

    @Test
    void wrongDimensionSaysWhatFits() {
        assertThatThrownBy(() -> UnitExpression.parse("nm").factorTo(UnitSystem.EV_NM, Dimension.ENERGY))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("use a unit like 'eV'");
    }
}
