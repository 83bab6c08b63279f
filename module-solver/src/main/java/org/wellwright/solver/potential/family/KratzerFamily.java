package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = D[(r_e/r)² − 2r_e/r]. */
@ServiceProvider(service = PotentialFamily.class)
public final class KratzerFamily extends FormulaFamily {
    /** The family. */
    public KratzerFamily() {
        super(
                new Description(
                        "kratzer",
                        "Kratzer",
                        "D*((re/r)^2-2*re/r)",
                        "A rotating and vibrating diatomic molecule in closed form.",
                        "Kratzer 1920"),
                new FamilyParameter("depth", "D", Dimension.ENERGY, 0.2, "from the limit (V = 0) to the minimum"),
                new FamilyParameter("equilibrium", "re", Dimension.LENGTH, 2, "radius of the minimum, positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
    }
}
