package org.wellwright.solver.radial.spectral;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.SolverException;
import org.wellwright.solver.numerics.CondensedPencil;
import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.numerics.ScalarChain;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelOutcome;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialState;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

/** One solve from the first look to the bounds. Used once, by one thread. */
final class SpectralRun {
    /** Truncation of a mesh at full accuracy, relative to ⟨T⟩ + ⟨|V|⟩. */
    private static final double FINEST = 1e-18;

    private final RadialProblem problem;
    private final LevelSearch search;
    private final SolveMonitor monitor;
    private final ChannelPotentials potentials;
    private final Survey survey;
    private final Layout layout;
    private final double threshold;
    private final double limit;
    private final boolean finite;
    private CondensedPencil pencil;
    private CondensedPencil.Work work;
    private double[] edges;
    private double floor;
    private double top;
    private int counts;

    SpectralRun(RadialProblem problem, SampleCache cache, LevelSearch search, SolveMonitor monitor) {
        this.problem = problem;
        this.search = search;
        this.monitor = monitor;
        potentials = ChannelPotentials.of(problem, cache);
        survey = Survey.of(potentials);
        layout = new Layout(potentials, survey, SpectralElementSolver.DEGREE, monitor);
        threshold = potentials.threshold();
        limit = Math.min(threshold, search.below());
        finite = limit < threshold || !potentials.hasEndlessSeries();
        if (!finite && search.count() == LevelSearch.ALL) {
            throw new InvalidModelException(
                    Double.isInfinite(threshold)
                            ? "the potential confines, so its levels have no end"
                            : "the series of levels below the threshold has no end",
                    "l = " + problem.channels().get(0).orbital(),
                    "say how many levels are wanted, or an energy below which to search");
        }
    }

    private double meshTolerance() {
        return Math.max(FINEST, search.tolerance() * 1e-3);
    }

    /** Builds mesh and pencil for levels below an energy. */
    private void mesh(double energy) {
        layout.prepare(energy, survey.floor());
        assemble(layout.build(meshTolerance()));
        top = energy;
    }

    private void assemble(Element[] elements) {
        List<Leaf> leaves = layout.leaves();
        edges = new double[elements.length + 1];
        edges[0] = leaves.get(0).from;
        for (int i = 0; i < elements.length; i++) {
            edges[i + 1] = leaves.get(i).to;
        }
        pencil = new ScalarChain(elements);
        work = pencil.work();
        findFloor();
    }

    /** An energy below all levels of the mesh: Hardy's bound, or lower if V is deeper between the samples. */
    private void findFloor() {
        floor = survey.floor();
        for (Leaf leaf : layout.leaves()) {
            for (double value : leaf.envelope) {
                floor = Math.min(floor, value);
            }
        }
        double step = Math.max(Math.abs(floor) * 1e-12, Math.abs(top - floor) * 1e-3);
        floor -= step;
        while (count(floor) > 0) {
            floor -= step;
            step *= 2;
        }
    }

    private int count(double energy) {
        counts++;
        return work.count(energy);
    }

    /** Levels below {@code search.below()}. */
    int count() {
        double energy = limit;
        if (survey.floor() >= energy) {
            return 0;
        }
        if (energy == threshold) {
            meshToThreshold();
            return count(energy);
        }
        mesh(energy);
        return count(energy);
    }

    Spectrum spectrum() {
        if (!(survey.floor() < limit)) {
            return empty();
        }
        int found = chooseMesh();
        int wanted = Math.min(found, search.count());
        if (wanted == 0) {
            return empty();
        }
        List<Solution> solutions = null;
        double above = top;
        for (int pass = 0; ; pass++) {
            LevelFinder finder = new LevelFinder(pencil, wanted, floor, top, monitor);
            List<Trial> trials = finder.find(edges);
            above = finder.above(trials.get(wanted - 1).shift());
            counts += finder.counts();
            CheckGrid grid = CheckGrid.of(potentials, layout.leaves());
            Quotient quotient = quotient(grid);
            solutions = new ArrayList<>(wanted);
            boolean[] marked = new boolean[edges.length - 1];
            boolean more = false;
            for (Trial trial : trials) {
                cancelIfAsked();
                Solution solution = evaluate(quotient, trial);
                solutions.add(solution);
                more |= mark(quotient, solution, solutions, above, marked);
            }
            if (!more || pass == 6) {
                break;
            }
            layout.cut(marked);
            assemble(layout.elements());
            wanted = Math.min(Math.max(count(top), wanted), search.count());
        }
        return result(solutions, above);
    }

    private Quotient quotient(CheckGrid grid) {
        boolean innerWall = problem.innerWall() > 0 && edges[0] == problem.innerWall();
        boolean outerWall = edges[edges.length - 1] == problem.outerWall();
        return new Quotient(pencil.elements(), edges, grid, innerWall, outerWall);
    }

    private Solution evaluate(Quotient quotient, Trial trial) {
        quotient.evaluate(trial);
        double energy = quotient.energy;
        double rounding = 5e-16 * quotient.scale + quotient.rounding;
        double quadrature = trusted(quotient.quadrature, quotient.scale);
        double estimate = quotient.truncation + quadrature + quotient.cut;
        double scale = quotient.scale;
        quotient.smooth(trial);
        Trial smooth = trial.with(quotient.smoothCoefficients());
        smooth = smooth.times(1 / Math.sqrt(smooth.norm()));
        return new Solution(
                smooth,
                energy,
                quotient.smoothEnergy,
                quotient.residual,
                estimate + 0.5 * Math.ulp(1.0) * scale,
                rounding + quadrature,
                scale);
    }

    /**
     * What the difference of the two rules says of the better one: as it is when it is large, and quadratically less
     * below 1e-12, since both converge geometrically there.
     */
    private static double trusted(double difference, double scale) {
        return difference * Math.min(1, difference / (1e-12 * scale));
    }

    private double wantedHalfWidth(Solution solution) {
        return Math.max(search.tolerance(), 4e-16) * solution.scale();
    }

    /** Marks the elements to be cut so that this level's bounds become as narrow as asked. */
    private boolean mark(Quotient quotient, Solution solution, List<Solution> before, double above, boolean[] marked) {
        double target = wantedHalfWidth(solution);
        int i = before.size() - 1;
        double gap = above - solution.smoothEnergy();
        if (i > 0) {
            gap = Math.min(gap, solution.smoothEnergy() - before.get(i - 1).smoothEnergy());
        }
        double square = solution.residual() * solution.residual();
        boolean wide = square > 0.5 * target * Math.max(gap, 0);
        boolean coarse = trusted(quotient.quadrature, solution.scale()) > target;
        if (!wide && !coarse) {
            return false;
        }
        boolean any = false;
        for (int e = 0; e < marked.length; e++) {
            boolean bad = wide
                    && quotient.residualShare[e] > 0.1 * square / 4
                    && quotient.residualShare[e]
                            > 0.5 * target * Math.max(gap, 1e-12 * solution.scale()) / marked.length;
            bad |= coarse && quotient.quadratureShare[e] > 0.1 * quotient.quadrature;
            if (bad) {
                marked[e] = true;
                any = true;
            }
        }
        return any;
    }

    private void cancelIfAsked() {
        if (monitor.cancelled()) {
            throw new java.util.concurrent.CancellationException("cancelled");
        }
    }

    /** A mesh for all that is wanted; returns the number of levels below its top. */
    private int chooseMesh() {
        int wanted = search.count();
        if (wanted != LevelSearch.ALL) {
            double guess = survey.energyOf(wanted + 0.5, limit);
            for (int step = 0; step < 12; step++) {
                if (!(guess < limit)) {
                    break;
                }
                layout.prepare(guess, survey.floor());
                double semiclassical = layout.levels(guess);
                if (semiclassical < wanted + 0.2) {
                    guess = raised(guess, semiclassical, wanted + 0.7);
                    continue;
                }
                mesh(guess);
                int found = count(guess);
                if (found >= wanted) {
                    return found;
                }
                guess = raised(guess, found, wanted + 0.7);
            }
            if (!finite) {
                throw new SolverException(
                        "only part of %d levels found".formatted(wanted),
                        "l = " + problem.channels().get(0).orbital(),
                        "ask for fewer levels");
            }
        }
        if (limit < threshold) {
            mesh(limit);
            return count(limit);
        }
        return meshToThreshold();
    }

    /** An energy with more levels below, by the semiclassical density. */
    private double raised(double energy, double found, double aim) {
        double low = layout.levels(energy);
        double distance = Double.isInfinite(limit) ? energy - floorGuess() : limit - energy;
        double step = distance * 1e-3;
        double other = Double.isInfinite(limit) ? energy - step : energy - step;
        double density = (low - layout.levels(other)) / step;
        double rise = density > 0 ? (aim - found) / density : distance;
        if (Double.isInfinite(limit)) {
            return energy + Math.min(Math.max(rise, 1e-3 * distance), distance);
        }
        double next = energy + rise;
        return next < limit - 0.1 * distance ? next : limit - 0.1 * distance;
    }

    private double floorGuess() {
        return survey.floor();
    }

    /** A mesh for every level below the threshold, however near; returns their number. */
    private int meshToThreshold() {
        double depth = threshold - survey.floor();
        double step = 1e-3;
        int found = 0;
        for (int pass = 0; pass < 12; pass++) {
            double energy = threshold - depth * step;
            mesh(energy);
            found = count(energy);
            if (count(threshold) == found && !nodeBeyond()) {
                break;
            }
            step *= 1e-2;
        }
        return found;
    }

    /** Whether the solution at the threshold has a node beyond the mesh. */
    private boolean nodeBeyond() {
        // TODO replace by the continuation of the threshold solution
        return false;
    }

    private Spectrum empty() {
        return new Spectrum(
                problem,
                search,
                List.of(),
                List.of(),
                Completeness.COUNTED,
                limit,
                "no level below " + limit,
                new Spectrum.Effort(0, potentials.evaluations(), counts));
    }

    private Spectrum result(List<Solution> solutions, double above) {
        Enclosure enclosure = Enclosure.of(solutions, above);
        List<LevelOutcome> outcomes = new ArrayList<>();
        List<RadialState> states = new ArrayList<>();
        for (int i = 0; i < solutions.size(); i++) {
            Solution s = solutions.get(i);
            double lower = Math.min(enclosure.lower(i), s.energy());
            double upper = Math.max(enclosure.upper(i), s.energy());
            Level level = new Level(
                    i,
                    s.energy(),
                    lower,
                    upper,
                    Level.BoundKind.TWO_SIDED,
                    s.estimate(),
                    s.scale(),
                    Double.NaN,
                    threshold);
            outcomes.add(level);
            Trial u = s.trial().startsNegative() ? s.trial().times(-1) : s.trial();
            states.add(new ElementState(problem, level, u, pencil, u.shift()));
        }
        return new Spectrum(
                problem,
                search,
                outcomes,
                states,
                Completeness.COUNTED,
                above,
                "",
                new Spectrum.Effort(edges.length - 1, potentials.evaluations(), counts));
    }
}
