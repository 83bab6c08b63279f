package org.wellwright.project.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers written with the digits that their uncertainty leaves meaningful. */
public final class Digits {
    /** A double holds no more. */
    private static final int MOST = 17;

    private Digits() {}

    /**
     * A value rounded to the decimal place of the second significant digit of its uncertainty; all digits that a double
     * holds where the uncertainty is 0 or unknown.
     *
     * @param uncertainty standard uncertainty or half-width, in the value's unit
     */
    public static String of(double value, double uncertainty) {
        if (!Double.isFinite(value)) {
            return special(value);
        }
        if (!(uncertainty > 0) || Double.isInfinite(uncertainty)) {
            return plain(value);
        }
        return text(rounded(value, place(uncertainty)), place(uncertainty));
    }

    /** "1.4402 ± 0.0013": both to the second significant digit of the uncertainty; "fixed" values stand alone. */
    public static String plusMinus(double value, double uncertainty) {
        if (!(uncertainty > 0) || Double.isInfinite(uncertainty) || !Double.isFinite(value)) {
            return of(value, uncertainty);
        }
        int place = place(uncertainty);
        int exponent = exponentOf(value, place);
        if (exponent == 0) {
            return text(rounded(value, place), place) + " ± " + text(rounded(uncertainty, place), place);
        }
        String digits = rounded(value, place).scaleByPowerOfTen(-exponent).toPlainString();
        String sigma = rounded(uncertainty, place).scaleByPowerOfTen(-exponent).toPlainString();
        return "(" + digits + " ± " + sigma + ")e" + exponent;
    }

    /** A number of its own with so many significant digits, without trailing zeros after the point. */
    public static String significant(double value, int digits) {
        if (!Double.isFinite(value)) {
            return special(value);
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
        if (rounded.signum() == 0) {
            return "0";
        }
        int exponent = rounded.precision() - rounded.scale() - 1;
        if (exponent < -5 || exponent >= Math.max(digits, 7)) {
            return rounded.scaleByPowerOfTen(-exponent).stripTrailingZeros().toPlainString() + "e" + exponent;
        }
        BigDecimal stripped = rounded.stripTrailingZeros();
        return stripped.scale() < 0 ? stripped.setScale(0).toPlainString() : stripped.toPlainString();
    }

    /** A number with a fixed count of decimals. */
    public static String decimals(double value, int decimals) {
        return Double.isFinite(value)
                ? new BigDecimal(value)
                        .setScale(decimals, RoundingMode.HALF_EVEN)
                        .toPlainString()
                : special(value);
    }

    /** The shortest text that reads back to the same double. */
    public static String plain(double value) {
        if (!Double.isFinite(value)) {
            return special(value);
        }
        return value == Math.rint(value) && Math.abs(value) < 1e7
                ? Long.toString((long) value)
                : Double.toString(value);
    }

    /** Whether a cell of a table is a number, perhaps with its uncertainty, and stands to the right. */
    public static boolean number(String cell) {
        for (int i = 0; i < cell.length(); i++) {
            if ("0123456789.+-−±∞–()e ≤≥".indexOf(cell.charAt(i)) < 0) {
                return false;
            }
        }
        return true;
    }

    private static String special(double value) {
        return Double.isNaN(value) ? "–" : value > 0 ? "∞" : "−∞";
    }

    /** The power of ten of the uncertainty's second significant digit. */
    private static int place(double uncertainty) {
        BigDecimal two = new BigDecimal(uncertainty).round(new MathContext(2, RoundingMode.HALF_EVEN));
        return two.precision() - two.scale() - 2;
    }

    private static BigDecimal rounded(double value, int place) {
        BigDecimal exact = new BigDecimal(value);
        BigDecimal rounded = exact.setScale(-place, RoundingMode.HALF_EVEN);
        return rounded.precision() > MOST ? exact.round(new MathContext(MOST, RoundingMode.HALF_EVEN)) : rounded;
    }

    private static String text(BigDecimal rounded, int place) {
        int exponent = exponentOf(rounded.doubleValue(), place);
        return exponent == 0
                ? rounded.toPlainString()
                : rounded.scaleByPowerOfTen(-exponent).toPlainString() + "e" + exponent;
    }

    /** The power of ten to write apart: 0 for numbers that read well without. */
    private static int exponentOf(double value, int place) {
        if (value == 0) {
            return place < -9 || place > 0 ? place : 0;
        }
        int exponent = (int) Math.floor(Math.log10(Math.abs(value)));
        return exponent < -5 || exponent > 9 || place > 0 ? exponent : 0;
    }
}
