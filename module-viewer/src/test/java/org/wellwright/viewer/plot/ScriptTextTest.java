package org.wellwright.viewer.plot;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import org.junit.jupiter.api.Test;

class ScriptTextTest {
    private static final Font FONT = new Font(Font.SANS_SERIF, Font.PLAIN, 14);

    @Test
    void fittedKeepsWhatFitsAndShortensTheRest() {
        assertThat(ScriptText.fitted(FONT, "short", 200)).isEqualTo("short");
        String text = ScriptText.fitted(FONT, "a rather long name of a model", 80);
        assertThat(text).startsWith("a rat").endsWith("…");
        assertThat(ScriptText.width(FONT, text)).isLessThanOrEqualTo(80);
        assertThat(ScriptText.fitted(FONT, "anything", 1)).isEmpty();
    }

    @Test
    void drawnTextIsAsWideAsMeasured() {
        BufferedImage image = new BufferedImage(300, 60, BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        g.setColor(Color.WHITE);
        ScriptText.drawRight(g, FONT, "Energy (cm⁻¹)", 290, 40);
        g.dispose();
        int first = Integer.MAX_VALUE;
        int last = 0;
        for (int x = 0; x < 300; x++) {
            for (int y = 0; y < 60; y++) {
                if ((image.getRGB(x, y) & 0xff) > 100) {
                    first = Math.min(first, x);
                    last = Math.max(last, x);
                }
            }
        }
        assertThat(last).isBetween(282, 290);
        assertThat((double) (290 - first))
                .isBetween(ScriptText.width(FONT, "Energy (cm⁻¹)") - 4, ScriptText.width(FONT, "Energy (cm⁻¹)") + 2);
    }
}
