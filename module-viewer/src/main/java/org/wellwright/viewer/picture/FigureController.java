package org.wellwright.viewer.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.concurrent.Executor;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureSelection;
import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.viewer.plot.Picture;

/** Computes the picture of a figure off the event thread, always for the newest request. */
public final class FigureController {
    private static final Logger LOG = Logger.getLogger(FigureController.class.getName());

    private final FigureProvider figure;
    private final Function<FigureRequest, Picture> pictures;
    private final Latest latest;
    private final Executor ui;
    private final Consumer<FigureViewModel> view;

    /**
     * A controller.
     *
     * @param pictures makes the picture of a request that the figure does not find missing
     * @param worker runs the computation
     * @param ui runs the view
     */
    public FigureController(
            FigureProvider figure,
            Function<FigureRequest, Picture> pictures,
            Executor worker,
            Executor ui,
            Consumer<FigureViewModel> view) {
        this.figure = Objects.requireNonNull(figure, "figure");
        this.pictures = Objects.requireNonNull(pictures, "pictures");
        this.latest = new Latest(worker);
        this.ui = Objects.requireNonNull(ui, "ui");
        this.view = Objects.requireNonNull(view, "view");
    }

    /** Shows a request as soon as it is computed. */
    public void show(FigureRequest request) {
        latest.run(() -> {
            FigureViewModel model = model(request);
            ui.execute(() -> view.accept(model));
        });
    }

    private FigureViewModel model(FigureRequest request) {
        try {
            Optional<Problem> missing = figure.missing(request);
            return missing.isPresent()
                    ? new FigureViewModel(null, request, missing.get())
                    : new FigureViewModel(pictures.apply(request), request, null);
        } catch (WellwrightException e) {
            return new FigureViewModel(null, request, e.problem());
        } catch (RuntimeException e) {
            // The outermost wrapper of background work: without it the window would go on showing the picture before.
            LOG.log(Level.WARNING, "the figure '" + figure.id() + "' failed", e);
            return new FigureViewModel(
                    null, request, new Problem("the picture failed: " + e, "", "report this problem"));
        }
    }

    /**
     * The selection after something was pointed at.
     *
     * @param more whether it joins the levels that are selected (or leaves them) instead of taking their place
     */
    public static FigureSelection picked(FigureSelection before, Picture.Spot spot, boolean more) {
        String model = spot.model().isEmpty() ? before.model() : spot.model();
        if (spot.level() == null) {
            return new FigureSelection(model, before.levels(), before.magnetic());
        }
        List<LevelKey> levels = new ArrayList<>(more ? before.levels() : List.of());
        if (!levels.remove(spot.level())) {
            levels.add(spot.level());
        }
        return new FigureSelection(model, levels, magnetic(before.magnetic(), levels));
    }

    /** m of the state in front: as before where its l allows it. */
    private static int magnetic(int before, List<LevelKey> levels) {
        int most = levels.isEmpty() ? 0 : Math.max(0, levels.get(0).channel().orbital());
        return Math.max(-most, Math.min(most, before));
    }
}
