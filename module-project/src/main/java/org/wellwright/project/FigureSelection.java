package org.wellwright.project;

import java.util.List;
import java.util.Objects;
import org.wellwright.solver.model.LevelKey;

/**
 * What the user picked, for figures that show part of a project.
 *
 * @param model name of the model in front; empty for the first
 * @param levels the levels in front, the first leads; empty for the figure's own choice
 * @param magnetic m of the state in a density
 */
public record FigureSelection(String model, List<LevelKey> levels, int magnetic) {
    /** Nothing picked. */
    public static final FigureSelection NONE = new FigureSelection("", List.of(), 0);

    /** Copies the list. */
    public FigureSelection {
        Objects.requireNonNull(model, "model");
        levels = List.copyOf(levels);
    }
}
