package org.wellwright.project.entry;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Objects;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.units.ExactNumber;

/**
 * A measured value as people write it: {@code 1.23456(12)}, {@code 1.23456 ± 0.00012}, {@code 1.2(3)e4 cm^-1},
 * {@code 12.3 +0.4 -0.2}, {@code < 3.5}.
 *
 * <p>Digits in parentheses count in units of the value's last digit (JCGM 100:2008, 7.2.2); a number with a point in
 * parentheses is meant as it stands. Digits are kept as typed.
 *
 * @param value the value
 * @param sigmaMinus standard uncertainty downward, > 0, or null if none is stated
 * @param sigmaPlus standard uncertainty upward, > 0, or null if none is stated
 * @param limit whether the value is a limit
 * @param unit what follows the number; may be empty
 */
public record MeasuredText(
        ExactNumber value, ExactNumber sigmaMinus, ExactNumber sigmaPlus, Datum.Limit limit, String unit) {
    private static final String UNSIGNED = "(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d{1,4})?";
    private static final String PLUS_MINUS = "(?:±|\\+/-|\\+-)";
    private static final Pattern LIMIT = Pattern.compile("(<=|>=|[<>≤≥])\\s*(.*)");
    private static final Pattern PARENTHESES = Pattern.compile(
            "([+-]?(?:\\d+\\.?\\d*|\\.\\d+))\\s?\\((\\d+\\.?\\d*|\\.\\d+)\\)((?:[eE][+-]?\\d{1,4})?)(.*)");
    private static final Pattern SYMMETRIC =
            Pattern.compile("(" + Typed.NUMBER + ")\\s*" + PLUS_MINUS + "\\s*(" + UNSIGNED + ")(.*)");
    private static final Pattern BRACKETED = Pattern.compile("\\(\\s*(" + Typed.NUMBER + ")\\s*" + PLUS_MINUS + "\\s*("
            + UNSIGNED + ")\\s*\\)((?:[eE][+-]?\\d{1,4})?)(.*)");
    private static final Pattern TWO_SIDED =
            Pattern.compile("(" + Typed.NUMBER + ")\\s*\\+\\s*(" + UNSIGNED + ")\\s*/?\\s*-\\s*(" + UNSIGNED + ")(.*)");

    /** Checks that both uncertainties are there or none. */
    public MeasuredText {
        Objects.requireNonNull(value, "value");
        Objects.requireNonNull(limit, "limit");
        Objects.requireNonNull(unit, "unit");
        if ((sigmaMinus == null) != (sigmaPlus == null)) {
            throw new IllegalArgumentException("a measured value needs both sigmas or none");
        }
    }

    /**
     * Reads a text.
     *
     * @throws InvalidModelException if it is none of the forms, or an uncertainty is zero
     */
    public static MeasuredText parse(String text) {
        String plain = Typed.plain(text);
        Matcher limited = LIMIT.matcher(plain);
        if (limited.matches()) {
            Typed typed = Typed.split(limited.group(2));
            boolean upper = limited.group(1).startsWith("<") || limited.group(1).startsWith("≤");
            return new MeasuredText(
                    typed.number(), null, null, upper ? Datum.Limit.UPPER : Datum.Limit.LOWER, typed.rest());
        }
        Matcher matcher = PARENTHESES.matcher(plain);
        if (matcher.matches()) {
            String sigma = matcher.group(2).contains(".")
                    ? matcher.group(2) + matcher.group(3)
                    : lastDigits(matcher.group(1) + matcher.group(3), matcher.group(2));
            return of(text, matcher.group(1) + matcher.group(3), sigma, sigma, matcher.group(4));
        }
        matcher = BRACKETED.matcher(plain);
        if (matcher.matches()) {
            String power = matcher.group(3);
            return of(
                    text,
                    scaled(matcher.group(1), power),
                    scaled(matcher.group(2), power),
                    scaled(matcher.group(2), power),
                    matcher.group(4));
        }
        matcher = SYMMETRIC.matcher(plain);
        if (matcher.matches()) {
            return of(text, matcher.group(1), matcher.group(2), matcher.group(2), matcher.group(3));
        }
        matcher = TWO_SIDED.matcher(plain);
        if (matcher.matches()) {
            return of(text, matcher.group(1), matcher.group(3), matcher.group(2), matcher.group(4));
        }
        Typed typed = Typed.split(plain);
        if (typed.rest().startsWith("(") || typed.rest().startsWith("±")) {
            throw new InvalidModelException(
                    "the uncertainty in '%s' cannot be read".formatted(Typed.shortened(plain)),
                    "",
                    "write 1.23456(12) or 1.23456 ± 0.00012");
        }
        return new MeasuredText(typed.number(), null, null, Datum.Limit.NONE, typed.rest());
    }

    /**
     * The short form: digits in parentheses where the uncertainty fills at most three of the value's last places, "v ±
     * s" otherwise.
     */
    public static String format(ExactNumber value, ExactNumber sigmaMinus, ExactNumber sigmaPlus, Datum.Limit limit) {
        if (limit != Datum.Limit.NONE) {
            return (limit == Datum.Limit.UPPER ? "< " : "> ") + value;
        }
        if (sigmaPlus == null) {
            return value.text();
        }
        if (sigmaMinus.decimal().compareTo(sigmaPlus.decimal()) != 0) {
            return value + " +" + sigmaPlus + " -" + sigmaMinus;
        }
        String digits = digitsInLastPlaces(value, sigmaPlus);
        if (digits == null) {
            return value + " ± " + sigmaPlus;
        }
        String text = value.text();
        int exponent = Math.max(text.indexOf('e'), text.indexOf('E'));
        return exponent < 0
                ? text + "(" + digits + ")"
                : text.substring(0, exponent) + "(" + digits + ")" + text.substring(exponent);
    }

    private static String digitsInLastPlaces(ExactNumber value, ExactNumber sigma) {
        BigDecimal inLastPlaces = sigma.decimal().movePointRight(value.decimal().scale());
        if (inLastPlaces.stripTrailingZeros().scale() > 0) {
            return null;
        }
        BigInteger digits = inLastPlaces.toBigInteger();
        return digits.bitLength() > 10 || digits.toString().length() > 3 ? null : digits.toString();
    }

    private static MeasuredText of(String text, String value, String minus, String plus, String unit) {
        ExactNumber down = Typed.exact(minus);
        ExactNumber up = Typed.exact(plus);
        if (down.sign() <= 0 || up.sign() <= 0) {
            throw new InvalidModelException(
                    "the uncertainty in '%s' is zero".formatted(Typed.shortened(text.strip())),
                    "",
                    "leave it out where it is not known");
        }
        return new MeasuredText(Typed.exact(value), down, up, Datum.Limit.NONE, unit.strip());
    }

    private static String lastDigits(String value, String digits) {
        return text(new BigDecimal(digits).movePointLeft(new BigDecimal(value).scale()));
    }

    private static String scaled(String number, String power) {
        if (power.isEmpty()) {
            return number;
        }
        return text(new BigDecimal(number).scaleByPowerOfTen(Integer.parseInt(power.substring(1))));
    }

    private static String text(BigDecimal number) {
        return number.precision() - number.scale() > 15 || number.scale() - number.precision() > 8
                ? number.toString().replace("E+", "e").replace('E', 'e')
                : number.toPlainString();
    }
}
