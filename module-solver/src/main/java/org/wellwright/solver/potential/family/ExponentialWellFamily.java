package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = −V₀ e^(−r/a). */
@ServiceProvider(service = PotentialFamily.class)
public final class ExponentialWellFamily extends FormulaFamily {
    /** The family. */
    public ExponentialWellFamily() {
        super(
                new Description(
                        "exponential-well",
                        "Exponential well",
                        "-V0*exp(-r/a)",
                        "Short-range attraction of two nucleons; s levels by zeros of Bessel functions.",
                        "Bethe and Bacher 1936"),
                new FamilyParameter("depth", "V0", Dimension.ENERGY, 1, "positive attracts"),
                new FamilyParameter("range", "a", Dimension.LENGTH, 1, "positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
    }
}
