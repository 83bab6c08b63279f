package org.wellwright.solver.potential;

import java.util.List;

/**
 * The channels in which a term acts.
 *
 * @param orbitalFrom lowest l, ≥ 0
 * @param orbitalTo highest l, {@link Integer#MAX_VALUE} for no limit
 * @param twiceTotals the values of 2j (or 2J) in which it acts; empty for all
 * @param twiceSpins the values of 2S in which it acts; empty for all
 */
public record ChannelFilter(int orbitalFrom, int orbitalTo, List<Integer> twiceTotals, List<Integer> twiceSpins) {
    /** Every channel. */
    public static final ChannelFilter ALL = new ChannelFilter(0, Integer.MAX_VALUE, List.of(), List.of());

    /** Checks the order of the limits and copies the lists. */
    public ChannelFilter {
        if (orbitalFrom < 0 || orbitalTo < orbitalFrom) {
            throw new IllegalArgumentException(
                    "a channel filter needs 0 <= from <= to, got %d, %d".formatted(orbitalFrom, orbitalTo));
        }
        twiceTotals = List.copyOf(twiceTotals);
        twiceSpins = List.copyOf(twiceSpins);
    }

    /** The channels with l in [from, to]. */
    public static ChannelFilter orbitals(int from, int to) {
        return new ChannelFilter(from, to, List.of(), List.of());
    }

    /** Whether the term acts in a channel; a channel without spin (−1) passes only where the filter asks for none. */
    public boolean accepts(ChannelFacts channel) {
        return orbitalFrom <= channel.orbital()
                && channel.orbital() <= orbitalTo
                && (twiceTotals.isEmpty() || twiceTotals.contains(channel.twiceTotal()))
                && (twiceSpins.isEmpty() || twiceSpins.contains(channel.twiceSpin()));
    }
}
