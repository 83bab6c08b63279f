package org.wellwright.project;

import java.util.List;
import java.util.Objects;
import org.wellwright.solver.model.LevelKey;

/**
 * What is selected in the selected project; every window follows it.
 *
 * @param model name of the selected model; empty for the project's first
 * @param levels the selected levels, in the order they were selected
 */
public record Selection(String model, List<LevelKey> levels) {
    /** Nothing in particular. */
    public static final Selection NONE = new Selection("", List.of());

    /** Copies the list. */
    public Selection {
        Objects.requireNonNull(model, "model");
        levels = List.copyOf(levels);
    }
}
