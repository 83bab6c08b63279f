package org.wellwright.solver.radial.spectral;

import org.wellwright.solver.numerics.SymmetricEigen;

/**
 * Bounds of k neighbouring levels from k trial functions at once, for levels nearer to each other than their residuals
 * allow one by one.
 *
 * <p>With A0, A1, A2 the Gram matrices of u, Hu (against u and each other) and no level in (levels of the cluster, ν):
 * the solutions of (A1 − νA0) x = τ (A2 − 2νA1 + ν²A0) x bound the levels by ν + 1/τ, from below for ν above the
 * cluster and from above for ν below it (Lehmann 1949; Goerisch and He 1990). Energies are taken from a reference ρ so
 * that nothing cancels.
 */
final class Cluster {
    private final int size;
    private final double reference;
    private final double[] gram;
    private final double[] first;
    private final double[] second;

    /**
     * From the matrices of H − ρ, row by row.
     *
     * @param gram ∫ u_i u_j
     * @param first ∫ u_i (H − ρ) u_j
     * @param second ∫ (H − ρ)u_i (H − ρ)u_j
     */
    Cluster(int size, double reference, double[] gram, double[] first, double[] second) {
        this.size = size;
        this.reference = reference;
        this.gram = gram;
        this.first = first;
        this.second = second;
    }

    /** Bounds ν + 1/τ, ascending; NaN where the inequality gives none. */
    double[] bounds(double nu) {
        double s = nu - reference;
        int n = size;
        double[] metric = new double[n * n];
        double[] form = new double[n * n];
        for (int i = 0; i < n * n; i++) {
            metric[i] = second[i] - 2 * s * first[i] + s * s * gram[i];
            form[i] = first[i] - s * gram[i];
        }
        double[] tau = generalised(form, metric, n);
        double[] result = new double[n];
        for (int i = 0; i < n; i++) {
            // The levels of a cluster lie all on one side of ν, so all τ have the sign of ρ − ν.
            boolean usable = s > 0 ? tau[i] < 0 : tau[i] > 0;
            result[i] = usable ? nu + 1 / tau[i] : Double.NaN;
        }
        java.util.Arrays.sort(result);
        return result;
    }

    /** Ritz values of the cluster's functions, ascending. */
    double[] ritz() {
        double[] values = generalised(first.clone(), gram.clone(), size);
        for (int i = 0; i < size; i++) {
            values[i] += reference;
        }
        return values;
    }

    /** Eigenvalues of form x = τ metric x, metric positive. */
    private static double[] generalised(double[] form, double[] metric, int n) {
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                double sum = metric[i * n + j];
                for (int k = 0; k < j; k++) {
                    sum -= metric[i * n + k] * metric[j * n + k];
                }
                metric[i * n + j] = i == j ? Math.sqrt(sum) : sum / metric[j * n + j];
            }
        }
        for (int j = 0; j < n; j++) {
            for (int i = 0; i < n; i++) {
                double sum = form[i * n + j];
                for (int k = 0; k < i; k++) {
                    sum -= metric[i * n + k] * form[k * n + j];
                }
                form[i * n + j] = sum / metric[i * n + i];
            }
        }
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                double sum = form[i * n + j];
                for (int k = 0; k < j; k++) {
                    sum -= form[i * n + k] * metric[j * n + k];
                }
                form[i * n + j] = sum / metric[j * n + j];
            }
        }
        double[] values = new double[n];
        for (double x : form) {
            if (!(Math.abs(x) < Double.POSITIVE_INFINITY)) {
                java.util.Arrays.fill(values, Double.NaN);
                return values;
            }
        }
        SymmetricEigen.decompose(form, n, values, new double[n + n * n]);
        return values;
    }
}
