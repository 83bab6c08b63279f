package org.wellwright.solver.radial.steps;

/**
 * Gauss–Legendre points on [0, 1] and the way from samples to a polynomial: shifted Legendre coefficients, then powers
 * of x.
 *
 * <p>Points by Newton's iteration on the Legendre recurrence (Abramowitz and Stegun 1964, 25.4.29).
 */
final class StepQuadrature {
    /** Number of points. */
    static final int POINTS = 12;
    /** Highest degree of the polynomials that are kept; the two above it measure what is left out. */
    static final int DEGREE = POINTS - 3;

    private static final double[] ABSCISSAE = new double[POINTS];
    /** (2n+1) w_i P*_n(x_i) at [n][i]. */
    private static final double[][] PROJECTION = new double[POINTS][POINTS];
    /** Coefficient of x^k in P*_n at [n][k]: (−1)^{n+k} C(n,k) C(n+k,k). */
    private static final double[][] POWERS = new double[POINTS][POINTS];

    static {
        for (int i = 0; i < POINTS; i++) {
            double x = -Math.cos(Math.PI * (i + 0.75) / (POINTS + 0.5));
            double slope = 1;
            for (int iteration = 0; iteration < 8; iteration++) {
                double[] p = legendre(x, POINTS);
                slope = POINTS * (x * p[POINTS] - p[POINTS - 1]) / (x * x - 1);
                x -= p[POINTS] / slope;
            }
            ABSCISSAE[i] = 0.5 * (1 + x);
            double weight = 1 / ((1 - x * x) * slope * slope);
            double[] p = legendre(x, POINTS);
            for (int n = 0; n < POINTS; n++) {
                PROJECTION[n][i] = (2 * n + 1) * weight * p[n];
            }
        }
        for (int n = 0; n < POINTS; n++) {
            double coefficient = n % 2 == 0 ? 1 : -1;
            for (int k = 0; k <= n; k++) {
                POWERS[n][k] = coefficient;
                coefficient *= -(double) (n - k) * (n + k + 1) / ((k + 1.0) * (k + 1.0));
            }
        }
    }

    private StepQuadrature() {}

    private static double[] legendre(double x, int degree) {
        double[] p = new double[degree + 1];
        p[0] = 1;
        p[1] = x;
        for (int n = 1; n < degree; n++) {
            p[n + 1] = ((2 * n + 1) * x * p[n] - n * p[n - 1]) / (n + 1);
        }
        return p;
    }

    /** Radii of the points in [from, from + width]. */
    static void radii(double from, double width, double[] into) {
        for (int i = 0; i < POINTS; i++) {
            into[i] = from + width * ABSCISSAE[i];
        }
    }

    /** Abscissa of point {@code i} on [0, 1]. */
    static double abscissa(int i) {
        return ABSCISSAE[i];
    }

    /** Shifted Legendre coefficients of the interpolating polynomial through the samples. */
    static void project(double[] samples, double[] into) {
        for (int n = 0; n < POINTS; n++) {
            double sum = 0;
            double[] row = PROJECTION[n];
            for (int i = 0; i < POINTS; i++) {
                sum += row[i] * samples[i];
            }
            into[n] = sum;
        }
    }

    /** Adds {@code factor · Σ_{n=first}^{last} c_n P*_n(x)} in powers of x to {@code into}. */
    static void addPowers(double[] c, int first, int last, double factor, double[] into) {
        for (int n = first; n <= last; n++) {
            double[] row = POWERS[n];
            double weight = factor * c[n];
            for (int k = 0; k <= n; k++) {
                into[k] += weight * row[k];
            }
        }
    }
}
