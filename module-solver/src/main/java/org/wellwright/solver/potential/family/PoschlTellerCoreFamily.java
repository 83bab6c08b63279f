package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = A/sinh²(αr) − B/cosh²(αr). */
@ServiceProvider(service = PotentialFamily.class)
public final class PoschlTellerCoreFamily extends FormulaFamily {
    /** The family. */
    public PoschlTellerCoreFamily() {
        super(
                new Description(
                        "poschl-teller-core",
                        "Poschl-Teller with core",
                        "A/sinh(alpha*r)^2-B/cosh(alpha*r)^2",
                        "Well with a repulsive core, s levels in closed form; A/(alpha r)^2 joins the centrifugal term.",
                        "Poschl and Teller 1933"),
                new FamilyParameter("core", "A", Dimension.ENERGY, 0.5, "positive repels"),
                new FamilyParameter("depth", "B", Dimension.ENERGY, 4, "positive attracts"),
                new FamilyParameter("steepness", "alpha", INVERSE_LENGTH, 0.7, "positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(2, values[2]);
    }
}
