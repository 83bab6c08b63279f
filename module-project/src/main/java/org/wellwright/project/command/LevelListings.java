package org.wellwright.project.command;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.command.json.LevelListing;
import org.wellwright.project.command.json.LevelListing.ChannelRow;
import org.wellwright.project.command.json.LevelListing.LevelRow;
import org.wellwright.project.command.json.LevelListing.Place;
import org.wellwright.project.command.json.LevelsJson;
import org.wellwright.project.report.Csv;
import org.wellwright.project.report.Digits;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.Level;

/** A level listing in the three formats. */
final class LevelListings {
    private LevelListings() {}

    static String print(LevelListing listing, Input.Format format) {
        return switch (format) {
            case JSON -> LevelsJson.write(listing);
            case CSV -> csv(listing);
            case TABLE -> table(listing);
        };
    }

    private static String csv(LevelListing listing) {
        boolean project = project(listing);
        List<String> header = new ArrayList<>(project ? List.of("model", "curve", "system", "label") : List.of());
        header.addAll(
                List.of("l", "J", "index", "energy", "lower", "upper", "boundKind", "width", "complete", "energyUnit"));
        List<List<String>> rows = new ArrayList<>();
        for (LevelRow row : listing.levels()) {
            Level level = row.level();
            List<String> cells = new ArrayList<>();
            if (project) {
                cells.addAll(List.of(
                        row.place().model(), row.place().curve(), row.place().system(), row.label()));
            }
            ChannelKey channel = row.place().channel();
            cells.add(channel.coupled() ? "" : Integer.toString(channel.orbital()));
            cells.add(channel.twiceTotal() < 0 ? "" : half(channel.twiceTotal()));
            cells.add(Integer.toString(level.index()));
            cells.add(Csv.number(level.energy()));
            cells.add(Csv.number(level.lower()));
            cells.add(Csv.number(level.upper()));
            cells.add(LevelsJson.word(level.boundKind()));
            cells.add(Csv.number(level.width()));
            cells.add(LevelsJson.word(completeness(listing, row.place())));
            cells.add(listing.energyUnit());
            rows.add(cells);
        }
        return Csv.of(header, rows);
    }

    private static String table(LevelListing listing) {
        boolean project = project(listing);
        boolean spins = listing.channels().stream()
                .anyMatch(row -> row.place().channel().twiceTotal() >= 0);
        String unit = listing.energyUnit().equals("1") ? "" : " (" + listing.energyUnit() + ")";
        List<String> header = new ArrayList<>(project ? List.of("model", "curve", "system", "label") : List.of());
        header.add("l");
        if (spins) {
            header.add("J");
        }
        header.addAll(List.of("n_r", "energy" + unit, "± at most", "kind", "complete"));
        TextTable table = new TextTable(header.toArray(new String[0]));
        for (LevelRow row : listing.levels()) {
            Level level = row.level();
            List<String> cells = new ArrayList<>();
            if (project) {
                cells.addAll(List.of(
                        row.place().model(), row.place().curve(), row.place().system(), row.label()));
            }
            ChannelKey channel = row.place().channel();
            cells.add(channel.coupled() ? "" : Integer.toString(channel.orbital()));
            if (spins) {
                cells.add(channel.twiceTotal() < 0 ? "" : half(channel.twiceTotal()));
            }
            cells.add(Integer.toString(level.index()));
            double bound = Math.max(level.upper() - level.energy(), level.energy() - level.lower());
            cells.add(Digits.of(level.energy(), bound));
            cells.add(Digits.significant(bound, 2));
            cells.add(LevelsJson.word(level.boundKind()));
            cells.add(LevelsJson.word(completeness(listing, row.place())));
            table.row(cells);
        }
        return table.toString();
    }

    private static boolean project(LevelListing listing) {
        return !listing.channels().isEmpty()
                && listing.channels().get(0).place().model() != null;
    }

    private static Completeness completeness(LevelListing listing, Place place) {
        for (ChannelRow row : listing.channels()) {
            if (row.place().equals(place)) {
                return row.completeness();
            }
        }
        throw new IllegalArgumentException("a level of a channel that was not searched: " + place);
    }

    private static String half(int twice) {
        return twice % 2 == 0 ? Integer.toString(twice / 2) : twice + "/2";
    }
}
