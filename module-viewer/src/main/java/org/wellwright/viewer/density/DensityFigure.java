package org.wellwright.viewer.density;

import java.awt.Graphics2D;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.viewer.plot.Figures;
import org.wellwright.viewer.plot.Picks;
import org.wellwright.viewer.plot.Picture;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.Viewport;

/** A slice of |R_nl Y_lm|² of the selected level. */
@ServiceProvider(service = FigureProvider.class, position = 400)
public final class DensityFigure implements FigureProvider {
    @Override
    public String id() {
        return "density";
    }

    @Override
    public String title() {
        return "Density";
    }

    @Override
    public int position() {
        return 400;
    }

    @Override
    public List<Variant> variants() {
        return Arrays.stream(DensityPlane.Plane.values())
                .map(DensityPlane.Plane::variant)
                .toList();
    }

    @Override
    public Optional<Problem> missing(FigureRequest request) {
        Optional<Problem> missing = Figures.missingState(request);
        if (missing.isPresent()) {
            return missing;
        }
        LevelKey key = Picks.levels(Picks.model(request.input(), request.selection()), request.selection(), 1)
                .get(0);
        int magnetic = request.selection().magnetic();
        if (key.channel().coupled()) {
            return Optional.of(
                    new Problem("a state of several l has no single density here", "", "choose a level of one l"));
        }
        if (Math.abs(magnetic) > key.channel().orbital()) {
            return Optional.of(new Problem(
                    "m = %d does not go with l = %d"
                            .formatted(magnetic, key.channel().orbital()),
                    "",
                    "m lies between -l and l"));
        }
        return Optional.empty();
    }

    @Override
    public void paint(Graphics2D target, int width, int height, FigureRequest request) {
        picture(request).paint(target, width, height, PlotStyle.of(request), Viewport.ALL);
    }

    /** The picture of a request that can be drawn. */
    static Picture picture(FigureRequest request) {
        Figures.require(new DensityFigure(), request);
        DensityPlane.Plane plane = DensityPlane.Plane.of(request.variant());
        return new DensityPicture(DensityPlane.of(request.input(), request.selection(), plane));
    }
}
