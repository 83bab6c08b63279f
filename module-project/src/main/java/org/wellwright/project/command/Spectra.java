package org.wellwright.project.command;

import java.util.List;
import org.wellwright.project.command.json.LevelListing.ChannelRow;
import org.wellwright.project.command.json.LevelListing.LevelRow;
import org.wellwright.project.command.json.LevelListing.Place;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.radial.ChannelTerm;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelOutcome;
import org.wellwright.solver.radial.MissingLevel;
import org.wellwright.solver.radial.RadialChannel;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.Spectrum;

/** Turns spectra into rows of a listing. */
final class Spectra {
    private Spectra() {}

    /** Names a level. */
    interface Labels {
        String label(int index);
    }

    /**
     * Adds a spectrum to a listing and tells of levels that are missing.
     *
     * @param labels names its levels, or null
     * @param origin added to every energy
     * @return whether nothing is missing
     */
    static boolean list(
            Place place,
            Labels labels,
            double origin,
            Spectrum spectrum,
            List<ChannelRow> channels,
            List<LevelRow> levels,
            Console console) {
        boolean whole = spectrum.completeness() != Completeness.NO;
        for (LevelOutcome outcome : spectrum.outcomes()) {
            if (outcome instanceof Level level) {
                levels.add(new LevelRow(
                        place, labels == null ? null : labels.label(level.index()), shifted(level, origin)));
            } else if (outcome instanceof MissingLevel missing) {
                whole = false;
                console.fault(missing.problem());
            }
        }
        if (spectrum.completeness() == Completeness.NO) {
            console.say(describe(place) + ": " + spectrum.message());
        }
        channels.add(new ChannelRow(
                place,
                threshold(spectrum) + origin,
                spectrum.searchedBelow() + origin,
                spectrum.completeness(),
                spectrum.message()));
        return whole;
    }

    private static String describe(Place place) {
        String channel = "l = " + place.channel().orbital();
        return place.model() == null
                ? channel
                : "model '" + place.model() + "', curve '" + place.curve() + "', " + place.system() + ", " + channel;
    }

    private static Level shifted(Level level, double origin) {
        if (origin == 0) {
            return level;
        }
        double energy = level.energy() + origin;
        return new Level(
                level.index(),
                energy,
                Math.min(level.lower() + origin, energy),
                Math.max(level.upper() + origin, energy),
                level.boundKind(),
                level.errorEstimate(),
                level.scale(),
                level.width(),
                level.threshold() + origin);
    }

    /** The energy at which the pair is no longer bound; +∞ if it always is, NaN if that is not known. */
    private static double threshold(Spectrum spectrum) {
        List<Level> levels = spectrum.levels();
        if (!levels.isEmpty()) {
            return levels.get(0).threshold();
        }
        RadialProblem problem = spectrum.problem();
        if (Double.isFinite(problem.outerWall())) {
            return Double.POSITIVE_INFINITY;
        }
        double lowest = Double.POSITIVE_INFINITY;
        for (int c = 0; c < problem.channels().size(); c++) {
            RadialChannel channel = problem.channels().get(c);
            TailBehaviour tail = problem.common().tail();
            for (ChannelTerm term : problem.rest()) {
                if (term.row() == c && term.column() == c) {
                    tail = tail.plus(term.potential().tail());
                }
            }
            if (!tail.known()) {
                return Double.NaN;
            }
            double limit = tail.rises()
                    ? Double.POSITIVE_INFINITY
                    : tail.falls() ? Double.NEGATIVE_INFINITY : tail.limit() + channel.threshold();
            lowest = Math.min(lowest, limit);
        }
        return lowest;
    }
}
