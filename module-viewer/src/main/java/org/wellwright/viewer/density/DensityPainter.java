package org.wellwright.viewer.density;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Image;
import java.awt.RenderingHints;
import java.awt.geom.AffineTransform;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.List;
import java.util.stream.IntStream;
import org.jfree.chart.plot.XYPlot;
import org.wellwright.branding.ColourScale;
import org.wellwright.viewer.plot.AxisSpec;
import org.wellwright.viewer.plot.PlotFrame;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.ScriptText;
import org.wellwright.viewer.plot.Ticks;
import org.wellwright.viewer.plot.Viewport;

/** Paints a density with axes, colour bar and scale bar; both axes have one scale. */
final class DensityPainter {
    private static final Color ON_IMAGE = new Color(0xf4f1e8);
    private static final int MOST_PIXELS = 1600;

    private DensityPainter() {}

    /** Paints into (0, 0, width, height). */
    static PlotFrame.Area paint(
            Graphics2D g, int width, int height, DensityPlane plane, PlotStyle style, Viewport view) {
        double right = colourBarWidth(plane, style);
        PlotFrame.Space space = new PlotFrame.Space(0, right, 0);
        // Painted once out of sight to learn the shape of the area, which the ranges follow.
        Graphics2D rehearsal = new BufferedImage(1, 1, BufferedImage.TYPE_INT_RGB).createGraphics();
        Rectangle2D shape = frame(plane, view, 1, 1)
                .paint(rehearsal, width, height, style, new XYPlot(), space)
                .area();
        rehearsal.dispose();
        double shorter = Math.min(shape.getWidth(), shape.getHeight());
        PlotFrame.Area area = frame(plane, view, shape.getWidth() / shorter, shape.getHeight() / shorter)
                .paint(g, width, height, style, new XYPlot(), space);
        image(g, plane, area);
        scaleBar(g, area, plane.lengthUnit(), style);
        colourBar(g, area, plane, right, style);
        return area;
    }

    /** Axes around the middle of the view, the vertical one deciding how much is shown. */
    private static PlotFrame frame(DensityPlane plane, Viewport view, double wide, double high) {
        boolean whole = !(view.bottom() < view.top() && view.left() < view.right());
        double middleAcross = whole ? 0 : 0.5 * (view.left() + view.right());
        double middleUp = whole ? 0 : 0.5 * (view.bottom() + view.top());
        double reach = whole ? plane.reach() : 0.5 * (view.top() - view.bottom()) / high;
        AxisSpec across = AxisSpec.of(
                "%s (%s)".formatted(plane.plane().across(), plane.lengthUnit()),
                middleAcross - reach * wide,
                middleAcross + reach * wide);
        AxisSpec up = AxisSpec.of(
                "%s (%s)".formatted(plane.plane().up(), plane.lengthUnit()),
                middleUp - reach * high,
                middleUp + reach * high);
        return new PlotFrame("Density", plane.subtitle(), List.of(), across, up);
    }

    private static void image(Graphics2D g, DensityPlane plane, PlotFrame.Area area) {
        AffineTransform device = g.getTransform();
        double scale = Math.max(1, Math.sqrt(Math.abs(device.getDeterminant())));
        Rectangle2D box = area.area();
        double fitted = Math.min(scale, MOST_PIXELS / Math.max(box.getWidth(), box.getHeight()));
        int columns = (int) Math.max(2, Math.round(box.getWidth() * fitted));
        int rows = (int) Math.max(2, Math.round(box.getHeight() * fitted));
        Image image = pixels(plane, area, columns, rows);
        Object before = g.getRenderingHint(RenderingHints.KEY_INTERPOLATION);
        g.setRenderingHint(RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_BILINEAR);
        AffineTransform place = AffineTransform.getTranslateInstance(box.getX(), box.getY());
        place.scale(box.getWidth() / columns, box.getHeight() / rows);
        g.drawImage(image, place, null);
        if (before != null) {
            g.setRenderingHint(RenderingHints.KEY_INTERPOLATION, before);
        }
    }

    /** The colours at pixel centres, rows in parallel. */
    static BufferedImage pixels(DensityPlane plane, PlotFrame.Area area, int columns, int rows) {
        BufferedImage image = new BufferedImage(columns, rows, BufferedImage.TYPE_INT_RGB);
        int[] colours = new int[columns * rows];
        ColourScale scale = ColourScale.sequential();
        AxisSpec across = area.horizontal();
        AxisSpec up = area.vertical();
        IntStream.range(0, rows).parallel().forEach(row -> {
            double b = up.upper() - (row + 0.5) / rows * (up.upper() - up.lower());
            for (int column = 0; column < columns; column++) {
                double a = across.lower() + (column + 0.5) / columns * (across.upper() - across.lower());
                colours[row * columns + column] = scale.rgbAt(position(plane.at(a, b), plane.greatest()));
            }
        });
        image.setRGB(0, 0, columns, rows, colours, 0, columns);
        return image;
    }

    /** Place of a density on the colour scale: its square root, so that the outskirts are seen. */
    private static double position(double density, double greatest) {
        return Math.sqrt(density / greatest);
    }

    private static void scaleBar(Graphics2D g, PlotFrame.Area area, String unit, PlotStyle style) {
        Rectangle2D box = area.area();
        double span = area.horizontal().upper() - area.horizontal().lower();
        double length = Ticks.roundedDown(0.25 * span);
        double pixels = length / span * box.getWidth();
        double x = box.getX() + style.em();
        double y = box.getMaxY() - style.em();
        g.setColor(ON_IMAGE);
        g.fill(new Rectangle2D.Double(x, y - style.em() * 0.25, pixels, style.em() * 0.25));
        ScriptText.draw(g, style.smallFont(), Ticks.number(length, 3) + " " + unit, x, y - style.em() * 0.55);
    }

    static String unit(DensityPlane plane) {
        String length = plane.lengthUnit();
        return length.endsWith("⁻¹") ? length.substring(0, length.length() - 2) + "³" : length + "⁻³";
    }

    private static String barLabel(DensityPlane plane) {
        return "|ψ|² (" + unit(plane) + ")";
    }

    private static double colourBarWidth(DensityPlane plane, PlotStyle style) {
        double widest = ScriptText.width(style.smallFont(), barLabel(plane));
        double step = Ticks.step(plane.greatest(), 5);
        for (double value = 0; value <= plane.greatest(); value += step) {
            widest = Math.max(widest, style.em() * 1.8 + ScriptText.width(style.smallFont(), Ticks.label(value, step)));
        }
        return widest + style.em() * 1.2;
    }

    private static void colourBar(
            Graphics2D g, PlotFrame.Area area, DensityPlane plane, double width, PlotStyle style) {
        Rectangle2D box = area.area();
        double line = ScriptText.lineHeight(style.smallFont());
        double x = box.getMaxX() + style.em() * 1.2;
        double top = box.getY() + line * 2.6;
        double height = box.getMaxY() - top;
        double thick = style.em();
        int pieces = 128;
        for (int i = 0; i < pieces; i++) {
            g.setColor(ColourScale.sequential().at((i + 0.5) / pieces));
            double y = top + height * (1 - (i + 1.0) / pieces);
            g.fill(new Rectangle2D.Double(x, y, thick, height / pieces + 0.5));
        }
        g.setColor(style.theme().text());
        ScriptText.draw(g, style.smallFont(), barLabel(plane), x, box.getY() + line * 0.8);
        g.setColor(style.quietText());
        ScriptText.draw(g, style.smallFont(), "√ scale", x, box.getY() + line * 1.75);
        double step = Ticks.step(plane.greatest(), 5);
        double free = Double.POSITIVE_INFINITY;
        for (double value = 0; value <= plane.greatest() * (1 + 1e-9); value += step) {
            double y = top + height * (1 - position(value, plane.greatest()));
            g.setColor(style.theme().axis());
            g.setStroke(style.hairline());
            g.draw(new Line2D.Double(x + thick, y, x + thick + style.em() * 0.35, y));
            if (free - y >= line) {
                g.setColor(style.theme().text());
                double baseline = y + ScriptText.ascent(style.smallFont()) * 0.37;
                ScriptText.draw(g, style.smallFont(), Ticks.label(value, step), x + thick + style.em() * 0.5, baseline);
                free = y;
            }
        }
    }
}
