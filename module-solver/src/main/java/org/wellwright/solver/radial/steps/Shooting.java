package org.wellwright.solver.radial.steps;

/**
 * Shoots from both ends at one energy: the count of levels below it and Newton's step to the level nearby.
 *
 * <p>Count = zeros of the inner solution up to the matching edge + zeros of the outer one beyond it + 1 if the inner
 * logarithmic derivative is the smaller (Sturm). Newton's step is −W/(dW/dE) of the Wronskian W, exact since dη_m/dZ =
 * ½η_{m+1}. Used by one thread.
 */
final class Shooting implements LevelShooting {
    private final StepMesh mesh;
    private final PotentialScan scan;
    private final double kinetic;
    private final double[] eta = new double[EtaFunctions.HIGHEST + 4];
    private final double[] matrix = new double[8];
    private final double[] fromInside = new double[4];
    private final double[] fromOutside = new double[4];
    private int counts;
    private int lastCount;
    private double shift;
    private double weightedResidue;
    private double meanPotential;

    Shooting(StepMesh mesh, PotentialScan scan, double kinetic) {
        this.mesh = mesh;
        this.scan = scan;
        this.kinetic = kinetic;
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
            lastCount = 0;
            return 0;
        }
        int start = mesh.start(energy);
        int end = mesh.end(energy);
        int match = Math.min(end, Math.max(start, mesh.indexOf(scan.lastAllowed(energy))));
        double e = energy / kinetic;
        mesh.begin(energy, start, fromInside);
        int zeros = 0;
        for (int g = start; g < match; g++) {
            zeros += outwards(mesh.step(g), e, derivative, fromInside);
        }
        mesh.finish(energy, end, fromOutside);
        for (int g = end - 1; g >= match; g--) {
            zeros += inwards(mesh.step(g), e, derivative, fromOutside);
        }
        double[] a = fromInside;
        double[] b = fromOutside;
        double wronskian = a[0] * b[1] - a[1] * b[0];
        boolean opposite = a[0] < 0 != b[0] < 0;
        lastCount = zeros + ((opposite ? -wronskian : wronskian) > 0 ? 1 : 0);
        if (derivative) {
            shift = -kinetic * wronskian / (a[2] * b[1] + a[0] * b[3] - a[3] * b[0] - a[1] * b[2]);
        }
        return lastCount;
    }

    private int outwards(PropagationStep step, double e, boolean derivative, double[] y) {
        double z = step.reference(e);
        double h = step.width;
        double[] t = matrix;
        step.transfer(z, derivative, eta, t);
        double u = y[0];
        double p = h * y[1];
        double u1 = t[0] * u + t[2] * p;
        double p1 = t[1] * u + t[3] * p;
        int zeros = step.zeros(z, e, u, p, u1, p1);
        double scale = 1 / Math.max(Math.abs(u1), Math.abs(p1));
        if (derivative) {
            double ue = y[2];
            double pe = h * y[3];
            double square = h * h;
            y[2] = scale * (t[0] * ue + t[2] * pe - square * (t[4] * u + t[6] * p));
            y[3] = scale * (t[1] * ue + t[3] * pe - square * (t[5] * u + t[7] * p)) / h;
        }
        y[0] = scale * u1;
        y[1] = scale * p1 / h;
        return zeros;
    }

    private int inwards(PropagationStep step, double e, boolean derivative, double[] y) {
        double z = step.reference(e);
        double h = step.width;
        double[] t = matrix;
        step.transfer(z, derivative, eta, t);
        double u = y[0];
        double p = h * y[1];
        double u0 = t[3] * u - t[2] * p;
        double p0 = -t[1] * u + t[0] * p;
        int zeros = step.zeros(z, e, u0, p0, u, p);
        double scale = 1 / Math.max(Math.abs(u0), Math.abs(p0));
        if (derivative) {
            double ue = y[2];
            double pe = h * y[3];
            double square = h * h;
            y[2] = scale * (t[3] * ue - t[2] * pe - square * (t[7] * u - t[6] * p));
            y[3] = scale * (-t[1] * ue + t[0] * pe - square * (-t[5] * u + t[4] * p)) / h;
        }
        y[0] = scale * u0;
        y[1] = scale * p0 / h;
        return zeros;
    }

    /**
     * Goes over the state at a level once more for what its error estimate needs; see {@link #weightedResidue()} and
     * {@link #meanPotential()}. ∫u² over a step is the difference of u′ ∂u/∂e − u ∂u′/∂e at its ends.
     */
    @Override
    public void weigh(double energy) {
        weightedResidue = 0;
        meanPotential = 0;
        if (Double.isNaN(scan.firstAllowed(energy))) {
            return;
        }
        int start = mesh.start(energy);
        int end = mesh.end(energy);
        int match = Math.min(end, Math.max(start, mesh.indexOf(scan.lastAllowed(energy))));
        double e = energy / kinetic;
        mesh.begin(energy, start, fromInside);
        double[] inside = new double[2];
        for (int g = start; g < match; g++) {
            accumulate(mesh.step(g), e, true, fromInside, inside);
        }
        mesh.finish(energy, end, fromOutside);
        double[] outside = new double[2];
        for (int g = end - 1; g >= match; g--) {
            accumulate(mesh.step(g), e, false, fromOutside, outside);
        }
        double norm = 0;
        double[] sums = {inside[0], inside[1], outside[0], outside[1]};
        double a = amplitude(fromInside);
        double b = amplitude(fromOutside);
        double inner = Math.abs(probability(fromInside)) / a;
        double outer = Math.abs(probability(fromOutside)) / b;
        norm = inner + outer;
        if (norm > 0) {
            weightedResidue = kinetic * (sums[0] / a + sums[2] / b) / norm;
            meanPotential = kinetic * (sums[1] / a + sums[3] / b) / norm;
        }
    }

    private double amplitude(double[] y) {
        return y[0] * y[0] + y[1] * y[1] * scan.anchor() * scan.anchor();
    }

    private static double probability(double[] y) {
        return y[1] * y[2] - y[0] * y[3];
    }

    private void accumulate(PropagationStep step, double e, boolean outwards, double[] y, double[] sums) {
        double before = probability(y);
        double u = y[0];
        double p = y[1];
        if (outwards) {
            outwards(step, e, true, y);
        } else {
            inwards(step, e, true, y);
        }
        // The factor by which the step scaled its result down, from ∫u² growing only by what lies in the step.
        double[] t = matrix;
        double h = step.width;
        double u1 = outwards ? t[0] * u + t[2] * h * p : t[3] * u - t[2] * h * p;
        double p1 = outwards ? t[1] * u + t[3] * h * p : -t[1] * u + t[0] * h * p;
        double scale = 1 / Math.max(Math.abs(u1), Math.abs(p1));
        double z = step.reference(e);
        double hidden = z >= EtaFunctions.SERIES_LIMIT ? Math.exp(-Math.sqrt(z)) : 1;
        double square = scale * scale * hidden * hidden;
        double part = Math.abs(probability(y) - before * square);
        sums[0] = sums[0] * square + part * step.residue;
        sums[1] = sums[1] * square + part * Math.abs(step.mean);
    }

    /** Σ over steps of what the polynomial leaves out of V, weighted by the probability there; energy. */
    @Override
    public double weightedResidue() {
        return weightedResidue;
    }

    /** ⟨|V + κλ/r²|⟩ by the steps' means; energy. */
    @Override
    public double meanPotential() {
        return meanPotential;
    }
}
