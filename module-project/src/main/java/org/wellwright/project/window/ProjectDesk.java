package org.wellwright.project.window;

import java.awt.Component;
import java.awt.KeyboardFocusManager;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import java.util.logging.Level;
import java.util.logging.Logger;
import javax.swing.JFileChooser;
import javax.swing.JTable;
import javax.swing.JTextField;
import javax.swing.SwingUtilities;
import javax.swing.filechooser.FileNameExtensionFilter;
import org.openide.awt.StatusDisplayer;
import org.openide.filesystems.FileChooserBuilder;
import org.openide.util.Lookup;
import org.openide.util.NbBundle.Messages;
import org.openide.util.RequestProcessor;
import org.openide.windows.WindowManager;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.ViewStateProvider;
import org.wellwright.project.file.ProjectFile;
import org.wellwright.project.file.ProjectFileException;
import org.wellwright.project.file.ProjectLock;
import org.wellwright.solver.WellwrightException;

/**
 * What the File menu does: opens, saves and closes projects, asks before anything is lost, holds the locks of the files
 * that are open. Event thread only; files are read and written on a thread of its own.
 */
@Messages({
    "# {0} - file",
    "MSG_Saved=Saved {0}",
    "# {0} - file",
    "MSG_Opened=Opened {0}",
    "TTL_Unsaved=Unsaved changes",
    "# {0} - project",
    "MSG_UnsavedOne=''{0}'' has unsaved changes.",
    "# {0} - number",
    "MSG_UnsavedMany={0} projects have unsaved changes:",
    "BTN_Save=Save",
    "BTN_SaveAll=Save all",
    "BTN_Discard=Discard changes",
    "BTN_Cancel=Cancel",
    "TTL_Outside=Changed by another program",
    "# {0} - file",
    "MSG_OutsideSave=The file {0} was changed by another program since it was opened here. Saving would overwrite that.",
    "# {0} - file",
    "MSG_OutsideRead=The file {0} was changed by another program. Read it again? One undo takes that back.",
    "# {0} - file",
    "MSG_OutsideGone=The file {0} is no longer where it was. Save the project to write it again.",
    "BTN_SaveElsewhere=Save under another name…",
    "BTN_Overwrite=Overwrite",
    "BTN_ReadAgain=Read it again",
    "BTN_KeepMine=Keep mine",
    "TTL_Exists=The file exists",
    "# {0} - file",
    "MSG_Exists={0} exists already; its content would be kept as {0}.bak.",
    "TTL_OpenProject=Open a project",
    "TTL_SaveProject=Save the project",
    "LBL_ProjectFiles=Wellwright projects (*.wellwright)",
    "# {0} - file",
    "MSG_InUse={0} is open elsewhere: you can work with it here, and save it under another name."
})
final class ProjectDesk {
    private static final Logger LOG = Logger.getLogger(ProjectDesk.class.getName());
    private static final RequestProcessor FILES = new RequestProcessor("project files", 1);
    private static ProjectDesk shared;

    private final OpenProjects open = Lookup.getDefault().lookup(OpenProjects.class);
    private final Remembered remembered = new Remembered();
    private final Map<ProjectSession, ProjectLock> locks = new HashMap<>();
    private final Map<ProjectSession, Path> lockedFiles = new HashMap<>();
    private final Set<ProjectSession> asked = new HashSet<>();
    private final Recovery recovery = new Recovery();
    private final List<RecoveryFolder.Entry> left = recovery.left();
    private boolean restoring = true;

    private ProjectDesk() {
        open.addListener(() -> SwingUtilities.invokeLater(this::changed));
    }

    /** The one there is. Event thread only. */
    static ProjectDesk get() {
        if (shared == null) {
            shared = new ProjectDesk();
        }
        return shared;
    }

    Remembered remembered() {
        return remembered;
    }

    Recovery recovery() {
        return recovery;
    }

    OpenProjects projects() {
        return open;
    }

    Optional<ProjectSession> selected() {
        return open.selected();
    }

    /** From now on, what is open is noted for the next start. */
    void restored() {
        restoring = false;
        changed();
    }

    private void changed() {
        List<ProjectSession> sessions = open.sessions();
        SelectionKept selections = Lookup.getDefault().lookup(SelectionKept.class);
        if (selections != null) {
            selections.follow(open);
        }
        if (!restoring) {
            remembered.note(sessions, open.selected());
        }
        recovery.follow(sessions);
        for (ProjectSession session : List.copyOf(locks.keySet())) {
            if (!sessions.contains(session)) {
                unlock(session);
            }
        }
        asked.retainAll(sessions);
    }

    /** Adds a new project and selects it. */
    ProjectSession create(Project project) {
        return open.add(project);
    }

    /** Asks for files and opens them. */
    void askAndOpen() {
        File[] files = chooser().setTitle(Bundle.TTL_OpenProject()).showMultiOpenDialog();
        if (files != null) {
            for (File file : files) {
                open(file.toPath(), session -> {});
            }
        }
    }

    static FileChooserBuilder chooser() {
        return new FileChooserBuilder(ProjectDesk.class)
                .setFilesOnly(true)
                .setFileFilter(new FileNameExtensionFilter(Bundle.LBL_ProjectFiles(), ProjectFile.ENDING.substring(1)));
    }

    /** What a crash left, without what this run has kept itself. */
    List<RecoveryFolder.Entry> left() {
        return left;
    }

    /** Opens a file and goes on, also where the file is faulty, which is told. */
    void openOrSkip(Path file, Runnable then) {
        open(file, session -> then.run(), then);
    }

    /** Opens a file; a fault is told. */
    void open(Path file, Consumer<ProjectSession> then) {
        open(file, then, () -> {});
    }

    private void open(Path file, Consumer<ProjectSession> then, Runnable otherwise) {
        FILES.post(() -> {
            try {
                ProjectSession session = open.open(file);
                ProjectLock lock = lock(file);
                SwingUtilities.invokeLater(() -> opened(session, lock, then));
            } catch (WellwrightException e) {
                SwingUtilities.invokeLater(() -> {
                    remembered.gone(file.toAbsolutePath().normalize());
                    otherwise.run();
                });
                Ask.tell(e);
            }
        });
    }

    private void opened(ProjectSession session, ProjectLock lock, Consumer<ProjectSession> then) {
        Path file = session.file().orElseThrow();
        remembered.used(file);
        if (locks.containsKey(session)) {
            close(lock);
        } else if (lock != null) {
            locks.put(session, lock);
            lockedFiles.put(session, file);
        }
        boolean held = locks.containsKey(session);
        String name = file.getFileName().toString();
        StatusDisplayer.getDefault().setStatusText(held ? Bundle.MSG_Opened(file) : Bundle.MSG_InUse(name));
        restoreViews(session);
        changed();
        then.accept(session);
    }

    /** The lock of a file; null if somebody else has it or the folder cannot be written. */
    private static ProjectLock lock(Path file) {
        try {
            return ProjectLock.take(file.toRealPath());
        } catch (ProjectFileException | IOException e) {
            LOG.log(Level.FINE, "no lock", e);
            return null;
        }
    }

    private void unlock(ProjectSession session) {
        lockedFiles.remove(session);
        close(locks.remove(session));
    }

    private static void close(ProjectLock lock) {
        if (lock != null) {
            lock.close();
        }
    }

    /** Whether somebody else has the file of a project open. */
    boolean inUseElsewhere(ProjectSession session) {
        return session.file().isPresent() && !locks.containsKey(session);
    }

    /** Saves a project where it is, or asks for a place; tells whether it was saved. */
    void save(ProjectSession session, Consumer<Boolean> then) {
        commitTyping();
        collectViews(session);
        if (session.file().isEmpty()) {
            askAndSave(session, then);
            return;
        }
        Path file = session.file().get();
        boolean held = locks.containsKey(session);
        FILES.post(() -> {
            try {
                if (!held) {
                    ProjectLock taken = ProjectLock.take(file);
                    SwingUtilities.invokeLater(() -> locked(session, file, taken));
                }
                if (Files.exists(file) && open.changedOutside(session)) {
                    SwingUtilities.invokeLater(() -> askBeforeOverwriting(session, file, then));
                    return;
                }
                if (Files.exists(file)) {
                    open.save(session);
                } else {
                    open.saveAs(session, file);
                }
                SwingUtilities.invokeLater(() -> saved(session, then));
            } catch (WellwrightException e) {
                Ask.tell(e);
                SwingUtilities.invokeLater(() -> then.accept(false));
            }
        });
    }

    private void locked(ProjectSession session, Path file, ProjectLock lock) {
        close(locks.put(session, lock));
        lockedFiles.put(session, file);
    }

    private void saved(ProjectSession session, Consumer<Boolean> then) {
        Path file = session.file().orElseThrow();
        asked.remove(session);
        remembered.used(file);
        StatusDisplayer.getDefault().setStatusText(Bundle.MSG_Saved(file));
        changed();
        then.accept(true);
    }

    private void askBeforeOverwriting(ProjectSession session, Path file, Consumer<Boolean> then) {
        Ask.Answer elsewhere = new Ask.Answer("elsewhere", Bundle.BTN_SaveElsewhere());
        Ask.Answer overwrite = new Ask.Answer("overwrite", Bundle.BTN_Overwrite());
        Ask.Answer again = new Ask.Answer("again", Bundle.BTN_ReadAgain());
        Ask.Answer cancel = new Ask.Answer("cancel", Bundle.BTN_Cancel());
        Ask.Answer answer = Ask.one(
                Bundle.TTL_Outside(), Bundle.MSG_OutsideSave(file), List.of(), elsewhere, overwrite, again, cancel);
        if (answer == elsewhere) {
            askAndSave(session, then);
        } else if (answer == overwrite) {
            saveAs(session, file, then);
        } else {
            if (answer == again) {
                readAgain(session);
            }
            then.accept(false);
        }
    }

    /** Asks for a place and saves a project there. */
    void askAndSave(ProjectSession session, Consumer<Boolean> then) {
        commitTyping();
        collectViews(session);
        String name = session.file()
                .map(file -> file.getFileName().toString())
                .orElseGet(() -> fileName(session.displayName()));
        FileChooserBuilder chooser = chooser().setTitle(Bundle.TTL_SaveProject());
        session.file().map(Path::getParent).ifPresent(folder -> chooser.setDefaultWorkingDirectory(folder.toFile()));
        JFileChooser dialog = chooser.createFileChooser();
        dialog.setSelectedFile(new File(dialog.getCurrentDirectory(), name));
        dialog.setDialogTitle(Bundle.TTL_SaveProject());
        if (dialog.showSaveDialog(WindowManager.getDefault().getMainWindow()) != JFileChooser.APPROVE_OPTION) {
            then.accept(false);
            return;
        }
        Path file = dialog.getSelectedFile().toPath();
        Path wanted = file.getFileName().toString().contains(".")
                ? file
                : file.resolveSibling(file.getFileName() + ProjectFile.ENDING);
        boolean own = session.file().filter(wanted::equals).isPresent();
        if (Files.exists(wanted) && !own) {
            Ask.Answer overwrite = new Ask.Answer("overwrite", Bundle.BTN_Overwrite());
            Ask.Answer cancel = new Ask.Answer("cancel", Bundle.BTN_Cancel());
            if (Ask.one(Bundle.TTL_Exists(), Bundle.MSG_Exists(wanted.getFileName()), List.of(), cancel, overwrite)
                    != overwrite) {
                then.accept(false);
                return;
            }
        }
        saveAs(session, wanted, then);
    }

    /** Saves a project in a file, whatever is there. */
    void saveAs(ProjectSession session, Path file, Consumer<Boolean> then) {
        boolean same = file.equals(lockedFiles.get(session));
        FILES.post(() -> {
            ProjectLock fresh = null;
            try {
                fresh = same ? null : ProjectLock.take(file);
                open.saveAs(session, file);
                ProjectLock lock = fresh;
                SwingUtilities.invokeLater(() -> {
                    if (lock != null) {
                        locked(session, session.file().orElseThrow(), lock);
                    }
                    saved(session, then);
                });
            } catch (WellwrightException e) {
                close(fresh);
                Ask.tell(e);
                SwingUtilities.invokeLater(() -> then.accept(false));
            }
        });
    }

    private static String fileName(String title) {
        String name = title.replaceAll("[^\\p{L}\\p{N}._ -]", "").strip().replace(' ', '-');
        return (name.isEmpty() ? "project" : name) + ProjectFile.ENDING;
    }

    /** Saves all projects that have unsaved changes, one after the other; tells whether all were saved. */
    void saveAll(Consumer<Boolean> then) {
        saveAll(new ArrayList<>(unsaved()), then);
    }

    private void saveAll(List<ProjectSession> left, Consumer<Boolean> then) {
        if (left.isEmpty()) {
            then.accept(true);
            return;
        }
        save(left.remove(0), saved -> {
            if (saved) {
                saveAll(left, then);
            } else {
                then.accept(false);
            }
        });
    }

    List<ProjectSession> unsaved() {
        return open.sessions().stream().filter(ProjectSession::modified).toList();
    }

    /** Closes a project; asks first if it has unsaved changes. */
    void close(ProjectSession session) {
        commitTyping();
        if (!session.modified()) {
            closeNow(session);
            return;
        }
        Ask.Answer save = new Ask.Answer("save", Bundle.BTN_Save());
        Ask.Answer discard = new Ask.Answer("discard", Bundle.BTN_Discard());
        Ask.Answer cancel = new Ask.Answer("cancel", Bundle.BTN_Cancel());
        Ask.Answer answer = Ask.one(
                Bundle.TTL_Unsaved(), Bundle.MSG_UnsavedOne(session.displayName()), List.of(), save, discard, cancel);
        if (answer == save) {
            save(session, saved -> {
                if (saved) {
                    closeNow(session);
                }
            });
        } else if (answer == discard) {
            closeNow(session);
        }
    }

    private void closeNow(ProjectSession session) {
        open.close(session);
        changed();
    }

    /** Asks about unsaved changes before the application ends; whether it may end is told. */
    void askBeforeExit(Consumer<Boolean> then) {
        commitTyping();
        List<ProjectSession> unsaved = unsaved();
        if (unsaved.isEmpty()) {
            then.accept(true);
            return;
        }
        Ask.Answer save = new Ask.Answer("save", unsaved.size() == 1 ? Bundle.BTN_Save() : Bundle.BTN_SaveAll());
        Ask.Answer discard = new Ask.Answer("discard", Bundle.BTN_Discard());
        Ask.Answer cancel = new Ask.Answer("cancel", Bundle.BTN_Cancel());
        boolean one = unsaved.size() == 1;
        String question =
                one ? Bundle.MSG_UnsavedOne(unsaved.get(0).displayName()) : Bundle.MSG_UnsavedMany(unsaved.size());
        List<String> names = one
                ? List.of()
                : unsaved.stream().map(ProjectSession::displayName).toList();
        Ask.Answer answer = Ask.one(Bundle.TTL_Unsaved(), question, names, save, discard, cancel);
        if (answer == save) {
            saveAll(then);
        } else {
            then.accept(answer == discard);
        }
    }

    /** Lets go of everything: the application ends. */
    void end() {
        recovery.endAll();
        for (ProjectSession session : List.copyOf(locks.keySet())) {
            unlock(session);
        }
    }

    /** Looks whether other programs changed the files that are open; asks once about each change. */
    void lookOutside() {
        List<ProjectSession> sessions = open.sessions();
        FILES.post(() -> {
            for (ProjectSession session : sessions) {
                try {
                    if (open.changedOutside(session)) {
                        SwingUtilities.invokeLater(() -> askAboutOutside(session));
                    }
                } catch (WellwrightException e) {
                    LOG.log(Level.FINE, "cannot look at a file", e);
                }
            }
        });
    }

    private void askAboutOutside(ProjectSession session) {
        if (!asked.add(session) || !open.sessions().contains(session)) {
            return;
        }
        Path file = session.file().orElseThrow();
        if (!Files.exists(file)) {
            StatusDisplayer.getDefault().setStatusText(Bundle.MSG_OutsideGone(file));
            return;
        }
        Ask.Answer again = new Ask.Answer("again", Bundle.BTN_ReadAgain());
        Ask.Answer keep = new Ask.Answer("keep", Bundle.BTN_KeepMine());
        if (Ask.one(Bundle.TTL_Outside(), Bundle.MSG_OutsideRead(file), List.of(), again, keep) == again) {
            readAgain(session);
        }
    }

    private void readAgain(ProjectSession session) {
        FILES.post(() -> {
            try {
                open.readAgain(session);
                SwingUtilities.invokeLater(() -> asked.remove(session));
            } catch (WellwrightException e) {
                Ask.tell(e);
            }
        });
    }

    /** Takes up what is still being typed, as the Enter key would. */
    static void commitTyping() {
        Component focused =
                KeyboardFocusManager.getCurrentKeyboardFocusManager().getFocusOwner();
        if (focused == null) {
            return;
        }
        JTable table = (JTable) SwingUtilities.getAncestorOfClass(JTable.class, focused);
        if (table != null && table.isEditing()) {
            table.getCellEditor().stopCellEditing();
        } else if (focused instanceof JTextField field) {
            field.postActionEvent();
        }
    }

    private static void collectViews(ProjectSession session) {
        Map<String, Map<String, String>> views =
                new LinkedHashMap<>(session.project().views());
        for (ViewStateProvider provider : Lookup.getDefault().lookupAll(ViewStateProvider.class)) {
            Map<String, String> state = provider.state(session);
            if (state.isEmpty()) {
                views.remove(provider.id());
            } else {
                views.put(provider.id(), state);
            }
        }
        session.putViews(views);
    }

    private static void restoreViews(ProjectSession session) {
        Map<String, Map<String, String>> views = session.project().views();
        for (ViewStateProvider provider : Lookup.getDefault().lookupAll(ViewStateProvider.class)) {
            provider.restore(session, views.getOrDefault(provider.id(), Map.of()));
        }
    }
}
