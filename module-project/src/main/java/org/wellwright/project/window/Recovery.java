package org.wellwright.project.window;

import java.nio.file.Path;
import java.time.Instant;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.UUID;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.openide.modules.Places;
import org.openide.util.RequestProcessor;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.WellwrightException;

/**
 * Keeps unsaved changes of open projects a moment after each edit, and forgets them when they are saved or given up.
 */
final class Recovery {
    /** Long enough not to write during a drag, short enough to lose little. */
    private static final int DELAY_MILLIS = 1000;

    private static final Logger LOG = Logger.getLogger(Recovery.class.getName());

    private final RequestProcessor writer = new RequestProcessor("recovery", 1);
    private final RecoveryFolder folder;
    private final Map<ProjectSession, Watch> watched = new HashMap<>();

    Recovery() {
        this(new RecoveryFolder(recoveryFolder()));
    }

    Recovery(RecoveryFolder folder) {
        this.folder = folder;
    }

    private static Path recoveryFolder() {
        return Places.getUserDirectory().toPath().resolve("var").resolve("recovery");
    }

    /** What a crash left. */
    List<RecoveryFolder.Entry> left() {
        return folder.entries();
    }

    Project project(RecoveryFolder.Entry entry) {
        return folder.project(entry);
    }

    void forget(RecoveryFolder.Entry entry) {
        folder.forget(entry.id());
    }

    /** Follows the projects that are open; what belongs to one that is open no more is forgotten. */
    synchronized void follow(List<ProjectSession> open) {
        for (ProjectSession session : open) {
            watched.computeIfAbsent(session, Watch::new);
        }
        watched.entrySet().removeIf(entry -> {
            if (!open.contains(entry.getKey())) {
                entry.getValue().end();
                return true;
            }
            return false;
        });
    }

    /** Forgets everything that is kept: the application ends as it should. */
    synchronized void endAll() {
        follow(List.of());
        writer.post(() -> {}).waitFinished();
    }

    private final class Watch implements Runnable {
        private final String id = UUID.randomUUID().toString();
        private final ProjectSession session;
        private final RequestProcessor.Task task = writer.create(this);
        private final Runnable listener = () -> task.schedule(DELAY_MILLIS);
        private Project kept;
        private volatile boolean ended;

        Watch(ProjectSession session) {
            this.session = session;
            session.addListener(listener);
            listener.run();
        }

        @Override
        public void run() {
            try {
                if (ended || !session.modified()) {
                    folder.forget(id);
                    kept = null;
                    return;
                }
                Project now = session.project();
                if (now != kept) {
                    folder.keep(id, now, session.displayName(), session.file(), Instant.now());
                    kept = now;
                }
            } catch (WellwrightException e) {
                LOG.log(Level.INFO, "unsaved changes are not kept", e);
            }
        }

        void end() {
            ended = true;
            session.removeListener(listener);
            task.schedule(0);
        }
    }
}
