package org.wellwright.project;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.Spectrum;

/**
 * The levels of one channel of one curve for one system, in the project's units.
 *
 * @param system id of the pair system
 * @param curve name of the curve
 * @param channel the channel
 * @param origin energy added to every energy of {@code spectrum} to stand on the project's common zero
 * @param spectrum what the solver found
 */
public record SolvedChannel(String system, String curve, ChannelKey channel, double origin, Spectrum spectrum) {
    /** Checks that nothing is missing. */
    public SolvedChannel {
        Objects.requireNonNull(system, "system");
        Objects.requireNonNull(curve, "curve");
        Objects.requireNonNull(channel, "channel");
        Objects.requireNonNull(spectrum, "spectrum");
        if (!Double.isFinite(origin)) {
            throw new IllegalArgumentException("the energy origin must be finite, got " + origin);
        }
    }

    /** The key of the level with this index. */
    public LevelKey key(int index) {
        return new LevelKey(system, curve, channel, index);
    }

    /** Whether a level belongs to this channel. */
    public boolean holds(LevelKey key) {
        return key.system().equals(system)
                && key.curve().equals(curve)
                && key.channel().equals(channel);
    }

    /** The found level of this index, or null. */
    public Level level(int index) {
        for (Level level : spectrum.levels()) {
            if (level.index() == index) {
                return level;
            }
        }
        return null;
    }

    /** The keys of all found levels, in the order of energy. */
    public List<LevelKey> keys() {
        List<LevelKey> keys = new ArrayList<>();
        for (Level level : spectrum.levels()) {
            keys.add(key(level.index()));
        }
        return List.copyOf(keys);
    }
}
