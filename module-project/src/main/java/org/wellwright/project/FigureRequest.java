package org.wellwright.project;

import java.awt.Font;
import java.util.Objects;

/**
 * One picture wanted of one figure.
 *
 * @param input what there is to show
 * @param selection what the user picked
 * @param variant id of one of the figure's variants; empty for its first
 * @param ground light or dark
 * @param font font of running text at the size wanted; the figure makes the others from it
 */
public record FigureRequest(FigureInput input, FigureSelection selection, String variant, Ground ground, Font font) {
    /** What is behind the picture. */
    public enum Ground {
        /** For paper, reports and the light window. */
        LIGHT,
        /** For the dark window. */
        DARK
    }

    /** Checks that nothing is missing. */
    public FigureRequest {
        Objects.requireNonNull(input, "input");
        Objects.requireNonNull(selection, "selection");
        Objects.requireNonNull(variant, "variant");
        Objects.requireNonNull(ground, "ground");
        Objects.requireNonNull(font, "font");
    }

    /** The same in another font. */
    public FigureRequest withFont(Font newFont) {
        return new FigureRequest(input, selection, variant, ground, newFont);
    }
}
