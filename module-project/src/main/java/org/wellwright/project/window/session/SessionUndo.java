package org.wellwright.project.window.session;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.CopyOnWriteArrayList;
import javax.swing.SwingUtilities;
import javax.swing.event.ChangeEvent;
import javax.swing.event.ChangeListener;
import javax.swing.undo.CannotRedoException;
import javax.swing.undo.CannotUndoException;
import org.openide.awt.UndoRedo;
import org.openide.util.Lookup;
import org.openide.util.LookupEvent;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.ProjectSession;

/** Undo and redo of the selected project, for every window of it. */
public final class SessionUndo implements UndoRedo {
    private static SessionUndo shared;

    private final List<ChangeListener> listeners = new CopyOnWriteArrayList<>();
    private final Lookup.Result<ProjectSession> result;
    private final Runnable changed = () -> SwingUtilities.invokeLater(this::fire);
    private ProjectSession session;

    private SessionUndo() {
        result = Lookup.getDefault().lookup(OpenProjects.class).getLookup().lookupResult(ProjectSession.class);
        result.addLookupListener((LookupEvent event) -> SwingUtilities.invokeLater(this::follow));
        follow();
    }

    /** The one that all windows share. Event thread only. */
    public static SessionUndo ofSelected() {
        if (shared == null) {
            shared = new SessionUndo();
        }
        return shared;
    }

    private void follow() {
        ProjectSession selected = result.allInstances().stream().findFirst().orElse(null);
        if (selected != session) {
            if (session != null) {
                session.removeListener(changed);
            }
            session = selected;
            if (session != null) {
                session.addListener(changed);
            }
        }
        fire();
    }

    private void fire() {
        ChangeEvent event = new ChangeEvent(this);
        listeners.forEach(listener -> listener.stateChanged(event));
    }

    private Optional<ProjectSession> selected() {
        return Optional.ofNullable(session);
    }

    @Override
    public boolean canUndo() {
        return selected().flatMap(ProjectSession::undoLabel).isPresent();
    }

    @Override
    public boolean canRedo() {
        return selected().flatMap(ProjectSession::redoLabel).isPresent();
    }

    @Override
    public void undo() throws CannotUndoException {
        if (session == null || !session.undo()) {
            throw new CannotUndoException();
        }
    }

    @Override
    public void redo() throws CannotRedoException {
        if (session == null || !session.redo()) {
            throw new CannotRedoException();
        }
    }

    @Override
    public void addChangeListener(ChangeListener listener) {
        listeners.add(listener);
    }

    @Override
    public void removeChangeListener(ChangeListener listener) {
        listeners.remove(listener);
    }

    @Override
    public String getUndoPresentationName() {
        return selected().flatMap(ProjectSession::undoLabel).orElse("");
    }

    @Override
    public String getRedoPresentationName() {
        return selected().flatMap(ProjectSession::redoLabel).orElse("");
    }
}
