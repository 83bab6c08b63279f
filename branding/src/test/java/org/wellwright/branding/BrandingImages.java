package org.wellwright.branding;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Arc2D;
import java.awt.geom.Ellipse2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import javax.imageio.ImageIO;

/**
 * Draws the icons and splash pictures that the platform loads under fixed names. The names end in .gif, the content is
 * PNG: the platform's image reader goes by content, and PNG keeps soft edges. Run the main method with the folder
 * {@code src/main/nbm-branding} to write them anew.
 */
final class BrandingImages {
    private static final String FOLDER = "core/core.jar/org/netbeans/core/startup/";

    private BrandingImages() {}

    public static void main(String[] args) throws IOException {
        Path root = Path.of(args[0]);
        for (Map.Entry<String, BufferedImage> entry : all().entrySet()) {
            Path file = root.resolve(entry.getKey());
            Files.createDirectories(file.getParent());
            ImageIO.write(entry.getValue(), "png", file.toFile());
        }
    }

    /** Each picture by its path below the branding folder. */
    static Map<String, BufferedImage> all() {
        Map<String, BufferedImage> pictures = new LinkedHashMap<>(icons());
        pictures.put(FOLDER + "splash.gif", splash(Color.WHITE, new Color(0x17324d), new Color(0x5b6270)));
        pictures.put(FOLDER + "splash_dark.gif", splash(new Color(0x1e2126), new Color(0xf4f1e8), new Color(0x9aa2b0)));
        return pictures;
    }

    static Map<String, BufferedImage> icons() {
        Map<String, BufferedImage> icons = new LinkedHashMap<>();
        icons.put("../resources/org/wellwright/branding/look.png", halfAndHalf(32));
        icons.put(FOLDER + "frame.gif", icon(16));
        icons.put(FOLDER + "frame_dark.gif", icon(16));
        icons.put(FOLDER + "frame32.gif", icon(32));
        icons.put(FOLDER + "frame32_dark.gif", icon(32));
        icons.put(FOLDER + "frame48.gif", icon(48));
        icons.put(FOLDER + "frame48_dark.gif", icon(48));
        icons.put(FOLDER + "frame256.png", icon(256));
        icons.put(FOLDER + "frame512.png", icon(512));
        icons.put(FOLDER + "frame1024.png", icon(1024));
        return icons;
    }

    private static BufferedImage icon(int size) {
        BufferedImage image = new BufferedImage(size, size, BufferedImage.TYPE_INT_ARGB);
        Graphics2D g = image.createGraphics();
        Mark.paint(g, 0, 0, size);
        g.dispose();
        return image;
    }

    /** A disc, one half light and one half dark: the sign of the options page. */
    private static BufferedImage halfAndHalf(int size) {
        BufferedImage image = new BufferedImage(size, size, BufferedImage.TYPE_INT_ARGB);
        Graphics2D g = image.createGraphics();
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        double edge = size / 8.0;
        g.setColor(Mark.CURVE);
        g.fill(new Ellipse2D.Double(edge, edge, size - 2 * edge, size - 2 * edge));
        g.setColor(Mark.TILE);
        g.fill(new Arc2D.Double(edge, edge, size - 2 * edge, size - 2 * edge, 90, 180, Arc2D.PIE));
        g.setStroke(new BasicStroke(size / 16f));
        g.draw(new Ellipse2D.Double(edge, edge, size - 2 * edge, size - 2 * edge));
        g.dispose();
        return image;
    }

    private static BufferedImage splash(Color ground, Color name, Color line) {
        BufferedImage image = new BufferedImage(480, 300, BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        g.setColor(ground);
        g.fillRect(0, 0, 480, 300);
        g.setColor(new Color(line.getRed(), line.getGreen(), line.getBlue(), 90));
        g.drawRect(0, 0, 479, 299);
        Mark.paint(g, 32, 44, 132);
        g.setColor(name);
        g.setFont(new Font(Font.SANS_SERIF, Font.BOLD, 40));
        g.drawString("Wellwright", 188, 112);
        g.setColor(line);
        g.setFont(new Font(Font.SANS_SERIF, Font.PLAIN, 14));
        g.drawString("Two particles, one central force:", 190, 142);
        g.drawString("which potential holds, and how firmly", 190, 162);
        g.dispose();
        return image;
    }
}
