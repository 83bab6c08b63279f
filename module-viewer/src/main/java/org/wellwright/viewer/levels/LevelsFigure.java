package org.wellwright.viewer.levels;

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

/** The level diagram of all models beside the measured levels. */
@ServiceProvider(service = FigureProvider.class, position = 100)
public final class LevelsFigure implements FigureProvider {
    @Override
    public String id() {
        return "levels";
    }

    @Override
    public String title() {
        return "Level diagram";
    }

    @Override
    public int position() {
        return 100;
    }

    @Override
    public List<Variant> variants() {
        return List.of(new Variant("all", "All levels"));
    }

    @Override
    public Optional<Problem> missing(FigureRequest request) {
        return request.input().measured().isEmpty() ? Figures.nothingSolved(request.input()) : Optional.empty();
    }

    @Override
    public void paint(Graphics2D target, int width, int height, FigureRequest request) {
        picture(request).paint(target, width, height, PlotStyle.of(request), Viewport.ALL);
    }

    /** The picture of a request that can be drawn. */
    static Picture picture(FigureRequest request) {
        Figures.require(new LevelsFigure(), request);
        String unit = request.input().units().energy().printed();
        return new LevelsPicture(LevelDiagram.of(request.input(), request.selection()), unit);
    }
}
