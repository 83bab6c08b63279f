package org.wellwright.viewer.potential;

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
import org.wellwright.viewer.plot.XyPicture;

/** The potentials of all models in one channel with the levels of the model in front. */
@ServiceProvider(service = FigureProvider.class, position = 200)
public final class PotentialFigure implements FigureProvider {
    static final Variant BARE = new Variant("bare", "V(r)");
    static final Variant EFFECTIVE = new Variant("effective", "V(r) with the centrifugal term");

    @Override
    public String id() {
        return "potential";
    }

    @Override
    public String title() {
        return "Potential with levels";
    }

    @Override
    public int position() {
        return 200;
    }

    @Override
    public List<Variant> variants() {
        return List.of(BARE, EFFECTIVE);
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
        Figures.require(new PotentialFigure(), request);
        boolean effective = request.variant().equals(EFFECTIVE.id());
        return new XyPicture(PotentialPlot.of(request.input(), request.selection(), effective));
    }
}
