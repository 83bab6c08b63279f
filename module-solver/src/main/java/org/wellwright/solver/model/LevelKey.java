package org.wellwright.solver.model;

import java.util.Objects;

/**
 * What names a level, whatever the model.
 *
 * @param system id of the pair system
 * @param curve name of the curve
 * @param channel the channel
 * @param index position in the order of energy from 0, equal to the node count only in an uncoupled channel
 */
public record LevelKey(String system, String curve, ChannelKey channel, int index) {
    /** Checks the index. */
    public LevelKey {
        Objects.requireNonNull(system, "system");
        Objects.requireNonNull(curve, "curve");
        Objects.requireNonNull(channel, "channel");
        if (index < 0) {
            throw new IllegalArgumentException("a level's index must be >= 0, got " + index);
        }
    }
}
