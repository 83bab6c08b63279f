package org.wellwright.solver.model;

import org.wellwright.solver.units.ExactNumber;

/**
 * What is known of a parameter from elsewhere; counts as one datum of a fit.
 *
 * @param value its value, in the parameter's unit
 * @param sigma its standard uncertainty, > 0
 */
public record Prior(ExactNumber value, ExactNumber sigma) {
    /** Checks the uncertainty. */
    public Prior {
        if (value == null || sigma == null || sigma.sign() <= 0) {
            throw new IllegalArgumentException(
                    "a prior needs a value and a sigma > 0, got %s, %s".formatted(value, sigma));
        }
    }
}
