package org.wellwright.solver.radial.spectral;

import java.util.Arrays;
import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.numerics.ElementBasis;

/**
 * The energy of a trial function, its parts and its errors: E = (squares for T + quadrature of W u²)/∫u², so that
 * rounding is proportional to ⟨T⟩ + ⟨|V|⟩ and not to the norm of a matrix.
 *
 * <p>One object is used for many levels of one mesh; results are read before the next call.
 */
final class Quotient {
    private final Element[] elements;
    private final double[] edges;
    private final CheckGrid grid;
    private final boolean innerWall;
    private final boolean outerWall;
    private final int channels;
    private final int functions;
    private final int bubbles;
    private final double[][] value;
    private final double[][] second;
    private final double[] enriched;
    private final double[] share;
    private final double[] jump;

    /** Rayleigh quotient of the trial function. */
    double energy;
    /** ⟨T⟩ + ⟨|W|⟩. */
    double scale;
    /** ⟨T⟩ without the centrifugal part, except at the origin. */
    double kinetic;
    /** Σ over bubbles beyond the space of residual²/(A − EM): how far the energy is above the exact one. */
    double truncation;
    /** Difference of the two Gauss rules. */
    double quadrature;
    /** Effect of the cut at the ends. */
    double cut;
    /** ⟨rounding bound of V⟩. */
    double rounding;
    /** Rayleigh quotient of the smoothed trial function. */
    double smoothEnergy;
    /** ‖Hu − ρu‖/‖u‖ of the smoothed trial function. */
    double residual;

    private final double[] residualShare;
    private final double[] quadratureShare;

    Quotient(Element[] elements, double[] edges, CheckGrid grid, boolean innerWall, boolean outerWall) {
        this.elements = elements;
        this.edges = edges;
        this.grid = grid;
        this.innerWall = innerWall;
        this.outerWall = outerWall;
        channels = elements[0].channels;
        bubbles = elements[0].basis[0].bubbles;
        functions = bubbles + ElementBasis.EXTRA;
        int nodes = elements[0].basis[0].check.size;
        value = new double[channels][nodes];
        second = new double[channels][nodes];
        enriched = new double[elements.length * channels * functions];
        share = new double[elements.length];
        jump = new double[(elements.length + 1) * channels];
        residualShare = new double[elements.length];
        quadratureShare = new double[elements.length];
    }

    /** Sums that lose nothing to order. Source: Neumaier (1974). */
    private static final class Sum {
        private double sum;
        private double lost;

        void clear() {
            sum = 0;
            lost = 0;
        }

        void add(double x) {
            double t = sum + x;
            lost += Math.abs(sum) >= Math.abs(x) ? (sum - t) + x : (x - t) + sum;
            sum = t;
        }

        double value() {
            return sum + lost;
        }
    }

    private double squaredNorm;
    private final Sum norm = new Sum();
    private final Sum energySum = new Sum();
    private final Sum absolute = new Sum();

    /** Energy, scale and error estimate of a trial function. */
    void evaluate(Trial trial) {
        norm.clear();
        energySum.clear();
        absolute.clear();
        double kineticSum = 0;
        double roundingSum = 0;
        double difference = 0;
        for (int e = 0; e < elements.length; e++) {
            Element element = elements[e];
            double squares = kineticOn(trial, trial.coefficients(), e);
            kineticSum += squares;
            values(trial, trial.coefficients(), e, bubbles, true);
            double mass = 0;
            double energyOn = 0;
            double absoluteOn = 0;
            double[] weight = element.basis[0].check.weight;
            double[] bound = grid.rounding(e);
            double roundingOn = 0;
            for (int c = 0; c < channels; c++) {
                double[] u = value[c];
                for (int d = 0; d < channels; d++) {
                    double[] w = grid.check(e, c, d);
                    if (w == null) {
                        continue;
                    }
                    double[] v = value[d];
                    for (int g = 0; g < u.length; g++) {
                        double x = weight[g] * u[g] * v[g];
                        energyOn += x * w[g];
                        absoluteOn += Math.abs(x * w[g]);
                    }
                }
                for (int g = 0; g < u.length; g++) {
                    double x = weight[g] * u[g] * u[g];
                    mass += x;
                    roundingOn += x * bound[g];
                }
            }
            norm.add(element.unit * mass);
            energySum.add(squares);
            energySum.add(element.unit * energyOn);
            absolute.add(squares + element.unit * absoluteOn);
            roundingSum += element.unit * roundingOn;
            double other = quadratureOn(trial, e);
            quadratureShare[e] = element.unit * Math.abs(other - energyOn);
            difference += element.unit * (other - energyOn);
        }
        double n = norm.value();
        squaredNorm = n;
        energy = energySum.value() / n;
        scale = Math.max(absolute.value() / n, Math.abs(energy));
        kinetic = kineticSum / n;
        rounding = roundingSum / n;
        quadrature = Math.abs(difference) / n;
        for (int e = 0; e < elements.length; e++) {
            quadratureShare[e] /= n;
        }
        enrich(trial, n);
        cut = cutError(trial) / n;
    }

    /** ∫u² of the last function of {@link #evaluate}. */
    double norm() {
        return squaredNorm;
    }

    private double kineticOn(Trial trial, double[] coefficient, int e) {
        Element element = elements[e];
        double sum = 0;
        for (int c = 0; c < channels; c++) {
            int at = (e * channels + c) * functions;
            double squares = 0;
            for (int k = 0; k < functions; k++) {
                squares += coefficient[at + k] * coefficient[at + k];
            }
            double right = trial.vertex(e + 1, c);
            if (element.basis[c].atOrigin()) {
                squares += element.basis[c].vertexStiffness * right * right;
            } else {
                double rise = right - trial.vertex(e, c);
                squares += 0.5 * rise * rise;
            }
            sum += squares;
        }
        return sum * element.kinetic / element.unit;
    }

    private void values(Trial trial, double[] coefficient, int e, int count, boolean check) {
        for (int c = 0; c < channels; c++) {
            ElementBasis basis = elements[e].basis[c];
            fill(trial, coefficient, e, c, count, check ? basis.check : basis.assembly, value[c]);
        }
    }

    private void fill(
            Trial trial, double[] coefficient, int e, int c, int count, ElementBasis.Table table, double[] into) {
        double left = trial.vertex(e, c);
        double right = trial.vertex(e + 1, c);
        int n = table.size;
        double[] l = table.left;
        double[] r = table.right;
        for (int g = 0; g < n; g++) {
            into[g] = left * l[g] + right * r[g];
        }
        int at = (e * channels + c) * functions;
        for (int k = 0; k < count; k++) {
            double a = coefficient[at + k];
            double[] row = table.bubble[k];
            for (int g = 0; g < n; g++) {
                into[g] += a * row[g];
            }
        }
    }

    /** ∫ W u² over the element by the first rule, in units of L. */
    private double quadratureOn(Trial trial, int e) {
        Element element = elements[e];
        int n = element.basis[0].assembly.size;
        double[] weight = element.basis[0].assembly.weight;
        // The first rule has fewer nodes, so its values fit into the second arrays.
        for (int c = 0; c < channels; c++) {
            fill(trial, trial.coefficients(), e, c, bubbles, element.basis[c].assembly, second[c]);
        }
        double sum = 0;
        for (int c = 0; c < channels; c++) {
            for (int d = 0; d < channels; d++) {
                double[] w = grid.assembly(e, c, d);
                if (w != null) {
                    for (int g = 0; g < n; g++) {
                        sum += weight[g] * second[c][g] * second[d][g] * w[g];
                    }
                }
            }
        }
        return sum;
    }

    /** Coefficients of the bubbles beyond the space by one Jacobi step, and the error they account for. */
    private void enrich(Trial trial, double n) {
        double[] source = trial.coefficients();
        System.arraycopy(source, 0, enriched, 0, source.length);
        int modes = elements[0].modes;
        int stride = modes + 2 * channels + 1;
        double sum = 0;
        for (int e = 0; e < elements.length; e++) {
            Element element = elements[e];
            values(trial, source, e, bubbles, true);
            double[] weight = element.basis[0].check.weight;
            double shareOn = 0;
            for (int c = 0; c < channels; c++) {
                double[] force = second[c];
                for (int g = 0; g < force.length; g++) {
                    force[g] = -energy * value[c][g];
                }
                for (int d = 0; d < channels; d++) {
                    double[] w = grid.check(e, c, d);
                    if (w != null) {
                        for (int g = 0; g < force.length; g++) {
                            force[g] += w[g] * value[d][g];
                        }
                    }
                }
                for (int g = 0; g < force.length; g++) {
                    force[g] *= weight[g];
                }
                for (int x = 0; x < ElementBasis.EXTRA; x++) {
                    double[] bubble = element.basis[c].check.bubble[bubbles + x];
                    double r = 0;
                    for (int g = 0; g < force.length; g++) {
                        r += force[g] * bubble[g];
                    }
                    r *= element.unit;
                    int at = (x * channels + c) * stride + modes + 2 * channels;
                    double own = element.extraA[at] - energy * element.extraM[at];
                    own = own > 0 ? own : element.kinetic / element.unit;
                    enriched[(e * channels + c) * functions + bubbles + x] -= r / own;
                    shareOn += r * r / own;
                }
            }
            share[e] = shareOn / n;
            sum += shareOn;
        }
        truncation = sum / n;
    }

    /** What each element contributed to the errors of the last function. */
    Solution.Shares shares() {
        return new Solution.Shares(residualShare.clone(), quadratureShare.clone(), share.clone());
    }

    private double slopeRight(Trial trial, double[] coefficient, int e, int c) {
        ElementBasis basis = elements[e].basis[c];
        double right = trial.vertex(e + 1, c);
        double slope = basis.atOrigin() ? basis.exponent * right : 0.5 * (right - trial.vertex(e, c));
        int at = (e * channels + c) * functions;
        for (int k = 0; k < functions; k++) {
            slope += coefficient[at + k] * basis.slopeRight[k];
        }
        return slope / elements[e].unit;
    }

    private double slopeLeft(Trial trial, double[] coefficient, int e, int c) {
        ElementBasis basis = elements[e].basis[c];
        double slope = 0.5 * (trial.vertex(e + 1, c) - trial.vertex(e, c));
        int at = (e * channels + c) * functions;
        for (int k = 0; k < functions; k++) {
            slope += coefficient[at + k] * basis.slopeLeft[k];
        }
        return slope / elements[e].unit;
    }

    /** Lowering of the energy if the ends were not cut: κ u′²/(2k) each, k the decay outside. */
    private double cutError(Trial trial) {
        double sum = 0;
        int last = elements.length - 1;
        for (int c = 0; c < channels; c++) {
            if (!outerWall) {
                double slope = slopeRight(trial, trial.coefficients(), last, c);
                double[] w = grid.check(last, c, c);
                sum += cutAt(slope, w[w.length - 1], last);
            }
            if (!innerWall && !elements[0].basis[c].atOrigin()) {
                double slope = slopeLeft(trial, trial.coefficients(), 0, c);
                sum += cutAt(slope, grid.check(0, c, c)[0], 0);
            }
        }
        return sum;
    }

    private double cutAt(double slope, double w, int e) {
        double kappa = elements[e].kinetic;
        double decay = Math.sqrt(Math.max(w - energy, 0) / kappa);
        return kappa * slope * slope / (2 * Math.max(decay, 1 / edges[edges.length - 1]));
    }

    /**
     * Makes the trial function C¹ with zero slope at cut ends, and computes its Rayleigh quotient and the norm of its
     * residual, from which two-sided bounds follow. After {@link #evaluate} of the same function.
     */
    void smooth(Trial trial) {
        mendSlopes(trial);
        norm.clear();
        energySum.clear();
        double total = 0;
        Arrays.fill(residualShare, 0);
        for (int e = 0; e < elements.length; e++) {
            Element element = elements[e];
            energySum.add(kineticOn(trial, enriched, e));
            values(trial, enriched, e, functions, true);
            double[] weight = element.basis[0].check.weight;
            double mass = 0;
            double energyOn = 0;
            for (int c = 0; c < channels; c++) {
                double[] bend = second[c];
                Arrays.fill(bend, 0);
                int at = (e * channels + c) * functions;
                double[][] table = element.basis[c].check.second;
                for (int k = 0; k < functions; k++) {
                    double a = enriched[at + k];
                    double[] row = table[k];
                    for (int g = 0; g < bend.length; g++) {
                        bend[g] += a * row[g];
                    }
                }
                double factor = -element.kinetic / (element.unit * element.unit);
                double[] u = value[c];
                for (int g = 0; g < bend.length; g++) {
                    bend[g] = bend[g] * factor - energy * u[g];
                }
                for (int d = 0; d < channels; d++) {
                    double[] w = grid.check(e, c, d);
                    if (w != null) {
                        double[] v = value[d];
                        for (int g = 0; g < bend.length; g++) {
                            bend[g] += w[g] * v[g];
                            energyOn += weight[g] * u[g] * w[g] * v[g];
                        }
                    }
                }
                double squares = 0;
                for (int g = 0; g < bend.length; g++) {
                    squares += weight[g] * bend[g] * bend[g];
                    mass += weight[g] * u[g] * u[g];
                }
                residualShare[e] += squares * element.unit;
            }
            norm.add(element.unit * mass);
            energySum.add(element.unit * energyOn);
            total += residualShare[e];
        }
        double n = norm.value();
        smoothEnergy = energySum.value() / n;
        for (int e = 0; e < elements.length; e++) {
            residualShare[e] /= n;
        }
        double shift = energy - smoothEnergy;
        residual = Math.sqrt(Math.max(total / n - shift * shift, 0));
    }

    private void mendSlopes(Trial trial) {
        int last = elements.length - 1;
        Arrays.fill(jump, 0);
        // First all jumps of the function as it is, then the corrections.
        for (int v = 1; v <= last; v++) {
            for (int c = 0; c < channels; c++) {
                jump[v * channels + c] = slopeLeft(trial, enriched, v, c) - slopeRight(trial, enriched, v - 1, c);
            }
        }
        for (int c = 0; c < channels; c++) {
            if (!outerWall) {
                jump[(last + 1) * channels + c] = -slopeRight(trial, enriched, last, c);
            }
            if (!innerWall && !elements[0].basis[c].atOrigin()) {
                jump[c] = slopeLeft(trial, enriched, 0, c);
            }
        }
        for (int e = 0; e <= last; e++) {
            double unit = elements[e].unit;
            for (int c = 0; c < channels; c++) {
                double before = e == 0 ? 0 : elements[e - 1].unit;
                double after = e == last ? 0 : elements[e + 1].unit;
                // The share of a correction that costs the least residual is proportional to the length.
                double atLeft = -jump[e * channels + c] * unit / (unit + before) * unit;
                double atRight = jump[(e + 1) * channels + c] * unit / (unit + after) * unit;
                ElementBasis basis = elements[e].basis[c];
                int at = (e * channels + c) * functions;
                if (basis.atOrigin()) {
                    enriched[at] += atRight / basis.slopeRight[0];
                } else {
                    enriched[at] += 0.5 * (atRight - atLeft) / basis.slopeRight[0];
                    enriched[at + 1] += 0.5 * (atRight + atLeft) / basis.slopeRight[1];
                }
            }
        }
    }

    /** Coefficients of the smoothed function, a copy. */
    double[] smoothCoefficients() {
        return enriched.clone();
    }
}
