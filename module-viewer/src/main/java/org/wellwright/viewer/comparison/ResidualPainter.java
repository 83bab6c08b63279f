package org.wellwright.viewer.comparison;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.plot.XYPlot;
import org.wellwright.viewer.plot.AxisSpec;
import org.wellwright.viewer.plot.LegendEntry;
import org.wellwright.viewer.plot.PlotFrame;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.ScriptText;
import org.wellwright.viewer.plot.Viewport;

/** Paints residuals: bands of one and two σ, a row per datum, a mark per model. */
final class ResidualPainter {
    private ResidualPainter() {}

    /** A mark that can be pointed at. */
    record PlacedMark(ResidualPlot.Row row, int model, double x, double y) {}

    /** Marks and axes of a painted picture. */
    record Painted(List<PlacedMark> marks, PlotFrame.Area area) {
        Painted {
            marks = List.copyOf(marks);
        }
    }

    static Painted paint(Graphics2D g, int width, int height, ResidualPlot plot, PlotStyle style, Viewport view) {
        int count = plot.rows().size();
        PlotFrame frame = new PlotFrame(
                "Residuals",
                plot.subtitle(),
                legend(plot, style),
                view.horizontal(plot.axis()),
                rows(plot, height, width, style));
        PlotFrame.Area area = frame.paint(g, width, height, style, new XYPlot(), PlotFrame.Space.NONE);
        band(g, area, plot.place(2), style);
        band(g, area, plot.place(1), style);
        g.setColor(style.theme().axis());
        g.setStroke(style.hairline());
        g.draw(new Line2D.Double(
                area.x(0), area.area().getMinY(), area.x(0), area.area().getMaxY()));
        double rowHeight = area.area().getHeight() / Math.max(1, count);
        double radius = Math.min(style.em() * 0.34, Math.max(style.em() * 0.16, rowHeight * 0.3));
        List<PlacedMark> marks = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            ResidualPlot.Row row = plot.rows().get(i);
            double middle = area.y(count - 1 - i);
            if (row.selected()) {
                g.setColor(PlotStyle.faded(style.theme().selection(), 0.18));
                g.fill(new Rectangle2D.Double(
                        area.area().getX(), middle - rowHeight / 2, area.area().getWidth(), rowHeight));
            }
            g.setColor(style.theme().grid());
            g.draw(new Line2D.Double(area.area().getX(), middle, area.area().getMaxX(), middle));
            marks.addAll(marks(g, plot, row, middle, rowHeight, radius, area, style));
        }
        return new Painted(marks, area);
    }

    private static List<PlacedMark> marks(
            Graphics2D g,
            ResidualPlot plot,
            ResidualPlot.Row row,
            double middle,
            double rowHeight,
            double radius,
            PlotFrame.Area area,
            PlotStyle style) {
        List<PlacedMark> marks = new ArrayList<>();
        int models = plot.models().size();
        double apart = models > 1 ? Math.min(2.2 * radius, 0.5 * rowHeight / (models - 1)) : 0;
        for (int k = 0; k < models; k++) {
            double residual = row.residuals().get(k);
            if (!Double.isFinite(residual)) {
                continue;
            }
            int series = plot.models().get(k).series();
            double x = area.x(plot.place(residual));
            if (x < area.area().getMinX() || x > area.area().getMaxX()) {
                continue;
            }
            double y = middle + (k - 0.5 * (models - 1)) * apart;
            Color colour = style.theme().seriesColour(series);
            g.setColor(row.used() ? colour : PlotStyle.faded(colour, 0.35));
            g.fill(LegendEntry.Sign.mark(series).around(x, y, radius));
            marks.add(new PlacedMark(row, k, x, y));
        }
        return marks;
    }

    private static List<LegendEntry> legend(ResidualPlot plot, PlotStyle style) {
        List<LegendEntry> legend = new ArrayList<>();
        for (ResidualPlot.Entry entry : plot.models()) {
            Color colour = style.theme().seriesColour(entry.series());
            legend.add(new LegendEntry(entry.text(), LegendEntry.Sign.mark(entry.series()), colour, style.hairline()));
        }
        legend.add(new LegendEntry(
                "±1 σ, ±2 σ",
                LegendEntry.Sign.BOX,
                PlotStyle.faded(style.theme().axis(), 0.2),
                style.hairline()));
        if (plot.rows().stream().anyMatch(row -> !row.used())) {
            legend.add(new LegendEntry(
                    "not counted",
                    LegendEntry.Sign.CIRCLE,
                    PlotStyle.faded(style.theme().text(), 0.35),
                    style.hairline()));
        }
        return legend;
    }

    /** The names of the data as ticks; where rows are lower than a line, only every second, third, … is named. */
    private static AxisSpec rows(ResidualPlot plot, int height, int width, PlotStyle style) {
        int count = Math.max(1, plot.rows().size());
        double line = ScriptText.lineHeight(style.smallFont());
        double room = Math.max(line, height - style.em() * 9);
        int every = (int) Math.max(1, Math.ceil(line * count / room));
        List<AxisSpec.Tick> ticks = new ArrayList<>();
        for (int i = 0; i < plot.rows().size(); i += every) {
            ticks.add(new AxisSpec.Tick(
                    count - 1.0 - i,
                    ScriptText.fitted(style.smallFont(), plot.rows().get(i).label(), width * 0.3)));
        }
        return new AxisSpec("", -0.6, count - 0.4, ticks, true);
    }

    private static void band(Graphics2D g, PlotFrame.Area area, double half, PlotStyle style) {
        double left = Math.max(area.x(-half), area.area().getX());
        double right = Math.max(left, Math.min(area.x(half), area.area().getMaxX()));
        g.setColor(PlotStyle.faded(style.theme().axis(), 0.1));
        g.fill(new Rectangle2D.Double(
                left, area.area().getY(), right - left, area.area().getHeight()));
    }
}
