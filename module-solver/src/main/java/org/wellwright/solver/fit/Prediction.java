package org.wellwright.solver.fit;

import java.util.Objects;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.LevelKey;

/**
 * A level that a fitted model predicts, in the project's unit of energy.
 *
 * @param level its key
 * @param energy its energy; NaN if the model has no such level
 * @param parameterSigma standard uncertainty from the fitted parameters; NaN without a fit
 * @param numericalHalfWidth half-width of the solver's bounds
 * @param problem why there is none, or null
 */
public record Prediction(
        LevelKey level, double energy, double parameterSigma, double numericalHalfWidth, Problem problem) {
    /** Checks that the key is there. */
    public Prediction {
        Objects.requireNonNull(level, "level");
    }
}
