package org.wellwright.solver.model;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.Names;

/**
 * Combinations of levels as text: "3p - 3s", "3p → 3s" (the same), "1/3 * 2p1/2 + 2/3 * 2p3/2 - 1s". A coefficient is a
 * decimal number or a fraction of whole numbers.
 */
public final class LevelSums {
    private static final Pattern COEFFICIENT =
            Pattern.compile("((?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d{1,3})?|\\d{1,9}/\\d{1,9})\\s*[*·×]\\s*(.*)");
    private static final int LARGEST_DENOMINATOR = 60;

    private LevelSums() {}

    /** The text of a combination. */
    public static String text(List<Datum.Contribution> levels, LevelNames names) {
        StringBuilder text = new StringBuilder();
        for (Datum.Contribution contribution : levels) {
            ExactNumber coefficient = contribution.coefficient();
            boolean negative = coefficient.sign() < 0;
            if (!text.isEmpty()) {
                text.append(negative ? " - " : " + ");
            } else if (negative) {
                text.append('-');
            }
            BigDecimal size = coefficient.decimal().abs();
            if (size.compareTo(BigDecimal.ONE) != 0) {
                text.append(coefficientText(new ExactNumber(size.toString()))).append(" * ");
            }
            text.append(names.name(contribution.level()));
        }
        return text.toString();
    }

    /**
     * Reads a combination.
     *
     * @throws InvalidModelException if it is empty or a level in it cannot be read
     */
    public static List<Datum.Contribution> parse(String text, LevelNames names) {
        String plain =
                text.strip().replace('\u2212', '-').replace('\u2013', '-').replace("->", "→");
        if (plain.isEmpty()) {
            throw new InvalidModelException("no level is named", "", "write one, or a difference of two");
        }
        List<Datum.Contribution> found = new ArrayList<>();
        int sign = 1;
        int start = 0;
        if (plain.charAt(0) == '-' || plain.charAt(0) == '+') {
            sign = plain.charAt(0) == '-' ? -1 : 1;
            start = 1;
        }
        for (int at = start; at < plain.length(); at++) {
            char c = plain.charAt(at);
            if (c != '+' && c != '-' && c != '→' || !readable(plain.substring(start, at), names)) {
                continue;
            }
            found.add(contribution(plain.substring(start, at), sign, names));
            sign = c == '+' ? 1 : -1;
            start = at + 1;
        }
        String last = plain.substring(start);
        if (!readable(last, names)) {
            // The first part that is at fault says more than the whole.
            for (String part : last.split("\\s[+-]\\s|→")) {
                contribution(part, 1, names);
            }
        }
        found.add(contribution(last, sign, names));
        return List.copyOf(found);
    }

    /**
     * A sign ends a level only if what stands before it is one: names of systems and coupled channels hold signs too.
     */
    private static boolean readable(String term, LevelNames names) {
        try {
            contribution(term, 1, names);
            return true;
        } catch (InvalidModelException e) {
            return false;
        }
    }

    private static Datum.Contribution contribution(String term, int sign, LevelNames names) {
        Matcher matcher = COEFFICIENT.matcher(term.strip());
        String size = "1";
        String level = term;
        if (matcher.matches()) {
            size = matcher.group(1);
            level = matcher.group(2);
        }
        LevelKey key = names.parse(level);
        ExactNumber coefficient = number(size, sign);
        if (coefficient.sign() == 0) {
            throw new InvalidModelException(
                    "the coefficient of a level is 0",
                    "'" + Names.shortened(term.strip()) + "'",
                    "leave the level out");
        }
        return new Datum.Contribution(coefficient, key);
    }

    private static ExactNumber number(String text, int sign) {
        int slash = text.indexOf('/');
        if (slash < 0) {
            return new ExactNumber(sign < 0 ? "-" + text : text);
        }
        double denominator = Double.parseDouble(text.substring(slash + 1));
        if (denominator == 0) {
            throw new InvalidModelException("a coefficient has denominator 0", "'" + text + "'", "");
        }
        return ExactNumber.of(sign * Double.parseDouble(text.substring(0, slash)) / denominator);
    }

    private static String coefficientText(ExactNumber size) {
        double value = size.value();
        if (value == Math.rint(value) || size.text().length() < 8) {
            return size.text();
        }
        for (int denominator = 2; denominator <= LARGEST_DENOMINATOR; denominator++) {
            double numerator = Math.rint(value * denominator);
            if (numerator > 0 && numerator < 1e6 && numerator / denominator == value) {
                return (long) numerator + "/" + denominator;
            }
        }
        return size.text();
    }
}
