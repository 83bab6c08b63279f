package org.wellwright.application;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Without the viewer's module, and without the editor's, the application starts, opens and saves. */
class MissingModulesWindowTest {
    private static VirtualDisplay display;

    @TempDir
    Path folder;

    @BeforeAll
    static void openDisplay() throws IOException {
        display = VirtualDisplay.open(1400, 900);
    }

    @AfterAll
    static void closeDisplay() {
        if (display != null) {
            display.close();
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"viewer", "editor"})
    void theApplicationStartsOpensAndSaves(String module) throws Exception {
        PackagedApplication copy = PackagedApplication.built().copyTo(folder.resolve("application"));
        Files.delete(copy.folder().resolve("wellwright/modules/org-wellwright-" + module + ".jar"));
        Path own = Files.createDirectory(folder.resolve("without-" + module));
        WindowSession session = new WindowSession(copy, display, own);
        session.play(
                "size 1280 800",
                "wait-text start.example.1 Ol",
                "click start.example.1",
                "wait-title \"invented ion\"",
                "sleep 1000",
                "screenshot open.png",
                "action File/org-wellwright-project-window-SaveProjectAction",
                "choose-file saved.wellwright",
                "wait-file saved.wellwright Ol",
                "sleep 500");
        session.picture("open.png");
        session.play("wait-title \"invented ion\"", "rows projects.list projects.txt");
        assertThat(session.lines("projects.txt")).hasSize(2);
        String example = Files.readString(copy.folder().resolve("examples/alkali-ion.wellwright"))
                .strip();
        // What follows in the saved file is the state of windows.
        assertThat(Files.readString(own.resolve("saved.wellwright")))
                .startsWith(example.substring(0, example.length() - 2));
    }
}
