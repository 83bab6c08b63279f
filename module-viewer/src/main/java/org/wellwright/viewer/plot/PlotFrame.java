package org.wellwright.viewer.plot;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.NumberTickUnit;
import org.jfree.chart.axis.ValueTick;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.chart.ui.TextAnchor;

/**
 * The frame of a picture: title and subtitle at the upper left, the legend under them, the name of the vertical axis
 * above it, that of the horizontal axis below its right end, so that no text stands on its side. What stands inside is
 * painted by the caller over the plot.
 *
 * @param title what the picture shows
 * @param subtitle of what; may be empty
 * @param legend the legend in order
 * @param horizontal the horizontal axis
 * @param vertical the vertical axis
 */
public record PlotFrame(
        String title, String subtitle, List<LegendEntry> legend, AxisSpec horizontal, AxisSpec vertical) {
    /** Copies the legend. */
    public PlotFrame {
        Objects.requireNonNull(title, "title");
        Objects.requireNonNull(subtitle, "subtitle");
        Objects.requireNonNull(horizontal, "horizontal");
        Objects.requireNonNull(vertical, "vertical");
        legend = List.copyOf(legend);
    }

    /**
     * Where the data of a painted frame stand.
     *
     * @param area the rectangle inside the axes
     * @param horizontal the horizontal axis
     * @param vertical the vertical axis
     */
    public record Area(Rectangle2D area, AxisSpec horizontal, AxisSpec vertical) {
        /** Horizontal place of a value. */
        public double x(double value) {
            return area.getX()
                    + area.getWidth() * (value - horizontal.lower()) / (horizontal.upper() - horizontal.lower());
        }

        /** Vertical place of a value. */
        public double y(double value) {
            return area.getMaxY()
                    - area.getHeight() * (value - vertical.lower()) / (vertical.upper() - vertical.lower());
        }

        /** The value at a horizontal place. */
        public double valueAtX(double x) {
            return horizontal.lower() + (x - area.getX()) / area.getWidth() * (horizontal.upper() - horizontal.lower());
        }

        /** The value at a vertical place. */
        public double valueAtY(double y) {
            return vertical.lower() + (area.getMaxY() - y) / area.getHeight() * (vertical.upper() - vertical.lower());
        }
    }

    /**
     * Room around the axes for what the caller paints, user-space units.
     *
     * @param top above
     * @param right at the right
     * @param bottom below
     */
    public record Space(double top, double right, double bottom) {
        /** No room. */
        public static final Space NONE = new Space(0, 0, 0);
    }

    /**
     * Paints ground, title, legend and axes with grid.
     *
     * @param plot the plot whose data JFreeChart paints; its axes are set here
     * @param space what to leave free around the axes
     * @return where the data stand
     */
    public Area paint(Graphics2D g, int width, int height, PlotStyle style, XYPlot plot, Space space) {
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        g.setColor(style.theme().ground());
        g.fill(new Rectangle2D.Double(0, 0, width, height));
        double margin = style.em();
        double top = heading(g, width, style, margin);
        double line = ScriptText.lineHeight(style.font());
        if (!vertical.label().isEmpty()) {
            g.setColor(style.theme().text());
            String text = ScriptText.fitted(style.font(), vertical.label(), width - 2 * margin);
            ScriptText.draw(g, style.font(), text, margin, top + ScriptText.ascent(style.font()));
        }
        top += line * (vertical.label().isEmpty() ? 0.3 : 1.25) + space.top();
        double foot = margin * 0.7 + space.bottom() + (horizontal.label().isEmpty() ? 0 : line * 1.1);
        Rectangle2D outside =
                new Rectangle2D.Double(margin * 0.6, top, width - margin * 1.4 - space.right(), height - top - foot);
        Area area = axes(g, outside, style, plot);
        if (!horizontal.label().isEmpty()) {
            g.setColor(style.theme().text());
            String text = ScriptText.fitted(style.font(), horizontal.label(), width - 2 * margin);
            double end = Math.max(area.area().getMaxX(), margin + ScriptText.width(style.font(), text));
            ScriptText.drawRight(g, style.font(), text, end, height - margin * 0.7 - line * 0.15);
        }
        return area;
    }

    /** Paints title, subtitle and legend; returns where the next line may start. */
    private double heading(Graphics2D g, int width, PlotStyle style, double margin) {
        double room = width - 2 * margin;
        double baseline = margin * 0.8 + ScriptText.ascent(style.titleFont());
        String head = ScriptText.fitted(style.titleFont(), title, room);
        g.setColor(style.theme().text());
        ScriptText.draw(g, style.titleFont(), head, margin, baseline);
        double bottom = baseline + ScriptText.lineHeight(style.titleFont()) * 0.35;
        if (!subtitle.isEmpty()) {
            double after = margin + ScriptText.width(style.titleFont(), head) + style.em();
            g.setColor(style.quietText());
            if (after + ScriptText.width(style.font(), subtitle) <= width - margin) {
                ScriptText.draw(g, style.font(), subtitle, after, baseline);
            } else {
                ScriptText.draw(
                        g,
                        style.font(),
                        ScriptText.fitted(style.font(), subtitle, room),
                        margin,
                        bottom + ScriptText.ascent(style.font()));
                bottom += ScriptText.lineHeight(style.font()) * 1.05;
            }
        }
        return legend(g, width, style, margin, bottom) + style.em() * 0.35;
    }

    private double legend(Graphics2D g, int width, PlotStyle style, double margin, double top) {
        if (legend.isEmpty()) {
            return top;
        }
        double line = ScriptText.lineHeight(style.font()) * 1.05;
        double sign = style.em() * 1.7;
        double gap = style.em() * 1.3;
        double x = margin;
        double baseline = top + ScriptText.ascent(style.font()) + style.em() * 0.1;
        for (LegendEntry entry : legend) {
            String text = ScriptText.fitted(style.font(), entry.text(), width - 2 * margin - sign - style.em() * 0.4);
            double needed = sign + style.em() * 0.4 + ScriptText.width(style.font(), text);
            if (x > margin && x + needed > width - margin) {
                x = margin;
                baseline += line;
            }
            sign(g, entry, style, x, baseline - style.em() * 0.36, sign);
            g.setColor(style.theme().text());
            ScriptText.draw(g, style.font(), text, x + sign + style.em() * 0.4, baseline);
            x += needed + gap;
        }
        return baseline + ScriptText.lineHeight(style.font()) * 0.3;
    }

    private static void sign(Graphics2D g, LegendEntry entry, PlotStyle style, double x, double y, double width) {
        g.setColor(entry.colour());
        g.setStroke(entry.stroke());
        double r = style.em() * 0.3;
        double middle = x + width / 2;
        switch (entry.sign()) {
            case LINE -> g.draw(new Line2D.Double(x, y, x + width, y));
            case BOX -> g.fill(new Rectangle2D.Double(x, y - r, width, 2 * r));
            case MEASURED -> measured(g, style, middle, y, r, entry.colour());
            default -> g.fill(entry.sign().around(middle, y, r));
        }
    }

    /** An open diamond with a bar through it: a measured value. */
    public static void measured(Graphics2D g, PlotStyle style, double x, double y, double radius, Color colour) {
        g.setColor(colour);
        g.setStroke(new BasicStroke(style.em() * 0.1f));
        g.draw(new Line2D.Double(x, y - 2 * radius, x, y + 2 * radius));
        Shape diamond = LegendEntry.Sign.MEASURED.around(x, y, radius);
        g.setColor(style.theme().plotGround());
        g.fill(diamond);
        g.setColor(colour);
        g.draw(diamond);
    }

    private Area axes(Graphics2D g, Rectangle2D outside, PlotStyle style, XYPlot plot) {
        plot.setDomainAxis(axis(horizontal, style, outside.getWidth() / style.em() / 5.5));
        plot.setRangeAxis(axis(vertical, style, outside.getHeight() / style.em() / 3.2));
        plot.setInsets(RectangleInsets.ZERO_INSETS);
        style.theme().apply(new JFreeChart(null, null, plot, false));
        for (NumberAxis axis : List.of((NumberAxis) plot.getDomainAxis(), (NumberAxis) plot.getRangeAxis())) {
            axis.setTickLabelFont(style.smallFont());
        }
        plot.setDomainGridlinesVisible(horizontal.visible());
        plot.setRangeGridlinesVisible(vertical.visible());
        plot.setOutlineVisible(false);
        PlotRenderingInfo info = new PlotRenderingInfo(null);
        plot.draw(g, outside, null, null, info);
        return new Area(info.getDataArea(), horizontal, vertical);
    }

    private static NumberAxis axis(AxisSpec spec, PlotStyle style, double pieces) {
        NumberAxis axis = spec.ticks().isEmpty() ? new NumberAxis() : new NamedTicks(spec.ticks());
        axis.setAutoRange(false);
        axis.setRange(spec.lower(), spec.upper());
        double step = Ticks.step(spec.upper() - spec.lower(), Math.max(2, pieces));
        axis.setTickUnit(new NumberTickUnit(step, new Ticks.Format(step)));
        axis.setTickLabelInsets(
                new RectangleInsets(style.em() * 0.15, style.em() * 0.3, style.em() * 0.15, style.em() * 0.3));
        axis.setVisible(spec.visible());
        return axis;
    }

    /** An axis whose ticks are given. */
    private static final class NamedTicks extends NumberAxis {
        private static final long serialVersionUID = 1L;
        private final transient List<AxisSpec.Tick> ticks;

        NamedTicks(List<AxisSpec.Tick> ticks) {
            this.ticks = ticks;
        }

        @Override
        public List<ValueTick> refreshTicks(Graphics2D g, AxisState state, Rectangle2D area, RectangleEdge edge) {
            TextAnchor anchor = RectangleEdge.isLeftOrRight(edge) ? TextAnchor.CENTER_RIGHT : TextAnchor.TOP_CENTER;
            List<ValueTick> shown = new ArrayList<>();
            for (AxisSpec.Tick tick : ticks) {
                if (getRange().contains(tick.at())) {
                    shown.add(new NumberTick(tick.at(), tick.text(), anchor, TextAnchor.CENTER, 0));
                }
            }
            return shown;
        }
    }
}
