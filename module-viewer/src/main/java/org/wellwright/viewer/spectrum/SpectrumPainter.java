package org.wellwright.viewer.spectrum;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.jfree.chart.plot.XYPlot;
import org.wellwright.viewer.plot.AxisSpec;
import org.wellwright.viewer.plot.LegendEntry;
import org.wellwright.viewer.plot.PlotFrame;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.ScriptText;
import org.wellwright.viewer.plot.Viewport;

/** Paints a line spectrum in lanes. */
final class SpectrumPainter {
    private SpectrumPainter() {}

    static PlotFrame.Area paint(
            Graphics2D g, int width, int height, LineSpectrum spectrum, PlotStyle style, Viewport view) {
        PlotFrame frame = new PlotFrame(
                "Lines",
                spectrum.subtitle(),
                legend(spectrum, style),
                view.horizontal(spectrum.energy()),
                AxisSpec.hidden(0, 1));
        PlotFrame.Area area = frame.paint(g, width, height, style, new XYPlot(), new PlotFrame.Space(0, style.em(), 0));
        double height1 = area.area().getHeight() / Math.max(1, spectrum.lanes().size());
        Shape clip = g.getClip();
        g.clip(area.area());
        guides(g, spectrum, area, style);
        for (int i = 0; i < spectrum.lanes().size(); i++) {
            LineSpectrum.Lane lane = spectrum.lanes().get(i);
            new LanePainter(g, lane, area, area.area().getY() + i * height1, height1, style).paint();
        }
        g.setClip(clip);
        return area;
    }

    private static List<LegendEntry> legend(LineSpectrum spectrum, PlotStyle style) {
        List<LegendEntry> legend = new ArrayList<>();
        if (spectrum.lanes().stream().anyMatch(LineSpectrum.Lane::measured)) {
            legend.add(new LegendEntry(
                    "measured ± σ", LegendEntry.Sign.MEASURED, style.theme().measured(), style.hairline()));
        }
        if (!spectrum.lanes().stream().allMatch(LineSpectrum.Lane::measured)) {
            String text = spectrum.strengths() ? "calculated, height ∝ √(oscillator strength)" : "calculated";
            legend.add(
                    new LegendEntry(text, LegendEntry.Sign.LINE, style.theme().axis(), style.seriesStroke(0)));
        }
        return legend;
    }

    /** Thin lines through all lanes at the measured places. */
    private static void guides(Graphics2D g, LineSpectrum spectrum, PlotFrame.Area area, PlotStyle style) {
        g.setColor(PlotStyle.faded(style.theme().measured(), 0.35));
        g.setStroke(style.dashed());
        for (LineSpectrum.Lane lane : spectrum.lanes()) {
            for (LineSpectrum.Line line : lane.measured() ? lane.lines() : List.<LineSpectrum.Line>of()) {
                double x = area.x(line.energy());
                g.draw(new Line2D.Double(x, area.area().getY(), x, area.area().getMaxY()));
            }
        }
    }

    /** Paints one lane between its head, where the strongest line ends, and its foot. */
    private record LanePainter(
            Graphics2D g, LineSpectrum.Lane lane, PlotFrame.Area area, double top, double height, PlotStyle style) {
        void paint() {
            Color colour =
                    lane.measured() ? style.theme().measured() : style.theme().seriesColour(lane.series());
            g.setColor(style.theme().grid());
            g.setStroke(style.hairline());
            g.draw(new Line2D.Double(area.area().getX(), foot(), area.area().getMaxX(), foot()));
            for (LineSpectrum.Line line : lane.lines()) {
                Color own = line.selected() ? style.theme().selection() : colour;
                double x = area.x(line.energy());
                if (lane.measured()) {
                    sigma(line, own);
                    PlotFrame.measured(g, style, x, middle(), style.em() * 0.28, own);
                } else {
                    g.setColor(own);
                    g.setStroke(new BasicStroke(style.em() * 0.14f));
                    g.draw(new Line2D.Double(x, foot(), x, tip(line)));
                }
            }
            labels();
            nameplate(colour);
        }

        private double foot() {
            return top + height - style.em() * 0.3;
        }

        private double head() {
            return Math.min(foot() - 2, top + ScriptText.lineHeight(style.smallFont()) * 2.5);
        }

        private double middle() {
            return 0.5 * (foot() + head());
        }

        /** Upper end of a line. */
        private double tip(LineSpectrum.Line line) {
            return lane.measured()
                    ? middle() - style.em() * 0.7
                    : Math.min(foot() - 2, foot() - (foot() - head()) * line.height());
        }

        private String name() {
            return ScriptText.fitted(style.font(), lane.name(), area.area().getWidth() * 0.9);
        }

        /** Where the lane's name stands. */
        private Rectangle2D plate() {
            double x = area.area().getX() + style.em() * 0.5;
            return new Rectangle2D.Double(
                    x - 2, top + 1, ScriptText.width(style.font(), name()) + 4, ScriptText.lineHeight(style.font()));
        }

        private void nameplate(Color colour) {
            g.setColor(PlotStyle.faded(style.theme().plotGround(), 0.8));
            g.fill(plate());
            g.setColor(colour);
            ScriptText.draw(g, style.font(), name(), plate().getX() + 2, top + ScriptText.ascent(style.font()));
        }

        private void sigma(LineSpectrum.Line line, Color colour) {
            if (line.sigma() > 0) {
                double left = area.x(line.energy() - line.sigma());
                double right = area.x(line.energy() + line.sigma());
                g.setColor(PlotStyle.faded(colour, 0.3));
                g.fill(new Rectangle2D.Double(left, middle() - style.em() * 0.15, right - left, style.em() * 0.3));
            }
        }

        /**
         * Names of lines over their tips, the selected and the strongest first, as long as none overlaps another name
         * or line.
         */
        private void labels() {
            double text = ScriptText.lineHeight(style.smallFont());
            List<Rectangle2D> taken = new ArrayList<>(List.of(plate()));
            List<LineSpectrum.Line> order = new ArrayList<>(lane.lines());
            order.sort(Comparator.comparing(LineSpectrum.Line::selected)
                    .thenComparing(LineSpectrum.Line::height)
                    .reversed());
            for (LineSpectrum.Line line : order) {
                double width = ScriptText.width(style.smallFont(), line.label());
                double x = Math.min(
                        Math.max(area.x(line.energy()) - width / 2, area.area().getX() + 1),
                        area.area().getMaxX() - width - 1);
                Rectangle2D box = new Rectangle2D.Double(
                        x - style.em() * 0.2, tip(line) - text * 1.05, width + style.em() * 0.4, text);
                boolean inside = line.energy() > area.horizontal().lower()
                        && line.energy() < area.horizontal().upper();
                boolean free = taken.stream().noneMatch(box::intersects)
                        && lane.lines().stream().noneMatch(other -> other != line && crosses(other, box));
                if (inside && free) {
                    taken.add(box);
                    g.setColor(
                            line.selected()
                                    ? style.theme().selection()
                                    : style.theme().text());
                    ScriptText.draw(g, style.smallFont(), line.label(), x, tip(line) - text * 0.28);
                }
            }
        }

        private boolean crosses(LineSpectrum.Line line, Rectangle2D box) {
            double x = area.x(line.energy());
            return x > box.getMinX() && x < box.getMaxX() && tip(line) < box.getMaxY();
        }
    }
}
