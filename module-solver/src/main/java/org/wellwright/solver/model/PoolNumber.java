package org.wellwright.solver.model;

import java.util.Objects;

/**
 * One adjustable number of the pool; a parameter that depends on l or on the system has several.
 *
 * @param name the number: the parameter's name, with its place in brackets where it has several numbers ("a", "a[l=1]",
 *     "a[l=1,j=3/2]", "a[HD]", "a[others]")
 * @param parameter index of the parameter in the pool
 * @param entry index of the number within the parameter; the number for all other places comes last
 * @param setting its value, bounds and prior
 * @param unit the parameter's unit
 */
public record PoolNumber(String name, int parameter, int entry, Setting setting, String unit) {
    /** Checks that nothing is missing. */
    public PoolNumber {
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(setting, "setting");
        Objects.requireNonNull(unit, "unit");
    }
}
