package org.wellwright.solver.numerics;

import java.util.Arrays;

/**
 * The loops of {@link ScalarChain} over all elements and modes. Arrays come as arguments: only then are they compiled
 * to vector instructions. Modes of element e stand at {@code e * stride}, stride a multiple of 4; what pads a row has λ
 * = ∞ and no coupling.
 */
final class ChainKernels {
    private ChainKernels() {}

    /** {@code into = a − σ m}. */
    static void shifted(double shift, double[] a, double[] m, double[] into, int n) {
        for (int e = 0; e < n; e++) {
            into[e] = a[e] - shift * m[e];
        }
    }

    /** The terms e_i e_j/(λ − σ) of all modes. */
    static void poles(
            double shift,
            double[] lambda,
            double[] alphaLeft,
            double[] betaLeft,
            double[] alphaRight,
            double[] betaRight,
            double[] leftLeft,
            double[] leftRight,
            double[] rightRight,
            int n) {
        for (int i = 0; i < n; i++) {
            double inverse = 1 / (lambda[i] - shift);
            double left = alphaLeft[i] - shift * betaLeft[i];
            double right = alphaRight[i] - shift * betaRight[i];
            double x = left * inverse;
            leftLeft[i] = left * x;
            leftRight[i] = right * x;
            rightRight[i] = right * (right * inverse);
        }
    }

    /** Amplitudes of all modes for given edge values, and what each adds to the norm. */
    static void responses(
            double shift,
            double[] lambda,
            double[] alphaLeft,
            double[] betaLeft,
            double[] alphaRight,
            double[] betaRight,
            double[] left,
            double[] right,
            double[] value,
            double[] mass,
            int n) {
        for (int i = 0; i < n; i++) {
            double cross = betaLeft[i] * left[i] + betaRight[i] * right[i];
            double coupling = alphaLeft[i] * left[i] + alphaRight[i] * right[i] - shift * cross;
            double x = coupling / (shift - lambda[i]);
            value[i] = x;
            mass[i] = x * (x + 2 * cross);
        }
    }

    /** {@code from[e] −= Σ parts of element e}. */
    static void subtractSums(double[] parts, int stride, double[] from, int n) {
        if (stride == 16) {
            for (int e = 0; e < n; e++) {
                int i = e * 16;
                double a = (parts[i] + parts[i + 1]) + (parts[i + 2] + parts[i + 3]);
                double b = (parts[i + 4] + parts[i + 5]) + (parts[i + 6] + parts[i + 7]);
                double c = (parts[i + 8] + parts[i + 9]) + (parts[i + 10] + parts[i + 11]);
                double d = (parts[i + 12] + parts[i + 13]) + (parts[i + 14] + parts[i + 15]);
                from[e] -= (a + b) + (c + d);
            }
            return;
        }
        for (int e = 0; e < n; e++) {
            double sum = 0;
            for (int i = e * stride; i < (e + 1) * stride; i += 4) {
                sum += (parts[i] + parts[i + 1]) + (parts[i + 2] + parts[i + 3]);
            }
            from[e] -= sum;
        }
    }

    /**
     * For each element the mode nearest to σ, its distance and couplings, and whether it must stay an unknown.
     *
     * @param position the number of modes below the shift, corrected from its last value
     * @return modes below the shift, without those that stay
     */
    static int nearest(
            double shift,
            double[] lambda,
            double[] reach,
            double[] alphaLeft,
            double[] betaLeft,
            double[] alphaRight,
            double[] betaRight,
            int[] position,
            int[] nearest,
            double[] delta,
            double[] left,
            double[] right,
            boolean[] near,
            int stride,
            int modes,
            int n) {
        int below = 0;
        for (int e = 0; e < n; e++) {
            int first = e * stride;
            int k = position[e];
            while (k < modes && lambda[first + k] < shift) {
                k++;
            }
            while (k > 0 && lambda[first + k - 1] >= shift) {
                k--;
            }
            position[e] = k;
            below += k;
            if (k == modes || k > 0 && shift - lambda[first + k - 1] < lambda[first + k] - shift) {
                k--;
            }
            double d = lambda[first + k] - shift;
            nearest[e] = k;
            delta[e] = d;
            near[e] = Math.abs(d) <= reach[first + k];
            left[e] = alphaLeft[first + k] - shift * betaLeft[first + k];
            right[e] = alphaRight[first + k] - shift * betaRight[first + k];
            if (near[e] && d < 0) {
                below--;
            }
        }
        return below;
    }

    /** Repeats the value of each element over its modes. */
    static void spread(double[] values, double[] into, int stride, int n) {
        for (int e = 0; e < n; e++) {
            Arrays.fill(into, e * stride, (e + 1) * stride, values[e]);
        }
    }
}
