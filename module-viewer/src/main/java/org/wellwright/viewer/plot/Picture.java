package org.wellwright.viewer.plot;

import java.awt.Graphics2D;
import org.wellwright.solver.model.LevelKey;

/** A computed picture, ready to be painted at any size by any thread. Immutable. */
public interface Picture {
    /** Whether the horizontal axis can be zoomed and moved. */
    boolean movesAcross();

    /** Whether the vertical axis can be zoomed and moved. */
    boolean movesUp();

    /** Paints into (0, 0, width, height) and tells what stands where. */
    Painted paint(Graphics2D g, int width, int height, PlotStyle style, Viewport view);

    /** A painted picture, for pointing at it. Immutable. */
    interface Painted {
        /** Where its axes stand. */
        PlotFrame.Area area();

        /** What is at a point, in user-space units; null for nothing. */
        Spot at(double x, double y);
    }

    /**
     * Something that can be pointed at.
     *
     * @param text what it is, with all digits; lines end with line feeds
     * @param model the model it belongs to; empty for none
     * @param level the level it shows, or null
     */
    record Spot(String text, String model, LevelKey level) {}
}
