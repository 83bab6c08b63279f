package org.wellwright.solver.potential;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;

/**
 * A member of a {@link PotentialFamily}.
 *
 * @param frame what surrounds it
 * @param family id of the family
 * @param arguments what stands for each of the family's parameters, by {@link FamilyParameter#name()}; the order is
 *     kept
 */
public record FamilyTerm(TermFrame frame, String family, Map<String, Argument> arguments) implements Term {
    /** Copies the arguments. */
    public FamilyTerm {
        Objects.requireNonNull(frame, "frame");
        Objects.requireNonNull(family, "family");
        arguments = Collections.unmodifiableMap(new LinkedHashMap<>(arguments));
    }

    @Override
    public FamilyTerm withFrame(TermFrame newFrame) {
        return new FamilyTerm(newFrame, family, arguments);
    }

    /** The same with another argument for one parameter. */
    public FamilyTerm withArgument(String name, Argument argument) {
        Map<String, Argument> changed = new LinkedHashMap<>(arguments);
        changed.put(name, argument);
        return new FamilyTerm(frame, family, changed);
    }
}
