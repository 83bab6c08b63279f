package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = −k erf(√(3/2) r/R)/r. */
@ServiceProvider(service = PotentialFamily.class)
public final class GaussianNucleusFamily extends FormulaFamily {
    /** The family. */
    public GaussianNucleusFamily() {
        super(
                new Description(
                        "nucleus-gaussian",
                        "Nucleus: Gaussian charge",
                        "-k*erf(sqrt(1.5)*r/R)/r",
                        "A point charge in the field of a Gaussian charge distribution.",
                        "Visscher and Dyall 1997"),
                new FamilyParameter(
                        "strength", "k", ENERGY_LENGTH, 1, "positive attracts; the charge seen from outside"),
                new FamilyParameter("radius", "R", Dimension.LENGTH, 1, "rms charge radius, positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
    }
}
