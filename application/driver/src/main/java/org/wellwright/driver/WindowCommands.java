package org.wellwright.driver;

import java.awt.Component;
import java.awt.Dimension;
import java.awt.Frame;
import java.awt.event.ActionEvent;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import javax.swing.AbstractButton;
import javax.swing.Action;
import javax.swing.JTextField;
import javax.swing.text.JTextComponent;
import org.openide.LifecycleManager;
import org.openide.filesystems.FileUtil;
import org.openide.util.Lookup;
import org.openide.util.lookup.ServiceProvider;
import org.openide.windows.TopComponent;
import org.openide.windows.WindowManager;

/** The commands that act on the window and look at it. */
final class WindowCommands {
    private WindowCommands() {}

    /** Presses the button, box or menu entry of that name. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Click extends Command {
        public Click() {
            super("click", "NAME", (script, words) -> {
                AbstractButton button = Screen.onEventThread(() -> {
                    if (!(Screen.find(words.get(0)) instanceof AbstractButton found)) {
                        throw new ScriptFailure(words.get(0) + " is not a button");
                    }
                    if (!found.isEnabled()) {
                        throw new ScriptFailure(words.get(0) + " is grey");
                    }
                    return found;
                });
                Screen.startOnEventThread(button::doClick);
            });
        }
    }

    /**
     * Presses the last enabled button that shows this text, waiting until there is one: those of dialogs have no name.
     */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Press extends Command {
        public Press() {
            super("press", "TEXT", (script, words) -> {
                Screen.await("a button " + words.get(0), () -> buttonOf(words.get(0)) != null);
                Screen.startOnEventThread(() -> buttonOf(words.get(0)).doClick());
            });
        }
    }

    /** Types into the field of that name in place of what it held, and presses Enter. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Text extends Command {
        public Text() {
            super(
                    "text",
                    "NAME TEXT",
                    (script, words) -> Screen.onEventThread(() -> {
                        if (!(Screen.find(words.get(0)) instanceof JTextComponent field)) {
                            throw new ScriptFailure(words.get(0) + " is not a text field");
                        }
                        field.setText(words.get(1));
                        if (field instanceof JTextField line) {
                            line.postActionEvent();
                        }
                        return null;
                    }));
        }
    }

    /** Runs an action by its place below Actions: {@code Window/org-wellwright-...}. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class RunAction extends Command {
        public RunAction() {
            super("action", "CATEGORY/ID", (script, words) -> {
                Action action = Screen.onEventThread(() -> {
                    Action found = FileUtil.getConfigObject("Actions/" + words.get(0) + ".instance", Action.class);
                    if (found == null) {
                        throw new ScriptFailure("no action is registered as " + words.get(0));
                    }
                    if (!found.isEnabled()) {
                        throw new ScriptFailure("the action " + words.get(0) + " is grey");
                    }
                    return found;
                });
                ActionEvent event = new ActionEvent(Screen.class, ActionEvent.ACTION_PERFORMED, words.get(0));
                Screen.startOnEventThread(() -> action.actionPerformed(event));
            });
        }
    }

    /** Waits until the main window or an open window has a title that contains the text. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class WaitTitle extends Command {
        public WaitTitle() {
            super(
                    "wait-title",
                    "TEXT",
                    (script, words) -> Screen.await("the title " + words.get(0), () -> hasTitle(words.get(0))));
        }
    }

    /** Waits until the component of that name shows a text that contains the given one. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class WaitText extends Command {
        public WaitText() {
            super(
                    "wait-text",
                    "NAME TEXT",
                    (script, words) -> Screen.await("the text " + words.get(1), () -> {
                        Component component = Screen.findOrNull(words.get(0));
                        return component != null && Screen.text(component).contains(words.get(1));
                    }));
        }
    }

    /** Gives the main window a size in pixels. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Size extends Command {
        public Size() {
            super("size", "WIDTH HEIGHT", (script, words) -> {
                Screen.onEventThread(() -> {
                    Frame frame = WindowManager.getDefault().getMainWindow();
                    frame.setExtendedState(Frame.NORMAL);
                    frame.setLocation(0, 0);
                    frame.setSize(new Dimension(Integer.parseInt(words.get(0)), Integer.parseInt(words.get(1))));
                    frame.validate();
                    return null;
                });
                Screen.pause(300);
            });
        }
    }

    /** Paints the topmost dialog, or else the main window, into a PNG file. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Screenshot extends Command {
        public Screenshot() {
            super("screenshot", "FILE", (script, words) -> Screen.save(script.resolve(words.get(0))));
        }
    }

    /** Waits for a number of milliseconds. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Sleep extends Command {
        public Sleep() {
            super("sleep", "MILLISECONDS", (script, words) -> Screen.pause(Long.parseLong(words.get(0))));
        }
    }

    /** Leaves as the user would, so that the layout is saved; the status is the process's. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Exit extends Command {
        public Exit() {
            super("exit", "STATUS", (script, words) -> {
                Lookup.getDefault().lookup(LifecycleManager.class).exit(Integer.parseInt(words.get(0)));
                // The exit goes on in threads of the platform; this one must not end the process before.
                Screen.pause(Long.MAX_VALUE);
            });
        }
    }

    /** Ends the process at once, as a crash would. */
    @ServiceProvider(service = DriverCommand.class)
    public static final class Halt extends Command {
        public Halt() {
            super("halt", "STATUS", (script, words) -> Runtime.getRuntime().halt(Integer.parseInt(words.get(0))));
        }
    }

    private static AbstractButton buttonOf(String text) {
        AbstractButton found = null;
        for (Component component : Screen.showing()) {
            if (component instanceof AbstractButton button && button.isEnabled() && text.equals(button.getText())) {
                found = button;
            }
        }
        return found;
    }

    private static boolean hasTitle(String text) {
        String title = WindowManager.getDefault().getMainWindow().getTitle();
        if (title != null && title.contains(text)) {
            return true;
        }
        Set<TopComponent> open = TopComponent.getRegistry().getOpened();
        return open.stream()
                .flatMap(window -> Arrays.asList(window.getDisplayName(), window.getName()).stream())
                .anyMatch(name -> name != null && name.contains(text));
    }

    /** A command whose body is a function. */
    abstract static class Command implements DriverCommand {
        private final String name;
        private final String arguments;
        private final Body body;

        interface Body {
            void run(Script script, List<String> words);
        }

        Command(String name, String arguments, Body body) {
            this.name = name;
            this.arguments = arguments;
            this.body = body;
        }

        @Override
        public final String name() {
            return name;
        }

        @Override
        public final String arguments() {
            return arguments;
        }

        @Override
        public final void run(Script script, List<String> words) {
            body.run(script, words);
        }
    }
}
