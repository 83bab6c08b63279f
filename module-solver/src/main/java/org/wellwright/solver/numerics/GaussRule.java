package org.wellwright.solver.numerics;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/**
 * Nodes and weights of Gauss quadrature on [0, 1] with the weight t^β: ∫ t^β f dt ≈ Σ w_i f(t_i), exact for polynomials
 * f of degree 2n − 1.
 *
 * <p>β = 0 (Legendre) is refined in doubled precision, so that nodes and weights are right to the last bit or two; a
 * general β > −1 (Jacobi) reaches some 1e-15. Source: Szegő (1939), eqs. 3.4.1 and 15.3.1; Golub and Welsch (1969) for
 * the starting values.
 */
public final class GaussRule {
    private static final Map<Integer, GaussRule> LEGENDRE = new ConcurrentHashMap<>();

    private final double[] node;
    private final double[] weight;

    private GaussRule(double[] node, double[] weight) {
        this.node = node;
        this.weight = weight;
    }

    /** Number of nodes. */
    public int size() {
        return node.length;
    }

    /** The i-th node in (0, 1), ascending. */
    public double node(int i) {
        return node[i];
    }

    /** The i-th weight. */
    public double weight(int i) {
        return weight[i];
    }

    /** The rule with weight 1. */
    public static GaussRule legendre(int size) {
        return LEGENDRE.computeIfAbsent(size, GaussRule::computeLegendre);
    }

    private static GaussRule computeLegendre(int n) {
        double[] node = new double[n];
        double[] weight = new double[n];
        for (int i = 0; i < (n + 1) / 2; i++) {
            // Tricomi's first guess, then Newton in double, then one step in doubled precision.
            double x = Math.cos(Math.PI * (i + 0.75) / (n + 0.5));
            for (int k = 0; k < 6; k++) {
                double[] p = legendreWithSlope(n, x);
                x -= p[0] / p[1];
            }
            Doubled high = Doubled.of(x);
            Doubled[] p = legendreWithSlope(n, high);
            high = high.minus(p[0].over(p[1]));
            p = legendreWithSlope(n, high);
            Doubled one = Doubled.of(1);
            Doubled w = one.over(one.minus(high.times(high)).times(p[1].times(p[1])));
            // t = (1 - x)/2 ascends while x descends from 1.
            node[i] = one.minus(high).times(Doubled.of(0.5)).value();
            node[n - 1 - i] = one.plus(high).times(Doubled.of(0.5)).value();
            weight[i] = w.value();
            weight[n - 1 - i] = weight[i];
        }
        if (n % 2 == 1) {
            node[n / 2] = 0.5;
        }
        return new GaussRule(node, weight);
    }

    private static double[] legendreWithSlope(int n, double x) {
        double before = 1;
        double p = x;
        for (int k = 2; k <= n; k++) {
            double next = ((2 * k - 1) * x * p - (k - 1) * before) / k;
            before = p;
            p = next;
        }
        if (n == 1) {
            return new double[] {x, 1};
        }
        return new double[] {p, n * (before - x * p) / (1 - x * x)};
    }

    private static Doubled[] legendreWithSlope(int n, Doubled x) {
        Doubled before = Doubled.of(1);
        Doubled p = x;
        for (int k = 2; k <= n; k++) {
            Doubled next = x.times(p)
                    .times(Doubled.of(2 * k - 1))
                    .minus(before.times(Doubled.of(k - 1)))
                    .over(Doubled.of(k));
            before = p;
            p = next;
        }
        if (n == 1) {
            return new Doubled[] {x, Doubled.of(1)};
        }
        Doubled slope =
                before.minus(x.times(p)).times(Doubled.of(n)).over(Doubled.of(1).minus(x.times(x)));
        return new Doubled[] {p, slope};
    }

    /**
     * The rule with weight t^β.
     *
     * @param beta β > −1
     */
    public static GaussRule jacobi(int size, double beta) {
        if (!(beta > -1)) {
            throw new IllegalArgumentException("the weight t^beta needs beta > -1, got " + beta);
        }
        if (beta == 0) {
            return legendre(size);
        }
        int n = size;
        double[] diagonal = new double[n];
        double[] off = new double[n];
        for (int k = 0; k < n; k++) {
            double c = 2 * k + beta;
            // Jacobi (0, β) on [-1, 1]; k = 0 apart, since the general form is 0/0 for β = 0.
            diagonal[k] = k == 0 ? beta / (beta + 2) : beta * beta / (c * (c + 2));
            if (k > 0) {
                double top = 2 * k * (k + beta);
                off[k - 1] = top / (c * Math.sqrt((c - 1) * (c + 1)));
            }
        }
        SymmetricEigen.tridiagonal(diagonal, off, n);
        double[] node = new double[n];
        double[] weight = new double[n];
        for (int i = 0; i < n; i++) {
            double x = diagonal[i];
            double slope = 0;
            for (int k = 0; k < 4; k++) {
                double[] p = JacobiPolynomials.valueWithSlope(n, 0, beta, x);
                slope = p[1];
                x -= p[0] / slope;
            }
            node[i] = (1 + x) / 2;
            slope = JacobiPolynomials.valueWithSlope(n, 0, beta, x)[1];
            weight[i] = 1 / ((1 - x) * (1 + x) * slope * slope);
        }
        return new GaussRule(node, weight);
    }
}
