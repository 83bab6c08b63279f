package org.wellwright.solver.numerics;

/** Jacobi polynomials P_n^(α,β)(x) by their three-term recurrence. Source: Szegő (1939), eqs. 4.5.1 and 4.21.7. */
public final class JacobiPolynomials {
    private JacobiPolynomials() {}

    /** P_0 … P_{count−1} at x into {@code into}. */
    public static void values(int count, double alpha, double beta, double x, double[] into) {
        if (count > 0) {
            into[0] = 1;
        }
        if (count > 1) {
            into[1] = ((alpha + beta + 2) * x + (alpha - beta)) / 2;
        }
        for (int n = 2; n < count; n++) {
            double s = 2 * n + alpha + beta;
            double lead = 2 * n * (n + alpha + beta) * (s - 2);
            double linear = (s - 1) * (s * (s - 2) * x + (alpha - beta) * (alpha + beta));
            double back = 2 * (n + alpha - 1) * (n + beta - 1) * s;
            into[n] = (linear * into[n - 1] - back * into[n - 2]) / lead;
        }
    }

    /** P_n and its derivative at x. */
    static double[] valueWithSlope(int n, double alpha, double beta, double x) {
        double[] values = new double[n + 1];
        values(n + 1, alpha, beta, x, values);
        double[] shifted = new double[n];
        values(n, alpha + 1, beta + 1, x, shifted);
        double slope = n == 0 ? 0 : (n + alpha + beta + 1) / 2 * shifted[n - 1];
        return new double[] {values[n], slope};
    }
}
