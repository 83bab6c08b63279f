package org.wellwright.viewer.density;

import java.awt.Graphics2D;
import org.wellwright.viewer.plot.Picture;
import org.wellwright.viewer.plot.PlotFrame;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.Ticks;
import org.wellwright.viewer.plot.Viewport;

/**
 * A density that can be zoomed and pointed at.
 *
 * @param plane what it shows
 */
record DensityPicture(DensityPlane plane) implements Picture {
    @Override
    public boolean movesAcross() {
        return true;
    }

    @Override
    public boolean movesUp() {
        return true;
    }

    @Override
    public Painted paint(Graphics2D g, int width, int height, PlotStyle style, Viewport view) {
        return new Pointed(plane, DensityPainter.paint(g, width, height, plane, style, view));
    }

    private record Pointed(DensityPlane plane, PlotFrame.Area area) implements Painted {
        @Override
        public Spot at(double x, double y) {
            if (!area.area().contains(x, y)) {
                return null;
            }
            double across = area.valueAtX(x);
            double up = area.valueAtY(y);
            String text = "%s = %s %s, %s = %s %s\n|ψ|² = %s %s"
                    .formatted(
                            plane.plane().across(),
                            Ticks.number(across, 4),
                            plane.lengthUnit(),
                            plane.plane().up(),
                            Ticks.number(up, 4),
                            plane.lengthUnit(),
                            Ticks.number(plane.at(across, up), 4),
                            DensityPainter.unit(plane));
            return new Spot(text, "", null);
        }
    }
}
