package org.wellwright.driver;

import java.awt.Component;
import java.awt.Frame;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import javax.swing.JFrame;
import javax.swing.JMenu;
import javax.swing.JMenuBar;
import javax.swing.JMenuItem;
import org.openide.filesystems.FileObject;
import org.openide.filesystems.FileUtil;
import org.openide.util.Lookup;
import org.openide.util.lookup.ServiceProvider;
import org.openide.windows.WindowManager;
import org.wellwright.driver.WindowCommands.Command;

/** The commands that write down what there is, for the test to read. */
final class ReportCommands {
    private static Heartbeat heartbeat;

    private ReportCommands() {}

    /** Writes the main window's title. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Title extends Command {
        public Title() {
            super(
                    "title",
                    "FILE",
                    (script, words) -> write(
                            script.resolve(words.get(0)),
                            List.of(Screen.onEventThread(() ->
                                    WindowManager.getDefault().getMainWindow().getTitle()))));
        }
    }

    /** Writes the menu bar as the user sees it, one entry a line: {@code File > Save}. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Menus extends Command {
        public Menus() {
            super("menus", "FILE", (script, words) -> write(script.resolve(words.get(0)), menus()));
        }
    }

    /**
     * Writes the files of a folder of the configuration, as the platform merged it from all modules: what menus and
     * options are made of.
     */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Configuration extends Command {
        public Configuration() {
            super("configuration", "FOLDER FILE", (script, words) -> {
                List<String> paths = new ArrayList<>();
                FileObject folder = FileUtil.getConfigFile(words.get(0));
                if (folder != null) {
                    for (FileObject file : java.util.Collections.list(folder.getData(true))) {
                        paths.add(file.getPath());
                    }
                }
                paths.sort(null);
                write(script.resolve(words.get(1)), paths);
            });
        }
    }

    /** Writes the class of every service of a type that the Lookup finds, in its order. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Services extends Command {
        public Services() {
            super("services", "TYPE FILE", (script, words) -> {
                try {
                    ClassLoader loader = Lookup.getDefault().lookup(ClassLoader.class);
                    Collection<?> found = Lookup.getDefault().lookupAll(Class.forName(words.get(0), true, loader));
                    write(
                            script.resolve(words.get(1)),
                            found.stream()
                                    .map(service -> service.getClass().getName())
                                    .toList());
                } catch (ClassNotFoundException missing) {
                    throw new ScriptFailure("no class is called " + words.get(0), missing);
                }
            });
        }
    }

    /** Writes class, name and text of everything on the screen; for whoever writes a script. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Components extends Command {
        public Components() {
            super(
                    "components",
                    "FILE",
                    (script, words) -> write(
                            script.resolve(words.get(0)),
                            Screen.onEventThread(() -> Screen.showing().stream()
                                    .map(c -> "%s\t%s\t%s\t%s"
                                            .formatted(
                                                    c.getClass().getName(), c.getName(), Screen.text(c), c.getBounds()))
                                    .toList())));
        }
    }

    /** Starts to measure how long the event thread keeps events waiting. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class HeartbeatStart extends Command {
        public HeartbeatStart() {
            super("heartbeat-start", "", (script, words) -> heartbeat = Heartbeat.start());
        }
    }

    /** Ends that measurement and writes its figures. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class HeartbeatStop extends Command {
        public HeartbeatStop() {
            super("heartbeat-stop", "FILE", (script, words) -> {
                if (heartbeat == null) {
                    throw new ScriptFailure("no heartbeat was started");
                }
                write(script.resolve(words.get(0)), List.of(heartbeat.stop()));
            });
        }
    }

    private static List<String> menus() {
        Frame frame = WindowManager.getDefault().getMainWindow();
        JMenuBar bar = Screen.onEventThread(() -> ((JFrame) frame).getJMenuBar());
        List<JMenu> menus = Screen.onEventThread(() -> {
            List<JMenu> found = new ArrayList<>();
            for (int i = 0; i < bar.getMenuCount(); i++) {
                found.add(bar.getMenu(i));
            }
            return found;
        });
        List<String> lines = new ArrayList<>();
        for (JMenu menu : menus) {
            // The platform fills a menu when it is opened, and partly later still.
            Screen.onEventThread(() -> {
                menu.setPopupMenuVisible(true);
                return null;
            });
            Screen.pause(400);
            Screen.onEventThread(() -> {
                list(menu.getText(), menu, lines);
                menu.setPopupMenuVisible(false);
                return null;
            });
        }
        return lines;
    }

    private static void list(String path, JMenu menu, List<String> lines) {
        for (Component component : menu.getMenuComponents()) {
            if (!component.isVisible() || !(component instanceof JMenuItem item)) {
                continue;
            }
            String entry = path + " > " + item.getText();
            if (item instanceof JMenu submenu && submenu.getMenuComponentCount() > 0) {
                list(entry, submenu, lines);
            } else {
                lines.add(entry + (item.isEnabled() ? "" : " (grey)"));
            }
        }
    }

    static void write(Path file, List<String> lines) {
        try {
            Files.write(file, lines);
        } catch (IOException failure) {
            throw new ScriptFailure("cannot write " + file, failure);
        }
    }
}
