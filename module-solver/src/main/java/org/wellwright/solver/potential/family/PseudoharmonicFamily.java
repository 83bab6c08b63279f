package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = D(r/r_e − r_e/r)². */
@ServiceProvider(service = PotentialFamily.class)
public final class PseudoharmonicFamily extends FormulaFamily {
    /** The family. */
    public PseudoharmonicFamily() {
        super(
                new Description(
                        "pseudoharmonic",
                        "Pseudoharmonic",
                        "D*(r/re-re/r)^2",
                        "A rotating oscillator with equal level distances.",
                        "Davidson 1932"),
                new FamilyParameter("depth", "D", Dimension.ENERGY, 0.2, "stiffness 8 D/re^2 at the minimum; positive"),
                new FamilyParameter(
                        "equilibrium", "re", Dimension.LENGTH, 2, "radius of the minimum (V = 0), positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(0, values[0]);
        requirePositive(1, values[1]);
    }
}
