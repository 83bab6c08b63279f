package org.wellwright.solver.radial;

import java.util.Objects;
import org.wellwright.solver.potential.TermEvaluator;

/**
 * A potential that acts in one channel only (row = column) or couples two of them (both elements of the symmetric
 * matrix).
 *
 * @param row channel index, 0 ≤ row ≤ column
 * @param column channel index
 * @param potential what acts there, in the problem's units
 */
public record ChannelTerm(int row, int column, TermEvaluator potential) {
    /** Checks the indices. */
    public ChannelTerm {
        Objects.requireNonNull(potential, "potential");
        if (row < 0 || column < row) {
            throw new IllegalArgumentException(
                    "a channel term needs 0 <= row <= column, got %d, %d".formatted(row, column));
        }
    }
}
