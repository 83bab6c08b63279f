package org.wellwright.solver.pair;

import java.util.Objects;
import org.wellwright.solver.units.ExactNumber;

/** Where a body's mass comes from. */
public sealed interface BodyMass {
    /**
     * The project's pinned mass table.
     *
     * @param particle identifier in the catalogue ("e-", "p", "Na-23")
     */
    record Catalogued(String particle) implements BodyMass {
        /** Checks that the identifier is there. */
        public Catalogued {
            if (particle.isBlank()) {
                throw new IllegalArgumentException("a mass from the catalogue needs a particle");
            }
        }
    }

    /**
     * A value typed by the user.
     *
     * @param value the mass, > 0
     * @param sigma its standard uncertainty, ≥ 0, or null if none is stated
     * @param unit mass unit, or an energy unit for m·c²
     */
    record Typed(ExactNumber value, ExactNumber sigma, String unit) implements BodyMass {
        /** Checks the signs. */
        public Typed {
            Objects.requireNonNull(unit, "unit");
            if (value.sign() <= 0) {
                throw new IllegalArgumentException("a mass must be positive, got " + value);
            }
            if (sigma != null && sigma.sign() < 0) {
                throw new IllegalArgumentException("the sigma of a mass cannot be negative, got " + sigma);
            }
        }
    }

    /**
     * A parameter of the project's pool whose unit is a mass (or energy, for m·c²).
     *
     * @param parameter its name
     */
    record FromParameter(String parameter) implements BodyMass {
        /** Checks that the name is there. */
        public FromParameter {
            if (parameter.isBlank()) {
                throw new IllegalArgumentException("a mass that is a parameter needs the parameter's name");
            }
        }
    }
}
