package org.wellwright.solver.model;

import java.util.List;
import org.wellwright.solver.potential.TermEvaluator;

/**
 * A term with its numbers put in.
 *
 * @param evaluator computes it in the unit system's units
 * @param parameters the evaluator's parameters as functions of the pool, in its order
 * @param channelDependent whether it would differ in another channel
 */
record BoundTerm(TermEvaluator evaluator, List<PoolValue> parameters, boolean channelDependent) {
    BoundTerm {
        parameters = List.copyOf(parameters);
    }
}
