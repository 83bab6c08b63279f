package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = −Σ Cₙ fₙ(br)/rⁿ, n = 6, 8, 10, fₙ(x) = 1 − e^(−x) Σ xᵏ/k!. */
@ServiceProvider(service = PotentialFamily.class)
public final class DampedDispersionFamily extends FormulaFamily {
    /** The family. */
    public DampedDispersionFamily() {
        super(
                new Description(
                        "damped-dispersion",
                        "Damped dispersion",
                        "-C6*damp(6,b*r)/r^6-C8*damp(8,b*r)/r^8-C10*damp(10,b*r)/r^10",
                        "Attraction of two closed-shell atoms, damped where their clouds overlap.",
                        "Tang and Toennies 1984"),
                new FamilyParameter(
                        "dispersion6",
                        "C6",
                        Dimension.ENERGY.times(Dimension.LENGTH.power(6)),
                        6.5,
                        "positive attracts"),
                new FamilyParameter(
                        "dispersion8",
                        "C8",
                        Dimension.ENERGY.times(Dimension.LENGTH.power(8)),
                        120,
                        "positive attracts"),
                new FamilyParameter(
                        "dispersion10",
                        "C10",
                        Dimension.ENERGY.times(Dimension.LENGTH.power(10)),
                        3000,
                        "positive attracts"),
                new FamilyParameter("damping", "b", INVERSE_LENGTH, 2, "positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(3, values[3]);
    }
}
