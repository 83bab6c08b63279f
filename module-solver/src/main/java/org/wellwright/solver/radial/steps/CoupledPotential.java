package org.wellwright.solver.radial.steps;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.ChannelTerm;
import org.wellwright.solver.radial.RadialProblem;

/**
 * The matrix V_ij(r) + κ λ_i δ_ij/r² of coupled channels as this method sees it; as a {@link SampledPotential} its
 * lowest eigenvalue. Counts its evaluations; used by one thread.
 */
final class CoupledPotential implements SampledPotential {
    private final RadialProblem problem;
    private final int channels;
    private final double[] breaks;
    private final TailBehaviour tail;
    private double[] scratch = new double[64];
    private double cutRadius = Double.POSITIVE_INFINITY;
    private long evaluations;

    /** Reads the problem. */
    CoupledPotential(RadialProblem problem) {
        this.problem = problem;
        channels = problem.channels().size();
        List<TermEvaluator> terms = new ArrayList<>();
        terms.add(problem.common());
        problem.rest().forEach(term -> terms.add(term.potential()));
        TreeSet<Double> radii = new TreeSet<>();
        for (TermEvaluator term : terms) {
            for (BreakPoint point : term.breakPoints()) {
                if (point.radius() > problem.innerWall() && point.radius() < problem.outerWall()) {
                    radii.add(point.radius());
                }
            }
        }
        breaks = new double[radii.size()];
        int n = 0;
        for (double radius : radii) {
            breaks[n++] = radius;
        }
        TailBehaviour lowest = diagonalTail(0);
        for (int c = 1; c < channels; c++) {
            TailBehaviour other = diagonalTail(c);
            if (!other.rises() && (lowest.rises() || other.limit() < lowest.limit())) {
                lowest = other;
            }
        }
        tail = lowest;
    }

    int channels() {
        return channels;
    }

    double kinetic() {
        return problem.kinetic();
    }

    long evaluations() {
        return evaluations;
    }

    double centrifugal(int channel) {
        return problem.channels().get(channel).centrifugal();
    }

    String where(int channel) {
        return "channel l = " + problem.channels().get(channel).orbital();
    }

    /** V_cc(r → ∞) as declared, the channel's threshold included. */
    TailBehaviour diagonalTail(int channel) {
        TailBehaviour sum = problem.common()
                .tail()
                .plus(TailBehaviour.constant(problem.channels().get(channel).threshold()));
        for (ChannelTerm term : problem.rest()) {
            if (term.row() == channel && term.column() == channel) {
                sum = sum.plus(term.potential().tail());
            }
        }
        return sum;
    }

    /** V_cc(r → 0) as declared. */
    OriginBehaviour diagonalOrigin(int channel) {
        OriginBehaviour sum = problem.common().origin();
        for (ChannelTerm term : problem.rest()) {
            if (term.row() == channel && term.column() == channel) {
                sum = sum.plus(term.potential().origin());
            }
        }
        return sum;
    }

    /**
     * Checks that what couples channels is weaker than r⁻² at the origin.
     *
     * @throws InvalidModelException if it is not; names the channel
     */
    void requireRegularCouplings() {
        for (ChannelTerm term : problem.rest()) {
            OriginBehaviour start = term.potential().origin();
            if (term.row() != term.column() && (start.inverseSquare() != 0 || start.power() <= -2)) {
                throw new InvalidModelException(
                        "the coupling of two channels grows as 1/r^2 or faster at the origin",
                        where(term.row()) + " and " + where(term.column()),
                        "use a shape that is regular at r = 0");
            }
        }
    }

    /** Fills {@code into[i·n + j][k]} with (V_ij + κ λ_i δ_ij/r²)/κ at radii[k], length⁻². */
    void matrices(double[] radii, int count, double[][] into) {
        evaluations += (long) count * (1 + problem.rest().size());
        if (scratch.length < count) {
            scratch = new double[count];
        }
        double kinetic = problem.kinetic();
        problem.common().values(radii, scratch, count);
        for (int i = 0; i < channels; i++) {
            for (int j = 0; j < channels; j++) {
                double[] element = into[i * channels + j];
                for (int k = 0; k < count; k++) {
                    element[k] = i == j ? diagonal(i, scratch[k], radii[k], kinetic) : 0;
                }
            }
        }
        for (ChannelTerm term : problem.rest()) {
            term.potential().values(radii, scratch, count);
            double[] element = into[term.row() * channels + term.column()];
            for (int k = 0; k < count; k++) {
                element[k] += radii[k] > cutRadius ? 0 : scratch[k] / kinetic;
            }
            if (term.row() != term.column()) {
                System.arraycopy(element, 0, into[term.column() * channels + term.row()], 0, count);
            }
        }
    }

    private double diagonal(int channel, double common, double radius, double kinetic) {
        double v = radius > cutRadius ? 0 : common;
        return (v + problem.channels().get(channel).threshold()) / kinetic + centrifugal(channel) / (radius * radius);
    }

    /** The lowest eigenvalue at each radius, energy. */
    @Override
    public void values(double[] radii, double[] into, int count) {
        double[][] elements = new double[channels * channels][count];
        matrices(radii, count, elements);
        double[] matrix = new double[channels * channels];
        for (int k = 0; k < count; k++) {
            boolean finite = true;
            boolean wall = true;
            for (int e = 0; e < matrix.length; e++) {
                matrix[e] = elements[e][k];
                finite &= Math.abs(matrix[e]) <= Double.MAX_VALUE;
                wall &= matrix[e] == Double.POSITIVE_INFINITY || e % (channels + 1) != 0;
            }
            double least = finite ? SmallMatrix.least(matrix, channels) : wall ? Double.POSITIVE_INFINITY : Double.NaN;
            into[k] = problem.kinetic() * least;
        }
    }

    @Override
    public double value(double radius) {
        double[] into = new double[1];
        values(new double[] {radius}, into, 1);
        return into[0];
    }

    @Override
    public double[] breaks() {
        return breaks;
    }

    @Override
    public TailBehaviour tail() {
        return tail;
    }

    /** Beyond the radius every term is taken as gone, so that the thresholds remain. */
    @Override
    public void cutAt(double radius, double value) {
        cutRadius = radius;
    }

    @Override
    public double roundingBound(double radius) {
        double sum = problem.common().roundingBound(radius);
        for (ChannelTerm term : problem.rest()) {
            sum += 2 * term.potential().roundingBound(radius);
        }
        return radius > cutRadius ? 0 : sum;
    }

    /** First break point above {@code radius}, +∞ if there is none. */
    double breakAbove(double radius) {
        for (double point : breaks) {
            if (point > radius) {
                return point;
            }
        }
        return radius < cutRadius ? cutRadius : Double.POSITIVE_INFINITY;
    }

    /** Last break point below {@code radius}, 0 if there is none. */
    double breakBelow(double radius) {
        for (int i = breaks.length - 1; i >= 0; i--) {
            if (breaks[i] < radius) {
                return breaks[i];
            }
        }
        return 0;
    }
}
