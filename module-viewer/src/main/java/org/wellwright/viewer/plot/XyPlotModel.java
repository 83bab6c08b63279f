package org.wellwright.viewer.plot;

import java.util.List;
import java.util.Objects;

/**
 * An ordinary x–y picture.
 *
 * @param title title
 * @param subtitle of what
 * @param horizontal horizontal axis
 * @param vertical vertical axis
 * @param curves curves in the order of the legend
 * @param rungs labelled horizontal pieces (levels between turning points)
 * @param baseline whether the zero of the vertical axis is drawn
 */
public record XyPlotModel(
        String title,
        String subtitle,
        AxisSpec horizontal,
        AxisSpec vertical,
        List<Curve> curves,
        List<Rung> rungs,
        boolean baseline) {
    /**
     * One curve.
     *
     * @param name its name in the legend; empty for none
     * @param points its points
     * @param series index of its colour
     * @param quiet whether it stands back
     */
    public record Curve(String name, Points points, int series, boolean quiet) {}

    /**
     * A horizontal piece.
     *
     * @param from left end
     * @param to right end
     * @param at vertical place
     * @param label text at its right end; empty for none
     * @param series index of its colour
     * @param selected whether it is selected
     * @param spot what it is when pointed at
     */
    public record Rung(
            double from, double to, double at, String label, int series, boolean selected, Picture.Spot spot) {}

    /** Copies the lists. */
    public XyPlotModel {
        Objects.requireNonNull(title, "title");
        Objects.requireNonNull(subtitle, "subtitle");
        Objects.requireNonNull(horizontal, "horizontal");
        Objects.requireNonNull(vertical, "vertical");
        curves = List.copyOf(curves);
        rungs = List.copyOf(rungs);
    }

    /** The same over other ranges. */
    public XyPlotModel over(AxisSpec newHorizontal, AxisSpec newVertical) {
        return new XyPlotModel(title, subtitle, newHorizontal, newVertical, curves, rungs, baseline);
    }
}
