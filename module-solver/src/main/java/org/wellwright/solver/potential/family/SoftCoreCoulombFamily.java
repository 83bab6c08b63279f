package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = −k/√(r² + a²). */
@ServiceProvider(service = PotentialFamily.class)
public final class SoftCoreCoulombFamily extends FormulaFamily {
    /** The family. */
    public SoftCoreCoulombFamily() {
        super(
                new Description(
                        "soft-core-coulomb",
                        "Soft-core Coulomb",
                        "-k/sqrt(r^2+a^2)",
                        "Coulomb attraction smoothed at the origin.",
                        "Su and Eberly 1991"),
                new FamilyParameter("strength", "k", ENERGY_LENGTH, 1, "positive attracts"),
                new FamilyParameter("core", "a", Dimension.LENGTH, 0.5, "positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
    }
}
