package org.wellwright.branding;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.GraphicsEnvironment;
import java.awt.Stroke;
import java.util.List;
import javax.swing.UIManager;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.Axis;
import org.jfree.chart.block.BlockBorder;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYItemRenderer;
import org.jfree.chart.title.LegendTitle;
import org.jfree.chart.title.TextTitle;
import org.jfree.chart.ui.RectangleInsets;

/**
 * The colours, fonts and strokes that every chart shares, for a light or a dark ground.
 *
 * <p>The series colours were found by maximising the least OKLab distance between any two of them, as seen with full
 * colour vision and with each of the three kinds of missing cones; each stands out from the ground by a contrast of at
 * least 2.9 to 1. Beyond seven series the colours repeat with another dash pattern. Immutable.
 *
 * @param ground behind everything
 * @param plotGround inside the axes
 * @param text titles and labels
 * @param axis axis lines and ticks
 * @param grid grid lines
 * @param series colours of data series, in the order of use
 * @param measured measured values beside calculated ones
 * @param selection what the user selected
 * @param onDark whether the ground is dark
 */
public record ChartTheme(
        Color ground,
        Color plotGround,
        Color text,
        Color axis,
        Color grid,
        List<Color> series,
        Color measured,
        Color selection,
        boolean onDark) {
    private static final float[][] DASHES = {null, {6, 4}, {2, 3}, {9, 3, 2, 3}};

    private static final ChartTheme LIGHT = new ChartTheme(
            Color.WHITE,
            Color.WHITE,
            new Color(0x20242c),
            new Color(0x5b6270),
            new Color(0xe1e4ea),
            List.of(
                    new Color(0x16a3ce),
                    new Color(0xd03b76),
                    new Color(0x277104),
                    new Color(0xc18e2c),
                    new Color(0x411b8f),
                    new Color(0x8558dc),
                    new Color(0x5b3120)),
            new Color(0x20242c),
            new Color(0xb3261e),
            false);

    private static final ChartTheme DARK = new ChartTheme(
            new Color(0x1e2126),
            new Color(0x1e2126),
            new Color(0xe4e7ec),
            new Color(0x9aa2b0),
            new Color(0x353a43),
            List.of(
                    new Color(0x38edd7),
                    new Color(0xff966d),
                    new Color(0xc2a0ff),
                    new Color(0xf0e32f),
                    new Color(0x1c80f6),
                    new Color(0xd44b93),
                    new Color(0x928316)),
            new Color(0xe4e7ec),
            new Color(0xff6f61),
            true);

    /** Keeps its own copy of the series colours. */
    public ChartTheme {
        series = List.copyOf(series);
    }

    /** On white, for paper, reports and the light window. */
    public static ChartTheme light() {
        return LIGHT;
    }

    /** On near black. */
    public static ChartTheme dark() {
        return DARK;
    }

    /** The theme that fits the window's present look; {@link #light} where there is no window system. */
    public static ChartTheme current() {
        if (GraphicsEnvironment.isHeadless()) {
            return LIGHT;
        }
        Color panel = UIManager.getColor("Panel.background");
        Color text = UIManager.getColor("Label.foreground");
        if (panel == null || text == null) {
            return LIGHT;
        }
        return OkLab.of(panel).lightness() < 0.5 ? DARK.on(panel, text) : LIGHT.on(panel, text);
    }

    /** The colour of the i-th series, i ≥ 0; they repeat after {@code series().size()}. */
    public Color seriesColour(int index) {
        return series.get(index % series.size());
    }

    /** The line of the i-th series, i ≥ 0: solid for the first round of colours, then dashed. */
    public Stroke seriesStroke(int index) {
        float[] dash = DASHES[(index / series.size()) % DASHES.length];
        return new BasicStroke(1.8f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, dash, 0);
    }

    /** The scale for signed quantities on this ground. */
    public ColourScale diverging() {
        return onDark ? ColourScale.divergingOnDark() : ColourScale.diverging();
    }

    /**
     * Dresses a chart: grounds, titles, legend, and for an x-y plot its axes, grid and series. Call it on the thread
     * that paints the chart.
     */
    public void apply(JFreeChart chart) {
        chart.setBackgroundPaint(ground);
        chart.setAntiAlias(true);
        TextTitle title = chart.getTitle();
        if (title != null) {
            title.setPaint(text);
            title.setFont(font(Font.BOLD, 1.15f));
        }
        LegendTitle legend = chart.getLegend();
        if (legend != null) {
            legend.setBackgroundPaint(ground);
            legend.setItemPaint(text);
            legend.setItemFont(font(Font.PLAIN, 1));
            legend.setFrame(BlockBorder.NONE);
        }
        chart.getPlot().setBackgroundPaint(plotGround);
        chart.getPlot().setOutlinePaint(axis);
        chart.getPlot().setNoDataMessagePaint(axis);
        chart.getPlot().setNoDataMessageFont(font(Font.PLAIN, 1.1f));
        if (chart.getPlot() instanceof XYPlot plot) {
            apply(plot);
        }
    }

    private void apply(XYPlot plot) {
        plot.setDomainGridlinePaint(grid);
        plot.setRangeGridlinePaint(grid);
        plot.setDomainGridlineStroke(new BasicStroke(1));
        plot.setRangeGridlineStroke(new BasicStroke(1));
        plot.setDomainZeroBaselinePaint(axis);
        plot.setRangeZeroBaselinePaint(axis);
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
        for (int i = 0; i < plot.getDomainAxisCount(); i++) {
            apply(plot.getDomainAxis(i));
        }
        for (int i = 0; i < plot.getRangeAxisCount(); i++) {
            apply(plot.getRangeAxis(i));
        }
        int first = 0;
        for (int i = 0; i < plot.getRendererCount(); i++) {
            XYItemRenderer renderer = plot.getRenderer(i);
            int count = plot.getDataset(i) == null ? 0 : plot.getDataset(i).getSeriesCount();
            for (int s = 0; renderer != null && s < count; s++) {
                renderer.setSeriesPaint(s, seriesColour(first + s));
                renderer.setSeriesStroke(s, seriesStroke(first + s));
            }
            first += count;
        }
    }

    private void apply(Axis axisOfPlot) {
        if (axisOfPlot == null) {
            return;
        }
        axisOfPlot.setLabelPaint(text);
        axisOfPlot.setTickLabelPaint(text);
        axisOfPlot.setAxisLinePaint(axis);
        axisOfPlot.setTickMarkPaint(axis);
        axisOfPlot.setLabelFont(font(Font.PLAIN, 1.05f));
        axisOfPlot.setTickLabelFont(font(Font.PLAIN, 0.95f));
    }

    /** The chart font at a multiple of the window's text size. */
    public static Font font(int style, float scale) {
        Font base = GraphicsEnvironment.isHeadless() ? null : UIManager.getFont("Label.font");
        float size = base == null ? 12 : base.getSize2D();
        return new Font(base == null ? Font.SANS_SERIF : base.getFamily(), style, 1).deriveFont(size * scale);
    }

    private ChartTheme on(Color panel, Color label) {
        return new ChartTheme(panel, plotGround, label, axis, grid, series, measured, selection, onDark);
    }
}
