package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = W (1/r) df/dr with f the Woods–Saxon shape: −W/(4ar cosh²((r − R)/2a)). */
@ServiceProvider(service = PotentialFamily.class)
public final class ThomasFamily extends FormulaFamily {
    /** The family. */
    public ThomasFamily() {
        super(
                new Description(
                        "thomas",
                        "Thomas spin-orbit",
                        "-W/(4*a*r*cosh((r-R)/(2*a))^2)",
                        "Radial factor of the spin-orbit term W (1/r) df/dr L.S of a nuclear mean field; give its term the angular operator spin-orbit.",
                        "Thomas 1926; Mayer and Jensen 1955"),
                new FamilyParameter(
                        "strength",
                        "W",
                        Dimension.ENERGY.times(Dimension.LENGTH.power(2)),
                        1,
                        "positive: the level with j = l + 1/2 lies lower; often V_so (hbar/m_pi c)^2"),
                new FamilyParameter("radius", "R", Dimension.LENGTH, 5, "radius of f = 1/(1+exp((r-R)/a))"),
                new FamilyParameter("diffuseness", "a", Dimension.LENGTH, 0.6, "positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(2, values[2]);
    }
}
