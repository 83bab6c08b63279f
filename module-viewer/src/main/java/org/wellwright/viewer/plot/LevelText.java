package org.wellwright.viewer.plot;

import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.LevelNames;
import org.wellwright.solver.model.ModelDocument;

/** Names of levels and channels as figures write them, with raised and lowered signs. Immutable. */
public final class LevelText {
    private final LevelNames names;
    private final boolean vibrational;

    private LevelText(LevelNames names, boolean vibrational) {
        this.names = names;
        this.vibrational = vibrational;
    }

    /** The names of a document. */
    public static LevelText of(ModelDocument document) {
        return new LevelText(LevelNames.of(document), document.labels() == LabelConvention.VIBRATIONAL);
    }

    /** The level without system and curve. */
    public String level(LevelKey key) {
        return pretty(names.shortName(key));
    }

    /** The level with system and curve where there are several. */
    public String full(LevelKey key) {
        return pretty(names.name(key));
    }

    /** The number of a level within its channel: n, or v. */
    public String number(LevelKey key) {
        String name = names.shortName(key);
        if (key.channel().coupled()) {
            return Integer.toString(key.index());
        }
        int from = vibrational ? name.indexOf('=') + 1 : 0;
        int to = from;
        while (to < name.length() && Character.isDigit(name.charAt(to))) {
            to++;
        }
        return name.substring(from, to);
    }

    /** The channel of a level: "p", "p3/2", "J = 1". */
    public String channel(LevelKey key) {
        String name = names.shortName(key);
        ChannelKey channel = key.channel();
        if (channel.coupled()) {
            return name.substring(0, name.lastIndexOf(' '));
        }
        if (vibrational) {
            return name.substring(name.indexOf(' ') + 1).replace("=", " = ");
        }
        String number = number(key);
        return pretty(name.substring(number.length()));
    }

    /** "^3P_1" as ³P₁. */
    private static String pretty(String name) {
        StringBuilder text = new StringBuilder();
        String signs = "";
        for (char c : name.toCharArray()) {
            if (c == '^' || c == '_') {
                signs = c == '^' ? "⁰¹²³⁴⁵⁶⁷⁸⁹" : "₀₁₂₃₄₅₆₇₈₉";
            } else if (!signs.isEmpty() && Character.isDigit(c)) {
                text.append(signs.charAt(c - '0'));
            } else {
                signs = "";
                text.append(c);
            }
        }
        return text.toString();
    }
}
