package org.wellwright.project.window;

import java.lang.reflect.InvocationTargetException;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicBoolean;
import javax.swing.SwingUtilities;
import org.openide.LifecycleManager;
import org.openide.modules.OnStop;

/** Asks about unsaved changes before the application ends. */
@OnStop
public final class ShutDown implements Callable<Boolean> {
    private static boolean agreed;

    @Override
    public Boolean call() {
        if (!SwingUtilities.isEventDispatchThread()) {
            return askAndWait();
        }
        if (agreed || ProjectDesk.get().unsaved().isEmpty()) {
            ProjectDesk.get().end();
            return true;
        }
        // Saving goes on in the background, so this attempt to end is given up; the next one finds everything settled.
        SwingUtilities.invokeLater(() -> ProjectDesk.get().askBeforeExit(may -> {
            if (may) {
                agreed = true;
                LifecycleManager.getDefault().exit();
            }
        }));
        return false;
    }

    private static boolean askAndWait() {
        AtomicBoolean may = new AtomicBoolean();
        CountDownLatch answered = new CountDownLatch(1);
        SwingUtilities.invokeLater(() -> ProjectDesk.get().askBeforeExit(answer -> {
            may.set(answer);
            answered.countDown();
        }));
        try {
            answered.await();
            if (may.get()) {
                SwingUtilities.invokeAndWait(ProjectDesk.get()::end);
            }
            return may.get();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return false;
        } catch (InvocationTargetException e) {
            throw new IllegalStateException(e.getCause());
        }
    }
}
