package org.wellwright.project;

import java.io.IOException;
import java.nio.file.Path;

/** Writes pictures of figures as files; found through the Lookup. */
public interface FigureWriter {
    /** A kind of file. */
    enum Format {
        /** Pixels. */
        PNG,
        /** Vector graphics for the web, text as text. */
        SVG,
        /** Vector graphics for print, text as text. */
        PDF
    }

    /**
     * Size and sort of a picture.
     *
     * @param format kind of file
     * @param width width in units of 1/96 inch
     * @param height height in units of 1/96 inch
     * @param dpi dots per inch of a PNG: 96 makes one pixel of one unit; without meaning for the others
     */
    record Sheet(Format format, int width, int height, int dpi) {
        /** Checks the numbers. */
        public Sheet {
            if (width < 320 || height < 200 || width > 20_000 || height > 20_000 || dpi < 24 || dpi > 1200) {
                throw new IllegalArgumentException(
                        "a picture needs 320x200 to 20000x20000 and 24 to 1200 dpi, got %dx%d, %d dpi"
                                .formatted(width, height, dpi));
            }
        }
    }

    /**
     * Writes one picture, replacing the file only when it is complete. The font of the request is replaced by the
     * writer's own, so that a picture is the same on every machine.
     *
     * @throws IOException if the file cannot be written
     * @throws org.wellwright.solver.InvalidModelException if the figure cannot be drawn
     */
    void write(FigureProvider figure, FigureRequest request, Sheet sheet, Path file) throws IOException;

    /** The picture as bytes; otherwise as {@link #write}. */
    byte[] bytes(FigureProvider figure, FigureRequest request, Sheet sheet) throws IOException;
}
