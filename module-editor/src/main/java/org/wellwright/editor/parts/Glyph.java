package org.wellwright.editor.parts;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Component;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import javax.swing.Icon;

/** Small icons in lines, drawn in the colour of the text beside them, sharp at any scale. */
public enum Glyph implements Icon {
    /** Add something. */
    ADD,
    /** Take something away. */
    REMOVE,
    /** Make a copy. */
    DUPLICATE,
    /** Move up. */
    UP,
    /** Move down. */
    DOWN,
    /** Bring in from a file. */
    IMPORT,
    /** Start. */
    RUN,
    /** Stop. */
    STOP;

    private static final int SIZE = 14;

    @Override
    public int getIconWidth() {
        return SIZE;
    }

    @Override
    public int getIconHeight() {
        return SIZE;
    }

    @Override
    public void paintIcon(Component component, Graphics graphics, int x, int y) {
        Graphics2D g = (Graphics2D) graphics.create();
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        g.translate(x, y);
        Color colour = component == null ? Color.DARK_GRAY : component.getForeground();
        g.setColor(component == null || component.isEnabled() ? colour : Tones.faint());
        g.setStroke(new BasicStroke(1.5f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
        switch (this) {
            case ADD -> {
                g.draw(new Line2D.Double(7, 2.5, 7, 11.5));
                g.draw(new Line2D.Double(2.5, 7, 11.5, 7));
            }
            case REMOVE -> g.draw(new Line2D.Double(2.5, 7, 11.5, 7));
            case DUPLICATE -> {
                g.draw(new Rectangle2D.Double(4.5, 4.5, 7, 7));
                g.draw(path(9, 2.5, 2.5, 2.5, 2.5, 9));
            }
            case UP -> {
                g.draw(new Line2D.Double(7, 2.5, 7, 11.5));
                g.draw(path(3.5, 6, 7, 2.5, 10.5, 6));
            }
            case DOWN -> {
                g.draw(new Line2D.Double(7, 2.5, 7, 11.5));
                g.draw(path(3.5, 8, 7, 11.5, 10.5, 8));
            }
            case IMPORT -> {
                g.draw(new Line2D.Double(7, 1.5, 7, 8.5));
                g.draw(path(4, 5.8, 7, 8.8, 10, 5.8));
                g.draw(path(2, 9, 2, 12, 12, 12, 12, 9));
            }
            case RUN -> g.fill(closed(path(3.5, 2, 12, 7, 3.5, 12)));
            case STOP -> g.fill(new Rectangle2D.Double(3, 3, 8, 8));
            default -> throw new IllegalStateException("no drawing for " + this);
        }
        g.dispose();
    }

    private static Path2D path(double... points) {
        Path2D path = new Path2D.Double();
        path.moveTo(points[0], points[1]);
        for (int i = 2; i < points.length; i += 2) {
            path.lineTo(points[i], points[i + 1]);
        }
        return path;
    }

    private static Path2D closed(Path2D path) {
        path.closePath();
        return path;
    }
}
