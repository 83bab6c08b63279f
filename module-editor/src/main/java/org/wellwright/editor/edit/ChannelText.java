package org.wellwright.editor.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.ChannelFilter;

/** Channel filters as text: "all", "l = 0", "l = 0..2", "l >= 1", "l = 1, j = 1/2 3/2, S = 1". */
public final class ChannelText {
    private static final Pattern ORBITAL =
            Pattern.compile("l\\s*(=|>=|≥|<=|≤)\\s*(\\d{1,4})(?:\\s*(?:\\.\\.|-|to)\\s*(\\d{1,4}))?");
    private static final Pattern SPIN = Pattern.compile("([jJSs])\\s*=\\s*((?:\\d{1,3}(?:/2)?\\s*)+)");

    private ChannelText() {}

    /** The text of a filter. */
    public static String text(ChannelFilter filter) {
        List<String> parts = new ArrayList<>();
        if (filter.orbitalTo() == Integer.MAX_VALUE) {
            if (filter.orbitalFrom() > 0) {
                parts.add("l >= " + filter.orbitalFrom());
            }
        } else if (filter.orbitalFrom() == filter.orbitalTo()) {
            parts.add("l = " + filter.orbitalFrom());
        } else {
            parts.add("l = %d..%d".formatted(filter.orbitalFrom(), filter.orbitalTo()));
        }
        if (!filter.twiceTotals().isEmpty()) {
            parts.add("j = " + halves(filter.twiceTotals()));
        }
        if (!filter.twiceSpins().isEmpty()) {
            parts.add("S = " + halves(filter.twiceSpins()));
        }
        return parts.isEmpty() ? "all" : String.join(", ", parts);
    }

    /**
     * Reads a filter.
     *
     * @throws InvalidModelException if it is none
     */
    public static ChannelFilter parse(String text) {
        int from = 0;
        int to = Integer.MAX_VALUE;
        List<Integer> totals = new ArrayList<>();
        List<Integer> spins = new ArrayList<>();
        String plain = text.strip();
        if (plain.isEmpty() || plain.equalsIgnoreCase("all")) {
            return ChannelFilter.ALL;
        }
        for (String part : plain.split("[,;]")) {
            Matcher orbital = ORBITAL.matcher(part.strip());
            Matcher spin = SPIN.matcher(part.strip());
            if (orbital.matches()) {
                int first = Integer.parseInt(orbital.group(2));
                boolean atLeast =
                        orbital.group(1).equals(">=") || orbital.group(1).equals("≥");
                boolean atMost =
                        orbital.group(1).equals("<=") || orbital.group(1).equals("≤");
                from = atMost ? 0 : first;
                to = atLeast
                        ? Integer.MAX_VALUE
                        : orbital.group(3) == null ? first : Integer.parseInt(orbital.group(3));
            } else if (spin.matches()) {
                List<Integer> into = spin.group(1).equalsIgnoreCase("j") ? totals : spins;
                for (String half : spin.group(2).strip().split("\\s+")) {
                    into.add(
                            half.endsWith("/2")
                                    ? Integer.parseInt(half.substring(0, half.length() - 2))
                                    : 2 * Integer.parseInt(half));
                }
            } else {
                throw new InvalidModelException(
                        "'%s' names no channels".formatted(part.strip()),
                        "",
                        "write 'all', 'l = 0', 'l = 1..3', 'l >= 2' or 'l = 1, j = 3/2'");
            }
        }
        return new ChannelFilter(from, to, totals, spins);
    }

    private static String halves(List<Integer> twice) {
        return String.join(
                " ",
                twice.stream()
                        .map(t -> t % 2 == 0 ? Integer.toString(t / 2) : t + "/2")
                        .toList());
    }
}
