package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.ChannelTerm;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.EnergyGradient;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelOutcome;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialState;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

/**
 * Closed-form levels of sums of terms ∝ 1/r: with k = −V(1), E = −k²/(4κ n²) and dE/dp = (k/(2κ n²)) ∂V(1)/∂p; no level
 * where k ≤ 0. Stands in for the solver, so that a fit's own arithmetic is tested alone. Counts its calls.
 */
final class HydrogenicSource implements SpectrumSource {
    private int solves;

    int solves() {
        return solves;
    }

    @Override
    public List<Spectrum> solve(List<Wanted> wanted, SolveMonitor monitor) {
        List<Spectrum> spectra = new ArrayList<>();
        for (Wanted one : wanted) {
            solves++;
            spectra.add(spectrum(one.problem(), one.search()));
        }
        return spectra;
    }

    private static Spectrum spectrum(RadialProblem problem, LevelSearch search) {
        double strength = -problem.common().value(1);
        for (ChannelTerm term : problem.rest()) {
            strength -= term.potential().value(1);
        }
        List<LevelOutcome> outcomes = new ArrayList<>();
        List<RadialState> states = new ArrayList<>();
        for (int index = 0; strength > 0 && index < search.count(); index++) {
            int n = index + problem.channels().get(0).orbital() + 1;
            double kinetic = problem.kinetic();
            double energy = -strength * strength / (4 * kinetic * n * n);
            Level level = new Level(
                    index,
                    energy,
                    energy - 1e-15 * Math.abs(energy),
                    energy + 1e-15 * Math.abs(energy),
                    Level.BoundKind.TWO_SIDED,
                    0,
                    Math.abs(energy),
                    Double.NaN,
                    0);
            outcomes.add(level);
            double byValue = strength / (2 * kinetic * n * n);
            double[][] rest = new double[problem.rest().size()][];
            for (int i = 0; i < rest.length; i++) {
                rest[i] = slopes(problem.rest().get(i).potential(), byValue);
            }
            EnergyGradient gradient = new EnergyGradient(
                    -energy / kinetic, slopes(problem.common(), byValue), rest, new double[] {1}, 0, 0);
            states.add(new GradientOnly(problem, level, gradient));
        }
        return new Spectrum(
                problem, search, outcomes, states, Completeness.PROVED, 0, "", new Spectrum.Effort(1, 1, 1));
    }

    private static double[] slopes(TermEvaluator evaluator, double byValue) {
        double[] slopes = new double[evaluator.parameterCount()];
        for (int j = 0; j < slopes.length; j++) {
            slopes[j] = byValue * evaluator.parameterDerivative(j, 1);
        }
        return slopes;
    }

    /** A state of which only the gradient is known. */
    private record GradientOnly(RadialProblem problem, Level level, EnergyGradient gradient) implements RadialState {
        @Override
        public double value(int channel, double r) {
            throw new UnsupportedOperationException("a stand-in has no radial function");
        }

        @Override
        public double slope(int channel, double r) {
            throw new UnsupportedOperationException("a stand-in has no radial function");
        }

        @Override
        public double innerRadius() {
            throw new UnsupportedOperationException("a stand-in has no radial function");
        }

        @Override
        public double outerRadius() {
            throw new UnsupportedOperationException("a stand-in has no radial function");
        }

        @Override
        public double[] elementEdges() {
            throw new UnsupportedOperationException("a stand-in has no radial function");
        }

        @Override
        public double expectation(DoubleUnaryOperator weight) {
            throw new UnsupportedOperationException("a stand-in has no radial function");
        }

        @Override
        public double overlap(int channel, RadialState other, int otherChannel, DoubleUnaryOperator weight) {
            throw new UnsupportedOperationException("a stand-in has no radial function");
        }

        @Override
        public double kineticEnergy() {
            throw new UnsupportedOperationException("a stand-in has no radial function");
        }

        @Override
        public RadialState response(SourceFunction source) {
            throw new UnsupportedOperationException("a stand-in has no radial function");
        }
    }
}
