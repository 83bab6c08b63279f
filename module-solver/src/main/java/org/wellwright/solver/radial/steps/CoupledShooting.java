package org.wellwright.solver.radial.steps;

import java.util.List;

/**
 * Propagates the matrix Y = u′u⁻¹ of coupled channels from both ends to one edge (Johnson 1973; Manolopoulos 1986).
 *
 * <p>Over a step with u(1) = A u(0) + B u′(0) the zeros of det u are the negative eigenvalues of Y(0) + B⁻¹A, since no
 * step holds a half-wave; the count of levels is the sum of these from both sides and of the negative eigenvalues of
 * Y_inside − Y_outside at the edge. Newton's step comes from the eigenvalue of that difference that is nearest to zero
 * for its slope. Used by one thread.
 */
final class CoupledShooting implements LevelShooting {
    private final CoupledMesh mesh;
    private final PotentialScan scan;
    private final double kinetic;
    private final int n;
    private final double[][] inside;
    private final double[][] outside;
    private final CoupledSeries series;
    private double residue;
    private double shift;
    private double depth;
    private int counts;

    CoupledShooting(CoupledMesh mesh, PotentialScan scan, double kinetic, int channels) {
        this.mesh = mesh;
        this.scan = scan;
        this.kinetic = kinetic;
        n = channels;
        inside = new double[2][n * n];
        outside = new double[2][n * n];
        series = new CoupledSeries(channels);
    }

    @Override
    public int count(double energy) {
        return shoot(energy, false);
    }

    @Override
    public int countAndStep(double energy) {
        return shoot(energy, true);
    }

    @Override
    public double step() {
        return shift;
    }

    @Override
    public int counts() {
        return counts;
    }

    private int shoot(double energy, boolean derivative) {
        counts++;
        shift = Double.NaN;
        if (Double.isNaN(scan.firstAllowed(energy))) {
            return 0;
        }
        int walls = mesh.prepare(energy, inside, outside);
        double e = energy / kinetic;
        int zeros = 0;
        boolean wall = (walls & 1) != 0;
        List<CoupledStep> inner = mesh.inner();
        for (int i = inner.size() - 1; i >= 0; i--) {
            zeros += propagate(inner.get(i), e, derivative, wall, 1, inside);
            wall = false;
        }
        boolean outerWall = (walls & 2) != 0;
        List<CoupledStep> outer = mesh.outer();
        for (int i = outer.size() - 1; i >= 0; i--) {
            zeros += propagate(outer.get(i), e, derivative, outerWall, -1, outside);
            outerWall = false;
        }
        return zeros + match(derivative);
    }

    private int match(boolean derivative) {
        double[] difference = new double[n * n];
        for (int i = 0; i < n * n; i++) {
            difference[i] = inside[0][i] - outside[0][i];
        }
        double[] values = new double[n];
        double[] vectors = new double[n * n];
        SmallMatrix.eigen(difference, values, vectors, n);
        int negative = 0;
        for (int k = 0; k < n; k++) {
            negative += values[k] < 0 ? 1 : 0;
            if (derivative) {
                double slope = 0;
                for (int i = 0; i < n; i++) {
                    for (int j = 0; j < n; j++) {
                        slope += vectors[i * n + k]
                                * (inside[1][i * n + j] - outside[1][i * n + j])
                                * vectors[j * n + k];
                    }
                }
                double step = -kinetic * values[k] / slope;
                shift = Math.abs(step) < Math.abs(shift) || Double.isNaN(shift) ? step : shift;
            }
        }
        return negative;
    }

    /**
     * Carries Y (and its derivative by e) over a step, outwards for direction 1 and inwards for −1; returns the zeros
     * passed.
     */
    private int propagate(CoupledStep step, double e, boolean derivative, boolean wall, int direction, double[][] y) {
        step.transfer(e, derivative, series);
        double[][] blocks = series.blocks().clone();
        double h = step.width;
        if (direction < 0) {
            reverse(blocks, derivative);
        }
        // In x, and with the sign of the direction, both ways are the same.
        double factor = direction * h;
        double[] y0 = scaled(y[0], factor);
        double[] a = blocks[0];
        double[] b = blocks[1];
        double[] c = blocks[2];
        double[] d = blocks[3];
        double[] denominator = wall ? b.clone() : sum(a, product(b, y0));
        double[] numerator = wall ? d.clone() : sum(c, product(d, y0));
        double[] inverse = new double[n * n];
        SmallMatrix.invert(denominator, inverse, n);
        double[] y1 = product(numerator, inverse);
        int zeros = 0;
        if (!wall) {
            double[] binverse = new double[n * n];
            SmallMatrix.invert(b, binverse, n);
            double[] node = product(binverse, denominator);
            SmallMatrix.symmetrize(node, n);
            zeros = SmallMatrix.negatives(node, n);
        }
        if (derivative) {
            double[] dy0 = scaled(y[1], factor);
            double[] top = wall ? blocks[7].clone() : sum(sum(blocks[6], product(blocks[7], y0)), product(d, dy0));
            double[] bottom = wall ? blocks[5].clone() : sum(sum(blocks[4], product(blocks[5], y0)), product(b, dy0));
            double[] dy1 = product(difference(top, product(y1, bottom)), inverse);
            SmallMatrix.symmetrize(dy1, n);
            y[1] = scaled(dy1, 1 / factor);
        }
        SmallMatrix.symmetrize(y1, n);
        y[0] = scaled(y1, 1 / factor);
        return zeros;
    }

    /** Turns the blocks into those of the mirrored step: A ↔ Dᵀ, B → Bᵀ, C → Cᵀ. */
    private void reverse(double[][] blocks, boolean derivative) {
        for (int start = 0; start < (derivative ? 8 : 4); start += 4) {
            double[] a = transposed(blocks[start + 3]);
            blocks[start + 3] = transposed(blocks[start]);
            blocks[start] = a;
            blocks[start + 1] = transposed(blocks[start + 1]);
            blocks[start + 2] = transposed(blocks[start + 2]);
        }
    }

    private double[] transposed(double[] a) {
        double[] into = new double[n * n];
        SmallMatrix.transpose(a, into, n);
        return into;
    }

    private double[] product(double[] a, double[] b) {
        double[] into = new double[n * n];
        SmallMatrix.multiply(a, b, into, n);
        return into;
    }

    private static double[] sum(double[] a, double[] b) {
        double[] into = a.clone();
        for (int i = 0; i < a.length; i++) {
            into[i] += b[i];
        }
        return into;
    }

    private static double[] difference(double[] a, double[] b) {
        double[] into = a.clone();
        for (int i = 0; i < a.length; i++) {
            into[i] -= b[i];
        }
        return into;
    }

    private static double[] scaled(double[] a, double factor) {
        double[] into = new double[a.length];
        for (int i = 0; i < a.length; i++) {
            into[i] = factor * a[i];
        }
        return into;
    }

    /**
     * The residue counts the steps where motion is allowed; the potential is taken as the depth of the lowest curve.
     */
    @Override
    public void weigh(double energy) {
        residue = 0;
        depth = Math.abs(energy - scan.hardyBound());
        double e = energy / kinetic;
        for (List<CoupledStep> steps : List.of(mesh.inner(), mesh.outer())) {
            for (CoupledStep step : steps) {
                if (step.least < e) {
                    residue += kinetic * step.residue * share(step);
                }
            }
        }
    }

    /** About how much of the state a step holds at most: its share of the width, and of u ~ r^s inside. */
    private double share(CoupledStep step) {
        double inner = Math.min(1, step.right() / scan.anchor());
        return Math.min(1, 4 * step.width / scan.anchor()) * Math.pow(inner, 2 * mesh.smallestExponent());
    }

    @Override
    public double weightedResidue() {
        return residue;
    }

    @Override
    public double meanPotential() {
        return depth;
    }
}
