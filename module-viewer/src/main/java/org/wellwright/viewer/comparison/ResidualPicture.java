package org.wellwright.viewer.comparison;

import java.awt.Graphics2D;
import org.wellwright.viewer.comparison.ResidualPainter.PlacedMark;
import org.wellwright.viewer.plot.Picture;
import org.wellwright.viewer.plot.PlotFrame;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.Ticks;
import org.wellwright.viewer.plot.Viewport;

/**
 * The residuals as a picture.
 *
 * @param plot what it shows
 */
record ResidualPicture(ResidualPlot plot) implements Picture {
    @Override
    public boolean movesAcross() {
        return true;
    }

    @Override
    public boolean movesUp() {
        return false;
    }

    @Override
    public Painted paint(Graphics2D g, int width, int height, PlotStyle style, Viewport view) {
        return new Pointed(plot, ResidualPainter.paint(g, width, height, plot, style, view), style.em() * 0.7);
    }

    private record Pointed(ResidualPlot plot, ResidualPainter.Painted painted, double reach) implements Painted {
        @Override
        public PlotFrame.Area area() {
            return painted.area();
        }

        @Override
        public Spot at(double x, double y) {
            PlacedMark nearest = null;
            double best = reach;
            for (PlacedMark mark : painted.marks()) {
                double distance = Math.hypot(mark.x() - x, mark.y() - y);
                if (distance <= best) {
                    best = distance;
                    nearest = mark;
                }
            }
            if (nearest == null) {
                return null;
            }
            String model = plot.models().get(nearest.model()).model();
            String text = "%s, %s\n(measured − calculated)/σ = %s%s"
                    .formatted(
                            nearest.row().label(),
                            model,
                            Ticks.number(nearest.row().residuals().get(nearest.model()), 4),
                            nearest.row().used() ? "" : "\nnot counted");
            return new Spot(text, model, nearest.row().level());
        }
    }
}
