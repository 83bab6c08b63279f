package org.wellwright.viewer.levels;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.plot.XYPlot;
import org.wellwright.viewer.levels.LevelDiagram.Bar;
import org.wellwright.viewer.levels.LevelDiagramLayout.PlacedBar;
import org.wellwright.viewer.levels.LevelDiagramLayout.PlacedColumn;
import org.wellwright.viewer.levels.LevelDiagramLayout.PlacedGroup;
import org.wellwright.viewer.levels.LevelDiagramLayout.PlacedLabel;
import org.wellwright.viewer.plot.AxisSpec;
import org.wellwright.viewer.plot.LegendEntry;
import org.wellwright.viewer.plot.PlotFrame;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.ScriptText;
import org.wellwright.viewer.plot.Viewport;

/** Paints a level diagram. */
final class LevelDiagramPainter {
    private LevelDiagramPainter() {}

    /** A painted diagram: its layout and the place of its axes. */
    record Painted(LevelDiagramLayout layout, PlotFrame.Area area) {}

    /** Paints into (0, 0, width, height) and tells what stands where. */
    static Painted paint(Graphics2D g, int width, int height, LevelDiagram whole, PlotStyle style, Viewport view) {
        LevelDiagram diagram = whole.over(view.vertical(whole.energy()));
        double line = ScriptText.lineHeight(style.font());
        boolean notes =
                diagram.groups().stream().anyMatch(group -> !group.note().isEmpty());
        PlotFrame frame = new PlotFrame(
                diagram.title(), diagram.subtitle(), legend(diagram, style), AxisSpec.hidden(0, 1), diagram.energy());
        PlotFrame.Space space = new PlotFrame.Space(line * (notes ? 2.25 : 1.35), 0, line * 1.25);
        PlotFrame.Area area = frame.paint(g, width, height, style, new XYPlot(), space);
        LevelDiagramLayout layout = LevelDiagramLayout.of(diagram, area, style);
        Shape clip = g.getClip();
        g.clip(area.area());
        for (PlacedGroup group : layout.groups()) {
            continuum(g, group, area, style);
            for (PlacedColumn column : group.columns()) {
                for (Bar bar : column.column().measured()) {
                    measured(
                            g, bar, column.left() - style.em() * 0.15, column.right() + style.em() * 0.25, area, style);
                }
            }
        }
        layout.bars().forEach(bar -> bar(g, bar, area, style));
        g.setClip(clip);
        layout.labels().forEach(label -> label(g, label, style));
        layout.groups().forEach(group -> headers(g, group, area, style, notes));
        return new Painted(layout, area);
    }

    private static List<LegendEntry> legend(LevelDiagram diagram, PlotStyle style) {
        List<LegendEntry> legend = new ArrayList<>();
        boolean measured = diagram.groups().stream().anyMatch(group -> group.series() < 0);
        boolean bands = diagram.groups().stream()
                .filter(group -> group.series() < 0)
                .flatMap(group -> group.columns().stream())
                .flatMap(column -> column.bars().stream())
                .anyMatch(bar -> bar.above() > 0);
        if (measured) {
            legend.add(new LegendEntry(
                    bands ? "measured ± σ" : "measured",
                    LegendEntry.Sign.LINE,
                    style.theme().measured(),
                    thin(style)));
        }
        if (diagram.groups().stream()
                .anyMatch(group -> group.threshold() < diagram.energy().upper())) {
            legend.add(new LegendEntry(
                    "threshold", LegendEntry.Sign.LINE, style.theme().axis(), style.dashed()));
        }
        if (diagram.groups().stream()
                .flatMap(group -> group.columns().stream())
                .flatMap(column -> column.bars().stream())
                .anyMatch(Bar::selected)) {
            legend.add(new LegendEntry(
                    "selected", LegendEntry.Sign.LINE, style.theme().selection(), thick(style, 0.3)));
        }
        return legend;
    }

    private static void continuum(Graphics2D g, PlacedGroup group, PlotFrame.Area area, PlotStyle style) {
        double threshold = group.group().threshold();
        if (!(threshold < area.vertical().upper())
                || threshold < area.vertical().lower()) {
            return;
        }
        double y = area.y(threshold);
        g.setColor(PlotStyle.faded(style.theme().axis(), 0.12));
        g.fill(new Rectangle2D.Double(
                group.left(),
                area.area().getMinY(),
                group.right() - group.left(),
                y - area.area().getMinY()));
        g.setColor(style.theme().axis());
        g.setStroke(style.dashed());
        g.draw(new Line2D.Double(group.left(), y, group.right(), y));
    }

    private static void measured(
            Graphics2D g, Bar bar, double left, double right, PlotFrame.Area area, PlotStyle style) {
        band(g, bar, left, right, area, style.theme().measured(), 0.16);
        g.setColor(PlotStyle.faded(style.theme().measured(), 0.75));
        g.setStroke(thin(style));
        double y = area.y(bar.energy());
        g.draw(new Line2D.Double(left, y, right, y));
    }

    private static void bar(Graphics2D g, PlacedBar placed, PlotFrame.Area area, PlotStyle style) {
        Bar bar = placed.bar();
        boolean measured = placed.series() < 0;
        Color colour = measured ? style.theme().measured() : style.theme().seriesColour(placed.series());
        band(g, bar, placed.left(), placed.right(), area, colour, 0.2);
        if (bar.selected()) {
            g.setColor(PlotStyle.faded(style.theme().selection(), 0.35));
            g.setStroke(thick(style, 0.55));
            g.draw(new Line2D.Double(placed.left(), placed.y(), placed.right(), placed.y()));
            colour = style.theme().selection();
        }
        g.setColor(colour);
        g.setStroke(thick(style, measured ? 0.12 : 0.17));
        g.draw(new Line2D.Double(placed.left(), placed.y(), placed.right(), placed.y()));
    }

    private static void band(
            Graphics2D g, Bar bar, double left, double right, PlotFrame.Area area, Color colour, double opacity) {
        double top = area.y(bar.energy() + bar.above());
        double bottom = area.y(bar.energy() - bar.below());
        if (bottom - top > 1) {
            g.setColor(PlotStyle.faded(colour, opacity));
            g.fill(new Rectangle2D.Double(left, top, right - left, bottom - top));
        }
    }

    private static void label(Graphics2D g, PlacedLabel label, PlotStyle style) {
        Rectangle2D box = label.box();
        if (Math.abs(box.getCenterY() - label.barY()) > 1) {
            g.setColor(style.theme().axis());
            g.setStroke(style.hairline());
            g.draw(new Line2D.Double(label.barEnd() + 1, label.barY(), box.getX() - 1, box.getCenterY()));
        }
        g.setColor(label.selected() ? style.theme().selection() : style.theme().text());
        double baseline = box.getCenterY() + ScriptText.ascent(style.smallFont()) * 0.37;
        ScriptText.draw(g, style.smallFont(), label.text(), box.getX(), baseline);
    }

    private static void headers(Graphics2D g, PlacedGroup group, PlotFrame.Area area, PlotStyle style, boolean notes) {
        double line = ScriptText.lineHeight(style.font());
        double room = group.right() - group.left() + style.em() * 0.8;
        double baseline = area.area().getMinY() - line * (notes ? 1.38 : 0.45);
        int series = group.group().series();
        g.setColor(series < 0 ? style.theme().measured() : style.theme().seriesColour(series));
        ScriptText.draw(
                g, style.font(), ScriptText.fitted(style.font(), group.group().header(), room), group.left(), baseline);
        g.setStroke(thick(style, 0.12));
        double rule = area.area().getMinY() - style.em() * 0.06;
        g.draw(new Line2D.Double(group.left(), rule, group.right() - style.em() * 0.2, rule));
        g.setColor(style.quietText());
        if (notes) {
            String note = ScriptText.fitted(style.smallFont(), group.group().note(), room);
            ScriptText.draw(g, style.smallFont(), note, group.left(), baseline + line * 0.92);
        }
        g.setColor(style.theme().text());
        columnNames(g, group, area.area().getMaxY() + line * 1.05, style);
    }

    /** The channels under their columns; where they do not fit, the first and the last for the whole group. */
    private static void columnNames(Graphics2D g, PlacedGroup group, double baseline, PlotStyle style) {
        boolean fit = group.columns().stream()
                .allMatch(column ->
                        ScriptText.width(style.smallFont(), column.column().header()) <= column.end() - column.left());
        if (fit) {
            for (PlacedColumn column : group.columns()) {
                ScriptText.draw(g, style.smallFont(), column.column().header(), column.left(), baseline);
            }
        } else {
            String first = group.columns().get(0).column().header();
            String last =
                    group.columns().get(group.columns().size() - 1).column().header();
            int same = 0;
            while (same < Math.min(first.length(), last.length())
                    && first.charAt(same) == last.charAt(same)
                    && !Character.isDigit(first.charAt(same))) {
                same++;
            }
            String text = first + " … " + last.substring(same);
            ScriptText.draw(
                    g,
                    style.smallFont(),
                    ScriptText.fitted(style.smallFont(), text, group.right() - group.left() + style.em() * 0.8),
                    group.left(),
                    baseline);
        }
    }

    private static Stroke thin(PlotStyle style) {
        return thick(style, 0.08);
    }

    private static Stroke thick(PlotStyle style, double ems) {
        return new BasicStroke((float) (style.em() * ems), BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND);
    }
}
