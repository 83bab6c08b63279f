package org.wellwright.solver.model;

import java.util.Objects;

/**
 * A level that the Pauli principle forbids, filled by core electrons or other nucleons.
 *
 * @param channel its channel
 * @param index its position in the order of energy from 0
 */
public record OccupiedLevel(ChannelKey channel, int index) {
    /** Checks the index. */
    public OccupiedLevel {
        Objects.requireNonNull(channel, "channel");
        if (index < 0) {
            throw new IllegalArgumentException("a level's index must be >= 0, got " + index);
        }
    }
}
