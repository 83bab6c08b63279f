package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = D[(1 − e^(−β(r − r_e)))² − 1] with β a polynomial in y = (r^q − r_e^q)/(r^q + r_e^q). */
@ServiceProvider(service = PotentialFamily.class)
public final class ExpandedMorseFamily extends FormulaFamily {
    /** The family. */
    public ExpandedMorseFamily() {
        super(
                new Description(
                        "expanded-morse",
                        "Expanded Morse oscillator",
                        "y=(r^q-re^q)/(r^q+re^q); w=exp(-(b0+b1*y+b2*y^2+b3*y^3)*(r-re)); D*w*(w-2)",
                        "A diatomic curve fitted to levels; exponential at long range.",
                        "Lee, Seto, Hirao, Bernath and Le Roy 1999"),
                new FamilyParameter(
                        "depth", "D", Dimension.ENERGY, 0.1, "from the dissociation limit (V = 0) to the minimum"),
                new FamilyParameter("equilibrium", "re", Dimension.LENGTH, 2, "radius of the minimum, positive"),
                new FamilyParameter(
                        "order", "q", Dimension.NONE, 3, "power of the expansion variable y, positive; fixed"),
                new FamilyParameter("b0", "b0", INVERSE_LENGTH, 1, "exponent at the minimum"),
                new FamilyParameter("b1", "b1", INVERSE_LENGTH, 0.1, "coefficient of y"),
                new FamilyParameter("b2", "b2", INVERSE_LENGTH, 0.05, "coefficient of y^2"),
                new FamilyParameter("b3", "b3", INVERSE_LENGTH, 0.02, "coefficient of y^3"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
        requirePositive(2, values[2]);
    }
}
