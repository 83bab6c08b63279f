package org.wellwright.solver.units;

import java.math.BigDecimal;
import java.util.Objects;

/**
 * A finite decimal number kept as it was typed, so that saving a project changes no digit. Equal texts are equal
 * numbers.
 *
 * @param text decimal text as Java and JSON write numbers ("0.520", "-1.5e-3")
 */
public record ExactNumber(String text) {
    /** Zero. */
    public static final ExactNumber ZERO = new ExactNumber("0");

    /** One. */
    public static final ExactNumber ONE = new ExactNumber("1");

    /** Checks that the text is a finite decimal number. */
    public ExactNumber {
        Objects.requireNonNull(text, "text");
        if (!text.matches("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d{1,4})?")) {
            throw new IllegalArgumentException("'%s' is not a decimal number".formatted(shortened(text)));
        }
        if (Double.isInfinite(Double.parseDouble(text))) {
            throw new IllegalArgumentException("the number %s is too large".formatted(shortened(text)));
        }
    }

    /** The shortest text that gives back this double. */
    public static ExactNumber of(double value) {
        return new ExactNumber(
                value == Math.rint(value) && Math.abs(value) < 1e15
                        ? Long.toString((long) value)
                        : Double.toString(value));
    }

    /** The nearest double. */
    public double value() {
        return Double.parseDouble(text);
    }

    /** The number without rounding. */
    public BigDecimal decimal() {
        return new BigDecimal(text);
    }

    /** −1, 0 or 1. */
    public int sign() {
        return decimal().signum();
    }

    @Override
    public String toString() {
        return text;
    }

    private static String shortened(String text) {
        return text.length() <= 40 ? text : text.substring(0, 37) + "...";
    }
}
