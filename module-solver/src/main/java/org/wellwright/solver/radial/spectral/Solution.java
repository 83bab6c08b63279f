package org.wellwright.solver.radial.spectral;

/**
 * What was computed for one level before its bounds are put together.
 *
 * @param trial the smoothed, normalised state
 * @param energy Rayleigh quotient of the state of the pencil
 * @param smoothEnergy Rayleigh quotient of the smoothed state
 * @param residual ‖Hu − ρu‖ of the smoothed state
 * @param estimate estimated error of {@code energy}
 * @param rounding bound of the rounding in a Rayleigh quotient
 * @param scale ⟨T⟩ + ⟨|V|⟩
 */
record Solution(
        Trial trial,
        double energy,
        double smoothEnergy,
        double residual,
        double estimate,
        double rounding,
        double scale) {}
