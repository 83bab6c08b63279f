package org.wellwright.solver.units;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.wellwright.solver.PublishedDigits;

class ConstantsTest {
    @ParameterizedTest(name = "{0}")
    @CsvFileSource(resources = "constants.csv", numLinesToSkip = 2)
    void agreesWithTheRecommendedValue(String id, String quantity, String value, String unit, int digits) {
        double computed = switch (id) {
            case "c22_Eh" -> UnitSystem.EV_NM.coulombStrength() / inNanometres(Constants.BOHR_RADIUS);
            case "c22_Rinf" -> Constants.RYDBERG.value().value();
            case "c22_RyHz" -> of("Ry", "Hz");
            case "c22_RyeV" -> of("Ry", "eV");
            case "c22_a0" -> Constants.BOHR_RADIUS.value().value();
            case "c22_alpha" -> Math.sqrt(of("hartree", "eV") / massInEv("m_e"));
            case "c22_hbarc" -> UnitSystem.MEV_FM.planckLight() / (2 * Math.PI);
            case "c22_memev" -> massInEv("m_e") / 1e6;
            case "fact_Rcheck" -> 1 / inMetres(1 / of("Ry", "cm^-1"));
            default -> throw new IllegalArgumentException("no computation for " + id);
        };
        PublishedDigits.assertAgree(id, computed, value, digits);
    }

    @Test
    void atomicMassUnitAgreesWithItsRecommendedRestEnergy() {
        // CODATA 2022 (Mohr, Newell, Taylor and Tiesinga): 931.494 103 72(29) MeV; value from memory.
        PublishedDigits.assertAgree("u", massInEv("u") / 1e6, "931.49410372", 11);
    }

    @Test
    void everyConstantNamesItsSourceAndUncertainty() {
        assertThat(Constants.ALL).hasSizeGreaterThanOrEqualTo(9);
        for (Constants.Constant constant : Constants.ALL) {
            assertThat(constant.source()).as(constant.name()).startsWith("CODATA 2022");
            assertThat(constant.sigma().value() > 0)
                    .as(constant.name())
                    .isNotEqualTo(constant.source().endsWith("exact in the SI"));
        }
    }

    private static double of(String unit, String in) {
        double energy = UnitExpression.parse(unit).factorTo(UnitSystem.EV_NM, Dimension.ENERGY);
        return energy / UnitExpression.parse(in).factorTo(UnitSystem.EV_NM, Dimension.ENERGY);
    }

    private static double massInEv(String unit) {
        return UnitExpression.parse(unit).factorTo(UnitSystem.MEV_FM, Dimension.MASS) * 1e6;
    }

    private static double inNanometres(Constants.Constant length) {
        return length.value().value() * 1e9;
    }

    private static double inMetres(double centimetres) {
        return centimetres / 100;
    }
}
