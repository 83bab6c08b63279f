package org.wellwright.solver.pair;

import java.util.Objects;
import org.wellwright.solver.units.ExactNumber;

/**
 * A pair of bodies bound by a central force. Isotopologues are systems of one project.
 *
 * @param id identifier, unique in the project
 * @param title name on screen; may be empty
 * @param first one body
 * @param second the other body
 * @param massConvention which masses enter the kinetic energy
 * @param exchange what exchanging the bodies does
 * @param permittivity relative permittivity of the medium, > 0 (1 in vacuum); divides charge–charge terms that ask for
 *     it
 * @param abundance natural fraction of this isotopologue in [0, 1], or null if it plays no role
 */
public record PairSystem(
        String id,
        String title,
        Body first,
        Body second,
        MassConvention massConvention,
        ExchangeSymmetry exchange,
        ExactNumber permittivity,
        ExactNumber abundance) {

    /** Checks identifiers and ranges. */
    public PairSystem {
        Objects.requireNonNull(title, "title");
        Objects.requireNonNull(first, "first");
        Objects.requireNonNull(second, "second");
        Objects.requireNonNull(massConvention, "massConvention");
        Objects.requireNonNull(exchange, "exchange");
        if (id.isBlank()) {
            throw new IllegalArgumentException("a pair system needs an id");
        }
        if (permittivity.sign() <= 0) {
            throw new IllegalArgumentException("the relative permittivity must be positive, got " + permittivity);
        }
        if (abundance != null && !(abundance.value() >= 0 && abundance.value() <= 1)) {
            throw new IllegalArgumentException("an abundance lies between 0 and 1, got " + abundance);
        }
    }

    /** A system in vacuum of two distinguishable bodies of the catalogue, with the masses as tabulated. */
    public static PairSystem of(String id, Body first, Body second) {
        return new PairSystem(
                id, "", first, second, MassConvention.ATOMIC, ExchangeSymmetry.DISTINGUISHABLE, ExactNumber.ONE, null);
    }
}
