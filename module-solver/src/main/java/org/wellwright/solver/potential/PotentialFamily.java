package org.wellwright.solver.potential;

import java.util.List;

/**
 * A named kind of potential. Registered with {@code @ServiceProvider(service = PotentialFamily.class)} and found
 * through the Lookup, so that a third party adds one by dropping in a module.
 */
public interface PotentialFamily {
    /** Lower-case identifier used in project files, unique ("woods-saxon"). */
    String id();

    /** Name on screen. */
    String displayName();

    /** The formula in plain text, in the symbols of {@link #parameters()}. */
    String formula();

    /** For which values and uses it is meant, in one sentence. */
    String validity();

    /** Where the formula was published (author, year). */
    String source();

    /** The parameters in the order that {@link #bind} takes their values. */
    List<FamilyParameter> parameters();

    /** Whether the potential differs from channel to channel. */
    default boolean dependsOnChannel() {
        return false;
    }

    /**
     * The evaluator for given parameter values.
     *
     * @param values one value per parameter, in the problem's energy and length unit; copied
     * @param channel the channel it will act in
     * @throws org.wellwright.solver.InvalidModelException if a value is outside the family's domain; names the
     *     parameter
     */
    TermEvaluator bind(double[] values, ChannelFacts channel);
}
