package org.wellwright.viewer.plot;

import java.util.Optional;
import java.util.stream.Collectors;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.SolvedModel;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;

/** Checks that figures have in common. */
public final class Figures {
    private Figures() {}

    /** Says so if no model has a level; names the first fault that solving met. */
    public static Optional<Problem> nothingSolved(FigureInput input) {
        for (SolvedModel model : input.models()) {
            if (model.channels().stream()
                    .anyMatch(channel -> !channel.spectrum().levels().isEmpty())) {
                return Optional.empty();
            }
        }
        for (SolvedModel model : input.models()) {
            if (!model.problems().isEmpty()) {
                return Optional.of(model.problems().get(0));
            }
        }
        return Optional.of(new Problem(
                "no level is solved", "", "add a model that binds, and name levels in the data or ask for some"));
    }

    /** Says so if the model in front has no level, or not the one that is selected. */
    public static Optional<Problem> missingState(FigureRequest request) {
        Optional<Problem> nothing = nothingSolved(request.input());
        if (nothing.isPresent()) {
            return nothing;
        }
        SolvedModel model = Picks.model(request.input(), request.selection());
        if (model == null) {
            return Optional.of(new Problem(
                    "the model '%s' has no levels".formatted(request.selection().model()), "", "choose another model"));
        }
        if (Picks.levels(model, request.selection(), 1).isEmpty()) {
            String names = request.selection().levels().stream()
                    .map(LevelText.of(request.input().document())::full)
                    .collect(Collectors.joining(", "));
            return Optional.of(new Problem(
                    "the model '%s' has no level %s".formatted(model.model(), names),
                    "",
                    "choose one of its levels, or ask for more of them"));
        }
        return Optional.empty();
    }

    /**
     * Refuses a picture that cannot be drawn.
     *
     * @throws InvalidModelException with what {@link FigureProvider#missing} says
     */
    public static void require(FigureProvider figure, FigureRequest request) {
        Optional<Problem> missing = figure.missing(request);
        if (missing.isPresent()) {
            throw new InvalidModelException(missing.get());
        }
    }
}
