package org.wellwright.solver.radial.steps;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.SolverException;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.radial.SolveMonitor;

/**
 * The steps of coupled channels for one energy and those close to it, outwards and inwards from the radius where the
 * lowest curve + κ/4r² is least, and the logarithmic derivatives at both ends. The ends are those of {@link StepMesh},
 * for matrices. One thread uses a mesh at a time.
 */
final class CoupledMesh {
    private static final double ACTION = 22;
    private static final double FIT = 2e-15;
    private static final double NOISE = 4e-15;
    /** Largest width²·|Q − e|: below π², so that no step holds a half-wave, and small enough for the power series. */
    private static final double STRENGTH = 5;

    private static final double NARROWEST = 2e-12;
    private static final int MOST_STEPS = 100_000;

    private final CoupledPotential potential;
    private final PotentialScan scan;
    private final double innerWall;
    private final double outerWall;
    private final double threshold;
    private final SolveMonitor monitor;
    private final int channels;
    private final double[] exponents;
    private final OriginBehaviour[] origins;

    private final List<CoupledStep> outer = new ArrayList<>();
    private final List<CoupledStep> inner = new ArrayList<>();
    private double builtFor = Double.NaN;
    private double validWithin;
    private double suggestion;
    private boolean startsByPower;
    private boolean endsFar;
    private final double[] radii = new double[StepQuadrature.POINTS];
    private final double[] legendre = new double[StepQuadrature.POINTS];
    private final double[][] samples;

    /** An empty mesh; origins hold the behaviour of V_cc at r → 0 for each channel. */
    CoupledMesh(
            CoupledPotential potential,
            PotentialScan scan,
            OriginBehaviour[] origins,
            double innerWall,
            double outerWall,
            double threshold,
            SolveMonitor monitor) {
        this.potential = potential;
        this.scan = scan;
        this.origins = origins.clone();
        this.innerWall = innerWall;
        this.outerWall = outerWall;
        this.threshold = threshold;
        this.monitor = monitor;
        channels = potential.channels();
        exponents = new double[channels];
        for (int c = 0; c < channels; c++) {
            double square = potential.centrifugal(c) + origins[c].inverseSquare() / potential.kinetic();
            exponents[c] = 0.5 + Math.sqrt(Math.max(0, 0.25 + square));
        }
        samples = new double[channels * channels][StepQuadrature.POINTS];
    }

    /** The least s of u ~ r^s at the origin. */
    double smallestExponent() {
        return java.util.Arrays.stream(exponents).min().orElse(1);
    }

    /** Steps from the anchor outwards, in that order. */
    List<CoupledStep> outer() {
        return outer;
    }

    /** Steps from the anchor inwards, in that order. */
    List<CoupledStep> inner() {
        return inner;
    }

    /**
     * Makes the steps for an energy unless those at hand serve.
     *
     * @param inside filled with Y = u′u⁻¹ at the inner end and its derivative by e
     * @param outside the same at the outer end
     * @return which ends are hard walls: 1 for the inner, 2 for the outer one, 3 for both; Y means nothing there
     */
    int prepare(double energy, double[][] inside, double[][] outside) {
        double e = energy / potential.kinetic();
        if (!(Math.abs(e - builtFor) <= validWithin) || endsFar && e != builtFor) {
            rebuild(energy, e);
        }
        int walls = 0;
        CoupledStep last = outer.get(outer.size() - 1);
        if (last.right() >= outerWall) {
            walls += 2;
        } else if (endsFar) {
            far(last.right(), energy, outside);
        } else {
            decay(last.atEnd(false), e, -1, outside);
        }
        CoupledStep first = inner.isEmpty() ? outer.get(0) : inner.get(inner.size() - 1);
        if (innerWall > 0 && first.left <= innerWall) {
            walls += 1;
        } else if (startsByPower) {
            power(first.left, e, inside);
        } else {
            decay(first.atEnd(true), e, 1, inside);
        }
        return walls;
    }

    private void rebuild(double energy, double e) {
        outer.clear();
        inner.clear();
        builtFor = e;
        validWithin = Double.POSITIVE_INFINITY;
        double[][] scratch = new double[2][channels * channels];
        double allowed = scan.lastAllowed(energy);
        double width = 0.2 * scan.anchor();
        double action = 0;
        double from = scan.anchor();
        endsFar = false;
        while (from < outerWall && action < ACTION && !endsFar) {
            double to = Math.min(Math.min(potential.breakAbove(from), outerWall), 4 * from);
            CoupledStep step = null;
            while (step == null) {
                double right = width >= to - from ? to : from + Math.min(width, 0.5 * (to - from));
                step = build(from, right, e);
                width = (right - from) * suggestion;
            }
            outer.add(step);
            from = step.right();
            action = step.left < allowed || step.least < e ? 0 : action + step.width * Math.sqrt(step.least - e);
            endsFar = outer.size() > 2 && far(from, energy, scratch);
        }
        allowed = scan.firstAllowed(energy);
        width = 0.2 * scan.anchor();
        action = 0;
        double to = scan.anchor();
        startsByPower = power(to, e, scratch);
        while (to > innerWall && action < ACTION && !startsByPower) {
            double end = Math.max(Math.max(potential.breakBelow(to), innerWall), 0.3 * to);
            CoupledStep step = null;
            while (step == null) {
                double left = width >= to - end ? end : to - Math.min(width, 0.5 * (to - end));
                step = build(left, to, e);
                width = (to - left) * suggestion;
            }
            inner.add(step);
            to = step.left;
            action = step.right() > allowed || step.least < e ? 0 : action + step.width * Math.sqrt(step.least - e);
            startsByPower = power(to, e, scratch);
        }
    }

    private CoupledStep build(double from, double to, double e) {
        if (monitor.cancelled()) {
            throw new CancellationException();
        }
        if (outer.size() + inner.size() > MOST_STEPS) {
            throw new SolverException(
                    "the second method needs more than " + MOST_STEPS + " steps",
                    potential.where(0),
                    "ask for fewer levels, further below the threshold");
        }
        double width = to - from;
        double square = width * width;
        boolean narrow = width < NARROWEST * to;
        StepQuadrature.radii(from, width, radii);
        potential.matrices(radii, StepQuadrature.POINTS, samples);
        double least = Double.POSITIVE_INFINITY;
        double largest = 0;
        double strength = 0;
        double[] matrix = new double[channels * channels];
        for (int k = 0; k < StepQuadrature.POINTS; k++) {
            for (int i = 0; i < channels; i++) {
                double row = 0;
                for (int j = 0; j < channels; j++) {
                    double q = samples[i * channels + j][k];
                    matrix[i * channels + j] = q;
                    largest = Math.max(largest, Math.abs(q));
                    row += Math.abs(i == j ? q - e : q);
                }
                strength = Math.max(strength, row);
            }
            if (!(strength <= Double.MAX_VALUE)) {
                if (narrow) {
                    throw new InvalidModelException(
                            "the potential is not finite at r = " + radii[k],
                            potential.where(0),
                            "write the formula so that it stays finite there, or limit its range");
                }
                suggestion = 0.3;
                return null;
            }
            least = Math.min(least, SmallMatrix.least(matrix, channels));
        }
        double seen = Math.max(
                1e-6,
                Math.min(
                        1,
                        Math.pow(square * strength, 0.5 * (StepQuadrature.DEGREE + 1))
                                * EtaFunctions.atZero(StepQuadrature.DEGREE + 1)));
        double noise = NOISE * largest * square;
        double tail = 0;
        double amplitude = 0;
        double[][] powers = new double[StepQuadrature.DEGREE + 1][channels * channels];
        double[] polynomial = new double[StepQuadrature.POINTS];
        for (int element = 0; element < channels * channels; element++) {
            double bulk = samples[element][StepQuadrature.POINTS / 2];
            double[] shifted = new double[StepQuadrature.POINTS];
            for (int k = 0; k < StepQuadrature.POINTS; k++) {
                shifted[k] = samples[element][k] - bulk;
            }
            StepQuadrature.project(shifted, legendre);
            tail = Math.max(
                    tail,
                    square
                            * Math.max(
                                    Math.abs(legendre[StepQuadrature.DEGREE + 1]),
                                    Math.abs(legendre[StepQuadrature.DEGREE + 2])));
            java.util.Arrays.fill(polynomial, 0);
            int degree = StepQuadrature.DEGREE;
            while (degree > 0 && Math.abs(legendre[degree]) * square < 0.05 * Math.max(FIT, noise)) {
                degree--;
            }
            for (int n = 1; n <= degree; n++) {
                amplitude = Math.max(amplitude, Math.abs(legendre[n]) * square);
            }
            StepQuadrature.addPowers(legendre, 0, degree, square, polynomial);
            for (int k = 0; k <= degree; k++) {
                powers[k][element] = polynomial[k];
            }
            powers[0][element] += bulk * square;
        }
        boolean rough = tail > 1e-5 * amplitude;
        double fit = rough ? FIT * Math.min(1, width * Math.sqrt(largest)) : FIT / seen;
        if (tail > Math.max(fit, noise)) {
            double rounding = Math.max(
                    potential.roundingBound(radii[0]), potential.roundingBound(radii[StepQuadrature.POINTS - 1]));
            noise = Math.max(noise, 4 * rounding * square / potential.kinetic());
        }
        double allowed = Math.max(fit, noise);
        double byFit = 0.9 * Math.pow(allowed / Math.max(tail - 0.7 * noise, 1e-300), 1.0 / StepQuadrature.POINTS);
        double byStrength = 0.95 * Math.sqrt(STRENGTH / Math.max(square * strength, 1e-300));
        suggestion = Math.max(0.2, Math.min(2.5, Math.min(byFit, byStrength)));
        if (!narrow && (tail > allowed || square * strength > STRENGTH)) {
            suggestion = Math.min(suggestion, 0.85);
            return null;
        }
        if (!narrow && !endsFit(from, to, powers, (1e-11 + 64 * allowed) / square)) {
            suggestion = 0.5;
            return null;
        }
        validWithin = Math.min(validWithin, 1 / square);
        double residue = (rough && tail > noise ? amplitude : tail * seen) / square;
        return new CoupledStep(from, width, least, residue, powers);
    }

    /** Whether V just inside both ends lies on the polynomials. */
    private boolean endsFit(double from, double to, double[][] powers, double tolerance) {
        double[] ends = {Math.nextUp(from), Math.nextDown(to)};
        double[][] elements = new double[channels * channels][2];
        potential.matrices(ends, 2, elements);
        double square = (to - from) * (to - from);
        for (int element = 0; element < elements.length; element++) {
            double sum = 0;
            for (double[] power : powers) {
                sum += power[element];
            }
            if (!(Math.abs(elements[element][0] - powers[0][element] / square) < tolerance)
                    || !(Math.abs(elements[element][1] - sum / square) < tolerance)) {
                return false;
            }
        }
        return true;
    }

    /** Y = ±(Q − e)^½, the solution that grows outwards or inwards without the other. */
    private void decay(double[] q, double e, int sign, double[][] into) {
        for (int i = 0; i < channels; i++) {
            q[i * channels + i] -= e;
        }
        SmallMatrix.apply(x -> sign * Math.sqrt(Math.max(x, 1e-300)), q, into[0], channels);
        SmallMatrix.apply(x -> -sign * 0.5 / Math.sqrt(Math.max(x, 1e-300)), q, into[1], channels);
    }

    /**
     * Y at a radius so small that Y_ij = s_i δ_ij/r + W_ij/(r (q − 1 + s_i + s_j)) is enough, W = r²Q − s(s − 1) ~ r^q;
     * from Y′ = Q − Y² to first order.
     *
     * @return whether it is
     */
    private boolean power(double r, double e, double[][] into) {
        if (innerWall > 0 || potential.breakBelow(r) > 0) {
            return false;
        }
        double[][] elements = new double[channels * channels][1];
        potential.matrices(new double[] {r}, 1, elements);
        double largest = 0;
        double rest = 0;
        double rounding = 4 * r * r * potential.roundingBound(r) / potential.kinetic();
        double smallest = Double.POSITIVE_INFINITY;
        for (int i = 0; i < channels; i++) {
            smallest = Math.min(smallest, exponents[i]);
            for (int j = 0; j < channels; j++) {
                boolean diagonal = i == j;
                double start = diagonal ? exponents[i] * (exponents[i] - 1) : 0;
                double w = r * r * elements[i * channels + j][0] - start;
                double lead = diagonal && origins[i].power() < 0 ? origins[i].power() : 0;
                double known = lead < 0 ? origins[i].coefficient() / potential.kinetic() * Math.pow(r, lead + 2) : 0;
                double sum = exponents[i] + exponents[j];
                into[0][i * channels + j] = w / (r * (1 + lead + sum));
                into[1][i * channels + j] = diagonal ? -r / (1 + sum) : 0;
                if (diagonal) {
                    into[0][i * channels + j] += (exponents[i] - e * r * r / (1 + sum)) / r;
                }
                largest = Math.max(largest, Math.abs(w) + (diagonal ? r * r * Math.abs(e) : 0));
                rest = Math.max(rest, Math.abs(w - known) - rounding);
            }
        }
        double error = (largest * largest + rest) * Math.pow(r / scan.anchor(), 2 * smallest - 1);
        return error < 1e-18 && largest < 1e-3;
    }

    /**
     * Y at a radius beyond which only thresholds and centrifugal terms count and the energy is at the lowest threshold;
     * whether that holds.
     */
    private boolean far(double r, double energy, double[][] into) {
        if (Double.isInfinite(threshold)
                || r < 4 * scan.anchor()
                || !((threshold - energy) * r * r < 1e-14 * potential.kinetic())) {
            return false;
        }
        double[][] elements = new double[channels * channels][1];
        potential.matrices(new double[] {r}, 1, elements);
        for (int i = 0; i < channels; i++) {
            for (int j = 0; j < channels; j++) {
                double limit = i == j
                        ? potential.diagonalTail(i).limit() / potential.kinetic() + potential.centrifugal(i) / (r * r)
                        : 0;
                if (!(Math.abs(elements[i * channels + j][0] - limit) * r * r < 1e-13)) {
                    return false;
                }
                into[0][i * channels + j] = 0;
                into[1][i * channels + j] = 0;
            }
            double gap = (potential.diagonalTail(i).limit() - energy) / potential.kinetic();
            double nu = Math.sqrt(Math.max(0, 0.25 + potential.centrifugal(i)));
            into[0][i * channels + i] =
                    gap * r * r < 1e-12 ? (0.5 - nu) / r : -Math.sqrt(gap + potential.centrifugal(i) / (r * r));
        }
        for (int i = scan.firstAbove(r); i < scan.size(); i++) {
            if (scan.sample(i) < threshold - 1e-6 * potential.kinetic() / (scan.radius(i) * scan.radius(i))) {
                return false;
            }
        }
        return true;
    }
}
