package org.wellwright.project;

import java.util.List;
import java.util.Objects;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.LevelKey;

/**
 * What solving one model gave.
 *
 * @param model name of the model
 * @param channels its channels, system by system and curve by curve, in the order of l
 * @param problems why channels are missing; empty as a rule
 */
public record SolvedModel(String model, List<SolvedChannel> channels, List<Problem> problems) {
    /** Copies the lists. */
    public SolvedModel {
        Objects.requireNonNull(model, "model");
        channels = List.copyOf(channels);
        problems = List.copyOf(problems);
    }

    /** The channel that holds a level, or null. */
    public SolvedChannel channelOf(LevelKey key) {
        for (SolvedChannel channel : channels) {
            if (channel.holds(key)) {
                return channel;
            }
        }
        return null;
    }
}
