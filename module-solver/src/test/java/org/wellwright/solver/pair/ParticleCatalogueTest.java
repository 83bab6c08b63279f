package org.wellwright.solver.pair;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.PublishedDigits;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

class ParticleCatalogueTest {
    private static final ParticleCatalogue TABLE = ParticleCatalogue.STANDARD;

    @ParameterizedTest(name = "{0}")
    @CsvFileSource(resources = "masses.csv", numLinesToSkip = 2)
    void massesAgreeWithThePublishedOnes(String id, String quantity, String value, String unit, int digits) {
        double computed = switch (id) {
            case "c22_mdme" -> mass("d", UnitSystem.ATOMIC);
            case "c22_mmume" -> mass("mu-", UnitSystem.ATOMIC);
            case "c22_mmumev" -> mass("mu-", UnitSystem.MEV_FM);
            case "c22_mpme" -> mass("p", UnitSystem.ATOMIC);
            case "c22_mpmev" -> mass("p", UnitSystem.MEV_FM);
            case "dr_mu_CO" -> typed("12", "15.99491461957").reducedMass(UnitSystem.SPECTROSCOPIC);
            default -> throw new IllegalArgumentException("no computation for " + id);
        };
        PublishedDigits.assertAgree(id, computed, value, digits);
    }

    /** Energies of the point Coulomb force, −k²/(4κn²), through masses, units and charges as the assembly uses them. */
    @ParameterizedTest(name = "{0}")
    @CsvFileSource(resources = "coulomb.csv", numLinesToSkip = 2)
    void coulombLevelsAgreeWithTheRecomputedOnes(String id, String quantity, String value, String unit, int digits) {
        double computed = switch (id) {
            case "coul_H_1s" -> bohr("e-,p", 1);
            case "coul_H_3" -> bohr("e-,p", 3);
            case "coul_D_1s" -> bohr("e-,d", 1);
            case "coul_Ps_12" -> bohr("e-,e+", 2) - bohr("e-,e+", 1);
            case "coul_RH" ->
                -bohr("e-,p", 1) * UnitExpression.parse("eV").factorTo(UnitSystem.SPECTROSCOPIC, Dimension.ENERGY);
            case "coul_muH_1s" -> bohr("mu-,p", 1);
            case "coul_muH_2s" -> bohr("mu-,p", 2);
            case "coul_muH_a" -> bohrRadius("mu-,p");
            default -> throw new IllegalArgumentException("no computation for " + id);
        };
        PublishedDigits.assertAgree(id, computed, value, digits);
    }

    @Test
    void bareNucleiOfAtomsAgreeWithTheirOwnEntries() {
        // Atom minus electrons misses their binding energy: 13.6 eV of 9.4e8 eV in hydrogen, 79 eV of 3.7e9 eV in
        // helium.
        nucleus("H-1", "p", 2e-8);
        nucleus("H-2", "d", 1e-8);
        nucleus("He-4", "alpha", 3e-8);
    }

    private static void nucleus(String atom, String own, double relative) {
        double stripped = TABLE.find(atom).mass(MassConvention.NUCLEAR, 0).value()
                * UnitExpression.parse("u").factorTo(UnitSystem.ATOMIC, Dimension.MASS);
        double bare = mass(own, UnitSystem.ATOMIC);
        assertThat(stripped).isCloseTo(bare, within(relative * bare)).isLessThan(bare);
    }

    @Test
    void ionLosesAsManyElectronsAsItsCharge() {
        // Na+ from 22.98976928195 u (AME 2020) minus one electron of 5.485799090441e-4 u (CODATA 2022).
        assertThat(TABLE.find("Na-23").mass(MassConvention.ION, 1).value())
                .isCloseTo(22.9892207020409559, within(1e-14));
        assertThat(TABLE.find("Na-23").mass(MassConvention.ATOMIC, 1).text()).isEqualTo("22.98976928195");
        assertThat(TABLE.find("p").mass(MassConvention.ION, 1))
                .isEqualTo(TABLE.find("p").mass());
    }

    @Test
    void everyEntryNamesItsSource() {
        assertThat(TABLE.particles()).hasSizeGreaterThan(40);
        for (Particle particle : TABLE.particles()) {
            assertThat(particle.source()).as(particle.id()).matches("(CODATA 2022|AME 2020|Particle Data Group).*");
            assertThat(TABLE.find(particle.id())).isSameAs(particle);
        }
    }

    @Test
    void unknownParticleAndHalfAPairAreRefusedWithTheNearest() {
        assertThatThrownBy(() -> TABLE.find("prton"))
                .isInstanceOf(InvalidModelException.class)
                .hasMessage("the particle 'prton' is not known; did you mean proton, triton");
        assertThatThrownBy(() -> TABLE.pair("e-"))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("like e-,p");
    }

    private static double mass(String id, UnitSystem units) {
        Particle particle = TABLE.find(id);
        return particle.mass().value() * UnitExpression.parse(particle.unit()).factorTo(units, Dimension.MASS);
    }

    private static PairSystem typed(String first, String second) {
        return PairSystem.of("pair", body(first), body(second));
    }

    private static Body body(String mass) {
        return new Body("", new BodyMass.Typed(new ExactNumber(mass), null, "u"), ExactNumber.ZERO, -1);
    }

    private static double bohr(String pair, int principal) {
        UnitSystem units = UnitSystem.EV_NM;
        double kinetic = units.kineticFactor() / TABLE.pair(pair).reducedMass(units);
        double strength = units.coulombStrength();
        return -strength * strength / (4 * kinetic * principal * principal);
    }

    private static double bohrRadius(String pair) {
        UnitSystem units = UnitSystem.MEV_FM;
        return 2 * units.kineticFactor() / TABLE.pair(pair).reducedMass(units) / units.coulombStrength();
    }
}
