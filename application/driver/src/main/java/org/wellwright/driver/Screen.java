package org.wellwright.driver;

import java.awt.Component;
import java.awt.Container;
import java.awt.Graphics2D;
import java.awt.Window;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.lang.reflect.InvocationTargetException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.FutureTask;
import java.util.function.BooleanSupplier;
import java.util.function.Supplier;
import javax.imageio.ImageIO;
import javax.swing.AbstractButton;
import javax.swing.JLabel;
import javax.swing.SwingUtilities;
import javax.swing.text.JTextComponent;
import org.openide.windows.WindowManager;

/** What is on the screen: finds components, reads and paints them. */
final class Screen {
    /** Long enough for a loaded machine; a script that waits this long has failed. */
    private static final long PATIENCE_MILLIS = 60_000;

    private static final long POLL_MILLIS = 20;

    private Screen() {}

    /** Runs on the event thread and waits for the result; an exception thrown there is thrown here. */
    static <T> T onEventThread(Supplier<T> task) {
        FutureTask<T> future = new FutureTask<>(task::get);
        try {
            SwingUtilities.invokeAndWait(future);
            return future.get();
        } catch (InterruptedException | InvocationTargetException failure) {
            throw new ScriptFailure("interrupted", failure);
        } catch (java.util.concurrent.ExecutionException failure) {
            if (failure.getCause() instanceof ScriptFailure known) {
                throw known;
            }
            throw new ScriptFailure(failure.getCause().toString(), failure.getCause());
        }
    }

    /**
     * Starts something on the event thread and returns once the thread is free again, or busy in a dialog that it has
     * opened.
     */
    static void startOnEventThread(Runnable task) {
        SwingUtilities.invokeLater(task);
        onEventThread(() -> null);
    }

    /** Polls on the event thread until the condition holds. */
    static void await(String what, BooleanSupplier condition) {
        long end = System.nanoTime() + PATIENCE_MILLIS * 1_000_000;
        while (!onEventThread(condition::getAsBoolean)) {
            if (System.nanoTime() > end) {
                throw new ScriptFailure("waited %d s in vain for %s".formatted(PATIENCE_MILLIS / 1000, what));
            }
            pause(POLL_MILLIS);
        }
    }

    static void pause(long millis) {
        try {
            Thread.sleep(millis);
        } catch (InterruptedException interrupted) {
            throw new ScriptFailure("interrupted", interrupted);
        }
    }

    /** The showing component with this name, in any window; event thread only. */
    static Component find(String name) {
        Component found = findOrNull(name);
        if (found == null) {
            throw new ScriptFailure("no component on the screen is called " + name);
        }
        return found;
    }

    static Component findOrNull(String name) {
        for (Component component : showing()) {
            if (name.equals(component.getName())) {
                return component;
            }
        }
        return null;
    }

    /** All showing components of all windows, parents before children; event thread only. */
    static List<Component> showing() {
        List<Component> all = new ArrayList<>();
        for (Window window : Window.getWindows()) {
            if (window.isShowing()) {
                collect(window, all);
            }
        }
        return all;
    }

    private static void collect(Component component, List<Component> into) {
        if (!component.isVisible()) {
            return;
        }
        into.add(component);
        if (component instanceof Container container) {
            for (Component child : container.getComponents()) {
                collect(child, into);
            }
        }
    }

    /** The text a component shows; empty for one that shows none. */
    static String text(Component component) {
        if (component instanceof JTextComponent field) {
            return field.getText();
        }
        if (component instanceof AbstractButton button) {
            return button.getText();
        }
        if (component instanceof JLabel label) {
            return label.getText();
        }
        return "";
    }

    /** Paints the main window, or the topmost showing dialog, into a PNG file. */
    static void save(Path file) {
        BufferedImage image = onEventThread(() -> {
            Window window = topmost();
            window.validate();
            BufferedImage picture =
                    new BufferedImage(window.getWidth(), window.getHeight(), BufferedImage.TYPE_INT_RGB);
            Graphics2D g = picture.createGraphics();
            window.paint(g);
            g.dispose();
            return picture;
        });
        try {
            ImageIO.write(image, "png", file.toFile());
        } catch (IOException failure) {
            throw new ScriptFailure("cannot write " + file, failure);
        }
    }

    static void saveQuietly(Path file) {
        try {
            save(file);
        } catch (ScriptFailure ignored) {
            // The failure that is being reported matters more than its picture.
        }
    }

    private static Window topmost() {
        Window top = WindowManager.getDefault().getMainWindow();
        for (Window window : Window.getWindows()) {
            if (window.isShowing() && window instanceof java.awt.Dialog) {
                top = window;
            }
        }
        return top;
    }
}
