package org.wellwright.project.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.StringSelection;
import java.awt.datatransfer.Transferable;
import java.io.File;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;

class DroppedFilesTest {
    private record Files(List<File> files) implements Transferable {
        @Override
        public DataFlavor[] getTransferDataFlavors() {
            return new DataFlavor[] {DataFlavor.javaFileListFlavor};
        }

        @Override
        public boolean isDataFlavorSupported(DataFlavor flavour) {
            return flavour.equals(DataFlavor.javaFileListFlavor);
        }

        @Override
        public Object getTransferData(DataFlavor flavour) {
            return files;
        }
    }

    @Test
    void takesFilesAndTheirAddresses() {
        assertThat(DroppedFiles.files(new Files(List.of(new File("/a/b.wellwright"), new File("/c.wellwright")))))
                .containsExactly(Path.of("/a/b.wellwright"), Path.of("/c.wellwright"));
        assertThat(DroppedFiles.files(
                        new StringSelection("file:///a/with%20blank.wellwright\r\nfile:///c.wellwright\r\n")))
                .containsExactly(Path.of("/a/with blank.wellwright"), Path.of("/c.wellwright"));
        assertThat(DroppedFiles.files(new StringSelection("some text"))).isEmpty();
        assertThat(DroppedFiles.files(new StringSelection("file:not an address at all://")))
                .isEmpty();
    }
}
