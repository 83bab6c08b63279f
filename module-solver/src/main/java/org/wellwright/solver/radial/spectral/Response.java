package org.wellwright.solver.radial.spectral;

import java.util.List;
import org.wellwright.solver.numerics.CondensedPencil;
import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.numerics.ElementBasis;
import org.wellwright.solver.radial.RadialState.SourceFunction;

/**
 * First-order states: (H − E) w = f − ⟨u|f⟩ u with ⟨u|w⟩ = 0 on the mesh of u, by the condensed factorisation with the
 * twist's unknown held at zero, and one step of iterative refinement of the orthogonality.
 */
final class Response {
    private Response() {}

    static Trial solve(MeshData mesh, Trial u, SourceFunction source) {
        Element[] elements = u.elements();
        int channels = u.channels();
        double[] vertexLoad = new double[(elements.length + 1) * channels];
        double[][][] f = sampled(u, source);
        double overlap = 0;
        for (int e = 0; e < elements.length; e++) {
            for (int c = 0; c < channels; c++) {
                ElementBasis.Table table = elements[e].basis[c].assembly;
                for (int g = 0; g < table.size; g++) {
                    overlap += elements[e].unit * table.weight[g] * f[e][c][g] * u.assemblyValue(e, c, g);
                }
            }
        }
        CondensedPencil.Work work = mesh.pencil().work();
        work.solve(u.shift(), null);
        double[] modeLoad = new double[work.amplitudes().length];
        for (int e = 0; e < elements.length; e++) {
            load(u, e, f[e], overlap, vertexLoad, modeLoad, work);
        }
        double[] inner = new double[(elements.length - 1) * channels];
        System.arraycopy(vertexLoad, channels, inner, 0, inner.length);
        work.respond(inner, modeLoad);
        Trial w = Trial.raw(elements, u.edges(), work, u.shift());
        return w.orthogonalTo(List.of(u));
    }

    /** f at the assembly nodes, divided by what the origin's rule holds of u. */
    private static double[][][] sampled(Trial u, SourceFunction source) {
        Element[] elements = u.elements();
        double[][][] f = new double[elements.length][u.channels()][];
        for (int e = 0; e < elements.length; e++) {
            ElementBasis.Table table = elements[e].basis[0].assembly;
            double[] r = Leaf.nodes(table, u.edges()[e], u.edges()[e + 1]);
            for (int c = 0; c < u.channels(); c++) {
                f[e][c] = new double[r.length];
                ElementBasis basis = elements[e].basis[c];
                for (int g = 0; g < r.length; g++) {
                    double value = source.value(c, r[g]);
                    if (basis.atOrigin()) {
                        // The table's functions are u divided by t^(b−1).
                        value *= basis.assembly.right[g] / Math.pow(table.position[g], basis.exponent);
                    }
                    f[e][c][g] = value;
                }
            }
        }
        return f;
    }

    private static void load(
            Trial u,
            int e,
            double[][] f,
            double overlap,
            double[] vertexLoad,
            double[] modeLoad,
            CondensedPencil.Work work) {
        Element element = u.elements()[e];
        int channels = u.channels();
        int n = element.basis[0].bubbles;
        int big = element.modes;
        double[] plain = new double[big];
        for (int c = 0; c < channels; c++) {
            ElementBasis.Table table = element.basis[c].assembly;
            double left = 0;
            double right = 0;
            for (int g = 0; g < table.size; g++) {
                double x = table.weight[g] * element.unit * (f[c][g] - overlap * u.assemblyValue(e, c, g));
                left += x * table.left[g];
                right += x * table.right[g];
                double scaled = x / Math.sqrt(element.unit);
                for (int j = 0; j < n; j++) {
                    plain[c * n + j] += scaled * element.basis[c].orthonormal[j][g];
                }
            }
            vertexLoad[e * channels + c] += left;
            vertexLoad[(e + 1) * channels + c] += right;
        }
        for (int k = 0; k < big; k++) {
            double sum = 0;
            for (int j = 0; j < big; j++) {
                sum += element.vector[k * big + j] * plain[j];
            }
            modeLoad[work.first(e) + k * work.step()] = sum;
        }
    }
}
