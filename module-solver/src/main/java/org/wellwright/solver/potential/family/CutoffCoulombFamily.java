package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = −k/(r + b). */
@ServiceProvider(service = PotentialFamily.class)
public final class CutoffCoulombFamily extends FormulaFamily {
    /** The family. */
    public CutoffCoulombFamily() {
        super(
                new Description(
                        "cutoff-coulomb",
                        "Cut-off Coulomb",
                        "-k/(r+b)",
                        "Coulomb attraction of a spread charge; finite at the origin.",
                        "Mehta and Patil 1978"),
                new FamilyParameter("strength", "k", ENERGY_LENGTH, 1, "positive attracts"),
                new FamilyParameter("core", "b", Dimension.LENGTH, 0.5, "positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
    }
}
