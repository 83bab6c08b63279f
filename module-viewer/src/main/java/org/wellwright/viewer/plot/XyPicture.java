package org.wellwright.viewer.plot;

import java.awt.Graphics2D;

/**
 * An x–y picture that can be zoomed and pointed at: a rung tells what it is, any other place its values.
 *
 * @param model what it shows
 */
public record XyPicture(XyPlotModel model) implements Picture {
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
        XyPlotModel shown = model.over(view.horizontal(model.horizontal()), view.vertical(model.vertical()));
        return new Pointed(shown, XyPainter.paint(g, width, height, shown, style), style.em() * 0.5);
    }

    private record Pointed(XyPlotModel model, PlotFrame.Area area, double reach) implements Painted {
        @Override
        public Spot at(double x, double y) {
            if (!area.area().contains(x, y)) {
                return null;
            }
            Spot nearest = null;
            double best = reach;
            for (XyPlotModel.Rung rung : model.rungs()) {
                boolean beside = x >= area.x(rung.from()) - reach && x <= area.x(rung.to()) + 5 * reach;
                double distance = Math.abs(area.y(rung.at()) - y);
                if (beside && distance <= best) {
                    best = distance;
                    nearest = rung.spot();
                }
            }
            return nearest != null ? nearest : new Spot(place(x, y), "", null);
        }

        private String place(double x, double y) {
            return "%s: %s\n%s: %s"
                    .formatted(
                            model.horizontal().label(),
                            Ticks.number(area.valueAtX(x), 4),
                            model.vertical().label(),
                            Ticks.number(area.valueAtY(y), 4));
        }
    }
}
