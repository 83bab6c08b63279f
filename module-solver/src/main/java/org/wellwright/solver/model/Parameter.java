package org.wellwright.solver.model;

import java.util.Objects;

/**
 * A named number (or family of numbers) of the project's pool. Masses, energy origins and thresholds are parameters
 * like any other.
 *
 * @param name its name in terms and formulas: a letter, then letters, digits and underscores, then an index in brackets
 *     where formulas need one ("b[0]"); unique in the pool
 * @param unit unit expression of all its numbers ("eV nm", "1/angstrom"); empty for a pure number
 * @param convention what exactly the number is where there is a choice ("a, not 4 alpha_s/3"); empty if there is none
 * @param shape its numbers
 */
public record Parameter(String name, String unit, String convention, ParameterShape shape) {
    /** Checks the name. */
    public Parameter {
        Objects.requireNonNull(unit, "unit");
        Objects.requireNonNull(convention, "convention");
        Objects.requireNonNull(shape, "shape");
        if (!name.matches("\\p{L}[\\p{L}\\p{N}_]*(\\[\\d{1,4}\\])?")) {
            throw new IllegalArgumentException(
                    "a parameter's name is a letter followed by letters, digits and underscores, got '%s'"
                            .formatted(name));
        }
    }

    /** One number everywhere. */
    public static Parameter scalar(String name, String unit, Setting setting) {
        return new Parameter(name, unit, "", new ParameterShape.Scalar(setting));
    }

    /** The same with other numbers. */
    public Parameter withShape(ParameterShape newShape) {
        return new Parameter(name, unit, convention, newShape);
    }

    /** The same with another name. */
    public Parameter withName(String newName) {
        return new Parameter(newName, unit, convention, shape);
    }

    /** The same with another unit, its numbers as they are. */
    public Parameter withUnit(String newUnit) {
        return new Parameter(name, newUnit, convention, shape);
    }

    /** The same with another convention. */
    public Parameter withConvention(String newConvention) {
        return new Parameter(name, unit, newConvention, shape);
    }
}
