package org.wellwright.solver.numerics;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import org.junit.jupiter.api.Test;

/** The condensed chains against the full matrices that they stand for. */
class CondensedPencilTest {
    private static final int DEGREE = 8;

    private static double[][] potential(int channels, double from, double to, ElementBasis basis) {
        double[][] w = new double[channels * channels][basis.assembly.size];
        for (int g = 0; g < basis.assembly.size; g++) {
            double r = from + (to - from) * basis.assembly.position[g];
            for (int c = 0; c < channels; c++) {
                for (int d = 0; d < channels; d++) {
                    w[c * channels + d][g] = c == d ? (1 + 0.3 * c) * r * r : 0.4 * Math.sin(r);
                }
            }
        }
        return w;
    }

    private static Element[] chain(int channels, int count) {
        ElementBasis basis = ElementBasis.ordinary(DEGREE);
        ElementBasis[] all = new ElementBasis[channels];
        java.util.Arrays.fill(all, basis);
        Element[] elements = new Element[count];
        for (int e = 0; e < count; e++) {
            double from = 6.0 * e / count;
            double to = 6.0 * (e + 1) / count;
            elements[e] = new Element(
                    all, 0.7, 0.5 * (to - from), potential(channels, from, to, basis), new Element.Scratch());
        }
        return elements;
    }

    /** Eigenvalues of the uncondensed pencil, dense. */
    private static double[] dense(Element[] elements) {
        int channels = elements[0].channels;
        int modes = elements[0].modes;
        int inner = (elements.length - 1) * channels;
        int n = inner + elements.length * modes;
        double[] a = new double[n * n];
        double[] m = new double[n * n];
        for (int e = 0; e < elements.length; e++) {
            Element one = elements[e];
            for (int c = 0; c < channels; c++) {
                for (int d = 0; d < channels; d++) {
                    int cd = c * channels + d;
                    add(a, n, vertex(e - 1, c, channels, inner), vertex(e - 1, d, channels, inner), one.aLeftLeft[cd]);
                    add(a, n, vertex(e, c, channels, inner), vertex(e, d, channels, inner), one.aRightRight[cd]);
                    add(a, n, vertex(e - 1, c, channels, inner), vertex(e, d, channels, inner), one.aLeftRight[cd]);
                    add(a, n, vertex(e, d, channels, inner), vertex(e - 1, c, channels, inner), one.aLeftRight[cd]);
                }
                int left = vertex(e - 1, c, channels, inner);
                int right = vertex(e, c, channels, inner);
                add(m, n, left, left, one.mLeftLeft[c]);
                add(m, n, right, right, one.mRightRight[c]);
                add(m, n, left, right, one.mLeftRight[c]);
                add(m, n, right, left, one.mLeftRight[c]);
                for (int k = 0; k < modes; k++) {
                    int mode = inner + e * modes + k;
                    add(a, n, left, mode, one.alphaLeft[c * modes + k]);
                    add(a, n, mode, left, one.alphaLeft[c * modes + k]);
                    add(a, n, right, mode, one.alphaRight[c * modes + k]);
                    add(a, n, mode, right, one.alphaRight[c * modes + k]);
                    add(m, n, left, mode, one.betaLeft[c * modes + k]);
                    add(m, n, mode, left, one.betaLeft[c * modes + k]);
                    add(m, n, right, mode, one.betaRight[c * modes + k]);
                    add(m, n, mode, right, one.betaRight[c * modes + k]);
                }
            }
            for (int k = 0; k < modes; k++) {
                int mode = inner + e * modes + k;
                a[mode * n + mode] += one.lambda[k];
                m[mode * n + mode] += 1;
            }
        }
        return generalised(a, m, n);
    }

    private static int vertex(int v, int c, int channels, int inner) {
        int at = v * channels + c;
        return v < 0 || at >= inner ? -1 : at;
    }

    private static void add(double[] matrix, int n, int i, int j, double x) {
        if (i >= 0 && j >= 0) {
            matrix[i * n + j] += x;
        }
    }

    private static double[] generalised(double[] a, double[] m, int n) {
        double[] values = new double[n];
        double[] vectors = m.clone();
        SymmetricEigen.decompose(vectors, n, values, new double[n + n * n]);
        double[] half = new double[n * n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                double sum = 0;
                for (int k = 0; k < n; k++) {
                    sum += vectors[k * n + i] * vectors[k * n + j] / Math.sqrt(values[k]);
                }
                half[i * n + j] = sum;
            }
        }
        double[] standard = multiply(multiply(half, a, n), half, n);
        SymmetricEigen.decompose(standard, n, values, new double[n + n * n]);
        return values;
    }

    private static double[] multiply(double[] x, double[] y, int n) {
        double[] z = new double[n * n];
        for (int i = 0; i < n; i++) {
            for (int k = 0; k < n; k++) {
                for (int j = 0; j < n; j++) {
                    z[i * n + j] += x[i * n + k] * y[k * n + j];
                }
            }
        }
        return z;
    }

    private static void check(CondensedPencil pencil, double[] exact) {
        CondensedPencil.Work work = pencil.work();
        Random random = new Random(7);
        for (int trial = 0; trial < 300; trial++) {
            double shift = 40 * random.nextDouble();
            int below = 0;
            double nearest = Double.POSITIVE_INFINITY;
            for (double value : exact) {
                below += value < shift ? 1 : 0;
                nearest = Math.min(nearest, Math.abs(value - shift));
            }
            if (nearest > 1e-10) {
                assertThat(work.count(shift)).as("count below %s", shift).isEqualTo(below);
                work.solve(shift, null);
                assertThat(work.below()).isEqualTo(below);
            }
        }
        for (int i = 0; i < 12; i++) {
            double shift = exact[i] + 1e-5;
            for (int step = 0; step < 3; step++) {
                work.solve(shift, null);
                shift += work.correction();
            }
            assertThat(Math.abs(shift - exact[i])).isLessThan(1e-11);
        }
    }

    @Test
    void scalarChainHasTheEigenvaluesOfTheFullPencil() {
        Element[] elements = chain(1, 5);
        check(new ScalarChain(elements), dense(elements));
    }

    @Test
    void blockChainHasTheEigenvaluesOfTheFullPencil() {
        Element[] elements = chain(2, 4);
        check(new BlockChain(elements), dense(elements));
    }

    @Test
    void blocksOfOneAreTheScalarChain() {
        Element[] elements = chain(1, 6);
        check(new BlockChain(elements), dense(elements));
    }

    /**
     * A free box cut into equal elements: every level of even order vanishes at every edge, at a pole of the
     * condensation.
     */
    @Test
    void levelsThatVanishAtEveryEdgeAreCountedAndFound() {
        ElementBasis basis = ElementBasis.ordinary(16);
        Element[] elements = new Element[4];
        for (int e = 0; e < 4; e++) {
            elements[e] = new Element(
                    new ElementBasis[] {basis},
                    1,
                    0.5,
                    new double[][] {new double[basis.assembly.size]},
                    new Element.Scratch());
        }
        CondensedPencil.Work work = new ScalarChain(elements).work();
        for (int n = 1; n <= 12; n++) {
            double exact = Math.pow(n * Math.PI / 4, 2);
            assertThat(work.count(exact * (1 - 1e-9))).isEqualTo(n - 1);
            assertThat(work.count(exact * (1 + 1e-9))).isEqualTo(n);
            double shift = exact * (1 + 1e-6);
            for (int step = 0; step < 3; step++) {
                work.solve(shift, null);
                shift += work.correction();
            }
            assertThat(Math.abs(shift - exact)).isLessThan(1e-10 * exact);
        }
    }
}
