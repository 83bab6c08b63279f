package org.wellwright.solver.radial;

/**
 * One bound level with its numerical bounds.
 *
 * @param index position in the order of energy from 0; equals the number of nodes for r > 0 in an uncoupled channel
 * @param energy Rayleigh quotient of the computed state, the problem's energy unit
 * @param lower no exact level of this index lies below, rounding included
 * @param upper no exact level of this index lies above, rounding included
 * @param boundKind what the two bounds rest on
 * @param errorEstimate estimated |energy − exact|, a number of its own, not a bound
 * @param scale ⟨T⟩ + ⟨|V|⟩ of the state, to which rounding is proportional
 * @param width first-order width Γ, NaN if none
 * @param threshold lowest energy at which the pair is no longer bound; +∞ for a confining potential
 */
public record Level(
        int index,
        double energy,
        double lower,
        double upper,
        BoundKind boundKind,
        double errorEstimate,
        double scale,
        double width,
        double threshold)
        implements LevelOutcome {

    /** What the bounds rest on. */
    public enum BoundKind {
        /** Variational upper and residual-based lower bound of the true operator, index confirmed by counting. */
        TWO_SIDED,
        /** An estimate of the error only. */
        ESTIMATE
    }

    /** Checks the order of the three energies. */
    public Level {
        if (index < 0 || !(lower <= energy && energy <= upper)) {
            throw new IllegalArgumentException(
                    "a level needs index >= 0 and lower <= energy <= upper, got %d, %s, %s, %s"
                            .formatted(index, lower, energy, upper));
        }
    }

    /** Threshold minus energy, > 0; +∞ for a confining potential. */
    public double bindingEnergy() {
        return threshold - energy;
    }
}
