package org.wellwright.solver.potential.family;

import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.HardWalls;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.units.Dimension;

/** V = 0 for r < R, ∞ beyond: a wall at R. */
@ServiceProvider(service = PotentialFamily.class)
public final class HardCavityFamily extends BuiltInFamily {
    /** The family. */
    public HardCavityFamily() {
        super(
                new Description(
                        "hard-cavity",
                        "Hard cavity",
                        "0 for r < R, infinite beyond",
                        "Impenetrable spherical box, such as a dot in a matrix of wide gap; levels by zeros of spherical Bessel functions.",
                        "common practice, no source"),
                new FamilyParameter("radius", "R", Dimension.LENGTH, 5, "radius of the cavity, positive"));
    }

    @Override
    TermEvaluator evaluator(double[] values, ChannelFacts channel) {
        requirePositive(0, values[0]);
        return new Wall(id(), values, new HardWalls(0, values[0], List.of(), List.of(1.0)));
    }
}
