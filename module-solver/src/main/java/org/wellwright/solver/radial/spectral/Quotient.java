package org.wellwright.solver.radial.spectral;

import java.util.Arrays;
import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.numerics.ElementBasis;
import org.wellwright.solver.numerics.ElementKernels;

/**
 * The energy of a trial function, its parts and its errors: E = (squares for T + quadrature of W u²)/∫u², so that
 * rounding is proportional to ⟨T⟩ + ⟨|V|⟩ and not to the norm of a matrix.
 *
 * <p>One object is used for many levels of one mesh; results are read before the next call.
 */
final class Quotient {
    /** Bubbles beyond the trial space that take part in estimates and in smoothing. */
    private static final int EXTRA = 4;

    private final Element[] elements;
    private final double[] edges;
    private final CheckGrid grid;
    private final boolean innerWall;
    private final boolean outerWall;
    private final int channels;
    private final int functions;
    private final int bubbles;
    private final int nodes;
    private final double[][][] value;
    private final double[] force;
    private final double[][] product;
    private final double[] scratch;
    private final double[] norms;
    private final double[] enriched;
    private final double[] share;
    private final double[] jump;
    private final double[] residualShare;
    private final double[] quadratureShare;
    private final Sum norm = new Sum();
    private final Sum energySum = new Sum();
    private double squaredNorm;

    /** Rayleigh quotient of the trial function. */
    double energy;
    /** ⟨T⟩ + ⟨|W|⟩. */
    double scale;
    /** Σ over bubbles beyond the space of residual²/(A − EM): how far the energy is above the exact one. */
    double truncation;
    /** Effect of the cut at the ends. */
    double cut;
    /** What the difference of the two Gauss rules says of the error of the better one. */
    double quadrature;
    /** ⟨rounding bound of V⟩. */
    double rounding;
    /** Rayleigh quotient of the smoothed trial function. */
    double smoothEnergy;
    /** ‖Hu − ρu‖/‖u‖ of the smoothed trial function. */
    double residual;

    Quotient(Element[] elements, double[] edges, CheckGrid grid, boolean innerWall, boolean outerWall) {
        this.elements = elements;
        this.edges = edges;
        this.grid = grid;
        this.innerWall = innerWall;
        this.outerWall = outerWall;
        channels = elements[0].channels;
        ElementBasis basis = elements[0].basis[0];
        bubbles = basis.bubbles;
        functions = bubbles + ElementBasis.EXTRA;
        nodes = basis.check.size;
        value = new double[elements.length][channels][nodes];
        force = new double[nodes];
        product = new double[channels][nodes];
        scratch = new double[2 * functions + 16];
        norms = new double[functions];
        for (int k = 0; k < functions; k++) {
            norms[k] = 1 / Math.sqrt(2 * (2 * k + 3));
        }
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

    /** Energy, scale and truncation error of a trial function. */
    void evaluate(Trial trial) {
        double[] coefficient = trial.coefficients();
        norm.clear();
        energySum.clear();
        double absolute = 0;
        for (int e = 0; e < elements.length; e++) {
            Element element = elements[e];
            double squares = kineticOn(trial, coefficient, e, bubbles);
            for (int c = 0; c < channels; c++) {
                values(trial, coefficient, e, c, bubbles, value[e][c]);
            }
            double potential = element.unit * potentialOn(e, value[e]);
            norm.add(element.unit * massOn(trial, coefficient, e, bubbles, value[e]));
            energySum.add(squares);
            energySum.add(potential);
            absolute += squares + (grid.definite(e) ? Math.abs(potential) : element.unit * absoluteOn(e, value[e]));
        }
        squaredNorm = norm.value();
        energy = energySum.value() / squaredNorm;
        scale = Math.max(absolute / squaredNorm, Math.abs(energy));
        truncation = 0;
        for (int e = 0; e < elements.length; e++) {
            share[e] = truncationOn(trial, e) / squaredNorm;
            truncation += share[e];
        }
        cut = cutError(trial) / squaredNorm;
    }

    /** ∫u² of the last function of {@link #evaluate}. */
    double norm() {
        return squaredNorm;
    }

    private double kineticOn(Trial trial, double[] coefficient, int e, int count) {
        Element element = elements[e];
        double sum = 0;
        for (int c = 0; c < channels; c++) {
            int at = (e * channels + c) * functions;
            double squares = ElementKernels.sumOfSquares(coefficient, at, count);
            double right = trial.vertex(e + 1, c);
            if (element.basis[c].atOrigin()) {
                squares += element.basis[c].vertexStiffness * right * right;
            } else {
                double rise = right - trial.vertex(e, c);
                squares += 0.5 * rise * rise;
            }
            sum += squares;
        }
        return sum * (element.kinetic / element.unit);
    }

    private void values(Trial trial, double[] coefficient, int e, int c, int count, double[] into) {
        ElementKernels.values(
                elements[e].basis[c].check,
                trial.vertex(e, c),
                trial.vertex(e + 1, c),
                coefficient,
                (e * channels + c) * functions,
                count,
                scratch,
                into);
    }

    private double massOn(Trial trial, double[] coefficient, int e, int count, double[][] u) {
        double sum = 0;
        for (int c = 0; c < channels; c++) {
            ElementBasis basis = elements[e].basis[c];
            sum += basis.atOrigin()
                    ? ElementKernels.squareSum(basis.check.weight, u[c], nodes)
                    : ElementKernels.legendreSquare(
                            trial.vertex(e, c),
                            trial.vertex(e + 1, c),
                            coefficient,
                            (e * channels + c) * functions,
                            count,
                            norms);
        }
        return sum;
    }

    /** ∫ Σ W u u by the check rule, in units of L. */
    private double potentialOn(int e, double[][] u) {
        double[] weight = elements[e].basis[0].check.weight;
        double sum = 0;
        for (int c = 0; c < channels; c++) {
            for (int d = 0; d < channels; d++) {
                double[] w = grid.check(e, c, d);
                if (w != null) {
                    sum += ElementKernels.weightedSum(weight, w, u[c], u[d], nodes);
                }
            }
        }
        return sum;
    }

    private double absoluteOn(int e, double[][] u) {
        double[] weight = elements[e].basis[0].check.weight;
        double sum = 0;
        for (int c = 0; c < channels; c++) {
            sum += ElementKernels.absoluteSum(weight, grid.check(e, c, c), u[c], nodes);
        }
        return sum;
    }

    /** (W − E)u of one channel at the check nodes into {@code force}. */
    private void force(int e, int c, double[][] u) {
        residualForce(grid.check(e, c, c), u[c], energy, force, nodes);
        for (int d = 0; d < channels; d++) {
            double[] w = d == c ? null : grid.check(e, c, d);
            if (w != null) {
                for (int g = 0; g < nodes; g++) {
                    force[g] += w[g] * u[d][g];
                }
            }
        }
    }

    private static void residualForce(double[] w, double[] u, double energy, double[] into, int n) {
        for (int g = 0; g < n; g++) {
            into[g] = (w[g] - energy) * u[g];
        }
    }

    /** Coefficients of the bubbles beyond the space by one Jacobi step, and the error that they account for. */
    private double truncationOn(Trial trial, int e) {
        Element element = elements[e];
        double sum = 0;
        for (int c = 0; c < channels; c++) {
            ElementBasis.Table table = element.basis[c].check;
            force(e, c, value[e]);
            multiply(force, table.weight, nodes);
            int at = (e * channels + c) * functions;
            System.arraycopy(trial.coefficients(), at, enriched, at, functions);
            for (int x = 0; x < EXTRA; x++) {
                double r = element.unit * ElementKernels.product(force, table.bubble[bubbles + x], nodes);
                double own = element.ownA[x * channels + c] - energy * element.ownM[x * channels + c];
                own = own > 0 ? own : element.kinetic / element.unit;
                enriched[at + bubbles + x] -= r / own;
                sum += r * r / own;
            }
        }
        return sum;
    }

    private static void multiply(double[] x, double[] by, int n) {
        for (int g = 0; g < n; g++) {
            x[g] *= by[g];
        }
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
        for (int k = 0; k < bubbles + EXTRA; k++) {
            slope += coefficient[at + k] * basis.slopeRight[k];
        }
        return slope / elements[e].unit;
    }

    private double slopeLeft(Trial trial, double[] coefficient, int e, int c) {
        ElementBasis basis = elements[e].basis[c];
        double slope = 0.5 * (trial.vertex(e + 1, c) - trial.vertex(e, c));
        int at = (e * channels + c) * functions;
        for (int k = 0; k < bubbles + EXTRA; k++) {
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
                sum += cutAt(slope, grid.check(last, c, c)[nodes - 1], last);
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
     * residual, from which two-sided bounds follow; with them what quadrature and V's own rounding may do. After
     * {@link #evaluate} of the same function.
     */
    void smooth(Trial trial) {
        quadratureAndRounding(trial);
        mendSlopes(trial);
        int count = bubbles + EXTRA;
        norm.clear();
        energySum.clear();
        double total = 0;
        for (int e = 0; e < elements.length; e++) {
            Element element = elements[e];
            energySum.add(kineticOn(trial, enriched, e, count));
            for (int c = 0; c < channels; c++) {
                values(trial, enriched, e, c, count, value[e][c]);
            }
            norm.add(element.unit * massOn(trial, enriched, e, count, value[e]));
            energySum.add(element.unit * potentialOn(e, value[e]));
            double squares = 0;
            double factor = -element.kinetic / (element.unit * element.unit);
            for (int c = 0; c < channels; c++) {
                ElementBasis.Table table = element.basis[c].check;
                double[] bend = product[c];
                ElementKernels.second(table, enriched, (e * channels + c) * functions, count, scratch, bend);
                force(e, c, value[e]);
                addMultiple(factor, bend, force, nodes);
                squares += ElementKernels.squareSum(table.weight, force, nodes);
            }
            residualShare[e] = squares * element.unit;
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

    private static void addMultiple(double a, double[] x, double[] into, int n) {
        for (int g = 0; g < n; g++) {
            into[g] += a * x[g];
        }
    }

    private void quadratureAndRounding(Trial trial) {
        double smooth = 0;
        double atOrigin = 0;
        double roundingSum = 0;
        for (int e = 0; e < elements.length; e++) {
            Element element = elements[e];
            double checked = potentialOn(e, value[e]);
            double[] bound = grid.rounding(e);
            for (int c = 0; c < channels; c++) {
                roundingSum += element.unit
                        * ElementKernels.weightedSum(
                                element.basis[c].check.weight, bound, value[e][c], value[e][c], nodes);
            }
            double other = otherRule(trial, e);
            quadratureShare[e] = element.unit * Math.abs(other - checked) / squaredNorm;
            if (element.basis[0].atOrigin()) {
                // V may be singular there, and the rules converge slowly: all of the difference but rounding.
                double rounded = 0x1p-50 * Math.abs(checked);
                atOrigin += element.unit * Math.max(0, Math.abs(other - checked) - rounded);
            } else {
                smooth += element.unit * (other - checked);
            }
        }
        rounding = roundingSum / squaredNorm;
        // Where both rules converge geometrically the better one gains digits on the difference.
        double difference = Math.abs(smooth) / squaredNorm;
        quadrature = atOrigin / squaredNorm + difference * Math.min(1, difference / (1e-12 * scale));
    }

    /** ∫ W u² over an element by the first rule, in units of L. */
    private double otherRule(Trial trial, int e) {
        Element element = elements[e];
        for (int c = 0; c < channels; c++) {
            ElementKernels.values(
                    element.basis[c].assembly,
                    trial.vertex(e, c),
                    trial.vertex(e + 1, c),
                    trial.coefficients(),
                    (e * channels + c) * functions,
                    bubbles,
                    scratch,
                    product[c]);
        }
        double sum = 0;
        ElementBasis.Table table = element.basis[0].assembly;
        for (int c = 0; c < channels; c++) {
            for (int d = 0; d < channels; d++) {
                double[] w = grid.assembly(e, c, d);
                if (w != null) {
                    sum += ElementKernels.weightedSum(table.weight, w, product[c], product[d], table.size);
                }
            }
        }
        return sum;
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
            double before = e == 0 ? 0 : elements[e - 1].unit;
            double after = e == last ? 0 : elements[e + 1].unit;
            for (int c = 0; c < channels; c++) {
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
