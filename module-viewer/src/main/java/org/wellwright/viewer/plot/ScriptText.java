package org.wellwright.viewer.plot;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.font.FontRenderContext;
import java.util.ArrayList;
import java.util.List;

/**
 * Text with raised and lowered signs (cm⁻¹, 10⁻³, a₀). Where the font has the signs the text is drawn in one piece;
 * where it lacks one, raised signs are drawn as small ordinary ones, and what it has not at all in the system's own
 * font.
 */
public final class ScriptText {
    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹⁻⁺";
    private static final String LOWERED = "₀₁₂₃₄₅₆₇₈₉₋₊";
    private static final String PLAIN = "0123456789−+";
    private static final FontRenderContext MEASURE = new FontRenderContext(null, true, true);
    private static final float SMALL = 0.7f;
    private static final String ELLIPSIS = "…";

    private ScriptText() {}

    private record Run(String text, Font font, float rise) {}

    /** Width of a text in user-space units. */
    public static double width(Font font, String text) {
        double width = 0;
        for (Run run : runs(font, text)) {
            width += run.font().getStringBounds(run.text(), MEASURE).getWidth();
        }
        return width;
    }

    /** Height of a line. */
    public static double lineHeight(Font font) {
        return font.getLineMetrics("Ag", MEASURE).getHeight();
    }

    /** Height of a line above its baseline. */
    public static double ascent(Font font) {
        return font.getLineMetrics("Ag", MEASURE).getAscent();
    }

    /** Draws a text from a baseline point to the right. */
    public static void draw(Graphics2D g, Font font, String text, double x, double baseline) {
        double at = x;
        for (Run run : runs(font, text)) {
            g.setFont(run.font());
            g.drawString(run.text(), (float) at, (float) (baseline - run.rise()));
            at += run.font().getStringBounds(run.text(), MEASURE).getWidth();
        }
    }

    /** Draws a text so that its right end is at x. */
    public static void drawRight(Graphics2D g, Font font, String text, double x, double baseline) {
        draw(g, font, text, x - width(font, text), baseline);
    }

    /** Draws a text centred at x. */
    public static void drawCentred(Graphics2D g, Font font, String text, double x, double baseline) {
        draw(g, font, text, x - width(font, text) / 2, baseline);
    }

    /**
     * The text itself if it fits into a width, otherwise its beginning with an ellipsis; empty if not even that fits.
     */
    public static String fitted(Font font, String text, double width) {
        if (width(font, text) <= width) {
            return text;
        }
        int length = text.length();
        while (length > 0) {
            length = text.offsetByCodePoints(length, -1);
            String shorter = text.substring(0, length).stripTrailing() + ELLIPSIS;
            if (length > 0 && width(font, shorter) <= width) {
                return shorter;
            }
        }
        return "";
    }

    private static List<Run> runs(Font font, String text) {
        if (text.isEmpty()) {
            return List.of();
        }
        if (font.canDisplayUpTo(text) < 0) {
            return List.of(new Run(text, font, 0));
        }
        Font small = font.deriveFont(font.getSize2D() * SMALL);
        Font other = new Font(Font.SANS_SERIF, font.getStyle(), 1).deriveFont(font.getSize2D());
        List<Run> runs = new ArrayList<>();
        text.codePoints().forEach(code -> {
            String sign = Character.toString(code);
            int raised = RAISED.indexOf(code);
            int lowered = LOWERED.indexOf(code);
            if (raised >= 0) {
                add(runs, PLAIN.substring(raised, raised + 1), small, font.getSize2D() * 0.33f);
            } else if (lowered >= 0) {
                add(runs, PLAIN.substring(lowered, lowered + 1), small, -font.getSize2D() * 0.15f);
            } else {
                add(runs, sign, font.canDisplay(code) ? font : other, 0);
            }
        });
        return runs;
    }

    private static void add(List<Run> runs, String sign, Font font, float rise) {
        int last = runs.size() - 1;
        if (last >= 0 && runs.get(last).font().equals(font) && runs.get(last).rise() == rise) {
            runs.set(last, new Run(runs.get(last).text() + sign, font, rise));
        } else {
            runs.add(new Run(sign, font, rise));
        }
    }
}
