package org.wellwright.project.report;

import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.Image;
import java.awt.image.BufferedImage;
import java.awt.image.RenderedImage;
import java.awt.image.renderable.RenderableImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStreamWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.Locale;
import java.util.Map;
import javax.imageio.ImageIO;
import org.apache.batik.dom.GenericDOMImplementation;
import org.apache.batik.svggen.DefaultImageHandler;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.apache.batik.svggen.SVGGraphics2DIOException;
import org.apache.batik.svggen.SimpleImageHandler;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.w3c.dom.NodeList;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureWriter.Sheet;

/** A figure as SVG 1.1 with text as text; the facts stand in a metadata element. */
final class SvgFigure {
    private static final String SVG = "http://www.w3.org/2000/svg";
    private static final String FACTS = "urn:wellwright:figure";

    private SvgFigure() {}

    static byte[] bytes(FigureProvider figure, FigureRequest request, Sheet sheet, FigureFacts facts)
            throws IOException {
        Document document = GenericDOMImplementation.getDOMImplementation().createDocument(SVG, "svg", null);
        SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
        context.setComment("");
        context.setPrecision(3);
        context.setGenericImageHandler(new SimpleImageHandler(new EmbeddedImages()));
        SVGGraphics2D g = new SVGGraphics2D(context, false);
        g.setSVGCanvasSize(new Dimension(sheet.width(), sheet.height()));
        figure.paint(g, sheet.width(), sheet.height(), request);
        Element root = g.getRoot();
        root.setAttributeNS(null, "viewBox", "0 0 %d %d".formatted(sheet.width(), sheet.height()));
        Node first = root.getFirstChild();
        root.insertBefore(element(document, SVG, "title", facts.title()), first);
        Element metadata = document.createElementNS(SVG, "metadata");
        for (Map.Entry<String, String> fact : facts.named().entrySet()) {
            metadata.appendChild(
                    element(document, FACTS, "w:" + fact.getKey().toLowerCase(Locale.ROOT), fact.getValue()));
        }
        root.setAttributeNS("http://www.w3.org/2000/xmlns/", "xmlns:w", FACTS);
        root.insertBefore(metadata, first);
        nameFonts(root, request.font().getFamily());
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (Writer writer = new OutputStreamWriter(bytes, StandardCharsets.UTF_8)) {
            g.stream(root, writer, false, false);
        }
        return bytes.toByteArray();
    }

    /** Names substitutes of equal widths, for readers that do not have the font. */
    private static void nameFonts(Element element, String family) {
        if (element.getAttribute("font-family").contains(family)) {
            element.setAttribute("font-family", FigureFont.FAMILIES);
        }
        NodeList children = element.getChildNodes();
        for (int i = 0; i < children.getLength(); i++) {
            if (children.item(i) instanceof Element child) {
                nameFonts(child, family);
            }
        }
    }

    private static Element element(Document document, String space, String name, String text) {
        Element element = document.createElementNS(space, name);
        element.appendChild(document.createTextNode(text));
        return element;
    }

    /** Images as PNG inside the file. */
    private static final class EmbeddedImages extends DefaultImageHandler {
        private static final String XLINK = "http://www.w3.org/1999/xlink";

        @Override
        protected void handleHREF(Image image, Element element, SVGGeneratorContext context)
                throws SVGGraphics2DIOException {
            BufferedImage copy =
                    new BufferedImage(image.getWidth(null), image.getHeight(null), BufferedImage.TYPE_INT_ARGB);
            Graphics2D g = copy.createGraphics();
            g.drawImage(image, 0, 0, null);
            g.dispose();
            handleHREF((RenderedImage) copy, element, context);
        }

        @Override
        protected void handleHREF(RenderedImage image, Element element, SVGGeneratorContext context)
                throws SVGGraphics2DIOException {
            ByteArrayOutputStream bytes = new ByteArrayOutputStream();
            try {
                ImageIO.write(image, "png", bytes);
            } catch (IOException e) {
                throw new SVGGraphics2DIOException(e);
            }
            String data = Base64.getEncoder().encodeToString(bytes.toByteArray());
            element.setAttributeNS(XLINK, "xlink:href", "data:image/png;base64," + data);
        }

        @Override
        protected void handleHREF(RenderableImage image, Element element, SVGGeneratorContext context)
                throws SVGGraphics2DIOException {
            handleHREF(image.createDefaultRendering(), element, context);
        }
    }
}
