package org.wellwright.solver.radial.steps;

import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialSolver;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

/**
 * Levels of coupled channels by propagation of the logarithmic derivative (Johnson 1973; Manolopoulos 1986), with steps
 * of high order.
 *
 * <p>Energies come with an estimate of their error, confirmed by counts on either side; there are no states and no
 * strict bounds. What couples channels must be weaker than r⁻² at the origin.
 */
public final class LogDerivativeSolver implements RadialSolver {
    @Override
    public String method() {
        return "logarithmic-derivative propagation";
    }

    @Override
    public Spectrum solve(RadialProblem problem, LevelSearch search, SolveMonitor monitor) {
        Setting setting = new Setting(problem, monitor);
        return setting.search.run(
                problem,
                search,
                monitor,
                () -> setting.mesh.inner().size() + setting.mesh.outer().size(),
                setting.potential::evaluations);
    }

    @Override
    public int countBelow(RadialProblem problem, double energy) {
        return new Setting(problem, SolveMonitor.NONE).search.count(energy);
    }

    /** What one problem is solved with. */
    private static final class Setting {
        private final CoupledPotential potential;
        private final CoupledMesh mesh;
        private final LevelRun search;

        Setting(RadialProblem problem, SolveMonitor monitor) {
            potential = new CoupledPotential(problem);
            potential.requireRegularCouplings();
            double kinetic = problem.kinetic();
            PotentialScan scan = PotentialScan.of(
                    potential, kinetic, 0, problem.innerWall(), problem.outerWall(), potential.where(0));
            OriginBehaviour[] origins = new OriginBehaviour[potential.channels()];
            double lowest = Double.POSITIVE_INFINITY;
            boolean endless = Double.isFinite(problem.outerWall());
            for (int c = 0; c < origins.length; c++) {
                origins[c] = potential.diagonalOrigin(c);
                if (problem.innerWall() == 0) {
                    requireNoFall(c, origins[c]);
                }
                TailBehaviour tail = potential.diagonalTail(c);
                if (tail.falls()) {
                    throw new InvalidModelException(
                            "nothing is bound: the potential falls without end towards large r",
                            potential.where(c),
                            "add a term that rises, or an outer wall");
                }
                lowest = Math.min(lowest, tail.rises() ? Double.POSITIVE_INFINITY : tail.limit());
            }
            double threshold = endless ? Double.POSITIVE_INFINITY : lowest;
            for (int c = 0; c < origins.length; c++) {
                endless |= isEndless(c, threshold);
            }
            mesh = new CoupledMesh(
                    potential, scan, origins, problem.innerWall(), problem.outerWall(), threshold, monitor);
            CoupledShooting shooting = new CoupledShooting(mesh, scan, kinetic, origins.length);
            search = new LevelRun(shooting, threshold, scan.hardyBound(), endless, potential.where(0));
        }

        private void requireNoFall(int channel, OriginBehaviour origin) {
            double square = potential.centrifugal(channel) + origin.inverseSquare() / potential.kinetic();
            boolean core = origin.power() < -2;
            if (core ? origin.coefficient() < 0 : square < -0.25 - 1e-14 * (1 + Math.abs(square))) {
                throw new InvalidModelException(
                        "the particle falls to the centre: near r = 0 the attraction exceeds (l + 1/2)² κ/r²",
                        potential.where(channel),
                        "cut the potential off at small r, or leave this channel out");
            }
        }

        /** Whether levels crowd below the lowest threshold in this channel. */
        private boolean isEndless(int channel, double threshold) {
            TailBehaviour tail = potential.diagonalTail(channel);
            if (Double.isInfinite(threshold)) {
                return true;
            }
            if (tail.limit() > threshold || tail.coefficient() >= 0 || tail.power() < -2) {
                return false;
            }
            return tail.power() > -2
                    || potential.centrifugal(channel) + tail.coefficient() / potential.kinetic() < -0.25;
        }
    }
}
