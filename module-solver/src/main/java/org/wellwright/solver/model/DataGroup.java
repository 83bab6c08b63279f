package org.wellwright.solver.model;

import java.util.Objects;
import org.wellwright.solver.units.ExactNumber;

/**
 * Data that share an unknown error, solved as a nuisance parameter.
 *
 * @param id identifier, unique in the project
 * @param title name on screen; may be empty
 * @param kind how the error acts
 * @param sigma its standard uncertainty, > 0; null for an unknown offset, of which nothing is known beforehand
 * @param unit unit of an additive error or an unknown offset; empty for a multiplicative one
 */
public record DataGroup(String id, String title, Kind kind, ExactNumber sigma, String unit) {
    /** How the shared error acts. */
    public enum Kind {
        /** value = model + b, b with mean 0 and σ in the unit given. */
        ADDITIVE,
        /** value = model·(1 + b), b with mean 0 and σ a pure number. */
        MULTIPLICATIVE,
        /** value = model + b, b unknown. */
        UNKNOWN_OFFSET,
        /** The data share a name, for σ_mod or for sorting, and no error. */
        PLAIN
    }

    /** Checks what belongs together. */
    public DataGroup {
        Objects.requireNonNull(title, "title");
        Objects.requireNonNull(kind, "kind");
        Objects.requireNonNull(unit, "unit");
        if (id.isBlank()) {
            throw new IllegalArgumentException("a data group needs an id");
        }
        boolean needsSigma = kind == Kind.ADDITIVE || kind == Kind.MULTIPLICATIVE;
        if (needsSigma && (sigma == null || sigma.sign() <= 0)) {
            throw new IllegalArgumentException("the group '%s' needs a sigma > 0, got %s".formatted(id, sigma));
        }
        if (!needsSigma && sigma != null) {
            throw new IllegalArgumentException("the group '%s' has no use for a sigma".formatted(id));
        }
        if (kind == Kind.MULTIPLICATIVE && !unit.isEmpty()) {
            throw new IllegalArgumentException(
                    "the group '%s' is multiplicative and has no unit, got '%s'".formatted(id, unit));
        }
    }
}
