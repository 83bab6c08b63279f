package org.wellwright.solver.potential.family;

/**
 * Sums of alternating series, accelerated (Cohen, Rodriguez Villegas and Zagier 2000, algorithm 1): 24 terms are good
 * to 1e-18 of the first.
 */
final class AlternatingSum {
    private static final int TERMS = 24;
    private static final double[] WEIGHTS = weights();

    private AlternatingSum() {}

    private static double[] weights() {
        double root = Math.pow(3 + Math.sqrt(8), TERMS);
        double d = (root + 1 / root) / 2;
        double b = -1;
        double c = -d;
        double[] w = new double[TERMS];
        for (int k = 0; k < TERMS; k++) {
            c = b - c;
            w[k] = c / d;
            b *= (k + (double) TERMS) * (k - (double) TERMS) / ((k + 0.5) * (k + 1.0));
        }
        return w;
    }

    /** S_k(x) = Σ (−1)ⁿ e^(nx)/n^k over n ≥ 1, for x ≤ 0. */
    static double fermi(int k, double x) {
        double e = Math.exp(x);
        double power = 1;
        double sum = 0;
        for (int n = 1; n <= TERMS; n++) {
            power *= e;
            sum += WEIGHTS[n - 1] * power / order(n, k);
        }
        return -sum;
    }

    /** S_k(x) − S_k(y) for y ≤ x ≤ 0 without cancellation, as Σ (−1)ⁿ e^(nx)(1 − e^(n(y − x)))/n^k. */
    static double fermiDifference(int k, double x, double xMinusY) {
        double e = Math.exp(x);
        double power = 1;
        double sum = 0;
        for (int n = 1; n <= TERMS; n++) {
            power *= e;
            sum += WEIGHTS[n - 1] * power * -Math.expm1(-n * xMinusY) / order(n, k);
        }
        return -sum;
    }

    private static double order(int n, int k) {
        return k == 1 ? n : k == 2 ? (double) n * n : (double) n * n * n;
    }
}
