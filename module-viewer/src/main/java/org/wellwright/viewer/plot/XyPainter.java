package org.wellwright.viewer.plot;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Paint;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** Paints an x–y picture: JFreeChart draws axes and curves, then come the rungs with labels that do not overlap. */
final class XyPainter {
    private XyPainter() {}

    /** A rung's label and its box. */
    record PlacedLabel(XyPlotModel.Rung rung, Rectangle2D box) {}

    /** Paints into (0, 0, width, height) and tells where the axes stand. */
    static PlotFrame.Area paint(Graphics2D g, int width, int height, XyPlotModel model, PlotStyle style) {
        PlotFrame frame = new PlotFrame(
                model.title(), model.subtitle(), legend(model, style), model.horizontal(), model.vertical());
        XYPlot plot = plot(model, style);
        PlotFrame.Area area = frame.paint(g, width, height, style, plot, PlotFrame.Space.NONE);
        Shape clip = g.getClip();
        g.clip(area.area());
        for (XyPlotModel.Rung rung : model.rungs()) {
            g.setColor(
                    rung.selected() ? style.theme().selection() : style.theme().seriesColour(rung.series()));
            g.setStroke(new BasicStroke(style.em() * (rung.selected() ? 0.2f : 0.1f)));
            double y = area.y(rung.at());
            g.draw(new Line2D.Double(area.x(rung.from()), y, area.x(rung.to()), y));
        }
        g.setClip(clip);
        for (PlacedLabel label : labels(model, area, style)) {
            Rectangle2D box = label.box();
            g.setColor(PlotStyle.faded(style.theme().plotGround(), 0.75));
            g.fill(new Rectangle2D.Double(
                    box.getX() - 1, box.getY() + box.getHeight() * 0.1, box.getWidth() + 2, box.getHeight() * 0.8));
            g.setColor(
                    label.rung().selected()
                            ? style.theme().selection()
                            : style.theme().text());
            ScriptText.draw(
                    g,
                    style.smallFont(),
                    label.rung().label(),
                    box.getX(),
                    box.getCenterY() + ScriptText.ascent(style.smallFont()) * 0.37);
        }
        return area;
    }

    private static List<LegendEntry> legend(XyPlotModel model, PlotStyle style) {
        List<LegendEntry> legend = new ArrayList<>();
        for (XyPlotModel.Curve curve : model.curves()) {
            if (!curve.name().isEmpty()) {
                legend.add(new LegendEntry(
                        curve.name(),
                        LegendEntry.Sign.LINE,
                        style.theme().seriesColour(curve.series()),
                        style.seriesStroke(curve.series())));
            }
        }
        return legend;
    }

    private static XYPlot plot(XyPlotModel model, PlotStyle style) {
        XYSeriesCollection data = new XYSeriesCollection();
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false) {
            private static final long serialVersionUID = 1L;

            // The theme gives colours by position, curves bring their own.
            @Override
            public Paint getSeriesPaint(int series) {
                XyPlotModel.Curve curve = model.curves().get(series);
                Color colour = style.theme().seriesColour(curve.series());
                return curve.quiet() ? PlotStyle.faded(colour, 0.45) : colour;
            }

            @Override
            public Stroke getSeriesStroke(int series) {
                return style.seriesStroke(model.curves().get(series).series());
            }
        };
        renderer.setDrawSeriesLineAsPath(true);
        for (int i = 0; i < model.curves().size(); i++) {
            Points points = model.curves().get(i).points();
            XYSeries series = new XYSeries(i, false, true);
            for (int k = 0; k < points.size(); k++) {
                series.add(points.x(k), Double.isFinite(points.y(k)) ? Double.valueOf(points.y(k)) : null, false);
            }
            data.addSeries(series);
        }
        XYPlot plot = new XYPlot(data, null, null, renderer);
        plot.setRangeZeroBaselineVisible(model.baseline());
        return plot;
    }

    /**
     * Labels right of their rungs; where two would overlap, the later one moves right, and is left out where there is
     * no more room.
     */
    static List<PlacedLabel> labels(XyPlotModel model, PlotFrame.Area area, PlotStyle style) {
        double line = ScriptText.lineHeight(style.smallFont());
        List<XyPlotModel.Rung> order = new ArrayList<>(model.rungs());
        order.sort(Comparator.comparing(XyPlotModel.Rung::selected).reversed());
        List<PlacedLabel> placed = new ArrayList<>();
        for (XyPlotModel.Rung rung : order) {
            double y = area.y(rung.at());
            if (rung.label().isEmpty()
                    || y < area.area().getMinY() + line / 2
                    || y > area.area().getMaxY() - line / 2) {
                continue;
            }
            double width = ScriptText.width(style.smallFont(), rung.label());
            double x = Math.min(
                    Math.max(area.x(rung.to()), area.area().getX()) + style.em() * 0.4,
                    area.area().getMaxX() - width);
            Rectangle2D box = new Rectangle2D.Double(x, y - line / 2, width, line);
            for (int tries = 0; tries < 40 && overlapping(placed, box) != null; tries++) {
                double right = overlapping(placed, box).getMaxX() + style.em() * 0.5;
                box.setRect(right, box.getY(), width, line);
            }
            if (box.getMaxX() <= area.area().getMaxX() + 0.5 && overlapping(placed, box) == null) {
                placed.add(new PlacedLabel(rung, box));
            }
        }
        return placed;
    }

    private static Rectangle2D overlapping(List<PlacedLabel> placed, Rectangle2D box) {
        for (PlacedLabel label : placed) {
            if (label.box().intersects(box)) {
                return label.box();
            }
        }
        return null;
    }
}
