package org.wellwright.solver.fit;

import java.util.List;
import java.util.Objects;
import org.wellwright.solver.Problem;

/**
 * One model beside the data, at the parameter values of the document; group errors are at their best.
 *
 * @param model name of the model
 * @param rank 1 for the best; models that predict fewer of the data come last
 * @param quality χ² of all used data that the model predicts
 * @param commonCriterion χ² + 2k on the data that all models predict, which the rank follows
 * @param rows every datum
 * @param worstDatum id of the used datum with the largest |residual|; empty if there is none
 * @param groupErrors the shared errors of the data groups
 * @param problems why data are not predicted, or why the model cannot be solved
 */
public record ModelComparison(
        String model,
        int rank,
        FitQuality quality,
        double commonCriterion,
        List<ResidualRow> rows,
        String worstDatum,
        List<GroupError> groupErrors,
        List<Problem> problems) {

    /** Copies the lists. */
    public ModelComparison {
        Objects.requireNonNull(model, "model");
        Objects.requireNonNull(quality, "quality");
        rows = List.copyOf(rows);
        groupErrors = List.copyOf(groupErrors);
        problems = List.copyOf(problems);
    }

    /** The same with another rank. */
    ModelComparison withRank(int newRank) {
        return new ModelComparison(model, newRank, quality, commonCriterion, rows, worstDatum, groupErrors, problems);
    }
}
