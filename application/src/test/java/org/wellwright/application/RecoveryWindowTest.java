package org.wellwright.application;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Nothing that was typed is lost: not when the process is killed, not when another program writes into the file. */
class RecoveryWindowTest {
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

    private WindowSession session(String name) throws IOException {
        Path own = Files.createDirectory(folder.resolve(name));
        Files.copy(
                PackagedApplication.built().folder().resolve("examples/alkali-ion.wellwright"),
                own.resolve("ion.wellwright"));
        return new WindowSession(PackagedApplication.built(), display, own);
    }

    @Test
    void anEditThatAKilledProcessDidNotSaveIsOfferedBack() throws Exception {
        WindowSession session = session("kill");
        session.playToTheKill(
                new String[] {"ion.wellwright"},
                "wait-cell parameters.table 5 2 0.0548",
                "cell parameters.table 5 2 0.0612",
                "wait-title \"Ol⁺ *\"",
                "sleep 2500");
        assertThat(Files.readString(folder.resolve("kill/ion.wellwright"))).contains("0.0548");
        session.play(
                "wait-text ask.question \"did not end as it should\"",
                "screenshot offer.png",
                "rows ask.items offered.txt",
                "click ask.restore",
                "wait-cell parameters.table 5 2 0.0612",
                "wait-title \"Ol⁺ *\"",
                "action File/org-wellwright-project-window-SaveProjectAction",
                "wait-file ion.wellwright 0.0612",
                "action Edit/org-openide-actions-UndoAction",
                "wait-cell parameters.table 5 2 0.0548",
                "action Edit/org-openide-actions-RedoAction",
                "wait-cell parameters.table 5 2 0.0612");
        assertThat(session.lines("offered.txt").get(0)).contains("Ol⁺");
        session.picture("offer.png");
        session.play("wait-cell parameters.table 5 2 0.0612", "sleep 500", "windows quiet.txt");
    }

    @Test
    void aProjectThatWasNeverSavedComesBackToo() throws Exception {
        WindowSession session = session("unsaved");
        session.playToTheKill(
                new String[0],
                "wait-text start.example.1 Ol",
                "click start.example.1",
                "wait-cell parameters.table 5 2 0.0548",
                "cell parameters.table 5 2 0.0612",
                "sleep 2500");
        session.play(
                "wait-text ask.question \"did not end as it should\"",
                "click ask.restore",
                "wait-cell parameters.table 5 2 0.0612",
                "action File/org-wellwright-project-window-CloseProjectAction",
                "wait-text ask.question \"unsaved changes\"",
                "screenshot unsaved.png",
                "click ask.discard",
                "wait-title Wellwright",
                "sleep 500");
        session.picture("unsaved.png");
    }

    @Test
    void anOutsideChangeIsNoticedBeforeItIsOverwritten() throws Exception {
        WindowSession session = session("outside");
        session.playOn(
                new String[] {"ion.wellwright"},
                "wait-cell parameters.table 5 2 0.0548",
                "cell parameters.table 5 2 0.0612",
                "replace-in-file ion.wellwright 0.0548 0.0777",
                "action File/org-wellwright-project-window-SaveProjectAction",
                "wait-text ask.question \"changed by another program\"",
                "screenshot outside.png",
                "click ask.again",
                "wait-cell parameters.table 5 2 0.0777",
                "action Edit/org-openide-actions-UndoAction",
                "wait-cell parameters.table 5 2 0.0612",
                "action File/org-wellwright-project-window-SaveProjectAction",
                "wait-file ion.wellwright 0.0612");
        assertThat(Files.readString(folder.resolve("outside/ion.wellwright.bak")))
                .contains("0.0777");
        session.picture("outside.png");
    }

    @Test
    void quittingAsksAboutUnsavedChanges() throws Exception {
        WindowSession session = session("quit");
        session.playOn(
                new String[] {"ion.wellwright"},
                "wait-cell parameters.table 5 2 0.0548",
                "cell parameters.table 5 2 0.0612",
                "action System/org-netbeans-core-actions-SystemExit",
                "wait-text ask.question \"unsaved changes\"",
                "click ask.cancel",
                "wait-cell parameters.table 5 2 0.0612",
                "action System/org-netbeans-core-actions-SystemExit",
                "wait-text ask.question \"unsaved changes\"",
                "click ask.save",
                "sleep 60000");
        assertThat(Files.readString(folder.resolve("quit/ion.wellwright"))).contains("0.0612");
    }

    @Test
    void aFileThatIsOpenElsewhereCanBeLookedAtAndIsNotOverwritten() throws Exception {
        WindowSession session = session("lock");
        Path file = folder.resolve("lock/ion.wellwright");
        try (var channel = FileChannel.open(
                        file.resolveSibling("ion.wellwright.lock"),
                        StandardOpenOption.CREATE,
                        StandardOpenOption.WRITE);
                var lock = channel.lock()) {
            assertThat(lock.isValid()).isTrue();
            session.playOn(
                    new String[] {"ion.wellwright"},
                    "wait-cell parameters.table 5 2 0.0548",
                    "cell parameters.table 5 2 0.0612",
                    "action File/org-wellwright-project-window-SaveProjectAction",
                    "wait-text fault.text \"being written by\"",
                    "screenshot locked.png",
                    "press OK",
                    "action File/org-wellwright-project-window-SaveProjectAsAction",
                    "choose-file mine.wellwright",
                    "wait-file mine.wellwright 0.0612",
                    "sleep 500");
        }
        assertThat(Files.readString(file)).contains("0.0548");
        session.picture("locked.png");
        // A lock file that a dead owner left stands in nobody's way.
        Files.writeString(file.resolveSibling("ion.wellwright.lock"), "process 1 since 2020-01-01T00:00:00Z #1");
        session.playOn(
                new String[] {"ion.wellwright"},
                "wait-cell parameters.table 5 2 0.0548",
                "cell parameters.table 5 2 0.0613",
                "action File/org-wellwright-project-window-SaveProjectAction",
                "wait-file ion.wellwright 0.0613",
                "sleep 500");
    }
}
