package org.wellwright.viewer.plot;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.text.FieldPosition;
import java.text.NumberFormat;
import java.text.ParsePosition;
import java.util.Locale;

/** Round steps for axes and the text of their labels, the same in every country. */
public final class Ticks {
    private Ticks() {}

    /** The smallest of 1, 2, 5 times a power of ten that cuts a span into at most {@code pieces}. */
    public static double step(double span, double pieces) {
        double least = span / Math.max(1, pieces);
        double power = Math.pow(10, Math.floor(Math.log10(least)));
        for (double factor : new double[] {1, 2, 5}) {
            if (factor * power >= least * (1 - 1e-12)) {
                return factor * power;
            }
        }
        return 10 * power;
    }

    /** The largest of 1, 2, 5 times a power of ten that is not above a number > 0. */
    public static double roundedDown(double number) {
        double power = Math.pow(10, Math.floor(Math.log10(number)));
        double digit = number / power * (1 + 1e-12);
        return (digit >= 5 ? 5 : digit >= 2 ? 2 : 1) * power;
    }

    /**
     * A tick's label: with the decimals that its step needs, as a power of ten where the numbers are very large or
     * small.
     */
    public static String label(double value, double step) {
        int exponent = (int) Math.floor(Math.log10(step) + 1e-9);
        double rounded = Math.round(value / step) * step;
        if (rounded == 0) {
            return "0";
        }
        if (exponent < -5 || Math.abs(rounded) >= 1e7) {
            int top = (int) Math.floor(Math.log10(Math.abs(rounded)) + 1e-9);
            BigDecimal digits = BigDecimal.valueOf(rounded)
                    .movePointLeft(top)
                    .setScale(Math.max(0, top - exponent), RoundingMode.HALF_EVEN);
            return minus(digits.toPlainString()) + "×10" + raised(top);
        }
        return minus(BigDecimal.valueOf(rounded)
                .setScale(Math.max(0, -exponent), RoundingMode.HALF_EVEN)
                .toPlainString());
    }

    /** A number with a count of significant digits, without needless zeros or exponents. */
    public static String number(double value, int digits) {
        if (value == 0 || !Double.isFinite(value)) {
            return value == 0 ? "0" : Double.toString(value);
        }
        BigDecimal rounded =
                new BigDecimal(value).round(new MathContext(digits)).stripTrailingZeros();
        int top = rounded.precision() - rounded.scale() - 1;
        if (top < -4 || top > 6) {
            BigDecimal mantissa = rounded.movePointLeft(top).stripTrailingZeros();
            return minus(mantissa.toPlainString()) + "×10" + raised(top);
        }
        return minus(rounded.toPlainString());
    }

    /** An integer in raised signs. */
    public static String raised(int number) {
        StringBuilder text = new StringBuilder();
        for (char c : Integer.toString(number).toCharArray()) {
            text.append(c == '-' ? '⁻' : "⁰¹²³⁴⁵⁶⁷⁸⁹".charAt(c - '0'));
        }
        return text.toString();
    }

    static String minus(String number) {
        return number.replace('-', '−');
    }

    /** The labels of one step as a number format. */
    static final class Format extends NumberFormat {
        private static final long serialVersionUID = 1L;
        private final double step;

        Format(double step) {
            this.step = step;
        }

        @Override
        public StringBuffer format(double number, StringBuffer buffer, FieldPosition position) {
            return buffer.append(label(number, step));
        }

        @Override
        public StringBuffer format(long number, StringBuffer buffer, FieldPosition position) {
            return format((double) number, buffer, position);
        }

        @Override
        public Number parse(String source, ParsePosition position) {
            return NumberFormat.getInstance(Locale.ROOT).parse(source, position);
        }

        @Override
        public boolean equals(Object other) {
            return other instanceof Format format && format.step == step;
        }

        @Override
        public int hashCode() {
            return Double.hashCode(step);
        }
    }
}
