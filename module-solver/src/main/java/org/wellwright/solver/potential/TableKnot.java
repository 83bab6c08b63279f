package org.wellwright.solver.potential;

import java.util.Objects;

/**
 * One point of a table.
 *
 * @param radius r in the table's radius unit, > 0
 * @param value V(r): a number in the table's value unit unless it names its own, or a parameter
 */
public record TableKnot(double radius, Argument value) {
    /** Checks the radius. */
    public TableKnot {
        Objects.requireNonNull(value, "value");
        if (!(radius > 0) || Double.isInfinite(radius)) {
            throw new IllegalArgumentException("a table's radius must be positive and finite, got " + radius);
        }
    }
}
