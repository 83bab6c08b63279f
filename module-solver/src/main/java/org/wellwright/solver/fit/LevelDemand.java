package org.wellwright.solver.fit;

import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.Transform;

/**
 * Which levels are wanted of a model.
 *
 * @param levels the levels
 * @param states those of which the radial function is wanted too
 */
record LevelDemand(Set<LevelKey> levels, Set<LevelKey> states) {
    /** Keeps the order given, so that equal demands give equal sums. */
    LevelDemand {
        levels = new LinkedHashSet<>(levels);
        states = new LinkedHashSet<>(states);
    }

    /** Energies alone. */
    static LevelDemand of(Collection<LevelKey> levels) {
        return new LevelDemand(new LinkedHashSet<>(levels), Set.of());
    }

    /** What some data need. */
    static LevelDemand forData(List<Datum> data) {
        LevelDemand demand = of(Set.of());
        for (Datum datum : data) {
            for (List<Datum.Contribution> part : List.of(datum.levels(), datum.denominator())) {
                for (Datum.Contribution contribution : part) {
                    demand.levels.add(contribution.level());
                    if (datum.transform() == Transform.RADIUS) {
                        demand.states.add(contribution.level());
                    }
                }
            }
        }
        return demand;
    }

    /** This and some levels more. */
    LevelDemand plus(Collection<LevelKey> more) {
        LevelDemand sum = new LevelDemand(levels, states);
        sum.levels.addAll(more);
        return sum;
    }
}
