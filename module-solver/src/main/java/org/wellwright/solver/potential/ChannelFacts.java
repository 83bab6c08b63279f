package org.wellwright.solver.potential;

/**
 * What a term may know of the channel it acts in.
 *
 * @param orbital l, ≥ 0
 * @param twiceTotal 2j (or 2J), −1 if the model has no spin
 * @param twiceSpin 2S, −1 if the model has no spin
 */
public record ChannelFacts(int orbital, int twiceTotal, int twiceSpin) {
    /** A spinless channel. */
    public static ChannelFacts ofOrbital(int orbital) {
        return new ChannelFacts(orbital, -1, -1);
    }
}
