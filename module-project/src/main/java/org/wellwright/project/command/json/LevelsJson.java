package org.wellwright.project.command.json;

import org.wellwright.project.command.json.LevelListing.Place;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.Level;

/** The listing of {@code bound} and {@code solve} as JSON. */
public final class LevelsJson {
    private LevelsJson() {}

    /** Units, channels, levels; an energy that is infinite or unknown is null. */
    public static String write(LevelListing listing) {
        return JsonText.object(out -> {
            out.nested(
                    "units", units -> units.text("energy", listing.energyUnit()).text("length", listing.lengthUnit()));
            out.items("channels", listing.channels(), (item, row) -> {
                place(item, row.place());
                item.number("threshold", row.threshold())
                        .number("searchedBelow", row.searchedBelow())
                        .text("complete", word(row.completeness()));
                if (!row.message().isEmpty()) {
                    item.text("message", row.message());
                }
            });
            out.items("levels", listing.levels(), (item, row) -> {
                place(item, row.place());
                Level level = row.level();
                boolean coupled = row.place().channel().coupled();
                item.whole(coupled ? "index" : "radialNodes", level.index());
                if (row.label() != null) {
                    item.text("label", row.label());
                }
                item.number("energy", level.energy())
                        .number("lower", level.lower())
                        .number("upper", level.upper())
                        .text("boundKind", word(level.boundKind()))
                        .number("width", level.width());
            });
        });
    }

    /** "proved", "counted" or "no". */
    public static String word(Completeness completeness) {
        return switch (completeness) {
            case PROVED -> "proved";
            case COUNTED -> "counted";
            case NO -> "no";
        };
    }

    /** "two-sided" or "estimate". */
    public static String word(Level.BoundKind kind) {
        return switch (kind) {
            case TWO_SIDED -> "two-sided";
            case ESTIMATE -> "estimate";
        };
    }

    private static void place(JsonText out, Place place) {
        if (place.model() != null) {
            out.text("model", place.model()).text("curve", place.curve()).text("system", place.system());
        }
        ChannelKey channel = place.channel();
        if (!channel.coupled()) {
            out.whole("l", channel.orbital());
        }
        if (channel.twiceSpin() == 1 && !channel.coupled()) {
            out.number("j", channel.twiceTotal() / 2.0);
        } else {
            if (channel.twiceSpin() >= 0) {
                out.number("S", channel.twiceSpin() / 2.0);
            }
            if (channel.twiceTotal() >= 0) {
                out.number("J", channel.twiceTotal() / 2.0);
            }
        }
        if (channel.parity() != 0) {
            out.text("parity", channel.parity() > 0 ? "+" : "-");
        }
    }
}
