package org.wellwright.solver.radial.steps;

/**
 * The regular solution on (0, r0] as a power series u = r^s Σ a_k (r/r0)^k (Frobenius), for r²Q = s(s−1) + Σ_{j≥1} q_j
 * (r/r0)^j with s ≥ ½: a_k k(k + 2s − 1) = Σ_j q_j a_{k−j}. Immutable.
 */
final class OriginSeries {
    private static final double TOLERANCE = 2e-15;

    private final double radius;
    private final double exponent;
    private final double[] q;

    private OriginSeries(double radius, double exponent, double[] q) {
        this.radius = radius;
        this.exponent = exponent;
        this.q = q;
    }

    /**
     * The series up to {@code radius}, or null if r·V is not smooth enough there.
     *
     * @param inverseSquare coefficient of r⁻² in V/κ, without the centrifugal term
     * @param exponent s, the larger root of s(s−1) = λ + inverseSquare
     */
    static OriginSeries upTo(
            double radius,
            ScalarPotential potential,
            PotentialScan scan,
            double kinetic,
            double inverseSquare,
            double exponent) {
        double[] radii = new double[StepQuadrature.POINTS];
        double[] samples = new double[StepQuadrature.POINTS];
        double[] c = new double[StepQuadrature.POINTS];
        StepQuadrature.radii(0, radius, radii);
        potential.values(radii, samples, StepQuadrature.POINTS);
        double largest = 0;
        for (int i = 0; i < StepQuadrature.POINTS; i++) {
            double whole = radius * radii[i] * samples[i] / kinetic;
            samples[i] = inverseSquare == 0 ? whole : whole - radius * inverseSquare / radii[i];
            largest = Math.max(largest, Math.abs(whole));
        }
        if (!(largest < 1e6 * (1 + exponent * exponent))) {
            return null;
        }
        StepQuadrature.project(samples, c);
        double tail = Math.max(Math.abs(c[StepQuadrature.DEGREE + 1]), Math.abs(c[StepQuadrature.DEGREE + 2]));
        double noise = 8e-16 * largest;
        for (int i = 0; i < StepQuadrature.POINTS && tail > Math.max(TOLERANCE, noise); i++) {
            noise = Math.max(noise, 4 * radius * radii[i] * potential.roundingBound(radii[i]) / kinetic);
        }
        if (tail > Math.max(TOLERANCE, noise)) {
            return null;
        }
        double[] q = new double[StepQuadrature.DEGREE + 2];
        double[] powers = new double[StepQuadrature.DEGREE + 1];
        int last = StepQuadrature.DEGREE;
        while (last > 0 && Math.abs(c[last]) < 0.1 * noise) {
            last--;
        }
        StepQuadrature.addPowers(c, 0, last, 1, powers);
        System.arraycopy(powers, 0, q, 1, powers.length);
        OriginSeries series = new OriginSeries(radius, exponent, q);
        return series.fits(scan, kinetic, inverseSquare, noise) ? series : null;
    }

    private boolean fits(PotentialScan scan, double kinetic, double inverseSquare, double noise) {
        for (int i = scan.firstAbove(radius) - 1; i >= 0 && scan.radius(i) > radius / 64; i--) {
            double t = scan.radius(i) / radius;
            double sum = 0;
            for (int k = q.length - 1; k >= 1; k--) {
                sum = sum * t + q[k];
            }
            double r = scan.radius(i);
            double exact = r * r * scan.sample(i) / kinetic - inverseSquare;
            if (!(Math.abs(sum * t - exact) < 1e-11 + 64 * noise)) {
                return false;
            }
        }
        return true;
    }

    /** Whether the series converges without cancellation at e. */
    boolean usableAt(double e) {
        double strength = Math.abs(e) * radius * radius;
        for (int j = 1; j <= 3; j++) {
            strength += Math.abs(q[j]);
        }
        return strength <= limit(exponent);
    }

    /** How large r²|Q − s(s−1)/r²| may be. */
    static double limit(double exponent) {
        return 4 + 2 * exponent;
    }

    /** Fills u, u′, ∂u/∂e, ∂u′/∂e at r0, up to a common factor. */
    void evaluate(double e, double[] into) {
        int most = 120;
        double[] a = new double[most];
        double[] b = new double[most];
        a[0] = 1;
        double energy = e * radius * radius;
        double u = 1;
        double p = exponent;
        double ue = 0;
        double pe = 0;
        int small = 0;
        for (int k = 1; k < most && small < q.length; k++) {
            double sum = 0;
            double sumE = 0;
            int to = Math.min(k, q.length - 1);
            for (int j = 1; j <= to; j++) {
                sum += q[j] * a[k - j];
                sumE += q[j] * b[k - j];
            }
            if (k >= 2) {
                sum -= energy * a[k - 2];
                sumE -= energy * b[k - 2] + radius * radius * a[k - 2];
            }
            double divisor = k * (k + 2 * exponent - 1);
            a[k] = sum / divisor;
            b[k] = sumE / divisor;
            u += a[k];
            p += (exponent + k) * a[k];
            ue += b[k];
            pe += (exponent + k) * b[k];
            boolean tiny = Math.abs(a[k]) * (exponent + k) < 1e-18 * Math.abs(p) + 1e-30
                    && Math.abs(b[k]) * (exponent + k) < 1e-18 * Math.abs(pe) + 1e-30 * radius * radius;
            small = tiny ? small + 1 : 0;
        }
        into[0] = u;
        into[1] = p / radius;
        into[2] = ue;
        into[3] = pe / radius;
    }
}
