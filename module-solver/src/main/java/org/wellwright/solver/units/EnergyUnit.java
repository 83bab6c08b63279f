package org.wellwright.solver.units;

import java.math.BigDecimal;
import java.util.List;

/** Units of energy; wavenumbers count as hc/λ, frequencies as hν, temperatures as kT. */
public enum EnergyUnit implements Unit {
    /** Hartree, 2 h c R∞. */
    HARTREE("hartree", "hartree", Constants.HARTREE, "Eh", "E_h", "Hartree"),
    /** Rydberg energy, h c R∞. */
    RYDBERG("Ry", "Ry", Constants.HARTREE.divide(BigDecimal.valueOf(2), Constants.PRECISION), "rydberg"),
    /** Electronvolt. */
    EV("eV", "eV", BigDecimal.ONE),
    /** Microelectronvolt. */
    MICRO_EV("ueV", "µeV", new BigDecimal("1e-6"), "µeV", "μeV"),
    /** Millielectronvolt. */
    MILLI_EV("meV", "meV", new BigDecimal("1e-3")),
    /** Kiloelectronvolt. */
    KILO_EV("keV", "keV", new BigDecimal("1e3")),
    /** Megaelectronvolt. */
    MEGA_EV("MeV", "MeV", new BigDecimal("1e6")),
    /** Gigaelectronvolt. */
    GIGA_EV("GeV", "GeV", new BigDecimal("1e9")),
    /** Wavenumber, hc/cm. */
    PER_CM("cm^-1", "cm⁻¹", Constants.PLANCK_LIGHT.multiply(BigDecimal.valueOf(100)), "cm-1", "1/cm"),
    /** Hertz, h·Hz. */
    HERTZ("Hz", "Hz", hertz("1")),
    /** Kilohertz. */
    KILOHERTZ("kHz", "kHz", hertz("1e3")),
    /** Megahertz. */
    MEGAHERTZ("MHz", "MHz", hertz("1e6")),
    /** Gigahertz. */
    GIGAHERTZ("GHz", "GHz", hertz("1e9")),
    /** Terahertz. */
    TERAHERTZ("THz", "THz", hertz("1e12")),
    /** Kelvin, k·K. */
    KELVIN("K", "K", Constants.BOLTZMANN.decimal().divide(Constants.ELEMENTARY_CHARGE.decimal(), Constants.PRECISION)),
    /** Joule. */
    JOULE("J", "J", BigDecimal.ONE.divide(Constants.ELEMENTARY_CHARGE.decimal(), Constants.PRECISION)),
    /** Kilojoule per mole. */
    KILOJOULE_PER_MOLE(
            "kJ/mol",
            "kJ/mol",
            BigDecimal.valueOf(1000)
                    .divide(
                            Constants.ELEMENTARY_CHARGE.decimal().multiply(Constants.AVOGADRO.decimal()),
                            Constants.PRECISION));

    private final String symbol;
    private final String printed;
    private final BigDecimal size;
    private final List<String> aliases;

    EnergyUnit(String symbol, String printed, BigDecimal size, String... aliases) {
        this.symbol = symbol;
        this.printed = printed;
        this.size = size;
        this.aliases = List.of(aliases);
    }

    private static BigDecimal hertz(String count) {
        return Constants.PLANCK
                .decimal()
                .multiply(new BigDecimal(count))
                .divide(Constants.ELEMENTARY_CHARGE.decimal(), Constants.PRECISION);
    }

    /** Whether it is a frequency. */
    public boolean frequency() {
        return this == HERTZ || this == KILOHERTZ || this == MEGAHERTZ || this == GIGAHERTZ || this == TERAHERTZ;
    }

    /**
     * Whether it is an electronvolt or a multiple, which also serves as a unit of mass and, with ħ = c = 1, of inverse
     * length.
     */
    boolean electronvolt() {
        return symbol.endsWith("eV");
    }

    @Override
    public String symbol() {
        return symbol;
    }

    @Override
    public String printed() {
        return printed;
    }

    @Override
    public List<String> aliases() {
        return aliases;
    }

    @Override
    public Dimension dimension() {
        return Dimension.ENERGY;
    }

    @Override
    public BigDecimal size() {
        return size;
    }
}
