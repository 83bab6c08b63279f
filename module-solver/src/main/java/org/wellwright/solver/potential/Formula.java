package org.wellwright.solver.potential;

import java.util.List;
import java.util.Map;

/** A parsed formula V(r). Immutable, thread-safe; made by {@link FormulaText#parse}. */
public interface Formula {
    /** The text it was parsed from. */
    String text();

    /** The parameters in the order of their first appearance; indexed ones are written {@code b[0]}. */
    List<String> names();

    /** Whether it uses l, the orbital quantum number of the channel. */
    boolean dependsOnChannel();

    /**
     * The evaluator for given values, whose parameters are {@link #names} in that order.
     *
     * @param values one value per name
     * @throws org.wellwright.solver.InvalidModelException if a value is not finite
     */
    TermEvaluator bind(double[] values, ChannelFacts channel);

    /**
     * The evaluator for values by name; names that the formula does not use are ignored.
     *
     * @throws org.wellwright.solver.InvalidModelException if a name has no value (gives its column and the names that
     *     have one) or it is not finite
     */
    TermEvaluator bind(Map<String, Double> values, ChannelFacts channel);
}
