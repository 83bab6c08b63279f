package org.wellwright.solver.units;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;

/**
 * The constants of nature that everything is computed with: CODATA 2022 (Mohr, Newell, Taylor and Tiesinga 2025, Rev.
 * Mod. Phys. 97, 025002).
 *
 * <p>h, c, e, k and N_A are exact by the definition of the SI. Measured are R∞, a₀ and A_r(e); the hartree is 2 h c R∞,
 * the electron's rest energy ħ²c²/(E_h a₀²), u = m_e/A_r(e). So the units agree with each other to the last bit, and
 * every derived value agrees with the recommended one in all printed digits.
 */
public final class Constants {
    /** The edition, as projects pin it. */
    public static final String EDITION = "CODATA 2022";

    private static final String SOURCE =
            "CODATA 2022: Mohr, Newell, Taylor and Tiesinga, Rev. Mod. Phys. 97 (2025) 025002";

    /** Planck constant, J s, exact. */
    public static final Constant PLANCK = exact("Planck constant", "h", "6.62607015e-34", "J s");

    /** Speed of light, m/s, exact. */
    public static final Constant LIGHT_SPEED = exact("speed of light in vacuum", "c", "299792458", "m/s");

    /** Elementary charge, C, exact. */
    public static final Constant ELEMENTARY_CHARGE = exact("elementary charge", "e", "1.602176634e-19", "C");

    /** Boltzmann constant, J/K, exact. */
    public static final Constant BOLTZMANN = exact("Boltzmann constant", "k", "1.380649e-23", "J/K");

    /** Avogadro constant, 1/mol, exact. */
    public static final Constant AVOGADRO = exact("Avogadro constant", "N_A", "6.02214076e23", "1/mol");

    /** Rydberg constant, 1/m. */
    public static final Constant RYDBERG = measured("Rydberg constant", "R_inf", "10973731.568157", "0.000012", "1/m");

    /** Bohr radius, m. */
    public static final Constant BOHR_RADIUS =
            measured("Bohr radius", "a_0", "5.29177210544e-11", "0.00000000082e-11", "m");

    /** Relative atomic mass of the electron: its mass in u. */
    public static final Constant ELECTRON_RELATIVE_MASS =
            measured("electron relative atomic mass", "A_r(e)", "5.485799090441e-4", "0.000000000097e-4", "");

    /** Fine-structure constant, a pure number. */
    public static final Constant FINE_STRUCTURE =
            measured("fine-structure constant", "alpha", "7.2973525643e-3", "0.0000000011e-3", "");

    /** All constants, in the order of this page. */
    public static final List<Constant> ALL = List.of(
            PLANCK,
            LIGHT_SPEED,
            ELEMENTARY_CHARGE,
            BOLTZMANN,
            AVOGADRO,
            RYDBERG,
            BOHR_RADIUS,
            ELECTRON_RELATIVE_MASS,
            FINE_STRUCTURE);

    /** Precision of conversion factors before they are rounded to a double once. */
    static final MathContext PRECISION = new MathContext(60, RoundingMode.HALF_EVEN);

    /** π to 60 digits (DLMF 3.12.1). */
    private static final BigDecimal PI =
            new BigDecimal("3.14159265358979323846264338327950288419716939937510582097494");

    /** hc, eV m. */
    static final BigDecimal PLANCK_LIGHT =
            PLANCK.decimal().multiply(LIGHT_SPEED.decimal()).divide(ELEMENTARY_CHARGE.decimal(), PRECISION);

    /** ħc, eV m. */
    static final BigDecimal REDUCED_PLANCK_LIGHT = PLANCK_LIGHT.divide(PI.multiply(BigDecimal.valueOf(2)), PRECISION);

    /** The hartree 2 h c R∞, eV. */
    static final BigDecimal HARTREE = PLANCK_LIGHT
            .multiply(RYDBERG.decimal())
            .multiply(BigDecimal.valueOf(2))
            .round(PRECISION);

    /** Rest energy of the electron, ħ²c²/(E_h a₀²), eV. */
    static final BigDecimal ELECTRON_REST_ENERGY = REDUCED_PLANCK_LIGHT
            .multiply(REDUCED_PLANCK_LIGHT)
            .divide(HARTREE.multiply(BOHR_RADIUS.decimal()).multiply(BOHR_RADIUS.decimal()), PRECISION);

    /** Rest energy of the atomic mass unit, m_e c²/A_r(e), eV. */
    static final BigDecimal ATOMIC_MASS_REST_ENERGY =
            ELECTRON_REST_ENERGY.divide(ELECTRON_RELATIVE_MASS.decimal(), PRECISION);

    private Constants() {}

    /**
     * One constant.
     *
     * @param name its name
     * @param symbol its usual symbol
     * @param value its value as published
     * @param sigma its standard uncertainty; 0 if it is exact
     * @param unit its SI unit; empty for a pure number
     * @param source where it was published
     */
    public record Constant(
            String name, String symbol, ExactNumber value, ExactNumber sigma, String unit, String source) {
        BigDecimal decimal() {
            return value.decimal();
        }
    }

    private static Constant exact(String name, String symbol, String value, String unit) {
        return new Constant(name, symbol, new ExactNumber(value), ExactNumber.ZERO, unit, SOURCE + "; exact in the SI");
    }

    private static Constant measured(String name, String symbol, String value, String sigma, String unit) {
        return new Constant(name, symbol, new ExactNumber(value), new ExactNumber(sigma), unit, SOURCE);
    }
}
