package org.wellwright.solver.units;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/** Finds the names that someone who mistyped may have meant. */
public final class Names {
    private Names() {}

    /**
     * Up to three names nearest to a text, nearest first: the same letters in another case, then by the number of edits
     * (Levenshtein 1966), at most half the length of the text.
     */
    public static List<String> near(String text, Collection<String> names) {
        String lower = text.toLowerCase(Locale.ROOT);
        List<String> found = new ArrayList<>();
        for (String name : names) {
            if (distance(lower, name.toLowerCase(Locale.ROOT)) <= Math.max(1, text.length() / 2)) {
                found.add(name);
            }
        }
        found.sort(Comparator.comparingInt((String name) -> distance(lower, name.toLowerCase(Locale.ROOT)))
                .thenComparingInt(name -> distance(text, name))
                .thenComparing(Comparator.naturalOrder()));
        return List.copyOf(found.subList(0, Math.min(3, found.size())));
    }

    /** "did you mean a, b, c" or, if nothing is near, "use one of ..." with at most twelve names. */
    public static String remedy(String text, Collection<String> names) {
        List<String> near = near(text, names);
        if (!near.isEmpty()) {
            return "did you mean " + String.join(", ", near);
        }
        List<String> all = names.stream().distinct().limit(12).toList();
        return all.isEmpty() ? "" : "use one of " + String.join(", ", all) + (names.size() > 12 ? ", ..." : "");
    }

    /** A text from outside, cut to at most 40 characters for a message. */
    public static String shortened(String text) {
        return text.length() <= 40 ? text : text.substring(0, 37) + "...";
    }

    private static int distance(String a, String b) {
        if (Math.abs(a.length() - b.length()) > 20) {
            return Integer.MAX_VALUE;
        }
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            row[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int substituted = diagonal + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.min(substituted, Math.min(row[j], row[j - 1]) + 1);
            }
        }
        return row[b.length()];
    }
}
