package org.wellwright.solver.fit;

import java.util.List;
import java.util.Objects;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Weighting;

/**
 * A finished fit.
 *
 * @param document the document with the fitted values in its pool
 * @param model name of the model
 * @param parameters all numbers of the pool that the model uses, free or not, in the order of the pool
 * @param groupErrors the shared errors of the data groups
 * @param covariance covariance of the free parameters that are not at a bound, then the group errors, scaled as the
 *     mode says
 * @param quality χ², degrees of freedom, criterion
 * @param mode what the uncertainties mean
 * @param sigmaScale factor by which σ were multiplied: √(χ²/ν) in the modes that estimate it, otherwise 1
 * @param modelErrors the fitted or fixed σ_mod by group
 * @param rows every datum, used or not
 * @param predictions the levels asked for
 * @param iterations steps that the search took
 * @param converged whether it reached a minimum
 * @param remarks what the user should know: bounds that hold, flat directions, limits left out
 */
public record FitResult(
        ModelDocument document,
        String model,
        List<FittedParameter> parameters,
        List<GroupError> groupErrors,
        Covariance covariance,
        FitQuality quality,
        Weighting mode,
        double sigmaScale,
        List<ModelErrorEstimate> modelErrors,
        List<ResidualRow> rows,
        List<Prediction> predictions,
        int iterations,
        boolean converged,
        List<Problem> remarks) {

    /** Copies the lists. */
    public FitResult {
        Objects.requireNonNull(document, "document");
        Objects.requireNonNull(covariance, "covariance");
        Objects.requireNonNull(quality, "quality");
        Objects.requireNonNull(mode, "mode");
        parameters = List.copyOf(parameters);
        groupErrors = List.copyOf(groupErrors);
        modelErrors = List.copyOf(modelErrors);
        rows = List.copyOf(rows);
        predictions = List.copyOf(predictions);
        remarks = List.copyOf(remarks);
    }
}
