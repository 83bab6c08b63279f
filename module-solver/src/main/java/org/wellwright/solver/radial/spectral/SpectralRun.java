package org.wellwright.solver.radial.spectral;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.InvalidModelException;
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
    /** Rounding of a Rayleigh quotient relative to ⟨T⟩ + ⟨|V|⟩. */
    private static final double QUOTIENT_ROUNDING = 6e-16;
    /** Times the mesh may be refined because bounds are too wide. */
    private static final int PASSES = 5;

    private final RadialProblem problem;
    private final LevelSearch search;
    private final SolveMonitor monitor;
    private final ChannelPotentials potentials;
    private final MeshChoice mesh;
    private int counts;

    SpectralRun(RadialProblem problem, SampleCache cache, LevelSearch search, SolveMonitor monitor) {
        this.problem = problem;
        this.search = search;
        this.monitor = monitor;
        potentials = ChannelPotentials.of(problem, cache);
        mesh = new MeshChoice(potentials, search, Math.max(FINEST, search.tolerance() * 1e-3), monitor);
        if (!mesh.finite() && search.count() == LevelSearch.ALL) {
            throw new InvalidModelException(
                    Double.isInfinite(mesh.threshold())
                            ? "the potential confines, so its levels have no end"
                            : "the series of levels below the threshold has no end",
                    "l = " + problem.channels().get(0).orbital(),
                    "say how many levels are wanted, or an energy below which to search");
        }
    }

    /** Levels below {@code search.below()}. */
    int count() {
        return mesh.choose();
    }

    Spectrum spectrum() {
        int found = mesh.choose();
        int wanted = Math.min(found, search.count());
        if (wanted == 0) {
            return empty();
        }
        for (int pass = 0; ; pass++) {
            LevelFinder finder = new LevelFinder(mesh.pencil(), wanted, mesh.floor(), mesh.top(), monitor);
            List<Trial> trials = finder.find(mesh.edges());
            double above = wanted == found && mesh.complete()
                    ? mesh.limit()
                    : finder.above(trials.get(wanted - 1).shift());
            counts += finder.counts();
            CheckGrid grid = CheckGrid.of(potentials, mesh.layout().leaves());
            MeshData data = data(grid);
            List<Solution> solutions = evaluate(trials, data);
            Enclosure enclosure = Enclosure.of(solutions, data, above);
            boolean[] marked = pass < PASSES ? mark(solutions, enclosure) : null;
            if (marked == null) {
                return result(solutions, enclosure, data, above);
            }
            mesh.layout().cut(marked);
            mesh.assemble(mesh.layout().elements());
            found = mesh.count(mesh.top());
            wanted = Math.min(found, search.count());
        }
    }

    private MeshData data(CheckGrid grid) {
        double[] edges = mesh.edges();
        boolean innerWall = problem.innerWall() > 0 && edges[0] == problem.innerWall();
        boolean outerWall = edges[edges.length - 1] == problem.outerWall();
        return new MeshData(edges, mesh.pencil(), grid, innerWall, outerWall);
    }

    private List<Solution> evaluate(List<Trial> trials, MeshData data) {
        Quotient quotient = data.quotient();
        List<Solution> solutions = new ArrayList<>(trials.size());
        for (Trial trial : trials) {
            if (monitor.cancelled()) {
                throw new java.util.concurrent.CancellationException("cancelled");
            }
            solutions.add(evaluate(quotient, trial));
        }
        return solutions;
    }

    private static Solution evaluate(Quotient quotient, Trial trial) {
        quotient.evaluate(trial);
        Trial normalised = trial.times(1 / Math.sqrt(quotient.norm()));
        quotient.smooth(trial);
        double energy = quotient.energy;
        double scale = quotient.scale;
        double quadrature = quotient.quadrature;
        double rounding = QUOTIENT_ROUNDING * scale + quotient.rounding + quadrature + quotient.cut;
        double estimate = quotient.truncation + quadrature + quotient.cut + 0.5 * Math.ulp(1.0) * scale;
        return new Solution(
                normalised,
                energy,
                quotient.smoothEnergy,
                quotient.residual,
                estimate,
                rounding,
                quadrature + quotient.cut,
                scale,
                quotient.shares());
    }

    /**
     * The elements to be cut so that all bounds become as narrow as asked; null if they are, or if cutting cannot help.
     */
    private boolean[] mark(List<Solution> solutions, Enclosure enclosure) {
        boolean[] marked = new boolean[mesh.edges().length - 1];
        boolean any = false;
        for (int i = 0; i < solutions.size(); i++) {
            Solution level = solutions.get(i);
            double target = Math.max(search.tolerance(), 4e-16) * level.scale();
            double square = level.residual() * level.residual();
            double gap = Math.max(enclosure.gap(i), 1e-12 * level.scale());
            boolean wide = potentials.residualExists() && square > 0.5 * target * gap;
            boolean coarse = level.quadrature() > 0.5 * target;
            if (!wide && !coarse && (potentials.residualExists() || level.estimate() < 4 * target)) {
                continue;
            }
            double allowance = 0.25 * target * gap / marked.length;
            for (int e = 0; e < marked.length; e++) {
                Solution.Shares shares = level.shares();
                boolean bad = wide && shares.residual(e) > allowance;
                bad |= coarse && shares.quadrature(e) > target / marked.length;
                bad |= !potentials.residualExists() && shares.truncation(e) > target / marked.length;
                marked[e] |= bad;
                any |= bad;
            }
        }
        return any ? marked : null;
    }

    private Spectrum empty() {
        return new Spectrum(
                problem,
                search,
                List.of(),
                List.of(),
                Completeness.COUNTED,
                mesh.limit(),
                "there is no level below " + mesh.limit(),
                new Spectrum.Effort(0, potentials.evaluations(), mesh.counts()));
    }

    private Spectrum result(List<Solution> solutions, Enclosure enclosure, MeshData data, double above) {
        List<LevelOutcome> outcomes = new ArrayList<>(solutions.size());
        List<RadialState> states = new ArrayList<>(solutions.size());
        for (int i = 0; i < solutions.size(); i++) {
            Solution s = solutions.get(i);
            double lower = enclosure.lower(i);
            double upper = enclosure.upper(i);
            Level.BoundKind kind = Level.BoundKind.TWO_SIDED;
            if (!potentials.residualExists() || !(lower <= upper)) {
                kind = Level.BoundKind.ESTIMATE;
                lower = s.smoothEnergy() - 3 * s.estimate() - s.rounding();
                upper = s.smoothEnergy() + s.estimate() + s.rounding();
            }
            Level level = new Level(
                    i,
                    s.energy(),
                    Math.min(lower, s.energy()),
                    Math.max(upper, s.energy()),
                    kind,
                    s.estimate(),
                    s.scale(),
                    Double.NaN,
                    mesh.threshold());
            outcomes.add(level);
            Trial u = s.trial().startsNegative() ? s.trial().times(-1) : s.trial();
            states.add(new ElementState(problem, level, u, data));
        }
        return new Spectrum(
                problem,
                search,
                outcomes,
                states,
                Completeness.COUNTED,
                above,
                "",
                new Spectrum.Effort(mesh.edges().length - 1, potentials.evaluations(), counts + mesh.counts()));
    }
}
