package org.wellwright.solver.potential.family;

import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.HardWalls;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.units.Dimension;

/** V = ∞ for r < R, 0 beyond: a wall at R. */
@ServiceProvider(service = PotentialFamily.class)
public final class HardSphereFamily extends BuiltInFamily {
    /** The family. */
    public HardSphereFamily() {
        super(
                new Description(
                        "hard-sphere",
                        "Hard sphere",
                        "infinite for r < R, 0 beyond",
                        "Impenetrable core; add it to an attraction. The wave function is zero at R.",
                        "common practice, no source"),
                new FamilyParameter("radius", "R", Dimension.LENGTH, 1, "radius of the core, positive"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        requirePositive(0, values[0]);
        return new Wall(id(), values, new HardWalls(values[0], Double.POSITIVE_INFINITY, List.of(1.0), List.of()));
    }
}
