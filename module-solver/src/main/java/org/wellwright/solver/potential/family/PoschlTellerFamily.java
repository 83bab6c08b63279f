package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = −V₀/cosh²(αr). */
@ServiceProvider(service = PotentialFamily.class)
public final class PoschlTellerFamily extends FormulaFamily {
    /** The family. */
    public PoschlTellerFamily() {
        super(
                new Description(
                        "poschl-teller",
                        "Poschl-Teller well",
                        "-V0/cosh(alpha*r)^2",
                        "Smooth well whose s levels are known in closed form.",
                        "Poschl and Teller 1933"),
                new FamilyParameter("depth", "V0", Dimension.ENERGY, 1, "positive attracts"),
                new FamilyParameter("steepness", "alpha", INVERSE_LENGTH, 0.7, "positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
    }
}
