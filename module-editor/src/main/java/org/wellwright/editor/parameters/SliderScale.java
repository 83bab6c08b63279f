package org.wellwright.editor.parameters;

import java.math.BigDecimal;
import java.math.RoundingMode;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.units.ExactNumber;

/**
 * The range of a slider, cut into equal steps.
 *
 * @param low value at its left end
 * @param high value at its right end, above {@code low}
 */
record SliderScale(double low, double high) {
    static final int STEPS = 2000;

    SliderScale {
        if (!(low < high) || Double.isInfinite(high - low)) {
            throw new IllegalArgumentException(
                    "a slider needs a left end below its right end, got %s, %s".formatted(low, high));
        }
    }

    /**
     * Between the bounds where there are any; where there are none, half the value to either side, or one where it is
     * 0.
     */
    static SliderScale around(Setting setting) {
        double value = setting.value().value();
        double reach = value == 0 ? 1 : Math.abs(value) / 2;
        double low = setting.lower() == null ? value - reach : setting.lower().value();
        double high = setting.upper() == null ? value + reach : setting.upper().value();
        return low < high ? new SliderScale(low, high) : new SliderScale(value - reach, value + reach);
    }

    double step() {
        return (high - low) / STEPS;
    }

    double value(int tick) {
        return low + (high - low) * tick / STEPS;
    }

    int tick(double value) {
        return (int) Math.round(Math.max(0, Math.min(1, (value - low) / (high - low))) * STEPS);
    }

    boolean holds(double value) {
        return low <= value && value <= high;
    }

    /** A value with no more digits than the step is worth. */
    static ExactNumber rounded(double value, double step) {
        int decimals = (int) Math.ceil(-Math.log10(step)) + 1;
        BigDecimal decimal =
                new BigDecimal(value).setScale(decimals, RoundingMode.HALF_EVEN).stripTrailingZeros();
        return new ExactNumber(
                decimal.scale() < 0 && decimal.precision() - decimal.scale() <= 15
                                || decimal.scale() >= 0 && decimal.scale() < 12
                        ? decimal.toPlainString()
                        : decimal.toString());
    }
}
