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
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.XyPainter;

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
        Figures.require(this, request);
        RadialQuantity quantity = RadialQuantity.of(request.variant());
        XyPainter.paint(
                target,
                width,
                height,
                RadialPlot.of(request.input(), request.selection(), quantity),
                PlotStyle.of(request));
    }
}
