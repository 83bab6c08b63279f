package org.wellwright.solver.angular;

import org.apache.commons.math3.complex.Complex;

/**
 * Rotation matrices of angular momentum: d^j_{m'm}(β) = ⟨jm'|e^{−iβJ_y}|jm⟩ and D^j_{m'm}(α, β, γ) = e^{−im'α}
 * d^j_{m'm}(β) e^{−imγ}.
 *
 * <p>d rises from j = max(|m|, |m'|) by its three-term recurrence in j (Varshalovich, Moskalev and Khersonskii 1988,
 * sec. 4.8); β may be any real angle. Quantum numbers are passed doubled.
 */
public final class Rotations {
    private Rotations() {}

    /**
     * d^j_{m'm}(β).
     *
     * @param beta rad, any real number
     * @throws IllegalArgumentException if m or m' is not one of −j, −j+1, …, j
     */
    public static double smallD(int twiceJ, int twiceMPrime, int twiceM, double beta) {
        check(twiceJ, twiceMPrime);
        check(twiceJ, twiceM);
        // d_{m'm} = (−1)^{m'−m} d_{mm'} = d_{−m,−m'}: bring the projection of largest size, positive, to the left.
        int left = twiceMPrime;
        int right = twiceM;
        int sign = 1;
        if (Math.abs(right) > Math.abs(left)) {
            sign = Coupling.sign(left - right);
            int swap = left;
            left = right;
            right = swap;
        }
        if (left < 0) {
            sign *= Coupling.sign(left - right);
            left = -left;
            right = -right;
        }
        return sign * ladder(twiceJ, left, right, beta);
    }

    /** d^j_{m'm} for m' ≥ |m|. */
    private static double ladder(int twiceJ, int twiceMPrime, int twiceM, double beta) {
        double m1 = twiceMPrime / 2.0;
        double m2 = twiceM / 2.0;
        double cosine = Math.cos(beta);
        double before = 0;
        double here = 1;
        for (int twice = twiceMPrime; twice < twiceJ; twice += 2) {
            double j = twice / 2.0;
            double next;
            if (twice == 0) {
                next = cosine;
            } else {
                double up = j + 1;
                double top = j * Math.sqrt((up - m1) * (up + m1) * (up - m2) * (up + m2));
                double bottom = up * Math.sqrt((j - m1) * (j + m1) * (j - m2) * (j + m2));
                next = ((2 * j + 1) * (j * up * cosine - m1 * m2) * here - bottom * before) / top;
            }
            before = here;
            here = next;
        }
        // d^{m'}_{m'm} = √C(2m', m'+m) cos^{m'+m}(β/2) (−sin(β/2))^{m'−m}
        int upper = (twiceMPrime + twiceM) / 2;
        int lower = (twiceMPrime - twiceM) / 2;
        double norm = 1;
        for (int k = 1; k <= Math.min(upper, lower); k++) {
            norm *= Math.sqrt((Math.max(upper, lower) + k) / (double) k);
        }
        // A power only makes the number smaller: what underflows here is below 1e-308 in the end.
        double first = ScaledPower.times(here * norm, Math.cos(beta / 2), upper);
        return ScaledPower.times(first, -Math.sin(beta / 2), lower);
    }

    /**
     * The whole matrix d^j(β), row j − m', column j − m (highest projection first), shape [2j+1][2j+1].
     *
     * @throws IllegalArgumentException if {@code twiceJ} is negative
     */
    public static double[][] smallDMatrix(int twiceJ, double beta) {
        check(twiceJ, twiceJ);
        double[][] matrix = new double[twiceJ + 1][twiceJ + 1];
        for (int row = 0; row <= twiceJ; row++) {
            for (int column = 0; column <= twiceJ; column++) {
                matrix[row][column] = smallD(twiceJ, twiceJ - 2 * row, twiceJ - 2 * column, beta);
            }
        }
        return matrix;
    }

    /**
     * D^j_{m'm}(α, β, γ).
     *
     * @param alpha rad, about z, applied last
     * @param beta rad, about y
     * @param gamma rad, about z, applied first
     * @throws IllegalArgumentException if m or m' is not one of −j, −j+1, …, j
     */
    public static Complex bigD(int twiceJ, int twiceMPrime, int twiceM, double alpha, double beta, double gamma) {
        double small = smallD(twiceJ, twiceMPrime, twiceM, beta);
        double phase = -(twiceMPrime / 2.0) * alpha - (twiceM / 2.0) * gamma;
        return new Complex(small * Math.cos(phase), small * Math.sin(phase));
    }

    private static void check(int twiceJ, int twiceM) {
        if (twiceJ < 0 || Math.abs(twiceM) > twiceJ || (twiceJ - twiceM) % 2 != 0) {
            throw new IllegalArgumentException(
                    "a projection must be one of -j, -j+1, ..., j, got 2j = %d, 2m = %d".formatted(twiceJ, twiceM));
        }
    }
}
