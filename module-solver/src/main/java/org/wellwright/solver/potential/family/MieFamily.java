package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = D/(n − m)[m(r_e/r)ⁿ − n(r_e/r)ᵐ]. */
@ServiceProvider(service = PotentialFamily.class)
public final class MieFamily extends FormulaFamily {
    /** The family. */
    public MieFamily() {
        super(
                new Description(
                        "mie",
                        "Lennard-Jones (m,n)",
                        "D/(n-m)*(m*(re/r)^n-n*(re/r)^m)",
                        "Two closed-shell atoms with chosen exponents.",
                        "Mie 1903"),
                new FamilyParameter("depth", "D", Dimension.ENERGY, 0.001, "from the limit (V = 0) to the minimum"),
                new FamilyParameter("equilibrium", "re", Dimension.LENGTH, 5, "radius of the minimum, positive"),
                new FamilyParameter("attractive", "m", Dimension.NONE, 6, "exponent of the attraction, positive"),
                new FamilyParameter("repulsive", "n", Dimension.NONE, 12, "exponent of the repulsion, above m"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
        requirePositive(2, values[2]);
        require(values[3] > values[2], 3, "above the attractive exponent", values[3]);
    }
}
