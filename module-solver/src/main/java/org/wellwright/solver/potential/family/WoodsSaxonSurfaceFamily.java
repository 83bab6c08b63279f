package org.wellwright.solver.potential.family;

import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.units.Dimension;

/** V = −4V₀ f(1 − f) = −V₀/cosh²((r − R)/2a), f the Woods–Saxon shape. */
@ServiceProvider(service = PotentialFamily.class)
public final class WoodsSaxonSurfaceFamily extends FormulaFamily {
    /** The family. */
    public WoodsSaxonSurfaceFamily() {
        super(
                new Description(
                        "woods-saxon-surface",
                        "Woods-Saxon surface",
                        "-V0/cosh((r-R)/(2*a))^2",
                        "Surface term of a nuclear mean field: -4 V0 e/(1+e)^2 with e = exp((r-R)/a).",
                        "Woods and Saxon 1954; derivative form in common practice"),
                new FamilyParameter("depth", "V0", Dimension.ENERGY, 1, "depth at r = R, positive attracts"),
                new FamilyParameter("radius", "R", Dimension.LENGTH, 5, "centre of the surface"),
                new FamilyParameter("diffuseness", "a", Dimension.LENGTH, 0.6, "positive"));
    }

    @Override
    void check(double[] values) {
        requirePositive(2, values[2]);
    }
}
