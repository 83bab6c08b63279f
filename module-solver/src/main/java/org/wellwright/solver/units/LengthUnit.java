package org.wellwright.solver.units;

import java.math.BigDecimal;
import java.util.List;

/** Units of length. */
public enum LengthUnit implements Unit {
    /** Bohr radius. */
    BOHR("bohr", "bohr", Constants.BOHR_RADIUS.decimal(), "a0", "a_0", "Bohr"),
    /** Ångström, 1e-10 m. */
    ANGSTROM("angstrom", "Å", new BigDecimal("1e-10"), "Angstrom", "Å", "\u212b", "ångström"),
    /** Femtometre. */
    FEMTOMETRE("fm", "fm", new BigDecimal("1e-15")),
    /** Picometre. */
    PICOMETRE("pm", "pm", new BigDecimal("1e-12")),
    /** Nanometre. */
    NANOMETRE("nm", "nm", new BigDecimal("1e-9")),
    /** Micrometre. */
    MICROMETRE("um", "µm", new BigDecimal("1e-6"), "µm", "μm"),
    /** Millimetre. */
    MILLIMETRE("mm", "mm", new BigDecimal("1e-3")),
    /** Centimetre. */
    CENTIMETRE("cm", "cm", new BigDecimal("1e-2")),
    /** Metre. */
    METRE("m", "m", BigDecimal.ONE),
    /** Inverse gigaelectronvolt, ħc/GeV. */
    PER_GEV(
            "GeV^-1",
            "GeV⁻¹",
            Constants.REDUCED_PLANCK_LIGHT.divide(new BigDecimal("1e9"), Constants.PRECISION),
            "1/GeV",
            "GeV-1");

    private final String symbol;
    private final String printed;
    private final BigDecimal size;
    private final List<String> aliases;

    LengthUnit(String symbol, String printed, BigDecimal size, String... aliases) {
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
        return Dimension.LENGTH;
    }

    @Override
    public BigDecimal size() {
        return size;
    }
}
