package org.wellwright.viewer.comparison;

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

/** Residuals in σ of every datum and model. */
@ServiceProvider(service = FigureProvider.class, position = 150)
public final class ComparisonFigure implements FigureProvider {
    @Override
    public String id() {
        return "comparison";
    }

    @Override
    public String title() {
        return "Residuals";
    }

    @Override
    public int position() {
        return 150;
    }

    @Override
    public List<Variant> variants() {
        return List.of(new Variant("residuals", "Residuals in σ"));
    }

    @Override
    public Optional<Problem> missing(FigureRequest request) {
        if (request.input().document().data().isEmpty()) {
            return Optional.of(new Problem("there are no data to compare with", "", "add measured levels or lines"));
        }
        if (request.input().comparison() == null
                || request.input().comparison().models().isEmpty()) {
            return Optional.of(new Problem("no model is compared with the data", "", "add a model that can be solved"));
        }
        return Optional.empty();
    }

    @Override
    public void paint(Graphics2D target, int width, int height, FigureRequest request) {
        picture(request).paint(target, width, height, PlotStyle.of(request), Viewport.ALL);
    }

    /** The picture of a request that can be drawn. */
    static Picture picture(FigureRequest request) {
        Figures.require(new ComparisonFigure(), request);
        return new ResidualPicture(ResidualPlot.of(request.input(), request.selection()));
    }
}
