package org.wellwright.project.window;

import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.Transferable;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.awt.dnd.DropTargetDragEvent;
import java.awt.dnd.DropTargetDropEvent;
import java.io.File;
import java.io.IOException;
import java.net.URI;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.openide.windows.ExternalDropHandler;

/** Opens project files that are dropped on the window. */
@ServiceProvider(service = ExternalDropHandler.class)
public final class DroppedFiles extends ExternalDropHandler {
    @Override
    public boolean canDrop(DropTargetDragEvent event) {
        return event.isDataFlavorSupported(DataFlavor.javaFileListFlavor)
                || event.isDataFlavorSupported(DataFlavor.stringFlavor);
    }

    @Override
    public boolean canDrop(DropTargetDropEvent event) {
        return event.isDataFlavorSupported(DataFlavor.javaFileListFlavor)
                || event.isDataFlavorSupported(DataFlavor.stringFlavor);
    }

    @Override
    public boolean handleDrop(DropTargetDropEvent event) {
        List<Path> files = files(event.getTransferable());
        files.forEach(file -> ProjectDesk.get().open(file, session -> {}));
        return !files.isEmpty();
    }

    /** The files of a drop: a list of files, or lines with their addresses, as some desktops give. */
    static List<Path> files(Transferable content) {
        List<Path> files = new ArrayList<>();
        try {
            if (content.isDataFlavorSupported(DataFlavor.javaFileListFlavor)) {
                for (Object file : (List<?>) content.getTransferData(DataFlavor.javaFileListFlavor)) {
                    files.add(((File) file).toPath());
                }
            } else if (content.isDataFlavorSupported(DataFlavor.stringFlavor)) {
                for (String line : content.getTransferData(DataFlavor.stringFlavor)
                        .toString()
                        .split("\\R")) {
                    if (line.startsWith("file:")) {
                        files.add(Path.of(URI.create(line.strip())));
                    }
                }
            }
        } catch (UnsupportedFlavorException | IOException | IllegalArgumentException e) {
            return List.of();
        }
        return files;
    }
}
