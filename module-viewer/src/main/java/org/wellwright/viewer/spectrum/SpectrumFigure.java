package org.wellwright.viewer.spectrum;

import java.awt.Graphics2D;
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

/** Calculated lines of all models beside the measured ones. */
@ServiceProvider(service = FigureProvider.class, position = 500)
public final class SpectrumFigure implements FigureProvider {
    @Override
    public String id() {
        return "spectrum";
    }

    @Override
    public String title() {
        return "Lines";
    }

    @Override
    public int position() {
        return 500;
    }

    @Override
    public List<Variant> variants() {
        return List.of(new Variant("lines", "Lines by transition energy"));
    }

    @Override
    public Optional<Problem> missing(FigureRequest request) {
        if (!request.input().lines().isEmpty()) {
            return Optional.empty();
        }
        Optional<Problem> nothing = Figures.nothingSolved(request.input());
        return nothing.isPresent()
                ? nothing
                : Optional.of(new Problem(
                        "no line joins the levels that are solved", "", "ask for levels whose l differs by one"));
    }

    @Override
    public void paint(Graphics2D target, int width, int height, FigureRequest request) {
        picture(request).paint(target, width, height, PlotStyle.of(request), Viewport.ALL);
    }

    /** The picture of a request that can be drawn. */
    static Picture picture(FigureRequest request) {
        Figures.require(new SpectrumFigure(), request);
        return new SpectrumPicture(LineSpectrum.of(request.input(), request.selection()));
    }
}
