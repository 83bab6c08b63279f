package org.wellwright.solver.radial.spectral;

import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialSolver;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

/**
 * The primary method: hp spectral elements (Babuška and Szabó 1991), condensed to the element edges; levels isolated by
 * counting (Wittrick and Williams 1971), refined by Rayleigh quotients on twisted factorisations (Dhillon and Parlett
 * 2004), bounded by Temple's and Kato's inequalities.
 */
public final class SpectralElementSolver implements RadialSolver {
    /** Polynomial degree of the elements. */
    static final int DEGREE = 16;

    private final SampleCache shared;

    /** A solver that keeps nothing between problems. */
    public SpectralElementSolver() {
        this(SampleCache.none());
    }

    private SpectralElementSolver(SampleCache shared) {
        this.shared = shared;
    }

    /**
     * A solver for a group of problems with one common potential: its values are computed once. Same bits as a new one.
     */
    public static SpectralElementSolver sharing(RadialProblem any) {
        return new SpectralElementSolver(SampleCache.shared(any.common()));
    }

    @Override
    public String method() {
        return "hp spectral elements";
    }

    @Override
    public Spectrum solve(RadialProblem problem, LevelSearch search, SolveMonitor monitor) {
        return new SpectralRun(problem, cacheFor(problem), search, monitor).spectrum();
    }

    private SampleCache cacheFor(RadialProblem problem) {
        return shared.serves(problem.common()) ? shared : SampleCache.none();
    }

    @Override
    public int countBelow(RadialProblem problem, double energy) {
        LevelSearch search = new LevelSearch(LevelSearch.ALL, energy, LevelSearch.FULL);
        return new SpectralRun(problem, cacheFor(problem), search, SolveMonitor.NONE).count();
    }
}
