package org.wellwright.solver.radial.spectral;

import java.util.List;
import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.numerics.ElementBasis;

/** The matrices of a {@link Cluster} from C¹ trial functions on one mesh. */
final class ClusterMatrices {
    private final CheckGrid grid;
    private final List<Trial> trials;
    private final double reference;
    private final int channels;

    private ClusterMatrices(CheckGrid grid, List<Trial> trials, double reference) {
        this.grid = grid;
        this.trials = trials;
        this.reference = reference;
        channels = trials.get(0).channels();
    }

    static Cluster of(CheckGrid grid, List<Trial> trials, double reference) {
        return new ClusterMatrices(grid, trials, reference).build();
    }

    private Cluster build() {
        int n = trials.size();
        double[] gram = new double[n * n];
        double[] first = new double[n * n];
        double[] second = new double[n * n];
        Element[] elements = trials.get(0).elements();
        for (int e = 0; e < elements.length; e++) {
            int nodes = elements[e].basis[0].check.size;
            double[][][] u = new double[n][channels][nodes];
            double[][][] hu = new double[n][channels][nodes];
            for (int i = 0; i < n; i++) {
                fill(trials.get(i), e, u[i], hu[i]);
            }
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    add(elements[e], e, i, j, u, hu, gram, first, second);
                }
            }
        }
        return new Cluster(n, reference, gram, first, second);
    }

    private void fill(Trial trial, int e, double[][] u, double[][] hu) {
        Element element = trial.elements()[e];
        int functions = trial.functions();
        double factor = -element.kinetic / (element.unit * element.unit);
        for (int c = 0; c < channels; c++) {
            double[][] table = element.basis[c].check.second;
            int at = (e * channels + c) * functions;
            for (int g = 0; g < u[c].length; g++) {
                u[c][g] = trial.valueAt(e, c, g);
                double bend = 0;
                for (int k = 0; k < functions; k++) {
                    bend += trial.coefficients()[at + k] * table[k][g];
                }
                hu[c][g] = factor * bend - reference * u[c][g];
            }
        }
        for (int c = 0; c < channels; c++) {
            for (int d = 0; d < channels; d++) {
                double[] w = grid.check(e, c, d);
                if (w != null) {
                    for (int g = 0; g < w.length; g++) {
                        hu[c][g] += w[g] * u[d][g];
                    }
                }
            }
        }
    }

    private void add(
            Element element,
            int e,
            int i,
            int j,
            double[][][] u,
            double[][][] hu,
            double[] gram,
            double[] first,
            double[] second) {
        int n = trials.size();
        double weak = kinetic(e, trials.get(i), trials.get(j));
        double mass = 0;
        double strong = 0;
        for (int c = 0; c < channels; c++) {
            ElementBasis.Table table = element.basis[c].check;
            for (int g = 0; g < table.size; g++) {
                double w = table.weight[g] * element.unit;
                mass += w * u[i][c][g] * u[j][c][g];
                strong += w * hu[i][c][g] * hu[j][c][g];
                for (int d = 0; d < channels; d++) {
                    double[] v = grid.check(e, c, d);
                    if (v != null) {
                        weak += w * u[i][c][g] * v[g] * u[j][d][g];
                    }
                }
            }
        }
        gram[i * n + j] += mass;
        first[i * n + j] += weak - reference * mass;
        second[i * n + j] += strong;
    }

    private double kinetic(int e, Trial a, Trial b) {
        Element element = a.elements()[e];
        int functions = a.functions();
        double sum = 0;
        for (int c = 0; c < channels; c++) {
            int at = (e * channels + c) * functions;
            for (int k = 0; k < functions; k++) {
                sum += a.coefficients()[at + k] * b.coefficients()[at + k];
            }
            if (element.basis[c].atOrigin()) {
                sum += element.basis[c].vertexStiffness * a.vertex(e + 1, c) * b.vertex(e + 1, c);
            } else {
                sum += 0.5 * (a.vertex(e + 1, c) - a.vertex(e, c)) * (b.vertex(e + 1, c) - b.vertex(e, c));
            }
        }
        return sum * element.kinetic / element.unit;
    }
}
