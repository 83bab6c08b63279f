package org.wellwright.viewer.plot;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.SolvedChannel;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.model.LevelKey;

/** What a picture of part of a project shows when the selection leaves it open. */
public final class Picks {
    private Picks() {}

    /** The selected model if it has levels, otherwise the first that has; null if none has. */
    public static SolvedModel model(FigureInput input, FigureSelection selection) {
        SolvedModel chosen = input.model(selection.model());
        if (chosen != null && solved(chosen)) {
            return chosen;
        }
        if (!selection.model().isEmpty()) {
            return null;
        }
        for (SolvedModel model : input.models()) {
            if (solved(model)) {
                return model;
            }
        }
        return null;
    }

    /** The channel of the first selected level, otherwise the model's first that has levels. */
    public static SolvedChannel channel(SolvedModel model, FigureSelection selection) {
        for (LevelKey key : selection.levels()) {
            SolvedChannel channel = model.channelOf(key);
            if (channel != null && !channel.spectrum().levels().isEmpty()) {
                return channel;
            }
        }
        for (SolvedChannel channel : model.channels()) {
            if (!channel.spectrum().levels().isEmpty()) {
                return channel;
            }
        }
        return null;
    }

    /** The selected levels that the model has; the lowest {@code most} of the first channel if none is selected. */
    public static List<LevelKey> levels(SolvedModel model, FigureSelection selection, int most) {
        List<LevelKey> levels = new ArrayList<>();
        for (LevelKey key : selection.levels()) {
            SolvedChannel channel = model.channelOf(key);
            if (channel != null && channel.level(key.index()) != null) {
                levels.add(key);
            }
        }
        if (levels.isEmpty() && selection.levels().isEmpty()) {
            List<LevelKey> keys = channel(model, selection).keys();
            levels.addAll(keys.subList(0, Math.min(most, keys.size())));
        }
        return List.copyOf(levels);
    }

    private static boolean solved(SolvedModel model) {
        return model.channels().stream()
                .anyMatch(channel -> !channel.spectrum().levels().isEmpty());
    }
}
