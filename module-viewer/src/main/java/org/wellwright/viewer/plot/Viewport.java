package org.wellwright.viewer.plot;

/**
 * The part of a picture's axes that is shown, in the axes' values; NaN for an end that the picture chooses.
 *
 * @param left lower end of the horizontal axis
 * @param right its upper end
 * @param bottom lower end of the vertical axis
 * @param top its upper end
 */
public record Viewport(double left, double right, double bottom, double top) {
    /** Everything. */
    public static final Viewport ALL = new Viewport(Double.NaN, Double.NaN, Double.NaN, Double.NaN);

    /** Zooming in ends where an axis is narrower than this share of its values. */
    private static final double FINEST = 1e-12;

    /** Whether the picture chooses both axes. */
    public boolean all() {
        return Double.isNaN(left) && Double.isNaN(bottom);
    }

    /** The horizontal axis as far as it is shown. */
    public AxisSpec horizontal(AxisSpec whole) {
        return left < right ? whole.over(left, right) : whole;
    }

    /** The vertical axis as far as it is shown. */
    public AxisSpec vertical(AxisSpec whole) {
        return bottom < top ? whole.over(bottom, top) : whole;
    }

    /**
     * Enlarges around a point.
     *
     * @param area the axes as painted
     * @param x place that stays, user-space units
     * @param y place that stays
     * @param factor above 1 enlarges
     */
    public Viewport zoomed(PlotFrame.Area area, double x, double y, double factor, boolean across, boolean up) {
        Viewport next = this;
        if (across) {
            double at = area.valueAtX(x);
            double from = at - (at - area.horizontal().lower()) / factor;
            double to = at + (area.horizontal().upper() - at) / factor;
            next = usable(from, to) ? new Viewport(from, to, next.bottom, next.top) : next;
        }
        if (up) {
            double at = area.valueAtY(y);
            double from = at - (at - area.vertical().lower()) / factor;
            double to = at + (area.vertical().upper() - at) / factor;
            next = usable(from, to) ? new Viewport(next.left, next.right, from, to) : next;
        }
        return next;
    }

    /**
     * Moves what is shown.
     *
     * @param dx how far the picture goes to the right, user-space units
     * @param dy how far it goes down
     */
    public Viewport moved(PlotFrame.Area area, double dx, double dy, boolean across, boolean up) {
        Viewport next = this;
        if (across) {
            double shift = area.valueAtX(dx) - area.valueAtX(0);
            next = new Viewport(
                    area.horizontal().lower() - shift, area.horizontal().upper() - shift, next.bottom, next.top);
        }
        if (up) {
            double shift = area.valueAtY(dy) - area.valueAtY(0);
            next = new Viewport(
                    next.left,
                    next.right,
                    area.vertical().lower() - shift,
                    area.vertical().upper() - shift);
        }
        return next;
    }

    private static boolean usable(double from, double to) {
        return to - from > FINEST * Math.max(Math.abs(from), Math.abs(to)) && to - from < Double.MAX_VALUE;
    }
}
