package org.wellwright.viewer.spectrum;

import java.awt.Graphics2D;
import org.wellwright.viewer.plot.Picture;
import org.wellwright.viewer.plot.PlotFrame;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.Viewport;

/**
 * The line spectrum as a picture.
 *
 * @param spectrum what it shows
 */
record SpectrumPicture(LineSpectrum spectrum) implements Picture {
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
        return new Pointed(spectrum, SpectrumPainter.paint(g, width, height, spectrum, style, view), style.em() * 0.5);
    }

    private record Pointed(LineSpectrum spectrum, PlotFrame.Area area, double reach) implements Painted {
        @Override
        public Spot at(double x, double y) {
            if (spectrum.lanes().isEmpty() || !area.area().contains(x, y)) {
                return null;
            }
            int index = (int) ((y - area.area().getY())
                    / area.area().getHeight()
                    * spectrum.lanes().size());
            LineSpectrum.Lane lane =
                    spectrum.lanes().get(Math.min(index, spectrum.lanes().size() - 1));
            LineSpectrum.Line nearest = null;
            double best = reach;
            for (LineSpectrum.Line line : lane.lines()) {
                double distance = Math.abs(area.x(line.energy()) - x);
                if (distance <= best) {
                    best = distance;
                    nearest = line;
                }
            }
            if (nearest == null) {
                return null;
            }
            String text = "%s, %s\n%s: %s"
                    .formatted(nearest.label(), lane.name(), spectrum.energy().label(), nearest.energy());
            return new Spot(text, lane.measured() ? "" : lane.name(), nearest.upper());
        }
    }
}
