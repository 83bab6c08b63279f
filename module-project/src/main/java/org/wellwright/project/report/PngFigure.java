package org.wellwright.project.report;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.Map;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageTypeSpecifier;
import javax.imageio.ImageWriter;
import javax.imageio.metadata.IIOMetadata;
import javax.imageio.metadata.IIOMetadataNode;
import javax.imageio.stream.ImageOutputStream;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureWriter.Sheet;

/** A figure as PNG (ISO/IEC 15948): pHYs carries the resolution, iTXt the facts. */
final class PngFigure {
    private static final String FORMAT = "javax_imageio_png_1.0";
    private static final double METRES_PER_INCH = 0.0254;

    private PngFigure() {}

    static byte[] bytes(FigureProvider figure, FigureRequest request, Sheet sheet, FigureFacts facts)
            throws IOException {
        double scale = sheet.dpi() / 96.0;
        BufferedImage image = new BufferedImage(
                (int) Math.round(sheet.width() * scale),
                (int) Math.round(sheet.height() * scale),
                BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        try {
            g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
            g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
            g.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
            g.scale(scale, scale);
            figure.paint(g, sheet.width(), sheet.height(), request);
        } finally {
            g.dispose();
        }
        ImageWriter writer = ImageIO.getImageWritersByFormatName("png").next();
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ImageOutputStream out = ImageIO.createImageOutputStream(bytes)) {
            writer.setOutput(out);
            IIOMetadata metadata =
                    writer.getDefaultImageMetadata(ImageTypeSpecifier.createFromRenderedImage(image), null);
            metadata.mergeTree(FORMAT, tree(sheet.dpi(), facts));
            writer.write(null, new IIOImage(image, null, metadata), null);
        } finally {
            writer.dispose();
        }
        return bytes.toByteArray();
    }

    private static IIOMetadataNode tree(int dpi, FigureFacts facts) {
        IIOMetadataNode root = new IIOMetadataNode(FORMAT);
        IIOMetadataNode size = new IIOMetadataNode("pHYs");
        String perMetre = Long.toString(Math.round(dpi / METRES_PER_INCH));
        size.setAttribute("pixelsPerUnitXAxis", perMetre);
        size.setAttribute("pixelsPerUnitYAxis", perMetre);
        size.setAttribute("unitSpecifier", "meter");
        root.appendChild(size);
        IIOMetadataNode texts = new IIOMetadataNode("iTXt");
        for (Map.Entry<String, String> fact : facts.named().entrySet()) {
            IIOMetadataNode text = new IIOMetadataNode("iTXtEntry");
            text.setAttribute("keyword", fact.getKey());
            text.setAttribute("compressionFlag", "FALSE");
            text.setAttribute("compressionMethod", "0");
            text.setAttribute("languageTag", "");
            text.setAttribute("translatedKeyword", "");
            text.setAttribute("text", fact.getValue());
            texts.appendChild(text);
        }
        root.appendChild(texts);
        return root;
    }
}
