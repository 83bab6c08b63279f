package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = −V₀ for R₁ < r < R₂, 0 elsewhere. */
@ServiceProvider(service = PotentialFamily.class)
public final class ShellFamily extends FormulaFamily {
    /** The family. */
    public ShellFamily() {
        super(
                new Description(
                        "shell",
                        "Spherical shell",
                        "-V0*step(r-R1)*step(R2-r)",
                        "A layer of constant potential, such as the shell of a layered dot; negative V0 is a barrier.",
                        "common practice, no source"),
                new FamilyParameter("depth", "V0", Dimension.ENERGY, 1, "positive attracts"),
                new FamilyParameter("inner", "R1", Dimension.LENGTH, 2, "positive"),
                new FamilyParameter("outer", "R2", Dimension.LENGTH, 4, "above the inner radius"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
        require(values[2] > values[1], 2, "above the inner radius", values[2]);
    }
}
