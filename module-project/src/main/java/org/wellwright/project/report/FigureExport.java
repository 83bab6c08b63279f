package org.wellwright.project.report;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureWriter;
import org.wellwright.project.file.SafeFile;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;

/**
 * Writes figures as PNG, SVG and PDF with the project, model, state and version in the metadata. Equal requests give
 * equal bytes.
 */
@ServiceProvider(service = FigureWriter.class)
public final class FigureExport implements FigureWriter {
    @Override
    public void write(FigureProvider figure, FigureRequest request, Sheet sheet, Path file) throws IOException {
        SafeFile.replace(file, bytes(figure, request, sheet), false);
    }

    @Override
    public byte[] bytes(FigureProvider figure, FigureRequest request, Sheet sheet) throws IOException {
        FigureRequest dressed = request.withFont(FigureFont.sized(sheet.width(), sheet.height()));
        Optional<Problem> missing = figure.missing(dressed);
        if (missing.isPresent()) {
            throw new InvalidModelException(missing.get());
        }
        FigureFacts facts = FigureFacts.of(figure, dressed, Version.text());
        return switch (sheet.format()) {
            case PNG -> PngFigure.bytes(figure, dressed, sheet, facts);
            case SVG -> SvgFigure.bytes(figure, dressed, sheet, facts);
            case PDF -> PdfFigure.bytes(figure, dressed, sheet, facts);
        };
    }
}
