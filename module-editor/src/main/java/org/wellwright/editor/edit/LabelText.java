package org.wellwright.editor.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.LabelRule;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.LevelNames;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.OccupiedLevel;

/** Label rules as text ("l=0: +2, l=1: +1, v: +1") and lists of occupied levels ("1s, 2s, 2p"). */
public final class LabelText {
    private static final Pattern PART = Pattern.compile("(?:l\\s*=\\s*(\\d{1,3})|v)\\s*:?\\s*([+-]?\\d{1,4})");

    private LabelText() {}

    /** The text of a rule; empty for the plain one. */
    public static String text(LabelRule rule) {
        List<String> parts = new ArrayList<>();
        for (LabelRule.PrincipalOffset offset : rule.principalOffsets()) {
            parts.add("l=%d: %+d".formatted(offset.orbital(), offset.offset()));
        }
        if (rule.vibrationalOffset() != 0) {
            parts.add("v: %+d".formatted(rule.vibrationalOffset()));
        }
        return String.join(", ", parts);
    }

    /**
     * Reads a rule.
     *
     * @throws InvalidModelException if it is none
     */
    public static LabelRule parse(String text) {
        List<LabelRule.PrincipalOffset> offsets = new ArrayList<>();
        int vibrational = 0;
        for (String part : text.split("[,;]")) {
            if (part.isBlank()) {
                continue;
            }
            Matcher matcher = PART.matcher(part.strip());
            if (!matcher.matches()) {
                throw new InvalidModelException(
                        "'%s' is not a label rule".formatted(part.strip()),
                        "",
                        "write 'l=0: +2' to add 2 to n of s levels, or 'v: +1'");
            }
            int offset = Integer.parseInt(matcher.group(2));
            if (matcher.group(1) == null) {
                vibrational = offset;
            } else {
                offsets.add(new LabelRule.PrincipalOffset(Integer.parseInt(matcher.group(1)), offset));
            }
        }
        return new LabelRule(offsets, vibrational);
    }

    /** The names of the occupied levels of a curve. */
    public static String occupied(Curve curve, ModelDocument document) {
        LevelNames names = LevelNames.of(document);
        return String.join(
                ", ",
                curve.occupied().stream()
                        .map(level -> names.shortName(new LevelKey("", curve.name(), level.channel(), level.index())))
                        .toList());
    }

    /**
     * Reads names of occupied levels.
     *
     * @throws InvalidModelException if one is no level
     */
    public static List<OccupiedLevel> parseOccupied(String text, Curve curve, ModelDocument document) {
        LevelNames names = LevelNames.of(document);
        String system =
                document.systems().isEmpty() ? "" : document.systems().get(0).id() + "/" + curve.name() + ": ";
        List<OccupiedLevel> levels = new ArrayList<>();
        for (String part : text.split("[,;]")) {
            if (!part.isBlank()) {
                LevelKey key = names.parse(system + part.strip());
                levels.add(new OccupiedLevel(key.channel(), key.index()));
            }
        }
        return levels;
    }
}
