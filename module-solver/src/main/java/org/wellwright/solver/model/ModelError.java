package org.wellwright.solver.model;

import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import org.wellwright.solver.units.ExactNumber;

/**
 * How far a model itself may be wrong: σ_mod, added in quadrature to the measured σ.
 *
 * @param parts one per data group, and at most one for all data that no other part names; empty for none
 */
public record ModelError(List<Part> parts) {
    /** The model is taken as exact. */
    public static final ModelError NONE = new ModelError(List.of());

    /** What σ_mod is measured by. */
    public enum Measure {
        /** A fixed amount in the unit given. */
        ABSOLUTE,
        /** A fraction of the measured value. */
        RELATIVE
    }

    /**
     * σ_mod of one group of data.
     *
     * @param group id of a data group; empty for all data that no other part names
     * @param measure absolute or relative
     * @param value σ_mod, ≥ 0 (> 0 where it is fitted: the value to start with)
     * @param unit unit of an absolute σ_mod; empty where it is relative
     * @param fitted whether a fit finds it by maximum likelihood
     */
    public record Part(String group, Measure measure, ExactNumber value, String unit, boolean fitted) {
        /** Checks the value. */
        public Part {
            Objects.requireNonNull(group, "group");
            Objects.requireNonNull(measure, "measure");
            Objects.requireNonNull(unit, "unit");
            if (value.sign() < 0 || fitted && value.sign() == 0) {
                throw new IllegalArgumentException(
                        "a model error must be >= 0, and > 0 to start a fit of it, got " + value);
            }
            if (measure == Measure.RELATIVE && !unit.isEmpty()) {
                throw new IllegalArgumentException("a relative model error has no unit, got '%s'".formatted(unit));
            }
        }

        /** The same with another σ_mod. */
        public Part withValue(double newValue) {
            return new Part(group, measure, ExactNumber.of(newValue), unit, fitted);
        }
    }

    /** Copies the list and checks that no group comes twice. */
    public ModelError {
        parts = List.copyOf(parts);
        Set<String> seen = new HashSet<>();
        for (Part part : parts) {
            if (!seen.add(part.group())) {
                throw new IllegalArgumentException(
                        "the model error of group '%s' is given twice".formatted(part.group()));
            }
        }
    }
}
