package org.wellwright.viewer;

import java.awt.Font;
import java.awt.font.FontRenderContext;
import java.awt.geom.Rectangle2D;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.lang.reflect.Proxy;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.openide.util.Lookup;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.w3c.dom.NodeList;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureWriter;
import org.xml.sax.SAXException;

/** The texts of a picture and where they stand, read back from its SVG with an XML parser. */
public final class PictureText {
    private static final FontRenderContext MEASURE = new FontRenderContext(null, true, true);

    private PictureText() {}

    /** A text and its box without leading. */
    public record Text(String text, Rectangle2D box) {}

    /** All texts of a picture in drawing order. */
    public static List<Text> of(FigureProvider figure, FigureRequest request, int width, int height)
            throws IOException, ParserConfigurationException, SAXException {
        FigureWriter writer = Lookup.getDefault().lookup(FigureWriter.class);
        FigureRequest[] seen = new FigureRequest[1];
        byte[] svg = writer.bytes(
                spy(figure, seen), request, new FigureWriter.Sheet(FigureWriter.Format.SVG, width, height, 96));
        DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
        factory.setFeature("http://apache.org/xml/features/nonvalidating/load-external-dtd", false);
        Document document = factory.newDocumentBuilder().parse(new ByteArrayInputStream(svg));
        NodeList nodes = document.getElementsByTagName("text");
        List<Text> texts = new ArrayList<>();
        for (int i = 0; i < nodes.getLength(); i++) {
            Element node = (Element) nodes.item(i);
            double x = Double.parseDouble(node.getAttribute("x"));
            double y = Double.parseDouble(node.getAttribute("y"));
            Font font = seen[0].font().deriveFont(size(node));
            Rectangle2D bounds = font.getStringBounds(node.getTextContent(), MEASURE);
            double ascent = font.getSize2D() * 0.72;
            texts.add(new Text(
                    node.getTextContent(),
                    new Rectangle2D.Double(x, y - ascent, bounds.getWidth(), ascent + font.getSize2D() * 0.1)));
        }
        if (new String(svg, StandardCharsets.UTF_8).contains("rotate(")) {
            throw new AssertionError("this reader knows no turned text");
        }
        return texts;
    }

    private static float size(Node node) {
        for (Node at = node; at instanceof Element element; at = at.getParentNode()) {
            String size = element.getAttribute("font-size");
            if (!size.isEmpty()) {
                return Float.parseFloat(size.replace("px", ""));
            }
        }
        return 12;
    }

    /** Passes everything on and remembers the request, which carries the writer's font. */
    private static FigureProvider spy(FigureProvider figure, FigureRequest[] seen) {
        return (FigureProvider) Proxy.newProxyInstance(
                PictureText.class.getClassLoader(),
                new Class<?>[] {FigureProvider.class},
                (proxy, method, arguments) -> {
                    if (method.getName().equals("paint")) {
                        seen[0] = (FigureRequest) arguments[3];
                    }
                    return method.invoke(figure, arguments);
                });
    }
}
