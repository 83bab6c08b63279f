package org.wellwright.project;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.openide.util.Lookup;

/**
 * The projects that are open: {@code Lookup.getDefault().lookup(OpenProjects.class)}.
 *
 * <p>Its own Lookup holds the selected {@link ProjectSession} and the {@link FigureSelection} in it; every window
 * listens to that. Safe for use by any thread.
 */
public interface OpenProjects extends Lookup.Provider {
    /** All of them, in the order they were opened. */
    List<ProjectSession> sessions();

    /** The selected one; none if no project is open. */
    Optional<ProjectSession> selected();

    /** Selects a project that is open. */
    void select(ProjectSession session);

    /** Selects a model and levels in the selected project. */
    void select(FigureSelection selection);

    /**
     * Opens a file and selects it; one that is open already is only selected.
     *
     * @throws org.wellwright.solver.WellwrightException if the file cannot be used
     */
    ProjectSession open(Path file);

    /** Adds a project that is in no file yet and selects it. */
    ProjectSession add(Project project);

    /**
     * Saves a project in its file.
     *
     * @throws org.wellwright.solver.WellwrightException if it has none, if the file was changed by someone else since,
     *     or cannot be written
     */
    void save(ProjectSession session);

    /**
     * Saves a project in a file, whatever is there; the previous content is kept as NAME.bak. The session then belongs
     * to that file.
     *
     * @throws org.wellwright.solver.WellwrightException if it cannot be written
     */
    void saveAs(ProjectSession session, Path file);

    /** Closes a project, saved or not, and selects its neighbour. */
    void close(ProjectSession session);

    /**
     * Whether somebody else changed or removed the file of a project since it was read or written here; false for one
     * that is in no file.
     */
    boolean changedOutside(ProjectSession session);

    /**
     * Takes up what somebody else wrote into the file of a project, as one undoable step.
     *
     * @throws org.wellwright.solver.WellwrightException if the file cannot be used; the project is then as before
     */
    void readAgain(ProjectSession session);

    /** Calls a listener after a project was opened, closed or selected, on the thread that did it. */
    void addListener(Runnable listener);

    /** Stops calling a listener. */
    void removeListener(Runnable listener);
}
