package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = −k/r + br + c. */
@ServiceProvider(service = PotentialFamily.class)
public final class CoulombLinearFamily extends FormulaFamily {
    /** The family. */
    public CoulombLinearFamily() {
        super(
                new Description(
                        "coulomb-linear",
                        "Coulomb plus linear",
                        "-k/r+b*r+c",
                        "Heavy quark and antiquark: one-gluon exchange and confinement.",
                        "Eichten et al. 1978"),
                new FamilyParameter(
                        "strength",
                        "k",
                        ENERGY_LENGTH,
                        0.5,
                        "positive attracts; 4/3 of the strong coupling (times hbar c), not the coupling itself"),
                new FamilyParameter(
                        "tension", "b", Dimension.ENERGY.times(Dimension.LENGTH.power(-1)), 0.2, "positive confines"),
                new FamilyParameter("offset", "c", Dimension.ENERGY, 0.1, "shifts every level"));
    }

    @Override
    void check(double[] values) {
        // every finite value makes sense
    }
}
