package org.wellwright.solver.radial.spectral;

import java.util.List;
import org.wellwright.solver.numerics.CondensedPencil;
import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.numerics.ElementBasis;

/**
 * Carries a state from the trial space to the space with the extra bubbles: the energy needs only the square of what
 * the trial space leaves out, values and slopes need all of it.
 *
 * <p>Residuals are removed in turn on the trial space, by the condensed factorisation orthogonally to the state, and on
 * each extra bubble by its own diagonal (a two-level Gauss–Seidel iteration; each round gains a digit or two).
 */
final class StateRefinement {
    private static final int ROUNDS = 8;

    private final Element[] elements;
    private final CheckGrid grid;
    private final CondensedPencil.Work work;
    private final int channels;
    private final int functions;
    private final int bubbles;
    private final double[] vertexResidual;
    private final double[] residual;
    private final double[][][] values;

    private StateRefinement(MeshData mesh, Trial trial) {
        elements = mesh.pencil().elements();
        grid = mesh.grid();
        channels = trial.channels();
        functions = trial.functions();
        bubbles = elements[0].basis[0].bubbles;
        vertexResidual = new double[(elements.length + 1) * channels];
        residual = new double[elements.length * channels * functions];
        values = new double[elements.length][channels][elements[0].basis[0].check.size];
        work = mesh.pencil().work();
        work.solve(trial.shift(), null);
    }

    /** The normalised state in the larger space. */
    static Trial refine(MeshData mesh, Trial trial) {
        return new StateRefinement(mesh, trial).run(mesh, trial);
    }

    private Trial run(MeshData mesh, Trial start) {
        Trial u = start;
        double before = Double.POSITIVE_INFINITY;
        for (int round = 0; round < ROUNDS; round++) {
            Trial next = low(high(u), mesh.edges());
            double change = next.minus(u).norm() / next.norm();
            // A state is good to 1e-6 before the first round; a larger step is a failed factorisation.
            if (!(change < Math.min(before, 1e-12))) {
                break;
            }
            u = next;
            before = change;
            if (change < 1e-31) {
                break;
            }
        }
        return u.times(1 / Math.sqrt(u.norm()));
    }

    /** Residuals ∫ (κ u′v′ + (W − E) u v) for all v, with E the quotient of u. */
    private void residuals(Trial u) {
        double mass = 0;
        double energy = 0;
        for (int e = 0; e < elements.length; e++) {
            Element element = elements[e];
            for (int c = 0; c < channels; c++) {
                energy += u.squaresOn(e, c) * element.kinetic / element.unit;
                for (int g = 0; g < values[e][c].length; g++) {
                    values[e][c][g] = u.valueAt(e, c, g);
                }
            }
            double[] weight = element.basis[0].check.weight;
            for (int c = 0; c < channels; c++) {
                for (int g = 0; g < weight.length; g++) {
                    double x = weight[g] * element.unit * values[e][c][g];
                    mass += x * values[e][c][g];
                    energy += x * applied(e, c, g);
                }
            }
        }
        energy /= mass;
        java.util.Arrays.fill(vertexResidual, 0);
        for (int e = 0; e < elements.length; e++) {
            for (int c = 0; c < channels; c++) {
                residualOn(u, e, c, energy);
            }
        }
    }

    private double applied(int e, int c, int g) {
        double sum = 0;
        for (int d = 0; d < channels; d++) {
            double[] w = grid.check(e, c, d);
            if (w != null) {
                sum += w[g] * values[e][d][g];
            }
        }
        return sum;
    }

    private void residualOn(Trial u, int e, int c, double energy) {
        Element element = elements[e];
        ElementBasis basis = element.basis[c];
        ElementBasis.Table table = basis.check;
        double stiffness = element.kinetic / element.unit;
        int at = (e * channels + c) * functions;
        for (int k = 0; k < functions; k++) {
            residual[at + k] = stiffness * u.coefficients()[at + k];
        }
        double left = 0;
        double right = 0;
        for (int g = 0; g < table.size; g++) {
            double force = table.weight[g] * element.unit * (applied(e, c, g) - energy * values[e][c][g]);
            for (int k = 0; k < functions; k++) {
                residual[at + k] += force * table.bubble[k][g];
            }
            left += force * table.left[g];
            right += force * table.right[g];
        }
        double a = u.vertex(e, c);
        double b = u.vertex(e + 1, c);
        if (basis.atOrigin()) {
            right += stiffness * basis.vertexStiffness * b;
        } else {
            left += stiffness * basis.vertexStiffness * (a - b);
            right += stiffness * basis.vertexStiffness * (b - a);
        }
        vertexResidual[e * channels + c] += left;
        vertexResidual[(e + 1) * channels + c] += right;
    }

    private Trial high(Trial u) {
        residuals(u);
        double[] changed = u.coefficients().clone();
        for (int e = 0; e < elements.length; e++) {
            Element element = elements[e];
            for (int c = 0; c < channels; c++) {
                for (int x = 0; x < ElementBasis.EXTRA; x++) {
                    int own = x * channels + c;
                    double diagonal = element.ownA[own] - u.shift() * element.ownM[own];
                    int at = (e * channels + c) * functions + bubbles + x;
                    changed[at] -= residual[at] / (diagonal > 0 ? diagonal : element.kinetic / element.unit);
                }
            }
        }
        return u.with(changed);
    }

    private Trial low(Trial u, double[] edges) {
        residuals(u);
        int modes = elements[0].modes;
        double[] load = new double[(elements.length - 1) * channels];
        for (int i = 0; i < load.length; i++) {
            load[i] = -vertexResidual[channels + i];
        }
        double[] modeLoad = new double[work.amplitudes().length];
        double[] plain = new double[modes];
        for (int e = 0; e < elements.length; e++) {
            Element element = elements[e];
            double scale = 1 / Math.sqrt(element.unit);
            for (int c = 0; c < channels; c++) {
                for (int j = 0; j < bubbles; j++) {
                    double sum = 0;
                    for (int k = 0; k < bubbles; k++) {
                        sum -= element.basis[c].toBubbles[j][k] * residual[(e * channels + c) * functions + k];
                    }
                    plain[c * bubbles + j] = scale * sum;
                }
            }
            for (int k = 0; k < modes; k++) {
                double sum = 0;
                for (int j = 0; j < modes; j++) {
                    sum += element.vector[k * modes + j] * plain[j];
                }
                modeLoad[work.first(e) + k * work.step()] = sum;
            }
        }
        work.respond(load, modeLoad);
        Trial step = Trial.raw(elements, edges, work, u.shift()).orthogonalTo(List.of(u));
        return u.plus(step);
    }
}
