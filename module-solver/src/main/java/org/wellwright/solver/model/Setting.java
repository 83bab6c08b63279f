package org.wellwright.solver.model;

import java.util.Objects;
import org.wellwright.solver.units.ExactNumber;

/**
 * One adjustable number of a parameter, in the parameter's unit.
 *
 * @param value its value
 * @param free whether a fit may change it
 * @param lower lower bound, or null
 * @param upper upper bound, or null
 * @param prior what is known of it from elsewhere, or null
 */
public record Setting(ExactNumber value, boolean free, ExactNumber lower, ExactNumber upper, Prior prior) {
    /** Checks that the value lies within its bounds. */
    public Setting {
        Objects.requireNonNull(value, "value");
        if (lower != null && upper != null && !(lower.value() < upper.value())) {
            throw new IllegalArgumentException("bounds need lower < upper, got %s, %s".formatted(lower, upper));
        }
        if (lower != null && value.value() < lower.value() || upper != null && value.value() > upper.value()) {
            throw new IllegalArgumentException("the value %s lies outside its bounds".formatted(value));
        }
    }

    /** A number that a fit leaves alone. */
    public static Setting fixed(ExactNumber value) {
        return new Setting(value, false, null, null, null);
    }

    /** A number that a fit may change, without bounds. */
    public static Setting free(ExactNumber value) {
        return new Setting(value, true, null, null, null);
    }

    /** The same with another value. */
    public Setting withValue(ExactNumber newValue) {
        return new Setting(newValue, free, lower, upper, prior);
    }

    /** The same, free or fixed. */
    public Setting withFree(boolean nowFree) {
        return new Setting(value, nowFree, lower, upper, prior);
    }

    /** The same with other bounds; null for none. */
    public Setting withBounds(ExactNumber newLower, ExactNumber newUpper) {
        return new Setting(value, free, newLower, newUpper, prior);
    }

    /** The same with another prior; null for none. */
    public Setting withPrior(Prior newPrior) {
        return new Setting(value, free, lower, upper, newPrior);
    }

    /** The same moved to another value, within the bounds; NaN leaves it as typed. */
    Setting moved(double newValue) {
        if (Double.isNaN(newValue) || newValue == value.value()) {
            return this;
        }
        if (lower != null && newValue <= lower.value()) {
            return withValue(lower);
        }
        if (upper != null && newValue >= upper.value()) {
            return withValue(upper);
        }
        return withValue(ExactNumber.of(newValue));
    }
}
