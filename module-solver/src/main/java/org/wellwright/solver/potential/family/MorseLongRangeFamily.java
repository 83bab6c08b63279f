package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = D[(1 − u e^(−s y))² − 1], u the long-range form relative to its value at r_e. */
@ServiceProvider(service = PotentialFamily.class)
public final class MorseLongRangeFamily extends FormulaFamily {
    /** The family. */
    public MorseLongRangeFamily() {
        super(
                new Description(
                        "morse-long-range",
                        "Morse/long-range",
                        "y=(r^p-re^p)/(r^p+re^p); u=(C6/r^6+C8/r^8)/(C6/re^6+C8/re^8); s=y*ln(2*D/(C6/re^6+C8/re^8))+(1-y)*(b0+b1*y+b2*y^2); w=u*exp(-s*y); D*w*(w-2)",
                        "A diatomic curve fitted to levels with the dispersion tail -C6/r^6 - C8/r^8 imposed.",
                        "Le Roy, Huang and Jary 2006; Le Roy, Dattani, Coxon, Ross, Crozet and Linton 2009"),
                new FamilyParameter(
                        "depth", "D", Dimension.ENERGY, 0.02, "from the dissociation limit (V = 0) to the minimum"),
                new FamilyParameter("equilibrium", "re", Dimension.LENGTH, 5, "radius of the minimum, positive"),
                new FamilyParameter(
                        "dispersion6",
                        "C6",
                        Dimension.ENERGY.times(Dimension.LENGTH.power(6)),
                        1500,
                        "positive; V tends to -C6/r^6"),
                new FamilyParameter(
                        "dispersion8",
                        "C8",
                        Dimension.ENERGY.times(Dimension.LENGTH.power(8)),
                        90000,
                        "zero or positive"),
                new FamilyParameter(
                        "order", "p", Dimension.NONE, 4, "power of y, above 2 so that the tail is kept; fixed"),
                new FamilyParameter("b0", "b0", Dimension.NONE, -1, "exponent coefficient of y^0"),
                new FamilyParameter("b1", "b1", Dimension.NONE, 0.1, "coefficient of y"),
                new FamilyParameter("b2", "b2", Dimension.NONE, 0.1, "coefficient of y^2"));
    }

    @Override
    void check(double[] values) {
        requirePositive(1, values[1]);
        requirePositive(2, values[2]);
        requireNotNegative(3, values[3]);
        require(values[4] > 2, 4, "above 2", values[4]);
    }
}
