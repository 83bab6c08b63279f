package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = −(k/r)[1 + (Z − 1)e^(−a₁r) − r(a₃ + a₄r)e^(−a₂r)] − (α_c/2r⁴)(1 − e^(−(r/r_c)⁶)). */
@ServiceProvider(service = PotentialFamily.class)
public final class ScreenedCoreFamily extends FormulaFamily {
    /** The family. */
    public ScreenedCoreFamily() {
        super(
                new Description(
                        "screened-core",
                        "Screened core with polarisation",
                        "-k/r*(1+(Z-1)*exp(-a1*r)-r*(a3+a4*r)*exp(-a2*r))+ac/(2*r^4)*expm1(-(r/rc)^6)",
                        "The outer electron of an alkali-like atom; give the parameters by l.",
                        "Marinescu, Sadeghpour and Dalgarno 1994"),
                new FamilyParameter(
                        "strength",
                        "k",
                        ENERGY_LENGTH,
                        1,
                        "charge of the ion core times the unit of Coulomb strength (1 in atomic units)"),
                new FamilyParameter("charge", "Z", Dimension.NONE, 11, "nuclear charge over that of the ion core"),
                new FamilyParameter("a1", "a1", INVERSE_LENGTH, 4.8, "decay of the core electrons, positive"),
                new FamilyParameter("a2", "a2", INVERSE_LENGTH, 2.4, "decay of the correction, positive"),
                new FamilyParameter("a3", "a3", INVERSE_LENGTH, -1.1, "coefficient of r in the correction"),
                new FamilyParameter(
                        "a4", "a4", Dimension.LENGTH.power(-2), -1.4, "coefficient of r^2 in the correction"),
                new FamilyParameter(
                        "polarisability",
                        "ac",
                        Dimension.ENERGY.times(Dimension.LENGTH.power(4)),
                        0.9,
                        "static dipole polarisability of the core"),
                new FamilyParameter(
                        "cutoff",
                        "rc",
                        Dimension.LENGTH,
                        0.45,
                        "radius below which the polarisation is cut off, positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(2, values[2]);
        requirePositive(3, values[3]);
        requirePositive(7, values[7]);
    }
}
