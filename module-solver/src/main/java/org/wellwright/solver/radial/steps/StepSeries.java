package org.wellwright.solver.radial.steps;

import java.util.Arrays;

/**
 * The numbers b_m(1), b′_m(1) of both solutions of a {@link PropagationStep}. Reused from step to step by one thread;
 * what it hands out is fresh.
 */
final class StepSeries {
    private static final int MOST_TERMS = 16;
    private static final int MOST_POWERS = 96;
    private static final double NEGLIGIBLE = 1e-17;

    private final double[] current = new double[MOST_POWERS + 4];
    private final double[] next = new double[MOST_POWERS + 4];
    private final double[][] values = new double[2][MOST_TERMS];
    private final double[][] slopes = new double[2][MOST_TERMS];
    private int terms;

    /**
     * Computes both solutions for ΔV(x) = Σ d_k x^k, k ≤ degree.
     *
     * @return whether the series has converged
     */
    boolean compute(double[] d, int degree) {
        Arrays.fill(current, 0);
        for (int k = 0; k <= degree; k++) {
            current[k + 1] = 0.5 * d[k] / (k + 1);
        }
        int first = run(d, degree, degree + 1, 0);
        if (first < 0) {
            return false;
        }
        Arrays.fill(current, 0);
        current[0] = 1;
        int second = run(d, degree, 0, 1);
        if (second < 0) {
            return false;
        }
        terms = Math.max(first, second);
        Arrays.fill(values[0], first, MOST_TERMS, 0);
        Arrays.fill(slopes[0], first, MOST_TERMS, 0);
        Arrays.fill(values[1], second, MOST_TERMS, 0);
        Arrays.fill(slopes[1], second, MOST_TERMS, 0);
        return true;
    }

    private int run(double[] d, int degree, int powers, int which) {
        double[] b = current;
        double[] c = next;
        int top = powers;
        int small = 0;
        for (int m = 0; m < MOST_TERMS; m++) {
            double value = 0;
            double slope = 0;
            for (int k = 0; k <= top; k++) {
                value += b[k];
                slope += k * b[k];
            }
            values[which][m] = value;
            slopes[which][m] = slope;
            double weight = EtaFunctions.atZero(m);
            small = (Math.abs(value) + Math.abs(slope)) * weight < NEGLIGIBLE ? small + 1 : 0;
            if (small == 2 || top < 0) {
                return m + 1;
            }
            int wanted = Math.min(top + degree, MOST_POWERS);
            b[top + 1] = 0;
            b[top + 2] = 0;
            for (int k = 0; k <= wanted; k++) {
                double sum = k + 2 <= top ? -(k + 2.0) * (k + 1) * b[k + 2] : 0;
                int from = Math.max(0, k - top);
                int to = Math.min(degree, k);
                for (int j = from; j <= to; j++) {
                    sum += d[j] * b[k - j];
                }
                c[k] = 0.5 * sum / (k + m + 1);
            }
            double trim = 1e-19 / EtaFunctions.atZero(m + 1);
            top = wanted;
            while (top >= 0 && Math.abs(c[top]) < trim) {
                top--;
            }
            double[] swap = b;
            b = c;
            c = swap;
        }
        return -1;
    }

    int terms() {
        return terms;
    }

    double[] first() {
        return Arrays.copyOf(values[0], terms);
    }

    double[] firstSlope() {
        return Arrays.copyOf(slopes[0], terms);
    }

    double[] second() {
        return Arrays.copyOf(values[1], terms);
    }

    double[] secondSlope() {
        return Arrays.copyOf(slopes[1], terms);
    }
}
