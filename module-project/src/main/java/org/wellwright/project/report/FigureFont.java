package org.wellwright.project.report;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import org.apache.pdfbox.pdmodel.PDDocument;

/**
 * The font of exported figures: Liberation Sans (SIL Open Font Licence), which the PDF library carries, so that a
 * picture is the same on every machine and a PDF can embed it. Its widths are those of Arial and Helvetica, which an
 * SVG names as substitutes.
 */
final class FigureFont {
    /** Font families for an SVG, in the order of preference. */
    static final String FAMILIES = "'Liberation Sans', Arial, Helvetica, sans-serif";

    private static final String RESOURCE = "/org/apache/pdfbox/resources/ttf/LiberationSans-Regular.ttf";
    private static final Font REGULAR = load();

    private FigureFont() {}

    /** The font at the size that suits a picture: 11 on a small one to 17 on a large one. */
    static Font sized(int width, int height) {
        double size = 12.5 * Math.sqrt(Math.min(width / 900.0, height / 600.0));
        return REGULAR.deriveFont((float) Math.min(17, Math.max(11, size)));
    }

    /** The font file. */
    static InputStream open() {
        return PDDocument.class.getResourceAsStream(RESOURCE);
    }

    private static Font load() {
        try (InputStream file = open()) {
            return Font.createFont(Font.TRUETYPE_FONT, file);
        } catch (IOException | FontFormatException e) {
            throw new IllegalStateException("the PDF library no longer carries " + RESOURCE, e);
        }
    }
}
