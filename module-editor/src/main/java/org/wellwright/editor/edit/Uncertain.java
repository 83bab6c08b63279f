package org.wellwright.editor.edit;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Computed numbers as text, with as many digits as their uncertainty is worth. */
public final class Uncertain {
    private static final int SHOWN = 10;

    private Uncertain() {}

    /** "0.5213(12)": two digits of the uncertainty; ten digits where there is none. */
    public static String text(double value, double sigma) {
        if (!Double.isFinite(value)) {
            return "—";
        }
        if (!(sigma > 0) || Double.isInfinite(sigma)) {
            return number(value, SHOWN);
        }
        BigDecimal twoDigits = new BigDecimal(sigma).round(new MathContext(2, RoundingMode.HALF_EVEN));
        BigDecimal error = twoDigits.setScale(twoDigits.scale() - twoDigits.precision() + 2, RoundingMode.UNNECESSARY);
        int exponent = value == 0 ? 0 : (int) Math.floor(Math.log10(Math.abs(value)));
        if (error.scale() <= 0 || exponent < -4) {
            return scientific(value, error, exponent);
        }
        BigDecimal rounded = new BigDecimal(value).setScale(error.scale(), RoundingMode.HALF_EVEN);
        return rounded.toPlainString() + "(" + error.unscaledValue() + ")";
    }

    /** A number with so many significant digits, in plain writing where it is of ordinary size. */
    public static String number(double value, int digits) {
        if (!Double.isFinite(value)) {
            return "—";
        }
        if (value == 0) {
            return "0";
        }
        BigDecimal rounded = new BigDecimal(value)
                .round(new MathContext(digits, RoundingMode.HALF_EVEN))
                .stripTrailingZeros();
        int exponent = rounded.precision() - rounded.scale() - 1;
        return exponent >= -5 && exponent < 12
                ? rounded.toPlainString()
                : rounded.toString().replace("E+", "e").replace('E', 'e');
    }

    private static String scientific(double value, BigDecimal error, int exponent) {
        if (error.scale() <= 0 && error.precision() - error.scale() <= 7) {
            BigDecimal rounded = new BigDecimal(value).setScale(error.scale(), RoundingMode.HALF_EVEN);
            return rounded.toPlainString() + "(" + error.toPlainString() + ")";
        }
        BigDecimal scaledError = error.movePointLeft(exponent);
        BigDecimal scaled = new BigDecimal(value)
                .movePointLeft(exponent)
                .setScale(Math.max(0, scaledError.scale()), RoundingMode.HALF_EVEN);
        return scaled.toPlainString() + "(" + scaledError.unscaledValue() + ")e" + exponent;
    }
}
