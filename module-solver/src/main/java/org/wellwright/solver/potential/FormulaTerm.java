package org.wellwright.solver.potential;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;

/**
 * A formula V(r); its numbers are in the project's unit system. It may be mistyped: a faulty formula is kept with its
 * project and fails when used.
 *
 * @param frame what surrounds it
 * @param text the formula as typed
 * @param arguments what stands for a name in the formula; a name that is not here is the pool's parameter of that name
 */
public record FormulaTerm(TermFrame frame, String text, Map<String, Argument> arguments) implements Term {
    /** Copies the arguments. */
    public FormulaTerm {
        Objects.requireNonNull(frame, "frame");
        Objects.requireNonNull(text, "text");
        arguments = Collections.unmodifiableMap(new LinkedHashMap<>(arguments));
    }

    @Override
    public FormulaTerm withFrame(TermFrame newFrame) {
        return new FormulaTerm(newFrame, text, arguments);
    }

    /** What stands for a name of the formula. */
    public Argument argument(String name) {
        Argument given = arguments.get(name);
        return given == null ? Argument.named(name) : given;
    }
}
