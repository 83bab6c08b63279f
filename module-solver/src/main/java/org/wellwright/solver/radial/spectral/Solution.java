package org.wellwright.solver.radial.spectral;

/**
 * What was computed for one level before its bounds are put together.
 *
 * @param trial the normalised state of the pencil
 * @param energy Rayleigh quotient of the state of the pencil
 * @param smoothEnergy Rayleigh quotient of the smoothed state
 * @param residual ‖Hu − ρu‖ of the smoothed state
 * @param estimate estimated error of {@code energy}
 * @param rounding bound of rounding and quadrature in a Rayleigh quotient
 * @param quadrature the part of {@code rounding} that a finer mesh would remove
 * @param scale ⟨T⟩ + ⟨|V|⟩
 * @param shares what each element contributes to the errors
 */
record Solution(
        Trial trial,
        double energy,
        double smoothEnergy,
        double residual,
        double estimate,
        double rounding,
        double quadrature,
        double scale,
        Shares shares) {

    /** Contributions by element; arrays are not changed. */
    static final class Shares {
        private final double[] residual;
        private final double[] quadrature;
        private final double[] truncation;

        Shares(double[] residual, double[] quadrature, double[] truncation) {
            this.residual = residual;
            this.quadrature = quadrature;
            this.truncation = truncation;
        }

        double residual(int e) {
            return residual[e];
        }

        double quadrature(int e) {
            return quadrature[e];
        }

        double truncation(int e) {
            return truncation[e];
        }
    }
}
