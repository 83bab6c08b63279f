package org.wellwright.solver.radial.steps;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.function.LongSupplier;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.LevelOutcome;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

/** One search for levels with a way of shooting, whatever the number of channels. Used by one thread. */
final class LevelRun {
    private final LevelShooting shooting;
    private final double threshold;
    private final double hardyBound;
    private final boolean endless;
    private final String where;

    /**
     * A search.
     *
     * @param threshold lowest energy that is not bound, +∞ if confining
     * @param hardyBound an energy below all levels
     * @param endless whether levels crowd without end below the threshold
     * @param where names the channel in messages
     */
    LevelRun(LevelShooting shooting, double threshold, double hardyBound, boolean endless, String where) {
        this.shooting = shooting;
        this.threshold = threshold;
        this.hardyBound = hardyBound;
        this.endless = endless;
        this.where = where;
    }

    /** Levels below an energy or the threshold, whichever is lower. */
    int count(double energy) {
        double ceiling = Math.min(energy, threshold);
        requireEnd(ceiling);
        return shooting.count(ceiling);
    }

    /**
     * Finds levels; see {@link org.wellwright.solver.radial.RadialSolver#solve}.
     *
     * @param steps how many steps there are in the end
     * @param evaluations how often V was evaluated in the end
     */
    Spectrum run(
            RadialProblem problem,
            LevelSearch search,
            SolveMonitor monitor,
            LongSupplier steps,
            LongSupplier evaluations) {
        double ceiling = Math.min(search.below(), threshold);
        boolean all = search.count() == LevelSearch.ALL;
        if (all) {
            requireEnd(ceiling);
        }
        LevelFinder finder = new LevelFinder(shooting, threshold, floor(), monitor);
        double above = all ? ceiling : finder.energyAbove(search.count(), ceiling);
        int found = Math.min(search.count(), finder.count(above));
        List<LevelOutcome> levels = new ArrayList<>(found);
        for (int index = 0; index < found; index++) {
            if (monitor.cancelled()) {
                throw new CancellationException();
            }
            monitor.progress((double) index / found, "second method, " + where);
            levels.add(finder.find(index, above));
        }
        return new Spectrum(
                problem,
                search,
                levels,
                List.of(),
                Completeness.NO,
                finder.searchedBelow(found, above),
                "one method alone, without strict bounds",
                new Spectrum.Effort((int) steps.getAsLong(), evaluations.getAsLong(), shooting.counts()));
    }

    private void requireEnd(double ceiling) {
        if (endless && ceiling >= threshold) {
            throw new InvalidModelException(
                    "the series of bound levels has no end",
                    where,
                    "ask for a number of levels, or for those below an energy");
        }
    }

    private double floor() {
        double floor = Math.min(hardyBound, threshold);
        double step = Math.max(Math.abs(floor) * 1e-3, Double.MIN_NORMAL);
        while (shooting.count(floor) > 0) {
            floor -= step;
            step *= 2;
        }
        return floor;
    }
}
