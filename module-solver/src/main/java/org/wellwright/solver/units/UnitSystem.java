package org.wellwright.solver.units;

import java.math.BigDecimal;
import java.util.List;
import org.wellwright.solver.InvalidModelException;

/**
 * The units in which a project is solved and shown.
 *
 * @param id name in files and options
 * @param title name on screen
 * @param energy unit of energies
 * @param length unit of lengths
 * @param mass unit of masses
 * @param natural whether ħ = c = 1: masses, inverse lengths and energies may stand for each other
 */
public record UnitSystem(
        String id, String title, EnergyUnit energy, LengthUnit length, MassUnit mass, boolean natural) {

    /** Hartree, bohr, electron masses. */
    public static final UnitSystem ATOMIC =
            new UnitSystem("atomic", "atomic units", EnergyUnit.HARTREE, LengthUnit.BOHR, MassUnit.ELECTRON, false);

    /** cm⁻¹, ångström, atomic mass units. */
    public static final UnitSystem SPECTROSCOPIC = new UnitSystem(
            "spectroscopic", "cm⁻¹, Å, u", EnergyUnit.PER_CM, LengthUnit.ANGSTROM, MassUnit.ATOMIC, false);

    /** eV, nm, electron masses. */
    public static final UnitSystem EV_NM =
            new UnitSystem("eV-nm", "eV, nm", EnergyUnit.EV, LengthUnit.NANOMETRE, MassUnit.ELECTRON, false);

    /** keV, fm, MeV/c². */
    public static final UnitSystem KEV_FM =
            new UnitSystem("keV-fm", "keV, fm", EnergyUnit.KILO_EV, LengthUnit.FEMTOMETRE, MassUnit.MEGA_EV, false);

    /** MeV, fm, MeV/c². */
    public static final UnitSystem MEV_FM =
            new UnitSystem("MeV-fm", "MeV, fm", EnergyUnit.MEGA_EV, LengthUnit.FEMTOMETRE, MassUnit.MEGA_EV, false);

    /** GeV, GeV⁻¹, GeV/c², ħ = c = 1. */
    public static final UnitSystem GEV = new UnitSystem(
            "GeV", "GeV, GeV⁻¹ (ħ = c = 1)", EnergyUnit.GIGA_EV, LengthUnit.PER_GEV, MassUnit.GIGA_EV, true);

    /** GeV, fm, GeV/c². */
    public static final UnitSystem GEV_FM =
            new UnitSystem("GeV-fm", "GeV, fm", EnergyUnit.GIGA_EV, LengthUnit.FEMTOMETRE, MassUnit.GIGA_EV, false);

    /** meV, nm, electron masses. */
    public static final UnitSystem MILLI_EV_NM =
            new UnitSystem("meV-nm", "meV, nm", EnergyUnit.MILLI_EV, LengthUnit.NANOMETRE, MassUnit.ELECTRON, false);

    /** All of them. */
    public static final List<UnitSystem> ALL =
            List.of(ATOMIC, SPECTROSCOPIC, EV_NM, KEV_FM, MEV_FM, GEV, GEV_FM, MILLI_EV_NM);

    /**
     * The system of a name. Case counts: MeV is not meV.
     *
     * @throws InvalidModelException if there is none; names those that are nearest
     */
    public static UnitSystem named(String id) {
        for (UnitSystem system : ALL) {
            if (system.id.equals(id)) {
                return system;
            }
        }
        throw new InvalidModelException(
                "the unit system '%s' is not known".formatted(Names.shortened(id)),
                "",
                "use one of "
                        + String.join(", ", ALL.stream().map(UnitSystem::id).toList()));
    }

    /**
     * ħ²/2m for m = 1 in these units, energy·length²·mass: κ = kineticFactor·(1/m₁ + 1/m₂). Exactly ½ in atomic units
     * and with ħ = c = 1.
     */
    public double kineticFactor() {
        BigDecimal hbarc = Constants.REDUCED_PLANCK_LIGHT;
        return hbarc.multiply(hbarc)
                .divide(
                        energy.size()
                                .multiply(length.size().pow(2))
                                .multiply(mass.size())
                                .multiply(BigDecimal.valueOf(2)),
                        Constants.PRECISION)
                .doubleValue();
    }

    /** c² for m in these units: the rest energy of one unit of mass, in units of energy. */
    public double restEnergy() {
        return mass.size().divide(energy.size(), Constants.PRECISION).doubleValue();
    }

    /** hc, energy·length: the wavelength of a photon is hc/E. */
    public double planckLight() {
        return Constants.PLANCK_LIGHT
                .divide(energy.size().multiply(length.size()), Constants.PRECISION)
                .doubleValue();
    }

    /** e²/4πε₀ = E_h a₀, energy·length: the strength of the Coulomb force of two elementary charges in vacuum. */
    public double coulombStrength() {
        return Constants.HARTREE
                .multiply(Constants.BOHR_RADIUS.decimal())
                .divide(energy.size().multiply(length.size()), Constants.PRECISION)
                .doubleValue();
    }

    /** The size in eV, m, eV of one unit of a dimension of this system. */
    BigDecimal size(Dimension dimension) {
        return power(energy.size(), dimension.energy())
                .multiply(power(length.size(), dimension.length()), Constants.PRECISION)
                .multiply(power(mass.size(), dimension.mass()), Constants.PRECISION);
    }

    /** The unit of a dimension in writing ("eV nm"); empty for a pure number. */
    public String unitText(Dimension dimension) {
        StringBuilder text = new StringBuilder();
        append(text, energy.symbol(), dimension.energy());
        append(text, length.symbol(), dimension.length());
        append(text, mass.symbol(), dimension.mass());
        return text.toString();
    }

    private static void append(StringBuilder text, String symbol, int exponent) {
        if (exponent == 0) {
            return;
        }
        if (!text.isEmpty()) {
            text.append(' ');
        }
        boolean compound = symbol.contains("^") || symbol.contains("/");
        text.append(exponent != 1 && compound ? "(" + symbol + ")" : symbol);
        if (exponent != 1) {
            text.append('^').append(exponent);
        }
    }

    static BigDecimal power(BigDecimal base, int exponent) {
        return base.pow(exponent, Constants.PRECISION);
    }
}
