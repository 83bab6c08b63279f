package org.wellwright.project;

import java.util.Objects;
import org.wellwright.solver.Problem;
import org.wellwright.solver.fit.FitResult;

/**
 * What became of the fit of one model.
 *
 * @param model name of the model
 * @param fit the fit; null if there is none
 * @param problem why there is none; null if there is one
 */
public record FittedModel(String model, FitResult fit, Problem problem) {
    /** Checks that there is either a fit or a reason. */
    public FittedModel {
        Objects.requireNonNull(model, "model");
        if ((fit == null) == (problem == null)) {
            throw new IllegalArgumentException(
                    "the model '" + model + "' needs either a fit or the reason why it has none");
        }
    }
}
