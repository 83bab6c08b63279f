package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;

/** V = −kα/(e^(αr) − 1). */
@ServiceProvider(service = PotentialFamily.class)
public final class HulthenFamily extends FormulaFamily {
    /** The family. */
    public HulthenFamily() {
        super(
                new Description(
                        "hulthen",
                        "Hulthen",
                        "-k*alpha/expm1(alpha*r)",
                        "Screened Coulomb attraction whose s levels are known in closed form.",
                        "Hulthen 1942"),
                new FamilyParameter(
                        "strength", "k", ENERGY_LENGTH, 1, "positive attracts; V tends to -k/r at the origin"),
                new FamilyParameter("screening", "alpha", INVERSE_LENGTH, 0.2, "positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
    }
}
