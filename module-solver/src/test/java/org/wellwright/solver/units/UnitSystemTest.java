package org.wellwright.solver.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.wellwright.solver.InvalidModelException;

class UnitSystemTest {
    static List<UnitSystem> systems() {
        return UnitSystem.ALL;
    }

    @Test
    void kineticFactorIsOneHalfWhereTheUnitsAreNatural() {
        assertThat(UnitSystem.ATOMIC.kineticFactor()).isEqualTo(0.5);
        assertThat(UnitSystem.GEV.kineticFactor()).isEqualTo(0.5);
        assertThat(UnitSystem.ATOMIC.coulombStrength()).isEqualTo(1);
    }

    @Test
    void kineticFactorOfSpectroscopyAgreesWithThePublishedNumber() {
        // hbar^2/2 = 16.857 629 u cm^-1 angstrom^2 (common in molecular spectroscopy; value from memory)
        assertThat(UnitSystem.SPECTROSCOPIC.kineticFactor()).isCloseTo(16.857629, within(5e-7));
    }

    /** The Bohr energy k²/4κ of one electron mass is half a hartree in every system. */
    @ParameterizedTest
    @MethodSource("systems")
    void bohrEnergyIsTheSameInEverySystem(UnitSystem system) {
        double electron = UnitExpression.parse("m_e").factorTo(system, Dimension.MASS);
        double kinetic = system.kineticFactor() / electron;
        double strength = system.coulombStrength();
        double rydberg = UnitExpression.parse("Ry").factorTo(system, Dimension.ENERGY);
        assertThat(strength * strength / (4 * kinetic)).isCloseTo(rydberg, within(4e-16 * rydberg));
    }

    @ParameterizedTest
    @MethodSource("systems")
    void writtenUnitsAreReadBack(UnitSystem system) {
        for (int energy = -2; energy <= 2; energy++) {
            for (int length = -2; length <= 2; length++) {
                Dimension dimension = new Dimension(energy, length, 0);
                UnitExpression unit = UnitExpression.parse(system.unitText(dimension));
                assertThat(unit.factorTo(system, dimension))
                        .as(system.unitText(dimension))
                        .isEqualTo(1);
            }
        }
    }

    @Test
    void unknownSystemNamesAllAndCaseCounts() {
        assertThat(UnitSystem.named("MeV-fm")).isSameAs(UnitSystem.MEV_FM);
        assertThatThrownBy(() -> UnitSystem.named("mev-fm"))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("MeV-fm")
                .hasMessageContaining("atomic");
    }

    @Test
    void exactNumberKeepsItsTextAndRefusesWhatIsNone() {
        assertThat(new ExactNumber("0.5200").text()).isEqualTo("0.5200");
        assertThat(new ExactNumber("-1.5e-3").value()).isEqualTo(-1.5e-3);
        assertThat(ExactNumber.of(0.1).text()).isEqualTo("0.1");
        assertThat(ExactNumber.of(-4).text()).isEqualTo("-4");
        for (String bad : new String[] {"", "1,5", "NaN", "Infinity", "1e999", "0x10", "1.0f"}) {
            assertThatThrownBy(() -> new ExactNumber(bad)).isInstanceOf(IllegalArgumentException.class);
        }
    }
}
