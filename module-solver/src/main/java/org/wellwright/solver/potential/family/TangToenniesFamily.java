package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = A e^(−br) − Σ Cₙ fₙ(br)/rⁿ, n = 6, 8, 10. */
@ServiceProvider(service = PotentialFamily.class)
public final class TangToenniesFamily extends FormulaFamily {
    /** The family. */
    public TangToenniesFamily() {
        super(
                new Description(
                        "tang-toennies",
                        "Tang-Toennies",
                        "A*exp(-b*r)-C6*damp(6,b*r)/r^6-C8*damp(8,b*r)/r^8-C10*damp(10,b*r)/r^10",
                        "Two closed-shell atoms: exponential repulsion and damped dispersion.",
                        "Tang and Toennies 1984"),
                new FamilyParameter("repulsion", "A", Dimension.ENERGY, 40, "positive"),
                new FamilyParameter(
                        "steepness", "b", INVERSE_LENGTH, 2, "of the repulsion and of the damping, positive"),
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
                        "positive attracts"));
    }

    @Override
    void check(double[] values) {
        requirePositive(0, values[0]);
        requirePositive(1, values[1]);
    }
}
