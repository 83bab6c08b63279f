package org.wellwright.branding;

import java.awt.Color;
import java.util.function.DoubleFunction;

/**
 * Maps a number in 0…1 to a colour so that equal steps of the number look equally large.
 *
 * <p>Each scale is a smooth curve in OKLab, walked at constant speed: the curve is measured once in 4,096 chords and
 * its parameter replaced by arc length. Lightness carries the order, so the scales can be read without colour, by
 * readers with any colour vision. Immutable and safe for several threads.
 */
public final class ColourScale {
    private static final int CHORDS = 4096;
    private static final int STEPS = 1024;

    private static final ColourScale SEQUENTIAL =
            new ColourScale(t -> OkLab.polar(0.25 + 0.70 * t, 0.04 + 0.05 * Math.sin(Math.PI * t), 150 - 65 * t));
    private static final ColourScale DIVERGING = new ColourScale(t -> arms(t, 0.965, 0.42, 0.116));
    private static final ColourScale DIVERGING_DARK = new ColourScale(t -> arms(t, 0.22, 0.79, 0.108));
    private static final ColourScale CYCLIC = new ColourScale(t -> loop(2 * Math.PI * t));

    private final int[] rgb = new int[STEPS + 1];

    private ColourScale(DoubleFunction<OkLab> curve) {
        double[] length = new double[CHORDS + 1];
        OkLab last = curve.apply(0);
        for (int i = 1; i <= CHORDS; i++) {
            OkLab next = curve.apply((double) i / CHORDS);
            length[i] = length[i - 1] + last.distance(next);
            last = next;
        }
        int chord = 1;
        for (int step = 0; step <= STEPS; step++) {
            double wanted = length[CHORDS] * step / STEPS;
            while (chord < CHORDS && length[chord] < wanted) {
                chord++;
            }
            double within = (wanted - length[chord - 1]) / (length[chord] - length[chord - 1]);
            rgb[step] = curve.apply((chord - 1 + within) / CHORDS).toColor().getRGB();
        }
    }

    /** From dark to light, for what starts at zero: densities, weights. */
    public static ColourScale sequential() {
        return SEQUENTIAL;
    }

    /** Blue below, orange above, light in the middle (0.5), for what has a sign, on a light ground. */
    public static ColourScale diverging() {
        return DIVERGING;
    }

    /** As {@link #diverging}, dark in the middle, for a dark ground. */
    public static ColourScale divergingOnDark() {
        return DIVERGING_DARK;
    }

    /** A closed loop, 0 and 1 the same colour, for angles and phases. It runs through light, orange, dark and blue. */
    public static ColourScale cyclic() {
        return CYCLIC;
    }

    /**
     * The colour of a value.
     *
     * @param value in 0…1; what lies outside takes the colour of the nearer end; not a number gives a mid grey
     */
    public Color at(double value) {
        return new Color(rgbAt(value));
    }

    /** As {@link #at}, packed as in {@link Color#getRGB}, for filling images. */
    public int rgbAt(double value) {
        if (Double.isNaN(value)) {
            return 0xff808080;
        }
        return rgb[(int) Math.round(Math.min(1, Math.max(0, value)) * STEPS)];
    }

    private static OkLab arms(double t, double middleLightness, double endLightness, double endChroma) {
        double x = 2 * t - 1;
        double s = Math.abs(x);
        return OkLab.polar(middleLightness + (endLightness - middleLightness) * s, endChroma * s, x < 0 ? 252 : 46);
    }

    private static OkLab loop(double angle) {
        return new OkLab(0.62 + 0.20 * Math.cos(angle), 0.06 * Math.sin(2 * angle + 0.5), 0.11 * Math.sin(angle));
    }
}
