package org.wellwright.viewer.plot;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Stroke;
import java.util.Objects;
import org.wellwright.branding.ChartTheme;
import org.wellwright.project.FigureRequest;

/**
 * Colours and sizes of one picture.
 *
 * @param theme the colours
 * @param font running text
 */
public record PlotStyle(ChartTheme theme, Font font) {
    /** Checks that both are there. */
    public PlotStyle {
        Objects.requireNonNull(theme, "theme");
        Objects.requireNonNull(font, "font");
    }

    /** The style that a request asks for. */
    public static PlotStyle of(FigureRequest request) {
        return new PlotStyle(
                request.ground() == FigureRequest.Ground.DARK ? ChartTheme.dark() : ChartTheme.light(), request.font());
    }

    /** Size of running text in user-space units; lengths are multiples of it. */
    public float em() {
        return font.getSize2D();
    }

    /** Titles. */
    public Font titleFont() {
        return font.deriveFont(em() * 1.3f);
    }

    /** Tick labels and labels inside a plot. */
    public Font smallFont() {
        return font.deriveFont(em() * 0.92f);
    }

    /** A thin line. */
    public Stroke hairline() {
        return new BasicStroke(em() * 0.07f);
    }

    /** The line of the i-th series, as the theme has it but in proportion to the text. */
    public Stroke seriesStroke(int index) {
        BasicStroke stroke = (BasicStroke) theme.seriesStroke(index);
        return scaled(stroke, em() / 12);
    }

    /** A dashed thin line. */
    public Stroke dashed() {
        return new BasicStroke(
                em() * 0.08f,
                BasicStroke.CAP_BUTT,
                BasicStroke.JOIN_ROUND,
                10,
                new float[] {em() * 0.4f, em() * 0.3f},
                0);
    }

    /** Text that stands back. */
    public Color quietText() {
        return theme.axis();
    }

    /** A colour with an opacity of 0 to 1. */
    public static Color faded(Color colour, double opacity) {
        return new Color(colour.getRed(), colour.getGreen(), colour.getBlue(), (int) Math.round(255 * opacity));
    }

    private static BasicStroke scaled(BasicStroke stroke, float factor) {
        float[] dash = stroke.getDashArray();
        if (dash != null) {
            for (int i = 0; i < dash.length; i++) {
                dash[i] *= factor;
            }
        }
        return new BasicStroke(
                stroke.getLineWidth() * factor,
                stroke.getEndCap(),
                stroke.getLineJoin(),
                stroke.getMiterLimit(),
                dash,
                stroke.getDashPhase() * factor);
    }
}
