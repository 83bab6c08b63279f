package org.wellwright.project.file;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.file.JsonValue.JsonArray;
import org.wellwright.project.file.JsonValue.JsonNumber;
import org.wellwright.project.file.JsonValue.JsonText;
import org.wellwright.solver.model.ChannelKey;

/**
 * Angular momenta in files: whole numbers as numbers, halves as texts ("3/2"); channels as l, or l and j, or l, S and
 * J, or J and parity.
 */
final class Spins {
    private static final String REMEDY = "write a whole number or a half such as \"3/2\"";

    private Spins() {}

    /** Twice the angular momentum under a key, or −1 without. */
    static int twice(ObjectIn in, String key) {
        JsonValue value = in.value(key);
        return value == null ? -1 : twice(in, key, value);
    }

    private static int twice(ObjectIn in, String key, JsonValue value) {
        String text = value instanceof JsonText t ? t.value() : value instanceof JsonNumber n ? n.text() : "";
        if (text.equals("none")) {
            return -1;
        }
        try {
            int twice;
            if (text.endsWith("/2")) {
                twice = Integer.parseInt(text.substring(0, text.length() - 2));
            } else {
                double doubled = 2 * Double.parseDouble(text);
                twice = (int) doubled;
                if (twice != doubled) {
                    throw in.fault(key, "'" + key + "' is " + text, REMEDY);
                }
            }
            if (twice >= 0 && twice < 10_000) {
                return twice;
            }
        } catch (NumberFormatException e) {
            throw in.fault(key, "'" + key + "' is " + (text.isEmpty() ? value.kind() : "'" + text + "'"), REMEDY);
        }
        throw in.fault(key, "'" + key + "' is " + text + ", out of range", REMEDY);
    }

    /** The values of 2j in a list. */
    static List<Integer> twices(ObjectIn in, String key) {
        List<Integer> twices = new ArrayList<>();
        for (JsonValue value : in.list(key)) {
            twices.add(twice(in, key, value));
        }
        return twices;
    }

    /** An angular momentum as JSON; null for −1. */
    static JsonValue json(int twice) {
        if (twice < 0) {
            return null;
        }
        return twice % 2 == 0 ? JsonNumber.of(twice / 2) : new JsonText(twice + "/2");
    }

    /** A list of angular momenta; null if it is empty. */
    static JsonValue json(List<Integer> twices) {
        List<JsonValue> items = new ArrayList<>();
        twices.forEach(twice -> items.add(json(twice)));
        return items.isEmpty() ? null : new JsonArray(items);
    }

    /** Reads the members l, j, S, J and parity. */
    static ChannelKey channel(ObjectIn in) {
        String sign = in.text("parity", "");
        if (!sign.isEmpty() && !sign.equals("+") && !sign.equals("-")) {
            throw in.fault("parity", "'parity' is '" + sign + "'", "write \"+\" or \"-\"");
        }
        int parity = sign.isEmpty() ? 0 : sign.equals("+") ? 1 : -1;
        if (in.has("j") && (in.has("J") || in.has("S"))) {
            throw in.fault("j", "a channel has either j (one spin) or S and J (two spins)", "leave one of them out");
        }
        if (!in.has("l")) {
            if (!in.has("J") || parity == 0) {
                throw in.fault("'l' is missing", "add \"l\", or \"J\" and \"parity\" for a block of coupled l");
            }
            return in.make(() -> new ChannelKey(-1, twice(in, "J"), twice(in, "S"), parity));
        }
        int orbital = in.integer("l");
        if (orbital < 0 || orbital > 10_000) {
            throw in.fault("l", "'l' is " + orbital, "use a whole number from 0");
        }
        if (in.has("j")) {
            return in.make(() -> new ChannelKey(orbital, twice(in, "j"), 1, parity));
        }
        if (in.has("J") != in.has("S")) {
            throw in.fault("a channel of two spins needs both S and J", "add the missing one");
        }
        return in.make(() -> new ChannelKey(orbital, twice(in, "J"), twice(in, "S"), parity));
    }

    /** Writes what {@link #channel} reads. */
    static void channel(ObjectOut out, ChannelKey key) {
        out.put("l", key.orbital() < 0 ? null : JsonNumber.of(key.orbital()));
        boolean one = key.orbital() >= 0 && key.twiceSpin() == 1;
        out.put("j", one ? json(key.twiceTotal()) : null);
        out.put("S", one ? null : json(key.twiceSpin()));
        out.put("J", one ? null : json(key.twiceTotal()));
        out.put("parity", key.parity() == 0 ? null : new JsonText(key.parity() > 0 ? "+" : "-"));
    }

    /** The keys that {@link #channel} knows. */
    static String[] with(String... others) {
        List<String> keys = new ArrayList<>(List.of("l", "j", "S", "J", "parity"));
        keys.addAll(List.of(others));
        return keys.toArray(new String[0]);
    }
}
