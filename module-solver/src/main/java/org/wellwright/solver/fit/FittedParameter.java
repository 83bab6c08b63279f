package org.wellwright.solver.fit;

import java.util.Objects;

/**
 * One number of the pool that a model uses, after a fit.
 *
 * @param name the number: the parameter's name, with its place in brackets where it has several numbers ("a", "a[l=1]",
 *     "a[l=1,j=3/2]", "m[HD]")
 * @param parameter the parameter's name
 * @param value its value in the parameter's unit
 * @param sigma its standard uncertainty in that unit; 0 if it is fixed, NaN at a bound or if it could not be found
 * @param unit the parameter's unit
 * @param free whether the fit could change it
 * @param bound which bound holds it
 */
public record FittedParameter(
        String name, String parameter, double value, double sigma, String unit, boolean free, Bound bound) {

    /** The bound at which a parameter ended. */
    public enum Bound {
        /** None: it lies between its bounds. */
        NONE,
        /** The lower one; its sigma is NaN. */
        LOWER,
        /** The upper one; its sigma is NaN. */
        UPPER
    }

    /** Checks that nothing is missing. */
    public FittedParameter {
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(parameter, "parameter");
        Objects.requireNonNull(unit, "unit");
        Objects.requireNonNull(bound, "bound");
    }
}
