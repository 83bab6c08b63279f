package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = −V₀ e^(−(r/a)²). */
@ServiceProvider(service = PotentialFamily.class)
public final class GaussianWellFamily extends FormulaFamily {
    /** The family. */
    public GaussianWellFamily() {
        super(
                new Description(
                        "gaussian-well",
                        "Gaussian well",
                        "-V0*exp(-(r/a)^2)",
                        "Soft short-range attraction; a dot with smooth walls.",
                        "common practice, no source"),
                new FamilyParameter("depth", "V0", Dimension.ENERGY, 1, "positive attracts"),
                new FamilyParameter("range", "a", Dimension.LENGTH, 2, "positive; V falls to V0/e there"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
    }
}
