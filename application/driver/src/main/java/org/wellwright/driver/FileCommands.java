package org.wellwright.driver;

import java.awt.Component;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import javax.swing.JFileChooser;
import org.openide.util.lookup.ServiceProvider;
import org.openide.windows.Mode;
import org.openide.windows.TopComponent;
import org.openide.windows.WindowManager;
import org.wellwright.driver.WindowCommands.Command;

/** The commands for choosing files, and for what stands where in the window. */
final class FileCommands {
    private FileCommands() {}

    /**
     * Chooses a file, relative to the script's folder, in the file chooser on the screen, waiting until there is one.
     */
    @ServiceProvider(service = DriverCommand.class)
    public static final class ChooseFile extends Command {
        public ChooseFile() {
            super("choose-file", "FILE", (script, words) -> {
                Screen.await("a file chooser", () -> chooser() != null);
                Screen.startOnEventThread(() -> {
                    JFileChooser chooser = chooser();
                    chooser.setSelectedFile(script.resolve(words.get(0)).toFile());
                    chooser.approveSelection();
                });
            });
        }
    }

    /** Waits until there is a file that contains a text. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class WaitFile extends Command {
        public WaitFile() {
            super("wait-file", "FILE TEXT", (script, words) -> {
                Path file = script.resolve(words.get(0));
                Screen.await("the file " + file, () -> {
                    try {
                        return Files.exists(file) && Files.readString(file).contains(words.get(1));
                    } catch (IOException failure) {
                        return false;
                    }
                });
            });
        }
    }

    /** Replaces a text in a file, as another program would. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class ReplaceInFile extends Command {
        public ReplaceInFile() {
            super("replace-in-file", "FILE OLD NEW", (script, words) -> {
                Path file = script.resolve(words.get(0));
                try {
                    String text = Files.readString(file);
                    if (!text.contains(words.get(1))) {
                        throw new ScriptFailure("%s does not contain %s".formatted(file, words.get(1)));
                    }
                    Files.writeString(file, text.replace(words.get(1), words.get(2)));
                } catch (IOException failure) {
                    throw new ScriptFailure("cannot change " + file, failure);
                }
            });
        }
    }

    /** Writes which windows are open: their place, their id, and whether they are in sight. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Windows extends Command {
        public Windows() {
            super(
                    "windows",
                    "FILE",
                    (script, words) -> ReportCommands.write(
                            script.resolve(words.get(0)), Screen.onEventThread(FileCommands::windows)));
        }
    }

    private static List<String> windows() {
        List<String> lines = new ArrayList<>();
        WindowManager manager = WindowManager.getDefault();
        for (Mode mode : manager.getModes()) {
            for (TopComponent window : manager.getOpenedTopComponents(mode)) {
                String sight = window.isShowing() ? " in sight" : "";
                lines.add(mode.getName() + " " + manager.findTopComponentID(window) + sight);
            }
        }
        lines.sort(null);
        return lines;
    }

    private static JFileChooser chooser() {
        for (Component component : Screen.showing()) {
            if (component instanceof JFileChooser chooser) {
                return chooser;
            }
        }
        return null;
    }
}
