package org.wellwright.solver.radial.steps;

import java.util.Arrays;
import java.util.concurrent.CancellationException;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.SolverException;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.radial.SolveMonitor;

/**
 * The steps between the two ends, made as far as an energy needs them: outwards and inwards from the radius where V +
 * κ(λ + ¼)/r² is least.
 *
 * <p>A step is as wide as its polynomial and its perturbation series allow, whatever the energy; every break point is
 * an edge. An end is a hard wall, the origin (a Frobenius series, or a power of r at a radius where nothing else
 * counts), a radius from which the WKB action into the forbidden region exceeds {@value #ACTION}, or a radius beyond
 * which V and the energy are negligible. One thread uses a mesh at a time.
 */
final class StepMesh {
    private static final double ACTION = 22;
    private static final double FIT = 2e-15;
    /** Rounding of the two highest Legendre coefficients, relative to the largest sample. */
    private static final double NOISE = 3e-15;

    private static final double AMPLITUDE = 6;
    private static final double NARROWEST = 2e-12;
    private static final int MOST_STEPS = 100_000;
    private static final int MOST_SERIES_TRIALS = 16;

    /** What lies at an end of a sweep. */
    private enum End {
        WALL,
        SERIES,
        POWER,
        DECAY,
        FAR
    }

    private final ScalarPotential potential;
    private final PotentialScan scan;
    private final double kinetic;
    private final double centrifugal;
    private final double innerWall;
    private final double outerWall;
    private final double threshold;
    private final String where;
    private final SolveMonitor monitor;
    private final double inverseSquare;
    private final double originPower;
    private final double originStrength;
    private final double exponent;

    private PropagationStep[] outer = new PropagationStep[64];
    private PropagationStep[] inner = new PropagationStep[64];
    private int outerCount;
    private int innerCount;
    private double outwards;
    private double inwards;
    private OriginSeries series;
    private int seriesTrials;
    private End startKind = End.DECAY;
    private End endKind = End.DECAY;

    private final double[] radii = new double[StepQuadrature.POINTS];
    private final double[] samples = new double[StepQuadrature.POINTS];
    private final double[] legendre = new double[StepQuadrature.POINTS];
    private final double[] powers = new double[StepQuadrature.POINTS];
    private final StepSeries builder = new StepSeries();
    private double suggestion;
    /** Range of e = E/κ that the steps are made for. */
    private final double lowest;

    private final double anchor;

    private double highest;

    /**
     * An empty mesh.
     *
     * @param origin V at r → 0, checked against the scan
     * @param threshold V at r → ∞, +∞ if confining
     */
    StepMesh(
            ScalarPotential potential,
            PotentialScan scan,
            double kinetic,
            double centrifugal,
            OriginBehaviour origin,
            double innerWall,
            double outerWall,
            double threshold,
            SolveMonitor monitor,
            String where) {
        this.potential = potential;
        this.scan = scan;
        this.kinetic = kinetic;
        this.centrifugal = centrifugal;
        this.innerWall = innerWall;
        this.outerWall = outerWall;
        this.threshold = threshold;
        this.monitor = monitor;
        this.where = where;
        inverseSquare = origin.inverseSquare() / kinetic;
        originPower = origin.power() < 0 ? origin.power() : 0;
        originStrength = origin.power() < 0 ? origin.coefficient() / kinetic : 0;
        exponent = 0.5 + Math.sqrt(Math.max(0, 0.25 + centrifugal + inverseSquare));
        lowest = scan.hardyBound() / kinetic;
        double edge = potential.breakAbove(scan.anchor());
        anchor = edge < 1.001 * scan.anchor() && edge < outerWall ? edge : scan.anchor();
        highest = Double.isInfinite(threshold) ? Double.NEGATIVE_INFINITY : threshold / kinetic;
        clear();
    }

    private void clear() {
        outerCount = 0;
        innerCount = 0;
        series = null;
        seriesTrials = 0;
        outwards = 0.25 * scan.anchor();
        inwards = 0.25 * scan.anchor();
    }

    PropagationStep step(int index) {
        return index >= 0 ? outer[index] : inner[-1 - index];
    }

    int innerCount() {
        return innerCount;
    }

    int stepCount() {
        return innerCount + outerCount;
    }

    private double innerEdge() {
        return innerCount == 0 ? anchor : inner[innerCount - 1].left;
    }

    private double outerEdge() {
        return outerCount == 0 ? anchor : outer[outerCount - 1].right();
    }

    /** Index of the step that holds r, clipped to the steps there are. */
    int indexOf(double r) {
        int low = -innerCount;
        int high = outerCount - 1;
        while (low < high) {
            int middle = Math.floorDiv(low + high + 1, 2);
            if (step(middle).left <= r) {
                low = middle;
            } else {
                high = middle - 1;
            }
        }
        return low;
    }

    /**
     * Makes the steps for an energy and remembers what lies at the inner end. Returns the index of the first step of a
     * sweep.
     */
    int start(double energy) {
        double e = energy / kinetic;
        if (e > highest) {
            highest = e + 3 * (e - lowest);
            clear();
        }
        double allowed = scan.firstAllowed(energy);
        while (outerCount == 0 || outerEdge() < Math.min(allowed, outerWall)) {
            extendOutwards();
        }
        double action = 0;
        int index = indexOf(Math.max(allowed, innerEdge())) + 1;
        while (true) {
            if (index == -innerCount) {
                if (terminatesInside(e)) {
                    return index;
                }
                extendInwards();
            }
            index--;
            PropagationStep step = step(index);
            action = step.smallest < e || step.right() > allowed
                    ? 0
                    : action + Math.sqrt(step.smallest - e) * step.width;
            if (action >= ACTION) {
                startKind = End.DECAY;
                return index;
            }
        }
    }

    /**
     * Makes the steps for an energy and remembers what lies at the outer end. Returns the index after the last step of
     * a sweep.
     */
    int end(double energy) {
        double e = energy / kinetic;
        double allowed = scan.lastAllowed(energy);
        int index = indexOf(Math.min(allowed, outerEdge())) - 1;
        double action = 0;
        while (true) {
            if (index == outerCount - 1) {
                if (outerEdge() >= outerWall) {
                    endKind = End.WALL;
                    return outerCount;
                }
                if (isFar(energy)) {
                    endKind = End.FAR;
                    return outerCount;
                }
                extendOutwards();
            }
            index++;
            PropagationStep step = step(index);
            action = step.smallest < e || step.left < allowed ? 0 : action + Math.sqrt(step.smallest - e) * step.width;
            if (action >= ACTION) {
                endKind = End.DECAY;
                return index + 1;
            }
        }
    }

    /** Fills u, u′, ∂u/∂e, ∂u′/∂e at the left end of the step that {@link #start} returned just before. */
    void begin(double energy, int index, double[] into) {
        double e = energy / kinetic;
        Arrays.fill(into, 0, 4, 0);
        switch (startKind) {
            case WALL -> into[1] = 1;
            case SERIES -> series.evaluate(e, into);
            case POWER -> power(innerEdge(), e, into);
            default -> {
                double root = Math.sqrt(Math.max(step(index).atLeft - e, 1e-300));
                into[0] = 1;
                into[1] = root;
                into[3] = -0.5 / root;
            }
        }
    }

    /**
     * Fills u, u′, ∂u/∂e, ∂u′/∂e at the right end of the step before the one that {@link #end} returned just before.
     */
    void finish(double energy, int index, double[] into) {
        double e = energy / kinetic;
        Arrays.fill(into, 0, 4, 0);
        switch (endKind) {
            case WALL -> into[1] = -1;
            case FAR -> far(outerEdge(), into);
            default -> {
                double root = Math.sqrt(Math.max(step(index - 1).atRight - e, 1e-300));
                into[0] = 1;
                into[1] = -root;
                into[3] = 0.5 / root;
            }
        }
    }

    private boolean terminatesInside(double e) {
        double r = innerEdge();
        if (innerWall > 0) {
            startKind = End.WALL;
            return r <= innerWall;
        }
        if (series != null && series.usableAt(e)) {
            startKind = End.SERIES;
            return true;
        }
        series = null;
        double w = r * r * potential.value(r) / kinetic - inverseSquare;
        double w0 = Math.abs(w) + r * r * Math.abs(e);
        if (w0 < OriginSeries.limit(exponent) && seriesTrials < MOST_SERIES_TRIALS && potential.breakBelow(r) == 0) {
            OriginSeries trial = OriginSeries.upTo(r, potential, scan, kinetic, inverseSquare, exponent);
            if (trial == null) {
                seriesTrials++;
            } else if (trial.usableAt(e)) {
                series = trial;
                startKind = End.SERIES;
                return true;
            }
        }
        // The first-order correction is exact for the declared power and rough for the rest; what is wrong with it dies
        // out as the irregular solution does.
        double rounding = r * r * potential.roundingBound(r) / kinetic;
        double rest = Math.max(0, Math.abs(w - originStrength * Math.pow(r, originPower + 2)) - 4 * rounding);
        double error = (w0 * w0 + rest) * Math.pow(r / scan.anchor(), 2 * exponent - 1);
        startKind = End.POWER;
        return error < 1e-18 && w0 < 1e-3 && potential.breakBelow(r) == 0;
    }

    /** u = r^s (1 + w r^q …): r u′/u = s + w/(q + 2s − 1) to first order in w = r²Q − s(s−1), apart for V and for e. */
    private void power(double r, double e, double[] into) {
        double w = r * r * potential.value(r) / kinetic - inverseSquare;
        double order = 2 + originPower;
        into[0] = 1;
        into[1] = (exponent + w / (order + 2 * exponent - 1) - e * r * r / (1 + 2 * exponent)) / r;
        into[3] = -r / (1 + 2 * exponent);
    }

    private boolean isFar(double energy) {
        double r = outerEdge();
        if (Double.isInfinite(threshold)
                || r < scan.anchor() * 4
                || !((threshold - energy) * r * r / kinetic < 1e-14)) {
            return false;
        }
        double limit = farInverseSquare();
        double negligible = followsPower() ? 1e-7 : 1e-15;
        if (!(Math.abs(r * r * (potential.value(r) - threshold) / kinetic - limit) < negligible)) {
            return false;
        }
        for (int i = scan.firstAbove(r); i < scan.size(); i++) {
            double s = scan.radius(i);
            if (!(Math.abs(s * s * (scan.sample(i) - threshold) / kinetic - limit) < 1e-6)) {
                return false;
            }
        }
        return true;
    }

    /** Whether V's approach to its limit is a known power of r, so that its first-order effect is known too. */
    private boolean followsPower() {
        return potential.tail().known() && potential.tail().power() > -30;
    }

    private double farInverseSquare() {
        TailBehaviour tail = potential.tail();
        return tail.known() && tail.power() == -2 ? tail.coefficient() / kinetic : 0;
    }

    /** The solution that does not grow, r^{½−ν}, at the threshold itself; corrected as at the origin. */
    private void far(double r, double[] into) {
        double limit = farInverseSquare();
        double nu = Math.sqrt(Math.max(0, 0.25 + centrifugal + limit));
        double w = r * r * (potential.value(r) - threshold) / kinetic - limit;
        double order = potential.tail().known() && potential.tail().power() > -30
                ? 2 + potential.tail().power()
                : -28;
        double correction = order < 0 ? w / (order - 2 * nu) : 0;
        into[0] = 1;
        into[1] = (0.5 - nu + correction) / r;
    }

    private void extendOutwards() {
        double from = outerEdge();
        double to = Math.min(Math.min(potential.breakAbove(from), outerWall), from * 4);
        double width = Math.min(outwards, to - from);
        PropagationStep step = null;
        boolean first = false;
        while (step == null) {
            first = !first && width == to - from;
            double right = width >= to - from ? to : from + Math.min(width, 0.5 * (to - from));
            step = build(from, right);
            width = (right - from) * suggestion;
        }
        // A step cut short by an edge says nothing about the next one.
        outwards = first ? Math.max(outwards, width) : width;
        if (outerCount == outer.length) {
            outer = Arrays.copyOf(outer, 2 * outerCount);
        }
        outer[outerCount++] = step;
    }

    private void extendInwards() {
        double to = innerEdge();
        double from = Math.max(Math.max(potential.breakBelow(to), innerWall), 0.3 * to);
        double width = Math.min(inwards, to - from);
        PropagationStep step = null;
        boolean first = false;
        while (step == null) {
            first = !first && width == to - from;
            double left = width >= to - from ? from : to - Math.min(width, 0.5 * (to - from));
            step = build(left, to);
            width = (to - left) * suggestion;
        }
        inwards = first ? Math.max(inwards, width) : width;
        if (innerCount == inner.length) {
            inner = Arrays.copyOf(inner, 2 * innerCount);
        }
        inner[innerCount++] = step;
    }

    /** The step [from, to], or null if it is too wide; {@code suggestion} then holds the factor for the next width. */
    private PropagationStep build(double from, double to) {
        if (monitor.cancelled()) {
            throw new CancellationException();
        }
        if (stepCount() > MOST_STEPS) {
            throw new SolverException(
                    "the second method needs more than " + MOST_STEPS + " steps",
                    where,
                    "ask for fewer levels, further below the threshold");
        }
        double width = to - from;
        boolean narrow = width < NARROWEST * to;
        double square = width * width;
        StepQuadrature.radii(from, width, radii);
        potential.values(radii, samples, StepQuadrature.POINTS);
        double smallest = Double.POSITIVE_INFINITY;
        double greatest = Double.NEGATIVE_INFINITY;
        double largest = 0;
        for (int i = 0; i < StepQuadrature.POINTS; i++) {
            double q = samples[i] / kinetic + centrifugal / (radii[i] * radii[i]);
            if (Double.isNaN(q) || Double.isInfinite(q)) {
                if (narrow) {
                    throw new InvalidModelException(
                            "the potential is %s at r = %s"
                                    .formatted(Double.isNaN(q) ? "not a number" : "infinite", radii[i]),
                            where,
                            "write the formula so that it stays finite there, or limit its range");
                }
                suggestion = 0.3;
                return null;
            }
            samples[i] = q;
            smallest = Math.min(smallest, q);
            greatest = Math.max(greatest, q);
            largest = Math.max(largest, Math.abs(q));
        }
        // Projected without the bulk of Q, so that rounding stays that of Q itself.
        double bulk = samples[StepQuadrature.POINTS / 2];
        for (int i = 0; i < StepQuadrature.POINTS; i++) {
            samples[i] -= bulk;
        }
        StepQuadrature.project(samples, legendre);
        legendre[0] += bulk;
        double noise = NOISE * largest * square;
        double tail =
                Math.max(Math.abs(legendre[StepQuadrature.DEGREE + 1]), Math.abs(legendre[StepQuadrature.DEGREE + 2]))
                        * square;
        double amplitude = 0;
        for (int n = 1; n <= StepQuadrature.DEGREE; n++) {
            amplitude += Math.abs(legendre[n]) * square;
        }
        // Coefficients that do not fall belong to a jump or a kink: there the mean itself is in doubt, over the local
        // wavelength and not over the step.
        boolean rough = tail > 1e-5 * amplitude;
        double seen = rough ? 1 : harmonic(square, smallest, greatest);
        double fit = rough ? FIT * Math.min(1, width * Math.sqrt(largest)) : FIT / seen;
        if (tail > Math.max(fit, noise)) {
            double rounding = Math.max(
                    potential.roundingBound(radii[0]), potential.roundingBound(radii[StepQuadrature.POINTS - 1]));
            noise = Math.max(noise, 4 * rounding * square / kinetic);
        }
        double allowed = Math.max(fit, noise);
        int degree = StepQuadrature.DEGREE;
        while (degree > 0 && Math.abs(legendre[degree]) * square <= 0.05 * Math.max(Math.min(fit, FIT), noise)) {
            degree--;
        }
        double byFit = 0.9 * Math.pow(allowed / Math.max(tail - 0.7 * noise, 1e-300), 1.0 / StepQuadrature.POINTS);
        double byAmplitude = 0.95 * Math.cbrt(AMPLITUDE / Math.max(amplitude, 1e-300));
        suggestion = Math.max(0.2, Math.min(2.5, Math.min(byFit, byAmplitude)));
        if (!narrow && (tail > allowed || amplitude > AMPLITUDE)) {
            suggestion = Math.min(suggestion, 0.85);
            return null;
        }
        Arrays.fill(powers, 0);
        StepQuadrature.addPowers(legendre, 1, degree, square, powers);
        boolean converged = builder.compute(powers, degree);
        if (!narrow && !(converged && fits(from, to, square, allowed + noise))) {
            suggestion = 0.5;
            return null;
        }
        if (!converged) {
            // Narrower than any feature that rounding lets us see: the mean alone.
            degree = 0;
            Arrays.fill(powers, 0);
            builder.compute(powers, 0);
        }
        double left = legendre[0];
        double right = legendre[0];
        for (int n = 1; n <= degree; n++) {
            left += n % 2 == 0 ? legendre[n] : -legendre[n];
            right += legendre[n];
        }
        double residue = (rough && tail > noise ? amplitude : tail) * seen / square;
        return new PropagationStep(from, width, legendre[0], smallest, left, right, residue, builder);
    }

    /**
     * How much of u² is seen by the first Legendre polynomial left out, j_N(ω) ≤ ω^N/(2N+1)!! for a wave of phase ω
     * across the step: what is left out of Q is orthogonal to the rest.
     */
    private double harmonic(double square, double smallest, double greatest) {
        double omegaSquare = square * Math.max(greatest - lowest, highest - smallest);
        double ratio = Math.pow(omegaSquare, 0.5 * (StepQuadrature.DEGREE + 1))
                * EtaFunctions.atZero(StepQuadrature.DEGREE + 1);
        return Math.max(1e-6, Math.min(1, ratio));
    }

    /**
     * Whether V just inside both ends and the scan's own samples lie on the step's polynomial, so that nothing hides
     * between the Gauss points.
     */
    private boolean fits(double from, double to, double square, double allowed) {
        double tolerance = (1e-11 + 64 * allowed) / square;
        double left = Math.nextUp(from);
        double right = Math.nextDown(to);
        if (!lies(left, potential.value(left), from, to, square, tolerance)
                || !lies(right, potential.value(right), from, to, square, tolerance)) {
            return false;
        }
        for (int i = scan.firstAbove(from); i < scan.size() && scan.radius(i) < to; i++) {
            if (!lies(scan.radius(i), scan.sample(i), from, to, square, tolerance)) {
                return false;
            }
        }
        return true;
    }

    private boolean lies(double r, double value, double from, double to, double square, double tolerance) {
        double x = (r - from) / (to - from);
        double sum = 0;
        for (int k = StepQuadrature.DEGREE; k >= 0; k--) {
            sum = sum * x + powers[k];
        }
        double exact = value / kinetic + centrifugal / (r * r);
        return Math.abs(legendre[0] + sum / square - exact) < tolerance;
    }
}
