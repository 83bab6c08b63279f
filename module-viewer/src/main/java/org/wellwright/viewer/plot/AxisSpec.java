package org.wellwright.viewer.plot;

import java.util.List;
import java.util.Objects;

/**
 * One axis of a picture.
 *
 * @param label what it measures, with the unit in brackets; empty for none
 * @param lower lower end
 * @param upper upper end, above {@code lower}
 * @param ticks the ticks; empty for round steps
 * @param visible whether it is drawn
 */
public record AxisSpec(String label, double lower, double upper, List<Tick> ticks, boolean visible) {
    /** A labelled place. */
    public record Tick(double at, String text) {}

    /** Checks the range. */
    public AxisSpec {
        Objects.requireNonNull(label, "label");
        ticks = List.copyOf(ticks);
        if (!(upper > lower) || !Double.isFinite(upper - lower)) {
            throw new IllegalArgumentException("an axis needs lower < upper, got %s, %s".formatted(lower, upper));
        }
    }

    /** An axis with round steps. */
    public static AxisSpec of(String label, double lower, double upper) {
        return new AxisSpec(label, lower, upper, List.of(), true);
    }

    /** An axis that is not drawn. */
    public static AxisSpec hidden(double lower, double upper) {
        return new AxisSpec("", lower, upper, List.of(), false);
    }

    /** The same over another range. */
    public AxisSpec over(double newLower, double newUpper) {
        return new AxisSpec(label, newLower, newUpper, ticks, visible);
    }
}
