package org.wellwright.solver.radial.steps;

import org.wellwright.solver.potential.OriginBehaviour;
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
        return setting.search.run(problem, search, monitor, setting.mesh::stepCount, setting.potential::evaluations);
    }

    @Override
    public int countBelow(RadialProblem problem, double energy) {
        return new Setting(problem, SolveMonitor.NONE).search.count(energy);
    }

    /** What one problem is solved with. */
    private static final class Setting {
        private final ScalarPotential potential;
        private final StepMesh mesh;
        private final LevelRun search;

        Setting(RadialProblem problem, SolveMonitor monitor) {
            if (problem.channels().size() != 1) {
                throw new IllegalArgumentException("this method solves one channel, got "
                        + problem.channels().size());
            }
            RadialChannel channel = problem.channels().get(0);
            double kinetic = problem.kinetic();
            String where = "channel l = " + channel.orbital();
            potential = new ScalarPotential(problem);
            PotentialScan scan = PotentialScan.of(
                    potential, kinetic, channel.centrifugal(), problem.innerWall(), problem.outerWall(), where);
            ChannelEnds ends = new ChannelEnds(potential, scan, kinetic, channel.centrifugal(), where);
            OriginBehaviour origin = problem.innerWall() > 0 ? OriginBehaviour.FINITE : ends.origin();
            boolean closed = !Double.isInfinite(problem.outerWall());
            double threshold = closed ? Double.POSITIVE_INFINITY : ends.threshold();
            boolean endless = Double.isInfinite(threshold) || ends.endlessTail();
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
            Shooting shooting = new Shooting(mesh, scan, kinetic);
            search = new LevelRun(shooting, threshold, scan.hardyBound(), endless, where);
        }
    }
}
