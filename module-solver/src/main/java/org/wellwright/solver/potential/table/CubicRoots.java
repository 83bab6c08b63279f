package org.wellwright.solver.potential.table;

import java.util.ArrayList;
import java.util.List;

/**
 * Real roots of polynomials of low degree in an interval, each found by bisection between the stationary points of the
 * polynomial.
 */
final class CubicRoots {
    private CubicRoots() {}

    /**
     * Roots of Σ c[k] s^k in [low, high] where the sign changes; a root that only touches zero may be left out or kept.
     */
    static List<Double> in(double[] c, double low, double high) {
        List<Double> edges = new ArrayList<>();
        edges.add(low);
        if (c.length > 2) {
            double[] derivative = new double[c.length - 1];
            for (int k = 1; k < c.length; k++) {
                derivative[k - 1] = k * c[k];
            }
            edges.addAll(in(derivative, low, high));
        }
        edges.add(high);
        List<Double> roots = new ArrayList<>();
        for (int i = 0; i + 1 < edges.size(); i++) {
            double a = edges.get(i);
            double b = edges.get(i + 1);
            double va = value(c, a);
            double vb = value(c, b);
            if (va == 0) {
                roots.add(a);
            } else if (va < 0 != vb < 0) {
                roots.add(bisect(c, a, b, va < 0));
            }
        }
        return roots;
    }

    static double value(double[] c, double s) {
        double sum = 0;
        for (int k = c.length - 1; k >= 0; k--) {
            sum = sum * s + c[k];
        }
        return sum;
    }

    private static double bisect(double[] c, double low, double high, boolean rising) {
        double a = low;
        double b = high;
        while (true) {
            double middle = a + (b - a) / 2;
            if (middle <= a || middle >= b) {
                return b;
            }
            if (value(c, middle) < 0 == rising) {
                a = middle;
            } else {
                b = middle;
            }
        }
    }
}
