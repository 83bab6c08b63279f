package org.wellwright.project.entry;

import java.util.Objects;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.units.ExactNumber;

/**
 * A text split at the end of its leading number.
 *
 * @param number the number
 * @param rest what follows it, without blanks around it
 */
record Typed(ExactNumber number, String rest) {
    static final String NUMBER = "[+-]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d{1,4})?";
    private static final Pattern LEADING = Pattern.compile("(" + NUMBER + ")(.*)");
    private static final Pattern DECIMAL_COMMA = Pattern.compile("[+-]?\\d+,\\d+.*");

    Typed {
        Objects.requireNonNull(number, "number");
        Objects.requireNonNull(rest, "rest");
    }

    static Typed split(String text) {
        String plain = plain(text);
        if (plain.isEmpty()) {
            throw new InvalidModelException("a number is missing here", "", "type one, as 1.25 or 1.25 eV");
        }
        if (DECIMAL_COMMA.matcher(plain).matches()) {
            throw new InvalidModelException(
                    "'%s' has a comma in its number".formatted(shortened(plain)),
                    "",
                    "write the decimals after a point");
        }
        Matcher matcher = LEADING.matcher(plain);
        if (!matcher.matches()) {
            throw new InvalidModelException(
                    "'%s' does not start with a number".formatted(shortened(plain)),
                    "",
                    "type one, as 1.25 or 1.25 eV");
        }
        return new Typed(exact(matcher.group(1)), matcher.group(2).strip());
    }

    /** The number of a text that matches {@link #NUMBER}. */
    static ExactNumber exact(String text) {
        try {
            return new ExactNumber(text.startsWith("+") ? text.substring(1) : text);
        } catch (IllegalArgumentException e) {
            throw new InvalidModelException(e.getMessage(), "", "");
        }
    }

    /**
     * Typographic minus signs and blanks inside numbers, as spreadsheets and papers print them, in plain characters.
     */
    static String plain(String text) {
        return text.replace('\u2212', '-')
                .replace('\u2013', '-')
                .replaceAll("(?<=\\d)[\u00a0\u2009\u202f](?=\\d)", "")
                .replace('\u00a0', ' ')
                .replace('\u2009', ' ')
                .replace('\u202f', ' ')
                .strip();
    }

    static String shortened(String text) {
        return text.length() <= 40 ? text : text.substring(0, 37) + "...";
    }
}
