package org.wellwright.project.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.imageio.ImageIO;
import javax.imageio.ImageReader;
import javax.imageio.metadata.IIOMetadataNode;
import javax.imageio.stream.ImageInputStream;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDResources;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.apache.pdfbox.rendering.PDFRenderer;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.openide.util.Lookup;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.FigureWriter;
import org.wellwright.project.FigureWriter.Format;
import org.wellwright.project.FigureWriter.Sheet;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Weighting;
import org.xml.sax.SAXException;

class FigureExportTest {
    private static final String LABEL = "Energy ħω ψ σ² Å";
    private final FigureWriter export = Lookup.getDefault().lookup(FigureWriter.class);

    @Test
    void svgHoldsTextAsTextAndTheFacts() throws IOException, ParserConfigurationException, SAXException {
        byte[] bytes = export.bytes(new Sample(true), request(), new Sheet(Format.SVG, 640, 420, 96));
        Document document = parse(bytes);
        assertThat(document.getDocumentElement().getAttribute("viewBox")).isEqualTo("0 0 640 420");
        assertThat(texts(document, "text")).contains(LABEL, "模型");
        assertThat(texts(document, "title")).contains("A sample");
        Element metadata = (Element) document.getElementsByTagName("metadata").item(0);
        assertThat(metadata.getTextContent())
                .contains("Invented project <1>")
                .contains("abc123")
                .contains("screened")
                .contains("pair, V, l = 1, index 2")
                .contains("Wellwright ");
        assertThat(new String(bytes, StandardCharsets.UTF_8)).contains("'Liberation Sans', Arial");
    }

    @Test
    void pdfHoldsTextAsTextInAnEmbeddedFontAndTheFacts() throws IOException {
        byte[] bytes = export.bytes(new Sample(true), request(), new Sheet(Format.PDF, 640, 420, 96));
        try (PDDocument document = Loader.loadPDF(bytes)) {
            PDPage page = document.getPage(0);
            assertThat(document.getNumberOfPages()).isEqualTo(1);
            assertThat(page.getMediaBox().getWidth()).isEqualTo(480f);
            assertThat(page.getMediaBox().getHeight()).isEqualTo(315f);
            assertThat(new PDFTextStripper().getText(document)).contains(LABEL);
            assertThat(document.getDocumentInformation().getTitle()).isEqualTo("A sample");
            assertThat(document.getDocumentInformation().getCustomMetadataValue("Model"))
                    .isEqualTo("screened");
            assertThat(document.getDocumentInformation().getCustomMetadataValue("State"))
                    .isEqualTo("pair, V, l = 1, index 2");
            assertThat(fonts(page))
                    .isNotEmpty()
                    .allMatch(name -> name.endsWith("LiberationSans") && name.contains("+"));
            // The picture is upright and fills the page: the corner mark of the sample is at the lower right.
            BufferedImage image = new PDFRenderer(document).renderImageWithDPI(0, 96);
            assertThat(new Color(image.getRGB(635, 415))).isEqualTo(Color.RED);
            assertThat(new Color(image.getRGB(5, 5))).isEqualTo(Color.WHITE);
        }
    }

    @Test
    void pngHasTheResolutionAndTheFacts() throws IOException {
        byte[] bytes = export.bytes(new Sample(true), request(), new Sheet(Format.PNG, 640, 420, 192));
        ImageReader reader = ImageIO.getImageReadersByFormatName("png").next();
        try (ImageInputStream in = ImageIO.createImageInputStream(new ByteArrayInputStream(bytes))) {
            reader.setInput(in);
            BufferedImage image = reader.read(0);
            assertThat(image.getWidth()).isEqualTo(1280);
            assertThat(image.getHeight()).isEqualTo(840);
            assertThat(new Color(image.getRGB(1275, 835))).isEqualTo(Color.RED);
            IIOMetadataNode root = (IIOMetadataNode) reader.getImageMetadata(0).getAsTree("javax_imageio_png_1.0");
            IIOMetadataNode size =
                    (IIOMetadataNode) root.getElementsByTagName("pHYs").item(0);
            assertThat(size.getAttribute("pixelsPerUnitXAxis")).isEqualTo("7559");
            NodeList texts = root.getElementsByTagName("iTXtEntry");
            List<String> entries = new ArrayList<>();
            for (int i = 0; i < texts.getLength(); i++) {
                Element entry = (Element) texts.item(i);
                entries.add(entry.getAttribute("keyword") + "=" + entry.getAttribute("text"));
            }
            assertThat(entries)
                    .contains("Project=Invented project <1>", "Project-Digest=abc123", "State=pair, V, l = 1, index 2");
        } finally {
            reader.dispose();
        }
    }

    @Test
    void equalRequestsGiveEqualBytes() throws IOException {
        for (Format format : Format.values()) {
            Sheet sheet = new Sheet(format, 400, 300, 96);
            assertThat(export.bytes(new Sample(true), request(), sheet))
                    .as(format.name())
                    .isEqualTo(export.bytes(new Sample(true), request(), sheet));
        }
    }

    @Test
    void aFigureThatCannotBeDrawnLeavesTheFileAlone(@TempDir Path folder) throws IOException {
        Path file = folder.resolve("levels.svg");
        Files.writeString(file, "before");
        assertThatThrownBy(() -> export.write(new Sample(false), request(), new Sheet(Format.SVG, 400, 300, 96), file))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("nothing is solved");
        assertThat(Files.readString(file)).isEqualTo("before");
        export.write(new Sample(true), request(), new Sheet(Format.SVG, 400, 300, 96), file);
        assertThat(Files.readString(file)).startsWith("<?xml");
        try (var files = Files.list(folder)) {
            assertThat(files).containsExactly(file);
        }
    }

    @Test
    void refusesSheetsOfNoUseNamingThem() {
        assertThatThrownBy(() -> new Sheet(Format.PNG, 10, 300, 96))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("10x300");
    }

    private static FigureRequest request() {
        ModelDocument document = new ModelDocument(
                "2022",
                "2020",
                "atomic",
                LabelConvention.ATOMIC,
                Weighting.KNOWN,
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of());
        FigureInput input =
                new FigureInput("Invented project <1>", "abc123", document, List.of(), List.of(), null, List.of());
        FigureSelection selection =
                new FigureSelection("screened", List.of(new LevelKey("pair", "V", ChannelKey.ofOrbital(1), 2)), 0);
        return new FigureRequest(
                input, selection, "", FigureRequest.Ground.LIGHT, new Font(Font.SANS_SERIF, Font.PLAIN, 12));
    }

    private static Document parse(byte[] bytes) throws IOException, ParserConfigurationException, SAXException {
        DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
        factory.setFeature("http://apache.org/xml/features/nonvalidating/load-external-dtd", false);
        return factory.newDocumentBuilder().parse(new ByteArrayInputStream(bytes));
    }

    private static List<String> texts(Document document, String tag) {
        NodeList nodes = document.getElementsByTagName(tag);
        List<String> texts = new ArrayList<>();
        for (int i = 0; i < nodes.getLength(); i++) {
            texts.add(nodes.item(i).getTextContent());
        }
        return texts;
    }

    private static List<String> fonts(PDPage page) throws IOException {
        List<String> names = new ArrayList<>();
        PDResources outer = page.getResources();
        for (COSName form : outer.getXObjectNames()) {
            if (outer.getXObject(form) instanceof PDFormXObject inner) {
                for (COSName font : inner.getResources().getFontNames()) {
                    names.add(inner.getResources().getFont(font).getName());
                }
            }
        }
        return names;
    }

    /** Paints a label and a red corner. */
    private record Sample(boolean possible) implements FigureProvider {
        @Override
        public String id() {
            return "sample";
        }

        @Override
        public String title() {
            return "A sample";
        }

        @Override
        public int position() {
            return 1;
        }

        @Override
        public List<Variant> variants() {
            return List.of(new Variant("one", "One"));
        }

        @Override
        public Optional<Problem> missing(FigureRequest request) {
            return possible ? Optional.empty() : Optional.of(new Problem("nothing is solved", "", "solve the model"));
        }

        @Override
        public void paint(Graphics2D target, int width, int height, FigureRequest request) {
            target.setColor(Color.WHITE);
            target.fillRect(0, 0, width, height);
            target.setColor(Color.RED);
            target.fillRect(width - 10, height - 10, 10, 10);
            target.setColor(Color.BLACK);
            target.draw(new Line2D.Double(20, 20, 100, 30));
            target.setFont(request.font());
            target.drawString(LABEL, 40f, 60f);
            target.drawString("模型", 40f, 90f);
        }
    }
}
