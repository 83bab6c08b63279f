package org.wellwright.viewer.picture;

import java.awt.Component;
import java.awt.Dimension;
import java.awt.Graphics2D;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javax.swing.JFileChooser;
import javax.swing.filechooser.FileNameExtensionFilter;
import org.openide.DialogDisplayer;
import org.openide.NotifyDescriptor;
import org.openide.awt.StatusDisplayer;
import org.openide.util.Lookup;
import org.openide.util.NbBundle.Messages;
import org.openide.util.RequestProcessor;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureWriter;
import org.wellwright.solver.Problem;
import org.wellwright.solver.WellwrightException;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.Viewport;

/** Asks for a file and writes a picture as it is shown, on a light ground. */
@Messages({
    "LBL_SaveFigure=Save picture",
    "FMT_Svg=Vector graphics for the web (SVG)",
    "FMT_Pdf=Vector graphics for print (PDF)",
    "FMT_Png=Pixels at 300 dots per inch (PNG)",
    "# {0} - name of a file",
    "MSG_FigureReplace={0} is there already. Replace it?",
    "# {0} - name of a file",
    "MSG_FigureSaved=Saved {0}",
    "# {0} - name of a file",
    "# {1} - what went wrong",
    "MSG_FigureNotSaved={0} could not be written: {1}"
})
final class SaveFigure {
    private static final RequestProcessor WRITING = new RequestProcessor("save picture", 1);
    private static final int PRINT_DPI = 300;

    private SaveFigure() {}

    static void ask(Component parent, FigureProvider figure, FigureViewModel shown, Viewport view, Dimension size) {
        JFileChooser chooser = new JFileChooser();
        chooser.setDialogTitle(Bundle.LBL_SaveFigure());
        chooser.setAcceptAllFileFilterUsed(false);
        chooser.addChoosableFileFilter(new FileNameExtensionFilter(Bundle.FMT_Svg(), "svg"));
        chooser.addChoosableFileFilter(new FileNameExtensionFilter(Bundle.FMT_Pdf(), "pdf"));
        chooser.addChoosableFileFilter(new FileNameExtensionFilter(Bundle.FMT_Png(), "png"));
        chooser.setSelectedFile(new File(figure.id() + ".svg"));
        if (chooser.showSaveDialog(parent) != JFileChooser.APPROVE_OPTION) {
            return;
        }
        String extension = ((FileNameExtensionFilter) chooser.getFileFilter()).getExtensions()[0];
        Path file = named(chooser.getSelectedFile().toPath(), extension);
        if (Files.exists(file) && !agreed(Bundle.MSG_FigureReplace(file.getFileName()))) {
            return;
        }
        WRITING.post(() -> write(figure, shown, view, size, file));
    }

    /** The file with an extension that says what is in it: its own if that is one of ours, otherwise the one chosen. */
    static Path named(Path file, String extension) {
        return format(file).isPresent() ? file : file.resolveSibling(file.getFileName() + "." + extension);
    }

    private static Optional<FigureWriter.Format> format(Path file) {
        String name = file.getFileName().toString().toLowerCase(Locale.ROOT);
        for (FigureWriter.Format format : FigureWriter.Format.values()) {
            if (name.endsWith("." + format.name().toLowerCase(Locale.ROOT))) {
                return Optional.of(format);
            }
        }
        return Optional.empty();
    }

    private static boolean agreed(String question) {
        NotifyDescriptor ask = new NotifyDescriptor.Confirmation(question, NotifyDescriptor.OK_CANCEL_OPTION);
        return DialogDisplayer.getDefault().notify(ask) == NotifyDescriptor.OK_OPTION;
    }

    private static void write(FigureProvider figure, FigureViewModel shown, Viewport view, Dimension size, Path file) {
        FigureWriter writer = Lookup.getDefault().lookup(FigureWriter.class);
        FigureWriter.Format format = format(file).orElseThrow();
        int width = Math.max(320, size.width);
        int height = Math.max(200, size.height);
        FigureRequest now = shown.request();
        FigureRequest request =
                new FigureRequest(now.input(), now.selection(), now.variant(), FigureRequest.Ground.LIGHT, now.font());
        try {
            writer.write(
                    new AsShown(figure, shown, view),
                    request,
                    new FigureWriter.Sheet(format, width, height, PRINT_DPI),
                    file);
            StatusDisplayer.getDefault().setStatusText(Bundle.MSG_FigureSaved(file));
        } catch (IOException | WellwrightException e) {
            String text = Bundle.MSG_FigureNotSaved(file, e.getMessage());
            DialogDisplayer.getDefault()
                    .notifyLater(new NotifyDescriptor.Message(text, NotifyDescriptor.ERROR_MESSAGE));
        }
    }

    /** The figure with the part of its axes that the window shows. */
    private record AsShown(FigureProvider figure, FigureViewModel shown, Viewport view) implements FigureProvider {
        @Override
        public String id() {
            return figure.id();
        }

        @Override
        public String title() {
            return figure.title();
        }

        @Override
        public int position() {
            return figure.position();
        }

        @Override
        public List<Variant> variants() {
            return figure.variants();
        }

        @Override
        public Optional<Problem> missing(FigureRequest request) {
            return figure.missing(request);
        }

        @Override
        public void paint(Graphics2D target, int width, int height, FigureRequest request) {
            shown.picture().paint(target, width, height, PlotStyle.of(request), view);
        }
    }
}
