package org.wellwright.viewer.plot;

import java.awt.Color;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.Objects;

/**
 * One entry of a legend.
 *
 * @param text what it stands for
 * @param sign the sign before the text
 * @param colour colour of the sign
 * @param stroke line of the sign
 */
public record LegendEntry(String text, Sign sign, Color colour, Stroke stroke) {
    /** How the sign looks. */
    public enum Sign {
        /** A piece of line. */
        LINE,
        /** A filled circle. */
        CIRCLE,
        /** A filled square. */
        SQUARE,
        /** A filled triangle. */
        TRIANGLE,
        /** A filled diamond. */
        DIAMOND,
        /** A filled box. */
        BOX,
        /** An open diamond with a bar. */
        MEASURED;

        private static final List<Sign> MARKS = List.of(CIRCLE, SQUARE, TRIANGLE, DIAMOND);

        /** The mark of the i-th series, so that marks differ by more than colour. */
        public static Sign mark(int series) {
            return MARKS.get(series % MARKS.size());
        }

        /** The outline of a mark around a point. */
        public Shape around(double x, double y, double radius) {
            return switch (this) {
                case SQUARE ->
                    new Rectangle2D.Double(x - 0.88 * radius, y - 0.88 * radius, 1.76 * radius, 1.76 * radius);
                case TRIANGLE ->
                    polygon(
                            x,
                            y - 1.15 * radius,
                            x + 1.1 * radius,
                            y + 0.8 * radius,
                            x - 1.1 * radius,
                            y + 0.8 * radius);
                case DIAMOND, MEASURED ->
                    polygon(x - 1.2 * radius, y, x, y - 1.2 * radius, x + 1.2 * radius, y, x, y + 1.2 * radius);
                default -> new Ellipse2D.Double(x - radius, y - radius, 2 * radius, 2 * radius);
            };
        }

        private static Path2D polygon(double... corners) {
            Path2D path = new Path2D.Double();
            path.moveTo(corners[0], corners[1]);
            for (int i = 2; i < corners.length; i += 2) {
                path.lineTo(corners[i], corners[i + 1]);
            }
            path.closePath();
            return path;
        }
    }

    /** Checks that nothing is missing. */
    public LegendEntry {
        Objects.requireNonNull(text, "text");
        Objects.requireNonNull(sign, "sign");
        Objects.requireNonNull(colour, "colour");
        Objects.requireNonNull(stroke, "stroke");
    }
}
