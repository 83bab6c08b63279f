package org.wellwright.solver.radial.spectral;

import org.wellwright.solver.numerics.Element;

/**
 * Whether an element resolves the solutions at an energy: the local energy error per norm, from the residual on the
 * bubbles beyond the trial space (Babuška and Szabó 1991, section 4.4, for hierarchic estimates).
 *
 * <p>With vertex values y the element's solution has η² = Σ_x t_x(y)²/(A_xx − E M_xx) and norm m(y); returned is a
 * bound of η²/m over all y, the trace of m⁻¹η².
 */
final class ResolutionTest {
    private final int channels;
    private final int modes;
    private final double[] response;
    private final double[] residual;
    private final double[] error;
    private final double[] mass;

    ResolutionTest(int channels, int modes) {
        this.channels = channels;
        this.modes = modes;
        int v = 2 * channels;
        response = new double[v * modes];
        residual = new double[v];
        error = new double[v * v];
        mass = new double[v * v];
    }

    double errorPerNorm(Element element, double energy) {
        int first = element.basis[0].atOrigin() ? channels : 0;
        int v = 2 * channels;
        for (int i = first; i < v; i++) {
            boolean left = i < channels;
            int c = left ? i : i - channels;
            double[] alpha = left ? element.alphaLeft : element.alphaRight;
            double[] beta = left ? element.betaLeft : element.betaRight;
            for (int k = 0; k < modes; k++) {
                double d = element.lambda[k] - energy;
                d = d == 0 ? Double.MIN_NORMAL : d;
                response[i * modes + k] = -(alpha[c * modes + k] - energy * beta[c * modes + k]) / d;
            }
        }
        masses(element, first);
        java.util.Arrays.fill(error, 0);
        int stride = modes + 2 * channels;
        for (int row = 0; row < Element.TESTED * channels; row++) {
            int at = row * stride;
            double own = element.ownA[row] - energy * element.ownM[row];
            if (!(own > 0)) {
                return Double.POSITIVE_INFINITY;
            }
            for (int i = first; i < v; i++) {
                double t = element.extraA[at + modes + i] - energy * element.extraM[at + modes + i];
                for (int k = 0; k < modes; k++) {
                    t += (element.extraA[at + k] - energy * element.extraM[at + k]) * response[i * modes + k];
                }
                residual[i] = t;
            }
            for (int i = first; i < v; i++) {
                for (int j = first; j <= i; j++) {
                    error[i * v + j] += residual[i] * residual[j] / own;
                }
            }
        }
        return trace(first, v);
    }

    private void masses(Element element, int first) {
        int v = 2 * channels;
        for (int i = first; i < v; i++) {
            for (int j = first; j <= i; j++) {
                boolean leftI = i < channels;
                boolean leftJ = j < channels;
                int ci = leftI ? i : i - channels;
                int cj = leftJ ? j : j - channels;
                double sum = 0;
                if (ci == cj) {
                    sum = leftI ? element.mLeftLeft[ci] : leftJ ? element.mLeftRight[ci] : element.mRightRight[ci];
                }
                double[] betaI = leftI ? element.betaLeft : element.betaRight;
                double[] betaJ = leftJ ? element.betaLeft : element.betaRight;
                for (int k = 0; k < modes; k++) {
                    double ri = response[i * modes + k];
                    double rj = response[j * modes + k];
                    sum += ri * rj + ri * betaJ[cj * modes + k] + rj * betaI[ci * modes + k];
                }
                mass[i * v + j] = sum;
            }
        }
    }

    /** Trace of mass⁻¹ error by Cholesky: with m = L Lᵀ it is the trace of L⁻¹ error L⁻ᵀ. */
    private double trace(int first, int v) {
        for (int i = first; i < v; i++) {
            for (int j = first; j <= i; j++) {
                double sum = mass[i * v + j];
                for (int k = first; k < j; k++) {
                    sum -= mass[i * v + k] * mass[j * v + k];
                }
                if (i == j) {
                    mass[i * v + i] = Math.sqrt(Math.max(sum, 1e-12 * mass[i * v + i]));
                } else {
                    mass[i * v + j] = sum / mass[j * v + j];
                }
            }
        }
        for (int i = first; i < v; i++) {
            for (int j = first; j < i; j++) {
                error[j * v + i] = error[i * v + j];
            }
        }
        double trace = 0;
        // Forward substitution on the rows, then on the columns of what is left.
        for (int j = first; j < v; j++) {
            for (int i = first; i < v; i++) {
                double sum = error[i * v + j];
                for (int k = first; k < i; k++) {
                    sum -= mass[i * v + k] * error[k * v + j];
                }
                error[i * v + j] = sum / mass[i * v + i];
            }
        }
        for (int i = first; i < v; i++) {
            for (int j = first; j <= i; j++) {
                double sum = error[i * v + j];
                for (int k = first; k < j; k++) {
                    sum -= error[i * v + k] * mass[j * v + k];
                }
                error[i * v + j] = sum / mass[j * v + j];
            }
            trace += error[i * v + i];
        }
        return Double.isNaN(trace) ? Double.POSITIVE_INFINITY : trace;
    }
}
