package org.wellwright.solver.units;

import java.math.BigDecimal;
import java.util.List;

/** Units of mass, as rest energies in eV. */
public enum MassUnit implements Unit {
    /** Electron mass. */
    ELECTRON("m_e", "mₑ", Constants.ELECTRON_REST_ENERGY, "me", "electron_mass"),
    /** Atomic mass unit. */
    ATOMIC("u", "u", Constants.ATOMIC_MASS_REST_ENERGY, "Da", "amu"),
    /** Kilogram. */
    KILOGRAM(
            "kg",
            "kg",
            Constants.LIGHT_SPEED.decimal().pow(2).divide(Constants.ELEMENTARY_CHARGE.decimal(), Constants.PRECISION)),
    /** eV/c². */
    EV("eV/c^2", "eV/c²", BigDecimal.ONE, "eV/c2"),
    /** keV/c². */
    KILO_EV("keV/c^2", "keV/c²", new BigDecimal("1e3"), "keV/c2"),
    /** MeV/c². */
    MEGA_EV("MeV/c^2", "MeV/c²", new BigDecimal("1e6"), "MeV/c2"),
    /** GeV/c². */
    GIGA_EV("GeV/c^2", "GeV/c²", new BigDecimal("1e9"), "GeV/c2");

    private final String symbol;
    private final String printed;
    private final BigDecimal size;
    private final List<String> aliases;

    MassUnit(String symbol, String printed, BigDecimal size, String... aliases) {
        this.symbol = symbol;
        this.printed = printed;
        this.size = size;
        this.aliases = List.of(aliases);
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
        return Dimension.MASS;
    }

    @Override
    public BigDecimal size() {
        return size;
    }
}
