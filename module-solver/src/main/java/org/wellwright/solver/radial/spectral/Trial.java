package org.wellwright.solver.radial.spectral;

import java.util.List;
import org.wellwright.solver.numerics.CondensedPencil;
import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.numerics.ElementBasis;

/**
 * A continuous function on a mesh: values at the edges and bubble coefficients, in all channels. Not normalised unless
 * {@link #normalised} made it.
 */
final class Trial {
    private final Element[] elements;
    private final double[] edges;
    private final int channels;
    private final int functions;
    private final double[] vertex;
    private final double[] coefficient;
    private final double shift;

    private Trial(Element[] elements, double[] edges, double[] vertex, double[] coefficient, double shift) {
        this.elements = elements;
        this.edges = edges;
        channels = elements[0].channels;
        functions = elements[0].basis[0].bubbles + ElementBasis.EXTRA;
        this.vertex = vertex;
        this.coefficient = coefficient;
        this.shift = shift;
    }

    /** The vector that a pencil has just computed, scaled against overflow. */
    static Trial of(Element[] elements, double[] edges, CondensedPencil.Work work, double shift) {
        return raw(elements, edges, work, shift).scaled();
    }

    /** The vector that a pencil has just computed. */
    static Trial raw(Element[] elements, double[] edges, CondensedPencil.Work work, double shift) {
        int channels = elements[0].channels;
        int n = elements[0].basis[0].bubbles;
        int functions = n + ElementBasis.EXTRA;
        double[] vertex = new double[(elements.length + 1) * channels];
        System.arraycopy(work.vertices(), 0, vertex, channels, (elements.length - 1) * channels);
        double[] coefficient = new double[elements.length * channels * functions];
        double[] scratch = new double[n];
        for (int e = 0; e < elements.length; e++) {
            for (int c = 0; c < channels; c++) {
                elements[e].bubbleCoefficients(
                        c,
                        work.amplitudes(),
                        work.first(e),
                        work.step(),
                        scratch,
                        coefficient,
                        (e * channels + c) * functions);
            }
        }
        return new Trial(elements, edges, vertex, coefficient, shift);
    }

    /** Largest vertex value or coefficient becomes about 1, so that squares do not overflow. */
    private Trial scaled() {
        double largest = 0;
        for (double x : vertex) {
            largest = Math.max(largest, Math.abs(x));
        }
        for (double x : coefficient) {
            largest = Math.max(largest, Math.abs(x));
        }
        if (!(largest > 0) || Double.isInfinite(largest)) {
            return this;
        }
        return times(1 / largest);
    }

    Trial times(double factor) {
        double[] v = vertex.clone();
        double[] c = coefficient.clone();
        for (int i = 0; i < v.length; i++) {
            v[i] *= factor;
        }
        for (int i = 0; i < c.length; i++) {
            c[i] *= factor;
        }
        return new Trial(elements, edges, v, c, shift);
    }

    /** The shift at which it was computed, an energy good to rounding. */
    double shift() {
        return shift;
    }

    Element[] elements() {
        return elements;
    }

    double[] edges() {
        return edges;
    }

    int channels() {
        return channels;
    }

    int functions() {
        return functions;
    }

    /** Value at edge v (0 … elements) in channel c. */
    double vertex(int v, int c) {
        return vertex[v * channels + c];
    }

    /** Coefficients; bubble k of channel c on element e is at {@code (e * C + c) * functions + k}. */
    double[] coefficients() {
        return coefficient;
    }

    Trial with(double[] changed) {
        return new Trial(elements, edges, vertex, changed, shift);
    }

    /** Integral of Σ_c u_c² over an element, times the exact mass. */
    double massOn(int e) {
        return product(this, e);
    }

    private double product(Trial other, int e) {
        double sum = 0;
        for (int c = 0; c < channels; c++) {
            ElementBasis.Table table = elements[e].basis[c].check;
            for (int g = 0; g < table.size; g++) {
                sum += table.weight[g] * valueAt(e, c, g) * other.valueAt(e, c, g);
            }
        }
        return sum * elements[e].unit;
    }

    /** Value at a check node of an element. */
    double valueAt(int e, int c, int g) {
        ElementBasis.Table table = elements[e].basis[c].check;
        double u = vertex(e, c) * table.left[g] + vertex(e + 1, c) * table.right[g];
        int at = (e * channels + c) * functions;
        for (int k = 0; k < functions; k++) {
            u += coefficient[at + k] * table.bubble[k][g];
        }
        return u;
    }

    /** Value at an assembly node of an element. */
    double assemblyValue(int e, int c, int g) {
        ElementBasis.Table table = elements[e].basis[c].assembly;
        double u = vertex(e, c) * table.left[g] + vertex(e + 1, c) * table.right[g];
        int at = (e * channels + c) * functions;
        for (int k = 0; k < functions; k++) {
            u += coefficient[at + k] * table.bubble[k][g];
        }
        return u;
    }

    /** ∫ u_c′² dr over an element in units of 1/L; at the origin with the part that the exponent holds. */
    double squaresOn(int e, int c) {
        int at = (e * channels + c) * functions;
        double squares = 0;
        for (int k = 0; k < functions; k++) {
            squares += coefficient[at + k] * coefficient[at + k];
        }
        double right = vertex(e + 1, c);
        ElementBasis basis = elements[e].basis[c];
        if (basis.atOrigin()) {
            return squares + basis.vertexStiffness * right * right;
        }
        double rise = right - vertex(e, c);
        return squares + 0.5 * rise * rise;
    }

    private int find(double r) {
        int at = java.util.Arrays.binarySearch(edges, r);
        int e = at >= 0 ? at : -at - 2;
        return Math.min(Math.max(e, 0), elements.length - 1);
    }

    /** u_c(r); zero outside the mesh. */
    double value(int c, double r) {
        if (!(r >= edges[0] && r <= edges[elements.length])) {
            return 0;
        }
        int e = find(r);
        return elements[e].basis[c].value(
                (r - edges[e]) / (edges[e + 1] - edges[e]),
                vertex(e, c),
                vertex(e + 1, c),
                coefficient,
                (e * channels + c) * functions);
    }

    /** du_c/dr; zero outside the mesh. */
    double slope(int c, double r) {
        if (!(r >= edges[0] && r <= edges[elements.length])) {
            return 0;
        }
        int e = find(r);
        return elements[e].basis[c].slope(
                        (r - edges[e]) / (edges[e + 1] - edges[e]),
                        vertex(e, c),
                        vertex(e + 1, c),
                        coefficient,
                        (e * channels + c) * functions)
                / elements[e].unit;
    }

    /** Whether u of the first channel that is not zero there is negative at the inner end. */
    boolean startsNegative() {
        for (int e = 0; e < elements.length; e++) {
            for (int c = 0; c < channels; c++) {
                double inside = value(c, edges[e] + 0.25 * (edges[e + 1] - edges[e]));
                if (Math.abs(inside) > 1e-300) {
                    return inside < 0;
                }
            }
        }
        return false;
    }

    double norm() {
        double sum = 0;
        for (int e = 0; e < elements.length; e++) {
            sum += massOn(e);
        }
        return sum;
    }

    /** Part of the norm on an element. */
    double share(int e) {
        return massOn(e) / norm();
    }

    /** ∫ Σ_c u_c v_c dr with a function on the same mesh. */
    double overlap(Trial other) {
        double sum = 0;
        for (int e = 0; e < elements.length; e++) {
            sum += product(other, e);
        }
        return sum;
    }

    Trial plus(Trial other) {
        return combined(other, 1);
    }

    Trial minus(Trial other) {
        return combined(other, -1);
    }

    private Trial combined(Trial other, double factor) {
        double[] v = vertex.clone();
        double[] c = coefficient.clone();
        for (int i = 0; i < v.length; i++) {
            v[i] += factor * other.vertex[i];
        }
        for (int i = 0; i < c.length; i++) {
            c[i] += factor * other.coefficient[i];
        }
        return new Trial(elements, edges, v, c, shift);
    }

    /** This function without its components along others. */
    Trial orthogonalTo(List<Trial> others) {
        Trial result = this;
        for (Trial other : others) {
            result = result.combined(other, -result.overlap(other) / other.norm());
        }
        return result;
    }
}
