package org.wellwright.solver.fit;

import java.util.List;
import java.util.Objects;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.ModelDocument;

/**
 * A fit of one model to the used data.
 *
 * @param document everything that determines it
 * @param model name of the model
 * @param predict levels to predict besides the data, with their uncertainties; may be empty
 * @param maximumIterations most steps of the search, ≥ 1
 */
public record FitRequest(ModelDocument document, String model, List<LevelKey> predict, int maximumIterations) {
    /** Steps that are enough for any well-posed fit. */
    public static final int STANDARD_ITERATIONS = 200;

    /** Checks that nothing is missing. */
    public FitRequest {
        Objects.requireNonNull(document, "document");
        Objects.requireNonNull(model, "model");
        predict = List.copyOf(predict);
        if (maximumIterations < 1) {
            throw new IllegalArgumentException("a fit needs at least 1 iteration, got " + maximumIterations);
        }
    }

    /** A fit with no predictions beyond the data. */
    public static FitRequest of(ModelDocument document, String model) {
        return new FitRequest(document, model, List.of(), STANDARD_ITERATIONS);
    }
}
