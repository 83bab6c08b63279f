package org.wellwright.project;

import java.util.List;
import java.util.Objects;

/**
 * One datum beside what every model says.
 *
 * @param datum id of the datum
 * @param label what it is, in words short enough for an axis ("3p → 3s")
 * @param unit unit of the values
 * @param measured measured value
 * @param sigmaMinus standard uncertainty downward; NaN if not stated
 * @param sigmaPlus standard uncertainty upward; NaN if not stated
 * @param used whether it counts
 * @param calculated one entry per model that says something about it
 */
public record DatumComparison(
        String datum,
        String label,
        String unit,
        double measured,
        double sigmaMinus,
        double sigmaPlus,
        boolean used,
        List<Calculated> calculated) {

    /**
     * What one model says.
     *
     * @param model name of the model
     * @param value calculated value, in the datum's unit
     * @param residual (measured − calculated) over the uncertainty that the comparison used; NaN if there is none
     */
    public record Calculated(String model, double value, double residual) {}

    /** Copies the list. */
    public DatumComparison {
        Objects.requireNonNull(datum, "datum");
        Objects.requireNonNull(label, "label");
        Objects.requireNonNull(unit, "unit");
        calculated = List.copyOf(calculated);
    }
}
