package org.wellwright.project;

import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.UnaryOperator;
import org.openide.util.Lookup;
import org.openide.util.lookup.AbstractLookup;
import org.openide.util.lookup.InstanceContent;

/**
 * One open project: the present snapshot, what can be undone and redone, and whether it is saved. Safe for use by any
 * thread; listeners are called on the thread that made the change.
 *
 * <p>Its Lookup holds what others publish about it, such as solved spectra; {@link #content} is how they do that.
 */
public final class ProjectSession implements Lookup.Provider {
    /** So many steps can be undone. */
    public static final int DEPTH = 1000;

    private final AtomicReference<State> state;
    private final List<Runnable> listeners = new CopyOnWriteArrayList<>();
    private final InstanceContent content = new InstanceContent();
    private final Lookup lookup = new AbstractLookup(content);

    /** One undoable step: what it is called and what the project was on its other side. */
    private record Step(String label, Object gesture, Project other, Step next, int depth) {}

    private record State(Project project, Project saved, Path file, Step undo, Step redo) {}

    /**
     * A session that counts as saved.
     *
     * @param file where it was read from, or null if it never was in a file
     */
    public ProjectSession(Project project, Path file) {
        this.state =
                new AtomicReference<>(new State(Objects.requireNonNull(project, "project"), project, file, null, null));
    }

    /** The present snapshot. */
    public Project project() {
        return state.get().project();
    }

    /** The file it is saved in, if it ever was. */
    public Optional<Path> file() {
        return Optional.ofNullable(state.get().file());
    }

    /** Its name on screen: the title, or the file's name, or "Untitled". */
    public String displayName() {
        State now = state.get();
        if (!now.project().title().isBlank()) {
            return now.project().title();
        }
        return now.file() == null ? "Untitled" : now.file().getFileName().toString();
    }

    /** Whether anything but views differs from what was saved. */
    public boolean modified() {
        State now = state.get();
        return !now.project().sameContent(now.saved());
    }

    /**
     * Changes the project as one undoable step.
     *
     * @param change makes the next snapshot from the present one; called again if another thread was faster, so it must
     *     depend on nothing else
     * @return whether the project is different now
     */
    public boolean edit(String label, UnaryOperator<Project> change) {
        return edit(label, null, change);
    }

    /**
     * Changes the project; consecutive changes by the same gesture (a drag, a burst of typing in one field) are one
     * undoable step.
     *
     * @param gesture identity of the gesture, compared with equals; null for a step of its own
     * @return whether the project is different now
     */
    public boolean edit(String label, Object gesture, UnaryOperator<Project> change) {
        return change(label, gesture, null, change);
    }

    /**
     * Changes the project as one undoable step, unless its document is no longer the one that the change was computed
     * from.
     *
     * @param digest {@link Project#digest} of the project that the change belongs to
     * @return false if the document has another digest by now; nothing is changed then
     */
    public boolean editIf(String digest, String label, UnaryOperator<Project> change) {
        return change(label, null, Objects.requireNonNull(digest, "digest"), change);
    }

    private boolean change(String label, Object gesture, String digest, UnaryOperator<Project> change) {
        Objects.requireNonNull(label, "label");
        while (true) {
            State now = state.get();
            if (digest != null && !now.project().digest().equals(digest)) {
                return false;
            }
            Project next = Objects.requireNonNull(change.apply(now.project()), "an edit must return a project");
            if (next.equals(now.project())) {
                return false;
            }
            boolean merged = gesture != null
                    && now.undo() != null
                    && gesture.equals(now.undo().gesture());
            Step undo = merged ? now.undo() : step(label, gesture, now.project(), now.undo());
            if (state.compareAndSet(now, new State(next, now.saved(), now.file(), undo, null))) {
                fire();
                return true;
            }
        }
    }

    /** Ends the present gesture: the next change is a step of its own. */
    public void endGesture() {
        state.updateAndGet(now -> {
            Step undo = now.undo();
            if (undo == null || undo.gesture() == null) {
                return now;
            }
            Step ended = new Step(undo.label(), null, undo.other(), undo.next(), undo.depth());
            return new State(now.project(), now.saved(), now.file(), ended, now.redo());
        });
    }

    /** What {@link #undo} would take back, if anything. */
    public Optional<String> undoLabel() {
        return Optional.ofNullable(state.get().undo()).map(Step::label);
    }

    /** What {@link #redo} would do again, if anything. */
    public Optional<String> redoLabel() {
        return Optional.ofNullable(state.get().redo()).map(Step::label);
    }

    /** Takes the last step back; false if there is none. View states stay as they are. */
    public boolean undo() {
        while (true) {
            State now = state.get();
            Step step = now.undo();
            if (step == null) {
                return false;
            }
            Step redo = new Step(step.label(), null, now.project(), now.redo(), 0);
            Project before = step.other().withViews(now.project().views());
            if (state.compareAndSet(now, new State(before, now.saved(), now.file(), step.next(), redo))) {
                fire();
                return true;
            }
        }
    }

    /** Does the step last taken back again; false if there is none. */
    public boolean redo() {
        while (true) {
            State now = state.get();
            Step step = now.redo();
            if (step == null) {
                return false;
            }
            Step undo = step(step.label(), null, now.project(), now.undo());
            Project after = step.other().withViews(now.project().views());
            if (state.compareAndSet(now, new State(after, now.saved(), now.file(), undo, step.next()))) {
                fire();
                return true;
            }
        }
    }

    /** Puts the state of the windows into the snapshot: no step, no mark for unsaved changes. */
    public void putViews(java.util.Map<String, java.util.Map<String, String>> views) {
        state.updateAndGet(
                now -> new State(now.project().withViews(views), now.saved(), now.file(), now.undo(), now.redo()));
    }

    /**
     * Notes that a snapshot was saved; later changes stay marked as unsaved.
     *
     * @param file where it is now
     */
    public void markSaved(Project project, Path file) {
        state.updateAndGet(
                now -> new State(now.project(), project, Objects.requireNonNull(file, "file"), now.undo(), now.redo()));
        fire();
    }

    /** Calls a listener after every change of the snapshot, of its file or of being saved. */
    public void addListener(Runnable listener) {
        listeners.add(listener);
    }

    /** Stops calling a listener. */
    public void removeListener(Runnable listener) {
        listeners.remove(listener);
    }

    /** Where others publish what they know about this project. */
    public InstanceContent content() {
        return content;
    }

    @Override
    public Lookup getLookup() {
        return lookup;
    }

    @Override
    public String toString() {
        return displayName();
    }

    private void fire() {
        listeners.forEach(Runnable::run);
    }

    /** A step on top of others; the oldest are dropped now and then, so that a long day does not fill the memory. */
    private static Step step(String label, Object gesture, Project other, Step next) {
        int depth = next == null ? 1 : next.depth() + 1;
        if (depth < 2 * DEPTH) {
            return new Step(label, gesture, other, next, depth);
        }
        Step[] kept = new Step[DEPTH - 1];
        Step at = next;
        for (int i = 0; i < kept.length; i++) {
            kept[i] = at;
            at = at.next();
        }
        Step rebuilt = null;
        for (int i = kept.length - 1; i >= 0; i--) {
            rebuilt = new Step(kept[i].label(), kept[i].gesture(), kept[i].other(), rebuilt, kept.length - i);
        }
        return new Step(label, gesture, other, rebuilt, DEPTH);
    }
}
