package org.wellwright.solver.radial.spectral;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.numerics.SymmetricEigen;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.ChannelTerm;
import org.wellwright.solver.radial.RadialChannel;
import org.wellwright.solver.radial.RadialProblem;

/**
 * What the method must know of a problem before it chooses a mesh: how each channel starts and ends, where V is not
 * smooth, and V itself at given radii.
 *
 * <p>A channel whose κλ + inverse-square part is below −κ/4 falls to the centre (Case 1950) and is refused by name.
 */
final class ChannelPotentials {
    private static final double HUGE = 1e300;

    private final RadialProblem problem;
    private final SampleCache cache;
    private final int channels;
    private final double[] exponent;
    private final double[] inverseSquare;
    private final boolean[] core;
    private final double[] singular;
    private final double[] limit;
    private final double[] tailSquare;
    private final boolean[] endless;
    private final boolean[] rising;
    private final double[] breaks;
    private long evaluations;

    private ChannelPotentials(RadialProblem problem, SampleCache cache) {
        this.problem = problem;
        this.cache = cache;
        channels = problem.channels().size();
        exponent = new double[channels];
        inverseSquare = new double[channels];
        core = new boolean[channels];
        singular = new double[channels];
        limit = new double[channels];
        tailSquare = new double[channels];
        endless = new boolean[channels];
        rising = new boolean[channels];
        breaks = collectBreaks();
    }

    /** Looks at a problem; the cache may be shared by problems with the same common potential. */
    static ChannelPotentials of(RadialProblem problem, SampleCache cache) {
        ChannelPotentials potentials = new ChannelPotentials(problem, cache);
        for (int c = 0; c < potentials.channels; c++) {
            potentials.examineOrigin(c);
            potentials.examineTail(c);
        }
        return potentials;
    }

    RadialProblem problem() {
        return problem;
    }

    int channels() {
        return channels;
    }

    double kinetic() {
        return problem.kinetic();
    }

    /** λ in κλ/r² of a channel. */
    double centrifugal(int c) {
        return problem.channels().get(c).centrifugal();
    }

    /** u_c ~ r^s at the origin. */
    double exponent(int c) {
        return exponent[c];
    }

    /** Coefficient of r⁻² in V of a channel near the origin; part of the exponent. */
    double inverseSquare(int c) {
        return inverseSquare[c];
    }

    /**
     * Whether Hu of a trial function r^s times a polynomial is square integrable: V less singular than r^−(s+½). Where
     * it is not, bounds from residuals do not exist for such functions.
     */
    boolean residualExists() {
        for (int c = 0; c < channels; c++) {
            if (exponent[c] < 0.51 && !core[c] && problem.innerWall() == 0 && singular[c] < 0) {
                return false;
            }
            if (singular[c] <= -exponent[c] - 0.49 && !core[c]) {
                return false;
            }
        }
        return true;
    }

    double leastExponent() {
        double least = Double.POSITIVE_INFINITY;
        for (double s : exponent) {
            least = Math.min(least, s);
        }
        return least;
    }

    /**
     * Whether any channel has a core more singular than r⁻², or the origin lies behind a wall: no element at the origin
     * then.
     */
    boolean startsInWall() {
        for (boolean one : core) {
            if (one) {
                return true;
            }
        }
        return problem.innerWall() > 0;
    }

    /** Energy above which something is unbound; +∞ if all channels rise or end at a wall. */
    double threshold() {
        if (!Double.isInfinite(problem.outerWall())) {
            return Double.POSITIVE_INFINITY;
        }
        double least = Double.POSITIVE_INFINITY;
        for (int c = 0; c < channels; c++) {
            if (!rising[c]) {
                least = Math.min(least, limit[c]);
            }
        }
        return least;
    }

    /** Whether the number of levels below the threshold is infinite. */
    boolean hasEndlessSeries() {
        double threshold = threshold();
        if (Double.isInfinite(threshold)) {
            return true;
        }
        for (int c = 0; c < channels; c++) {
            if (!rising[c] && limit[c] == threshold && endless[c]) {
                return true;
            }
        }
        return false;
    }

    /** Radii where V is not smooth, between the walls, ascending. */
    double[] breaks() {
        return breaks;
    }

    long evaluations() {
        return evaluations;
    }

    /**
     * V of all channels with their thresholds at {@code count} radii: {@code [c * C + d][i]}, without the centrifugal
     * term; null where nothing couples; the same array above and below the diagonal.
     */
    double[][] sample(double[] radii, int count) {
        double[] common = cache.common(problem.common(), radii, count);
        mendOverflow(problem.common(), common, radii, count);
        evaluations += count;
        double[][] w = new double[channels * channels][];
        for (int c = 0; c < channels; c++) {
            double[] own = new double[count];
            double threshold = problem.channels().get(c).threshold();
            for (int i = 0; i < count; i++) {
                own[i] = common[i] + threshold;
            }
            w[c * channels + c] = own;
        }
        double[] scratch = null;
        for (ChannelTerm term : problem.rest()) {
            scratch = scratch == null ? new double[count] : scratch;
            term.potential().values(radii, scratch, count);
            mendOverflow(term.potential(), scratch, radii, count);
            evaluations += count;
            int at = term.row() * channels + term.column();
            if (w[at] == null) {
                w[at] = new double[count];
                w[term.column() * channels + term.row()] = w[at];
            }
            double[] into = w[at];
            for (int i = 0; i < count; i++) {
                into[i] += scratch[i];
            }
        }
        return w;
    }

    /** Far outside a formula may be ∞/∞ although V has long reached its limit; near the origin +∞ is a wall. */
    private void mendOverflow(TermEvaluator term, double[] v, double[] radii, int count) {
        for (int i = 0; i < count; i++) {
            if (v[i] > HUGE) {
                v[i] = HUGE;
            } else if (!(v[i] >= -HUGE)) {
                v[i] = beyondOverflow(term, radii[i], v[i]);
            }
        }
    }

    /**
     * The value that V must have at a radius where it cannot be computed, if it was constant or on its known tail
     * before.
     */
    private double beyondOverflow(TermEvaluator term, double r, double value) {
        if (Double.isNaN(value)) {
            double finite = r;
            for (int k = 0; k < 400 && !(Math.abs(term.value(finite)) <= HUGE); k++) {
                finite /= 1.25;
            }
            double here = term.value(finite);
            double before = term.value(finite / 1.5);
            if (Math.abs(here - before) <= 1e-14 * Math.abs(here)
                    || Math.abs(here) < 1e-100 && Math.abs(before) < 1e-50) {
                return here;
            }
            TailBehaviour tail = term.tail();
            if (tail.known() && tail.power() < 0 && Math.abs(here) <= HUGE) {
                double drop = tail.coefficient() == 0 ? 0 : tail.coefficient() * Math.pow(finite, tail.power());
                if (Math.abs(here - tail.limit() - drop) <= 1e-6 * Math.abs(here)) {
                    return tail.limit() + (drop == 0 ? 0 : tail.coefficient() * Math.pow(r, tail.power()));
                }
            }
        }
        throw notFinite(r, value);
    }

    InvalidModelException notFinite(double radius, double value) {
        return new InvalidModelException(
                "the potential is %s at r = %.6g".formatted(Double.isNaN(value) ? "not a number" : "infinite", radius),
                where(0),
                "limit the term to a range of radii, or write it so that it does not overflow there");
    }

    private String where(int c) {
        return "l = " + problem.channels().get(c).orbital();
    }

    /**
     * Lowest eigenvalue of the matrix of V with Langer's centrifugal terms κ(λ + ¼)/r²: no level lies below its minimum
     * (Hardy's inequality).
     */
    void envelope(double[][] w, double[] radii, int count, double[] into) {
        double[] matrix = new double[channels * channels];
        double[] values = new double[channels];
        double[] work = new double[channels + channels * channels];
        for (int i = 0; i < count; i++) {
            double scale = kinetic() / radii[i] / radii[i];
            if (channels == 1) {
                into[i] = w[0][i] + scale * (centrifugal(0) + 0.25);
                continue;
            }
            boolean finite = true;
            for (int c = 0; c < channels; c++) {
                for (int d = 0; d < channels; d++) {
                    double[] element = w[c * channels + d];
                    double v = element == null ? 0 : element[i];
                    v += c == d ? scale * (centrifugal(c) + 0.25) : 0;
                    finite &= Math.abs(v) < HUGE;
                    matrix[c * channels + d] = v;
                }
            }
            if (finite) {
                SymmetricEigen.decompose(matrix, channels, values, work);
                into[i] = values[0];
            } else {
                into[i] = Double.POSITIVE_INFINITY;
            }
        }
    }

    /** The lower envelope as far as V can be computed; +∞ where it cannot. */
    double[] roughEnvelope(double[] radii) {
        int count = radii.length;
        double[] into = new double[count];
        double[][] w = new double[channels * channels][];
        for (int c = 0; c < channels; c++) {
            w[c * channels + c] = new double[count];
        }
        double[] v = new double[count];
        problem.common().values(radii, v, count);
        evaluations += count;
        for (int c = 0; c < channels; c++) {
            double threshold = problem.channels().get(c).threshold();
            for (int i = 0; i < count; i++) {
                w[c * channels + c][i] = v[i] + threshold;
            }
        }
        for (ChannelTerm term : problem.rest()) {
            term.potential().values(radii, v, count);
            evaluations += count;
            int at = term.row() * channels + term.column();
            if (w[at] == null) {
                w[at] = new double[count];
                w[term.column() * channels + term.row()] = w[at];
            }
            for (int i = 0; i < count; i++) {
                w[at][i] += v[i];
            }
        }
        envelope(w, radii, count, into);
        for (int i = 0; i < count; i++) {
            if (!(Math.abs(into[i]) < Double.POSITIVE_INFINITY)) {
                into[i] = Double.POSITIVE_INFINITY;
            }
        }
        return into;
    }

    /** Bound of V's own rounding in all terms at a radius. */
    double roundingBound(double r) {
        double sum = problem.common().roundingBound(r);
        for (ChannelTerm term : problem.rest()) {
            sum += term.potential().roundingBound(r);
        }
        return sum;
    }

    private double[] collectBreaks() {
        TreeSet<Double> radii = new TreeSet<>();
        List<TermEvaluator> all = new ArrayList<>();
        all.add(problem.common());
        problem.rest().forEach(term -> all.add(term.potential()));
        for (TermEvaluator term : all) {
            for (BreakPoint point : term.breakPoints()) {
                if (point.radius() > problem.innerWall() && point.radius() < problem.outerWall()) {
                    radii.add(point.radius());
                }
            }
        }
        return radii.stream().mapToDouble(Double::doubleValue).toArray();
    }

    /** Largest |r²(V − limit)/κ| of the open channels at and beyond a radius, from three octaves. */
    double strengthBeyond(double r) {
        double worst = 0;
        double threshold = threshold();
        for (int c = 0; c < channels; c++) {
            if (rising[c] || limit[c] > threshold) {
                continue;
            }
            for (int k = 0; k < 3; k++) {
                double x = Math.scalb(r, k);
                double v = channelValue(c, x) - limit[c] - tailSquare[c] / (x * x);
                double strength = Math.abs(v) * x * x / kinetic();
                // What overflows far outside has long reached its limit.
                worst = Math.max(worst, Double.isNaN(strength) ? 0 : strength);
            }
        }
        return worst;
    }

    /** κ u′/u of the decaying solution at the threshold beyond a radius, for each channel. */
    double[] exteriorStiffness(double r) {
        double[] stiffness = new double[channels];
        double threshold = threshold();
        for (int c = 0; c < channels; c++) {
            double excess = rising[c] ? channelValue(c, r) - threshold : limit[c] - threshold;
            double square = centrifugal(c) + tailSquare[c] / kinetic() + 0.25;
            double power = (Math.sqrt(Math.max(square, 0)) - 0.5) / r;
            stiffness[c] = kinetic() * Math.max(power, excess > 0 ? Math.sqrt(excess / kinetic()) : power);
        }
        return stiffness;
    }

    private void examineOrigin(int c) {
        RadialChannel channel = problem.channels().get(c);
        exponent[c] = 1;
        if (problem.innerWall() > 0) {
            return;
        }
        OriginBehaviour origin = problem.common().origin();
        for (ChannelTerm term : problem.rest()) {
            if (term.row() == c && term.column() == c) {
                origin = origin.plus(term.potential().origin());
            }
        }
        if (!origin.known()) {
            origin = new BehaviourProbe(this::channelValue, kinetic(), c).origin();
        }
        if (origin.power() < -2) {
            if (origin.coefficient() < 0) {
                throw fallsToCentre(channel, "V falls like r^%.3g".formatted(origin.power()));
            }
            core[c] = true;
            return;
        }
        inverseSquare[c] = origin.inverseSquare();
        singular[c] = origin.power();
        double strength = channel.centrifugal() + origin.inverseSquare() / kinetic();
        if (strength < -0.25 - 1e-13) {
            throw fallsToCentre(channel, "the r^-2 part is %.6g times kappa, below -1/4".formatted(strength));
        }
        exponent[c] = 0.5 + Math.sqrt(Math.max(0, strength + 0.25));
        if (Math.abs(exponent[c] - Math.rint(exponent[c])) < 1e-14 * exponent[c]) {
            exponent[c] = Math.rint(exponent[c]);
        }
    }

    private static InvalidModelException fallsToCentre(RadialChannel channel, String how) {
        return new InvalidModelException(
                "the attraction is too strong at the origin: " + how + ", so there is no lowest level",
                "l = " + channel.orbital(),
                "weaken the singular term, add a repulsive core or start at a higher l");
    }

    private void examineTail(int c) {
        RadialChannel channel = problem.channels().get(c);
        if (!Double.isInfinite(problem.outerWall())) {
            rising[c] = true;
            return;
        }
        TailBehaviour tail = problem.common().tail().plus(TailBehaviour.constant(channel.threshold()));
        for (ChannelTerm term : problem.rest()) {
            if (term.row() == c && term.column() == c) {
                tail = tail.plus(term.potential().tail());
            }
        }
        if (!tail.known()) {
            tail = new BehaviourProbe(this::channelValue, kinetic(), c).tail();
        }
        if (tail.falls()) {
            throw new InvalidModelException(
                    "V falls without end at large r, so nothing is bound",
                    where(c),
                    "check the sign of the term that grows with r, or add an outer wall");
        }
        rising[c] = tail.rises();
        limit[c] = tail.limit();
        boolean attractive = tail.coefficient() < 0;
        if (attractive && tail.power() > -2) {
            endless[c] = true;
        } else if (tail.power() == -2) {
            tailSquare[c] = tail.coefficient();
            endless[c] = channel.centrifugal() + tail.coefficient() / kinetic() < -0.25 - 1e-13;
        }
    }

    /** V of one channel at one radius, threshold included, as it comes. */
    double channelValue(int c, double r) {
        double v = problem.common().value(r) + problem.channels().get(c).threshold();
        for (ChannelTerm term : problem.rest()) {
            if (term.row() == c && term.column() == c) {
                v += term.potential().value(r);
            }
        }
        evaluations++;
        return v;
    }
}
