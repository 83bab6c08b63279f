package org.wellwright.project;

import java.awt.Graphics2D;
import java.util.List;
import java.util.Optional;
import org.wellwright.solver.Problem;

/**
 * A figure of a project. Registered with {@code @ServiceProvider(service = FigureProvider.class)} and found through the
 * Lookup, so that a module adds one by being there. Implementations hold no state and may be called from any thread.
 */
public interface FigureProvider {
    /**
     * One way to draw a figure.
     *
     * @param id lower-case identifier, unique in the figure
     * @param title name on screen
     */
    record Variant(String id, String title) {}

    /** Lower-case identifier used on the command line, unique ("levels"). */
    String id();

    /** Name on screen. */
    String title();

    /** Position among the figures of a report; lower comes first. */
    int position();

    /** The ways to draw it, the usual one first; at least one. */
    List<Variant> variants();

    /** Why this picture cannot be drawn (nothing solved, no data, no such state); empty if it can. */
    Optional<Problem> missing(FigureRequest request);

    /**
     * Paints the picture into (0, 0, width, height); text is drawn as text.
     *
     * @param width user-space units, at least 320
     * @param height user-space units, at least 200
     * @throws org.wellwright.solver.InvalidModelException with the problem that {@link #missing} reports
     */
    void paint(Graphics2D target, int width, int height, FigureRequest request);
}
