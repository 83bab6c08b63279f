package org.wellwright.project.command.json;

import java.util.List;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.Level;

/**
 * The levels of one or more spectra as a command lists them.
 *
 * @param energyUnit symbol of the unit of energies; "1" if the numbers have none
 * @param lengthUnit symbol of the unit of lengths; "1" if the numbers have none
 * @param channels what was searched
 * @param levels what was found, channel by channel in the order of energy
 */
public record LevelListing(String energyUnit, String lengthUnit, List<ChannelRow> channels, List<LevelRow> levels) {
    /** Copies the lists. */
    public LevelListing {
        channels = List.copyOf(channels);
        levels = List.copyOf(levels);
    }

    /**
     * Where a spectrum belongs.
     *
     * @param model name of the model; null outside a project
     * @param curve name of the curve; null outside a project
     * @param system id of the pair system; null outside a project
     * @param channel the channel
     */
    public record Place(String model, String curve, String system, ChannelKey channel) {}

    /**
     * One searched channel.
     *
     * @param place where it belongs
     * @param threshold lowest energy at which the pair is no longer bound; +∞ if it always is, NaN if unknown
     * @param searchedBelow every level below this energy is listed
     * @param completeness how sure that is
     * @param message why it is not complete, or what else there is to know; empty as a rule
     */
    public record ChannelRow(
            Place place, double threshold, double searchedBelow, Completeness completeness, String message) {}

    /**
     * One level.
     *
     * @param place where it belongs
     * @param label its name by the project's convention; null outside a project
     * @param level the level
     */
    public record LevelRow(Place place, String label, Level level) {}
}
