package org.wellwright.branding;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.RoundRectangle2D;

/**
 * The mark: an uneven well on a rounded tile, steep on the left and easing out on the right, with levels that crowd
 * towards the rim. Drawn from the shape V(x) = (1 − e^{−x})² − 1 at any size; the files under
 * {@code src/main/nbm-branding} are made from it.
 */
public final class Mark {
    static final Color TILE = new Color(0x17324d);
    static final Color CURVE = new Color(0xf4f1e8);
    private static final Color[] LEVELS = {
        new Color(0xf6c453), new Color(0xf29f58), new Color(0xe87a64), new Color(0xd05c7b)
    };
    private static final double[] DEPTHS = {0.78, 0.50, 0.28, 0.13};
    private static final double LEFT = -0.757;
    private static final double RIGHT = 2.9;
    private static final double RIM = 0.28;

    private Mark() {}

    /**
     * Paints the mark into a square.
     *
     * @param x left edge in user space
     * @param y upper edge in user space
     * @param size length of an edge in user space; below 24 the mark is drawn with fewer, thicker lines
     */
    public static void paint(Graphics2D target, double x, double y, double size) {
        Graphics2D g = (Graphics2D) target.create();
        try {
            g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
            g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
            g.translate(x, y);
            g.scale(size, size);
            g.setColor(TILE);
            g.fill(new RoundRectangle2D.Double(0.02, 0.02, 0.96, 0.96, 0.30, 0.30));
            boolean small = size < 24;
            float line = small ? 0.10f : 0.056f;
            g.setStroke(new BasicStroke(line * 0.86f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND));
            for (int i = 0; i < LEVELS.length; i += small ? 2 : 1) {
                g.setColor(LEVELS[i]);
                double root = Math.sqrt(1 - DEPTHS[i]);
                double height = screenY(-DEPTHS[i]);
                g.draw(new Line2D.Double(screenX(-Math.log(1 + root)), height, screenX(-Math.log(1 - root)), height));
            }
            g.setColor(CURVE);
            g.setStroke(new BasicStroke(line, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
            g.draw(well());
        } finally {
            g.dispose();
        }
    }

    private static Path2D well() {
        Path2D path = new Path2D.Double();
        int steps = 160;
        for (int i = 0; i <= steps; i++) {
            double at = LEFT + (RIGHT - LEFT) * i / steps;
            double root = 1 - Math.exp(-at);
            double height = root * root - 1;
            if (i == 0) {
                path.moveTo(screenX(at), screenY(Math.min(height, RIM)));
            } else {
                path.lineTo(screenX(at), screenY(Math.min(height, RIM)));
            }
        }
        return path;
    }

    private static double screenX(double x) {
        return 0.17 + 0.66 * (x - LEFT) / (RIGHT - LEFT);
    }

    private static double screenY(double v) {
        return 0.82 - 0.62 * (v + 1) / (1 + RIM);
    }
}
