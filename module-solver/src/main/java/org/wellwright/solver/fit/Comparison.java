package org.wellwright.solver.fit;

import java.util.List;
import java.util.Objects;
import org.wellwright.solver.model.Weighting;

/**
 * All models of a document beside its data, best first.
 *
 * @param mode what the uncertainties mean
 * @param models the models in the order of rank
 * @param commonData number of used data that all models predict
 */
public record Comparison(Weighting mode, List<ModelComparison> models, int commonData) {
    /** Copies the list. */
    public Comparison {
        Objects.requireNonNull(mode, "mode");
        models = List.copyOf(models);
    }
}
