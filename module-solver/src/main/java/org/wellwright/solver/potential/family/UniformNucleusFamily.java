package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = −k/r outside, −(k/2R)(3 − r²/R²) inside. */
@ServiceProvider(service = PotentialFamily.class)
public final class UniformNucleusFamily extends FormulaFamily {
    /** The family. */
    public UniformNucleusFamily() {
        super(
                new Description(
                        "nucleus-uniform",
                        "Nucleus: uniform sphere",
                        "-k/max(r,R)*(3-(min(r,R)/R)^2)/2",
                        "A point charge in the field of a uniformly charged sphere.",
                        "Bethe and Salpeter 1957, electrostatics of a sphere"),
                new FamilyParameter(
                        "strength", "k", ENERGY_LENGTH, 1, "positive attracts; the charge seen from outside"),
                new FamilyParameter(
                        "radius",
                        "R",
                        Dimension.LENGTH,
                        1,
                        "sharp radius, sqrt(5/3) of the rms charge radius; positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
    }
}
