package org.wellwright.solver.radial.spectral;

import java.util.List;
import org.wellwright.solver.numerics.Element;
import org.wellwright.solver.numerics.ElementBasis;

/**
 * V at the nodes of the second Gauss rule of every element, on which energies and residuals are evaluated, and at those
 * of the first, so that the difference of the two measures the quadrature.
 *
 * <p>A node's radius is rounded to double; where V is steep that costs r V′/V roundings. The rounding of the radius is
 * known exactly (Knuth's sum), so V is carried to the exact node with the slope of the element's own interpolant.
 */
final class CheckGrid {
    private final int channels;
    /**
     * {@code potential[e][c * C + d][g]} with the centrifugal term, or at the origin without what the exponents hold.
     */
    private final double[][][] check;

    private final double[][][] assembly;
    private final double[][] rounding;
    private final boolean[] definite;

    private CheckGrid(int channels, double[][][] check, double[][][] assembly, double[][] rounding) {
        this.channels = channels;
        this.check = check;
        this.assembly = assembly;
        this.rounding = rounding;
        definite = new boolean[check.length];
        for (int e = 0; e < check.length; e++) {
            definite[e] = channels == 1 && hasOneSign(check[e][0]);
        }
    }

    private static boolean hasOneSign(double[] w) {
        for (double x : w) {
            if (x > 0 != w[0] > 0) {
                return false;
            }
        }
        return true;
    }

    static CheckGrid of(ChannelPotentials potentials, List<Leaf> leaves) {
        int n = leaves.size();
        double[][][] check = new double[n][][];
        double[][][] assembly = new double[n][][];
        double[][] rounding = new double[n][];
        for (int e = 0; e < n; e++) {
            Leaf leaf = leaves.get(e);
            ElementBasis.Table table = leaf.basis[0].check;
            double[] radius = Leaf.nodes(table, leaf.from, leaf.to);
            double[][] raw = potentials.sample(radius, radius.length);
            check[e] = corrected(Leaf.effective(potentials, raw, radius, leaf.atOrigin()), leaf, table, radius);
            assembly[e] = corrected(
                    Leaf.effective(potentials, leaf.potential, leaf.radius, leaf.atOrigin()),
                    leaf,
                    leaf.basis[0].assembly,
                    leaf.radius);
            rounding[e] = roundingBounds(potentials, radius);
        }
        return new CheckGrid(potentials.channels(), check, assembly, rounding);
    }

    private static double[][] corrected(double[][] w, Leaf leaf, ElementBasis.Table table, double[] radius) {
        if (leaf.atOrigin()) {
            return w;
        }
        double[][] result = new double[w.length][];
        int n = table.size;
        double width = leaf.to - leaf.from;
        double[] shift = new double[n];
        for (int g = 0; g < n; g++) {
            double product = width * table.position[g];
            double productError = Math.fma(width, table.position[g], -product);
            double sum = radius[g];
            double part = sum - leaf.from;
            double sumError = (leaf.from - (sum - part)) + (product - part);
            shift[g] = (sumError + productError) / width;
        }
        double[][] derivative = Differentiation.at(table);
        for (int cd = 0; cd < w.length; cd++) {
            if (w[cd] == null) {
                continue;
            }
            double[] exact = w[cd].clone();
            for (int g = 0; g < n; g++) {
                double slope = 0;
                double[] row = derivative[g];
                for (int h = 0; h < n; h++) {
                    slope += row[h] * w[cd][h];
                }
                exact[g] += slope * shift[g];
            }
            result[cd] = exact;
        }
        return result;
    }

    private static double[] roundingBounds(ChannelPotentials potentials, double[] radius) {
        double[] bound = new double[radius.length];
        for (int g = 0; g < radius.length; g++) {
            bound[g] = potentials.roundingBound(radius[g]);
        }
        return bound;
    }

    /** W of channels c and d at the check nodes of element e; null for zero. */
    double[] check(int e, int c, int d) {
        return check[e][c * channels + d];
    }

    /** W at the assembly nodes. */
    double[] assembly(int e, int c, int d) {
        return assembly[e][c * channels + d];
    }

    /** Whether W has one sign on an element, in a single channel. */
    boolean definite(int e) {
        return definite[e];
    }

    /** Bound of V's own rounding at the check nodes. */
    double[] rounding(int e) {
        return rounding[e];
    }

    /** Largest |W| on an element, for scales. */
    double largest(int e, Element element) {
        double largest = 0;
        for (int c = 0; c < element.channels; c++) {
            for (double w : check(e, c, c)) {
                largest = Math.max(largest, Math.abs(w));
            }
        }
        return largest;
    }
}
