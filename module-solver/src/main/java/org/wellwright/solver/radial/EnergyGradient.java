package org.wellwright.solver.radial;

/**
 * dE/dp of one level for everything that a problem contains (Hellmann 1937; Feynman 1939), edges that move included.
 * Immutable.
 *
 * <p>For a range end, step or well radius R: dE/dR = [V(R⁻) − V(R⁺)] Σ u(R)²; for a hard outer wall −κ Σ u′(R)², for a
 * hard inner wall +κ Σ u′(R)².
 */
public final class EnergyGradient {
    private final double kinetic;
    private final double[] common;
    private final double[][] rest;
    private final double[] thresholds;
    private final double innerWall;
    private final double outerWall;

    /**
     * Copies all arrays: {@code common[j]} per parameter of the common potential, {@code rest[i][j]} per parameter of
     * the i-th channel term.
     */
    public EnergyGradient(
            double kinetic, double[] common, double[][] rest, double[] thresholds, double innerWall, double outerWall) {
        this.kinetic = kinetic;
        this.common = common.clone();
        this.rest = new double[rest.length][];
        for (int i = 0; i < rest.length; i++) {
            this.rest[i] = rest[i].clone();
        }
        this.thresholds = thresholds.clone();
        this.innerWall = innerWall;
        this.outerWall = outerWall;
    }

    /** dE/dκ, energy per (energy·length²). */
    public double kinetic() {
        return kinetic;
    }

    /** dE/dp_j of the common potential. */
    public double common(int parameter) {
        return common[parameter];
    }

    /** dE/dp_j of channel term {@code term}. */
    public double rest(int term, int parameter) {
        return rest[term][parameter];
    }

    /** dE/d(threshold of channel c), the probability of the channel. */
    public double threshold(int channel) {
        return thresholds[channel];
    }

    /** dE/d(inner wall); 0 without one. */
    public double innerWall() {
        return innerWall;
    }

    /** dE/d(outer wall); 0 without one. */
    public double outerWall() {
        return outerWall;
    }
}
