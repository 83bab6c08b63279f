package org.wellwright.project.file;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CopyOnWriteArrayList;
import org.openide.util.Lookup;
import org.openide.util.lookup.AbstractLookup;
import org.openide.util.lookup.InstanceContent;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.Problem;

/** The open projects, kept in project files. */
@ServiceProvider(service = OpenProjects.class)
public final class FileProjects implements OpenProjects {
    private final Object lock = new Object();
    private final List<ProjectSession> sessions = new ArrayList<>();
    private final Map<ProjectSession, byte[]> onDisk = new HashMap<>();
    private final InstanceContent content = new InstanceContent();
    private final Lookup lookup = new AbstractLookup(content);
    private final List<Runnable> listeners = new CopyOnWriteArrayList<>();
    private ProjectSession selected;
    private FigureSelection selection = FigureSelection.NONE;

    @Override
    public List<ProjectSession> sessions() {
        synchronized (lock) {
            return List.copyOf(sessions);
        }
    }

    @Override
    public Optional<ProjectSession> selected() {
        synchronized (lock) {
            return Optional.ofNullable(selected);
        }
    }

    @Override
    public void select(ProjectSession session) {
        synchronized (lock) {
            if (!sessions.contains(session)) {
                throw new IllegalArgumentException("the project '" + session.displayName() + "' is not open");
            }
            if (selected == session) {
                return;
            }
            selected = session;
            selection = FigureSelection.NONE;
        }
        publish();
    }

    @Override
    public void select(FigureSelection newSelection) {
        synchronized (lock) {
            if (selected == null) {
                return;
            }
            selection = newSelection;
        }
        publish();
    }

    @Override
    public ProjectSession open(Path file) {
        Path place = place(file);
        for (ProjectSession session : sessions()) {
            if (session.file().filter(place::equals).isPresent()) {
                select(session);
                return session;
            }
        }
        byte[] bytes = SafeFile.read(place);
        ProjectSession session =
                new ProjectSession(ProjectFile.parse(bytes, file.toString()).project(), place);
        return add(session, bytes);
    }

    @Override
    public ProjectSession add(Project project) {
        return add(new ProjectSession(project, null), null);
    }

    private ProjectSession add(ProjectSession session, byte[] bytes) {
        synchronized (lock) {
            sessions.add(session);
            onDisk.put(session, bytes);
        }
        select(session);
        return session;
    }

    @Override
    public void save(ProjectSession session) {
        Path file = session.file()
                .orElseThrow(() -> new ProjectFileException(
                        new Problem("the project is in no file yet", session.displayName(), "save it under a name")));
        if (Files.exists(file) && changedOutside(session)) {
            throw new ProjectFileException(new Problem(
                    "the file was changed by someone else since it was opened",
                    file.toString(),
                    "save it under another name, or open it again"));
        }
        saveAs(session, file);
    }

    @Override
    public boolean changedOutside(ProjectSession session) {
        byte[] known;
        synchronized (lock) {
            known = onDisk.get(session);
        }
        Path file = session.file().orElse(null);
        return known != null && file != null && (!Files.exists(file) || !Arrays.equals(SafeFile.read(file), known));
    }

    @Override
    public void readAgain(ProjectSession session) {
        Path file = session.file()
                .orElseThrow(() -> new ProjectFileException(
                        new Problem("the project is in no file yet", session.displayName(), "save it under a name")));
        byte[] bytes = SafeFile.read(file);
        Project read = ProjectFile.parse(bytes, file.toString()).project();
        session.edit("Read the file again", project -> read.withViews(project.views()));
        synchronized (lock) {
            onDisk.put(session, bytes);
        }
        session.markSaved(read, file);
    }

    @Override
    public void addListener(Runnable listener) {
        listeners.add(listener);
    }

    @Override
    public void removeListener(Runnable listener) {
        listeners.remove(listener);
    }

    @Override
    public void saveAs(ProjectSession session, Path file) {
        Path place = place(file);
        Project project = session.project();
        byte[] bytes = ProjectFile.text(project).getBytes(StandardCharsets.UTF_8);
        SafeFile.replace(place, bytes, true);
        synchronized (lock) {
            onDisk.put(session, bytes);
        }
        session.markSaved(project, place);
    }

    @Override
    public void close(ProjectSession session) {
        synchronized (lock) {
            int position = sessions.indexOf(session);
            if (position < 0) {
                return;
            }
            sessions.remove(position);
            onDisk.remove(session);
            if (selected == session) {
                selected = sessions.isEmpty() ? null : sessions.get(Math.min(position, sessions.size() - 1));
                selection = FigureSelection.NONE;
            }
        }
        publish();
    }

    @Override
    public Lookup getLookup() {
        return lookup;
    }

    /** Listeners are called outside the lock; whoever publishes last publishes the present state. */
    private void publish() {
        List<Object> items = new ArrayList<>();
        synchronized (lock) {
            if (selected != null) {
                items.add(selected);
                items.add(selection);
            }
        }
        content.set(items, null);
        listeners.forEach(Runnable::run);
    }

    private static Path place(Path file) {
        try {
            return file.toRealPath();
        } catch (IOException e) {
            // Not there (yet); its name must do.
            return file.toAbsolutePath().normalize();
        }
    }
}
