package org.wellwright.solver.model;

import java.util.Objects;

/**
 * Where a parameter is used.
 *
 * @param system id of the pair system
 * @param channel the channel, or null where the use belongs to none (a mass, an energy origin)
 */
public record Place(String system, ChannelKey channel) {
    /** Checks the system. */
    public Place {
        Objects.requireNonNull(system, "system");
    }
}
