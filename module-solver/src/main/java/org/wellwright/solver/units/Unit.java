package org.wellwright.solver.units;

import java.math.BigDecimal;
import java.util.List;

/** A unit of energy, length or mass. */
public sealed interface Unit permits EnergyUnit, LengthUnit, MassUnit {
    /** The symbol that is written ("eV", "angstrom"). */
    String symbol();

    /** The symbol in figures and running text ("cm⁻¹", "Å"). */
    String printed();

    /** Other symbols that are understood. */
    List<String> aliases();

    /** Energy, length or mass. */
    Dimension dimension();

    /** Its size in eV, metres or eV/c², to 60 digits where it is not exact. */
    BigDecimal size();
}
