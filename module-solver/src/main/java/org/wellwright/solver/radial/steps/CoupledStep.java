package org.wellwright.solver.radial.steps;

/**
 * One step of coupled channels, u″ = (Q(x) − h² e) u in x = (r − left)/h on [0, 1] with Q a matrix of polynomials.
 * Immutable.
 */
final class CoupledStep {
    final double left;
    final double width;
    /** Least eigenvalue of Q/h² among the samples, length⁻². */
    final double least;
    /** Size of what the polynomials leave out, length⁻². */
    final double residue;

    /** Coefficient matrices by power of x, h² included. */
    private final double[][] powers;

    CoupledStep(double left, double width, double least, double residue, double[][] powers) {
        this.left = left;
        this.width = width;
        this.least = least;
        this.residue = residue;
        this.powers = powers;
    }

    double right() {
        return left + width;
    }

    /** Q at the left or right end without e, length⁻². */
    double[] atEnd(boolean leftEnd) {
        double[] sum = powers[0].clone();
        for (int k = 1; k < powers.length && !leftEnd; k++) {
            for (int i = 0; i < sum.length; i++) {
                sum[i] += powers[k][i];
            }
        }
        for (int i = 0; i < sum.length; i++) {
            sum[i] /= width * width;
        }
        return sum;
    }

    /** Has the series make the transfer matrix and, if asked, its derivative by e. */
    void transfer(double e, boolean derivative, CoupledSeries series) {
        series.compute(powers, width * width, e, derivative);
    }
}
