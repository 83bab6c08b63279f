package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = C ln(r/r₀). */
@ServiceProvider(service = PotentialFamily.class)
public final class LogarithmicFamily extends FormulaFamily {
    /** The family. */
    public LogarithmicFamily() {
        super(
                new Description(
                        "logarithmic",
                        "Logarithmic",
                        "C*ln(r/r0)",
                        "Heavy quark pairs: level distances do not depend on the mass.",
                        "Quigg and Rosner 1977"),
                new FamilyParameter("strength", "C", Dimension.ENERGY, 0.75, "positive confines"),
                new FamilyParameter("zero", "r0", Dimension.LENGTH, 1, "radius where V = 0, positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
    }
}
