package org.wellwright.project.report;

import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2D;
import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2DFontTextDrawer;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.Map;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentInformation;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.font.PDType0Font;
import org.apache.pdfbox.util.Matrix;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureWriter.Sheet;

/** A figure as one page of PDF with the font embedded and text as text; the facts stand in the document information. */
final class PdfFigure {
    private static final float POINTS_PER_UNIT = 72f / 96f;

    private PdfFigure() {}

    static byte[] bytes(FigureProvider figure, FigureRequest request, Sheet sheet, FigureFacts facts)
            throws IOException {
        try (PDDocument document = new PDDocument()) {
            float width = sheet.width() * POINTS_PER_UNIT;
            float height = sheet.height() * POINTS_PER_UNIT;
            PDPage page = new PDPage(new PDRectangle(width, height));
            document.addPage(page);
            // The identifier would be made from the clock.
            document.setDocumentId((long) (facts.digest() + facts.title() + facts.state()).hashCode());
            document.setDocumentInformation(information(facts));
            PdfBoxGraphics2D g = new PdfBoxGraphics2D(document, sheet.width(), sheet.height());
            // What the font has no signs for is drawn as shapes.
            PdfBoxGraphics2DFontTextDrawer drawer = new PdfBoxGraphics2DFontTextDrawer();
            try (InputStream file = FigureFont.open()) {
                drawer.registerFont(request.font().getName(), PDType0Font.load(document, file, true));
            }
            g.setFontTextDrawer(drawer);
            try {
                figure.paint(g, sheet.width(), sheet.height(), request);
            } finally {
                g.dispose();
            }
            try (PDPageContentStream contents = new PDPageContentStream(document, page)) {
                contents.transform(Matrix.getScaleInstance(POINTS_PER_UNIT, POINTS_PER_UNIT));
                contents.drawForm(g.getXFormObject());
            }
            ByteArrayOutputStream bytes = new ByteArrayOutputStream();
            document.save(bytes);
            return bytes.toByteArray();
        }
    }

    private static PDDocumentInformation information(FigureFacts facts) {
        PDDocumentInformation information = new PDDocumentInformation();
        information.setTitle(facts.title());
        information.setSubject(facts.project());
        information.setCreator(facts.creator());
        for (Map.Entry<String, String> fact : facts.named().entrySet()) {
            information.setCustomMetadataValue(fact.getKey(), fact.getValue());
        }
        return information;
    }
}
