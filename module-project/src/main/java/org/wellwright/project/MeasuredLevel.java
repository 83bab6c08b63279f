package org.wellwright.project;

import java.util.Objects;
import org.wellwright.solver.model.LevelKey;

/**
 * A level whose energy the data fix.
 *
 * @param key the level
 * @param energy its energy, the project's energy unit, on the project's common zero
 * @param sigmaMinus standard uncertainty downward, ≥ 0; NaN if not stated
 * @param sigmaPlus standard uncertainty upward, ≥ 0; NaN if not stated
 * @param datum id of the datum that says so
 * @param reference name of the model whose other levels the datum was completed with (a line fixes only a difference);
 *     empty if none was needed
 */
public record MeasuredLevel(
        LevelKey key, double energy, double sigmaMinus, double sigmaPlus, String datum, String reference) {
    /** Checks that nothing is missing. */
    public MeasuredLevel {
        Objects.requireNonNull(key, "key");
        Objects.requireNonNull(datum, "datum");
        Objects.requireNonNull(reference, "reference");
        if (!Double.isFinite(energy)) {
            throw new IllegalArgumentException("a measured energy must be finite, got " + energy);
        }
    }
}
