package org.wellwright.viewer.radial;

import java.awt.Graphics2D;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.solver.Problem;
import org.wellwright.viewer.plot.Figures;
import org.wellwright.viewer.plot.Picture;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.Viewport;
import org.wellwright.viewer.plot.XyPicture;

/** Radial functions of the selected levels. */
@ServiceProvider(service = FigureProvider.class, position = 300)
public final class RadialFigure implements FigureProvider {
    @Override
    public String id() {
        return "radial";
    }

    @Override
    public String title() {
        return "Radial functions";
    }

    @Override
    public int position() {
        return 300;
    }

    @Override
    public List<Variant> variants() {
        return Arrays.stream(RadialQuantity.values())
                .map(RadialQuantity::variant)
                .toList();
    }

    @Override
    public Optional<Problem> missing(FigureRequest request) {
        return Figures.missingState(request);
    }

    @Override
    public void paint(Graphics2D target, int width, int height, FigureRequest request) {
        picture(request).paint(target, width, height, PlotStyle.of(request), Viewport.ALL);
    }

    /** The picture of a request that can be drawn. */
    static Picture picture(FigureRequest request) {
        Figures.require(new RadialFigure(), request);
        RadialQuantity quantity = RadialQuantity.of(request.variant());
        return new XyPicture(RadialPlot.of(request.input(), request.selection(), quantity));
    }
}
