package org.wellwright.solver.radial.steps;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelOutcome;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialChannel;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialSolver;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

/**
 * Levels of one uncoupled channel by piecewise constant-reference perturbation and shooting (Ixaru 1984; Ixaru, De
 * Meyer and Vanden Berghe 1997; Ledoux, Van Daele and Vanden Berghe 2004).
 *
 * <p>Energies come with an estimate of their error, confirmed by counts on either side; there are no states and no
 * strict bounds.
 */
public final class PerturbedStepSolver implements RadialSolver {
    @Override
    public String method() {
        return "constant-reference perturbation, shooting";
    }

    @Override
    public Spectrum solve(RadialProblem problem, LevelSearch search, SolveMonitor monitor) {
        Setting setting = new Setting(problem, monitor);
        double ceiling = Math.min(search.below(), setting.threshold);
        boolean all = search.count() == LevelSearch.ALL;
        if (all && setting.endlessBelow(ceiling)) {
            throw setting.endless();
        }
        LevelFinder finder = new LevelFinder(setting.shooting, setting.threshold, setting.floor(), monitor);
        double above;
        int found;
        if (!all) {
            above = finder.energyAbove(search.count(), ceiling);
            found = Math.min(search.count(), finder.count(above));
        } else {
            above = ceiling;
            found = finder.count(above);
        }
        List<LevelOutcome> levels = new ArrayList<>(found);
        for (int index = 0; index < found; index++) {
            if (monitor.cancelled()) {
                throw new CancellationException();
            }
            monitor.progress((double) index / found, "second method, " + setting.where);
            Level level = finder.find(index, above);
            levels.add(level);
        }
        Spectrum.Effort effort = new Spectrum.Effort(
                setting.mesh.stepCount(), setting.potential.evaluations(), setting.shooting.counts());
        return new Spectrum(
                problem,
                search,
                levels,
                List.of(),
                Completeness.NO,
                finder.searchedBelow(found, above),
                "one method alone, without strict bounds",
                effort);
    }

    @Override
    public int countBelow(RadialProblem problem, double energy) {
        Setting setting = new Setting(problem, SolveMonitor.NONE);
        double ceiling = Math.min(energy, setting.threshold);
        if (setting.endlessBelow(ceiling)) {
            throw setting.endless();
        }
        return setting.shooting.count(ceiling);
    }

    /** What one problem is solved with. */
    private static final class Setting {
        private final String where;
        private final ScalarPotential potential;
        private final PotentialScan scan;
        private final double threshold;
        private final StepMesh mesh;
        private final Shooting shooting;
        private final boolean endlessSeries;

        Setting(RadialProblem problem, SolveMonitor monitor) {
            if (problem.channels().size() != 1) {
                throw new IllegalArgumentException("this method solves one channel, got "
                        + problem.channels().size());
            }
            RadialChannel channel = problem.channels().get(0);
            double kinetic = problem.kinetic();
            where = "channel l = " + channel.orbital();
            potential = new ScalarPotential(problem);
            scan = PotentialScan.of(
                    potential, kinetic, channel.centrifugal(), problem.innerWall(), problem.outerWall(), where);
            ChannelEnds ends = new ChannelEnds(potential, scan, kinetic, channel.centrifugal(), where);
            OriginBehaviour origin = problem.innerWall() > 0 ? OriginBehaviour.FINITE : ends.origin();
            boolean closed = !Double.isInfinite(problem.outerWall());
            threshold = closed ? Double.POSITIVE_INFINITY : ends.threshold();
            endlessSeries = Double.isInfinite(threshold) || ends.endlessTail();
            mesh = new StepMesh(
                    potential,
                    scan,
                    kinetic,
                    channel.centrifugal(),
                    origin,
                    problem.innerWall(),
                    problem.outerWall(),
                    threshold,
                    monitor,
                    where);
            shooting = new Shooting(mesh, scan, kinetic);
        }

        boolean endlessBelow(double ceiling) {
            return endlessSeries && ceiling >= threshold;
        }

        InvalidModelException endless() {
            return new InvalidModelException(
                    "the series of bound levels has no end",
                    where,
                    "ask for a number of levels, or for those below an energy");
        }

        /** An energy below all levels. */
        double floor() {
            double floor = Math.min(scan.hardyBound(), threshold);
            double step = Math.max(Math.abs(floor) * 1e-3, Double.MIN_NORMAL);
            while (shooting.count(floor) > 0) {
                floor -= step;
                step *= 2;
            }
            return floor;
        }
    }
}
