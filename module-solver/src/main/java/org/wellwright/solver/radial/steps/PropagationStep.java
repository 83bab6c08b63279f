package org.wellwright.solver.radial.steps;

/**
 * One step of constant-reference perturbation: u″ = (Q(r) − e) u on [left, left + width] with e = E/κ.
 *
 * <p>With x = (r − left)/width, Z = width²(Q̄ − e) and ΔV(x) = width²(Q − Q̄), the solution that starts with (1, 0) is
 * ξ(Zx²) + Σ b_m(x) x^{2m+1} η_m(Zx²), the one that starts with (0, 1) is Σ c_m(x) x^{2m+1} η_m(Zx²), c_0 = 1, b_0 =
 * ½∫ΔV, and b_m[k] = ½ [ΔV b_{m−1} − b″_{m−1}]_k/(k + m) for both (Ixaru 1984; Ixaru, De Meyer and Vanden Berghe 1997;
 * Ledoux, Van Daele and Vanden Berghe 2004). What is kept does not depend on e. Immutable.
 */
final class PropagationStep {
    final double left;
    final double width;
    /** Mean of Q, length⁻². */
    final double mean;
    /** Smallest Q among the samples, length⁻². */
    final double smallest;
    /** Q of the polynomial at the left end, length⁻². */
    final double atLeft;
    /** Q of the polynomial at the right end, length⁻². */
    final double atRight;
    /** Size of what the polynomial leaves out of Q, length⁻². */
    final double residue;

    private final int terms;
    private final double[] first;
    private final double[] firstSlope;
    private final double[] second;
    private final double[] secondSlope;

    PropagationStep(
            double left,
            double width,
            double mean,
            double smallest,
            double atLeft,
            double atRight,
            double residue,
            StepSeries series) {
        this.left = left;
        this.width = width;
        this.mean = mean;
        this.smallest = smallest;
        this.atLeft = atLeft;
        this.atRight = atRight;
        this.residue = residue;
        this.terms = series.terms();
        this.first = series.first();
        this.firstSlope = series.firstSlope();
        this.second = series.second();
        this.secondSlope = series.secondSlope();
    }

    int terms() {
        return terms;
    }

    double right() {
        return left + width;
    }

    /** Z at e. */
    double reference(double e) {
        return width * width * (mean - e);
    }

    /**
     * Fills the transfer matrix in x at Z: [u, u′, v, v′] and, from index 4, their derivatives by Z; all without the
     * factor e^{√Z} where {@link EtaFunctions} leaves it out.
     *
     * @param eta scratch for at least {@link EtaFunctions#HIGHEST} + 2 numbers
     */
    void transfer(double z, boolean derivative, double[] eta, double[] into) {
        EtaFunctions.fill(z, terms + 1, eta);
        double u = eta[0];
        double du = z * eta[1];
        double v = 0;
        double dv = 0;
        for (int m = 0; m < terms; m++) {
            double before = eta[m];
            double here = eta[m + 1];
            u += first[m] * here;
            du += firstSlope[m] * here + first[m] * before;
            v += second[m] * here;
            dv += secondSlope[m] * here + second[m] * before;
        }
        into[0] = u;
        into[1] = du;
        into[2] = v;
        into[3] = dv;
        if (!derivative) {
            return;
        }
        double uz = eta[1];
        double duz = eta[1] + z * eta[2] + eta[1];
        double vz = 0;
        double dvz = 0;
        for (int m = 0; m < terms; m++) {
            double here = eta[m + 1];
            double next = eta[m + 2];
            uz += first[m] * next;
            duz += firstSlope[m] * next + first[m] * here;
            vz += second[m] * next;
            dvz += secondSlope[m] * next + second[m] * here;
        }
        into[4] = 0.5 * uz;
        into[5] = 0.5 * duz;
        into[6] = 0.5 * vz;
        into[7] = 0.5 * dvz;
    }

    /**
     * Zeros in the step of a solution that has value u0 and slope du0 (in x) at one end and u1, du1 at the other, in
     * either direction. Below one half-wave the sign tells; above it the phase is unwrapped against √−Z, its parity
     * again by the signs.
     */
    int zeros(double z, double e, double u0, double du0, double u1, double du1) {
        int parity = (u0 < 0) == (u1 < 0) ? 0 : 1;
        if (width * width * (smallest - e) > -8.5) {
            return parity;
        }
        double omega = Math.sqrt(Math.max(-z, 1e-300));
        double advance = omega - phase(omega * u1, du1) + phase(omega * u0, du0);
        long count = parity + 2 * Math.round((advance / Math.PI - parity) / 2);
        return (int) Math.max(count, parity);
    }

    /** Angle of (u, du) with u made non-negative, 0 … π. */
    private static double phase(double u, double du) {
        return u < 0 ? Math.atan2(-u, -du) : Math.atan2(u, du);
    }
}
