package org.wellwright.solver.fit;

import java.util.Objects;
import org.wellwright.solver.Problem;

/**
 * One datum beside what a model says of it, in the datum's unit.
 *
 * @param datum its id
 * @param measured the measured value
 * @param predicted the model's value without group errors; NaN if the model has none
 * @param predictedSigma standard uncertainty of the prediction from the fit; NaN without a fit
 * @param groupShift what the group errors add to the prediction
 * @param sigma standard uncertainty that the residual is measured by, σ_mod included; NaN if the datum has none
 * @param residual (measured − predicted − shift)/σ; NaN if it cannot be formed; 0 for a limit that holds
 * @param unit the datum's unit
 * @param used whether it counts in χ²
 * @param problem why there is no prediction, or null
 */
public record ResidualRow(
        String datum,
        double measured,
        double predicted,
        double predictedSigma,
        double groupShift,
        double sigma,
        double residual,
        String unit,
        boolean used,
        Problem problem) {

    /** Checks that nothing is missing. */
    public ResidualRow {
        Objects.requireNonNull(datum, "datum");
        Objects.requireNonNull(unit, "unit");
    }

    /** measured − predicted − shift, in the datum's unit. */
    public double difference() {
        return measured - predicted - groupShift;
    }
}
