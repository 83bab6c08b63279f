package org.wellwright.solver.model;

import java.util.List;
import java.util.Objects;
import org.wellwright.solver.potential.Term;

/**
 * What couples two curves of one model.
 *
 * @param first name of one curve
 * @param second name of the other curve
 * @param terms the coupling, a sum of terms
 */
public record CurveCoupling(String first, String second, List<Term> terms) {
    /** Copies the list and checks that the curves differ. */
    public CurveCoupling {
        Objects.requireNonNull(second, "second");
        terms = List.copyOf(terms);
        if (first.equals(second)) {
            throw new IllegalArgumentException(
                    "a coupling joins two different curves, got '%s' twice".formatted(first));
        }
    }
}
