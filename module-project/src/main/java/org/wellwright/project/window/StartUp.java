package org.wellwright.project.window;

import java.awt.Frame;
import java.awt.event.WindowAdapter;
import java.awt.event.WindowEvent;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.time.format.FormatStyle;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.OnShowing;
import org.openide.windows.TopComponent;
import org.openide.windows.WindowManager;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.WellwrightException;

/**
 * What happens when the window comes up: the projects of the last time are opened again, unsaved changes that a crash
 * left are offered back, files named on the command line are opened, and the start page is shown if nothing is open
 * then.
 */
@OnShowing
@Messages({
    "TTL_Recovery=Unsaved changes were kept",
    "MSG_Recovery=Wellwright did not end as it should. These unsaved changes were kept:",
    "BTN_Restore=Take them up",
    "BTN_RecoveryDiscard=Throw them away",
    "BTN_RecoveryLater=Decide at the next start",
    "# {0} - project",
    "# {1} - time",
    "TXT_Recovered={0}, kept {1}",
    "LBL_Recover=Take up unsaved changes"
})
public final class StartUp implements Runnable {
    private static final List<Path> NAMED = new ArrayList<>();
    private static boolean ready;

    /** Opens files that were named on the command line: now, or as soon as the window is up. Event thread only. */
    static void openNamed(List<Path> files) {
        if (ready) {
            files.forEach(file -> ProjectDesk.get().open(file, session -> {}));
        } else {
            NAMED.addAll(files);
        }
    }

    @Override
    public void run() {
        ProjectDesk desk = ProjectDesk.get();
        WindowTitle.follow(desk);
        Frame frame = WindowManager.getDefault().getMainWindow();
        frame.addWindowListener(new WindowAdapter() {
            @Override
            public void windowActivated(WindowEvent event) {
                desk.lookOutside();
            }
        });
        List<Path> last = new ArrayList<>();
        for (Path file : desk.remembered().open()) {
            if (Files.exists(file)) {
                last.add(file);
            }
        }
        Optional<Path> selected = desk.remembered().selected();
        openNext(last, () -> {
            selected.ifPresent(file -> select(desk, file));
            recover(desk);
        });
    }

    /** One after the other, so that they keep their order. */
    private static void openNext(List<Path> files, Runnable then) {
        if (files.isEmpty()) {
            then.run();
            return;
        }
        Path file = files.remove(0);
        ProjectDesk.get().openOrSkip(file, () -> openNext(files, then));
    }

    private static void select(ProjectDesk desk, Path file) {
        for (ProjectSession session : desk.projects().sessions()) {
            if (session.file().filter(file::equals).isPresent()) {
                desk.projects().select(session);
            }
        }
    }

    private static void recover(ProjectDesk desk) {
        List<RecoveryFolder.Entry> entries = desk.left();
        if (entries.isEmpty()) {
            finish(desk);
            return;
        }
        DateTimeFormatter times =
                DateTimeFormatter.ofLocalizedDateTime(FormatStyle.SHORT).withZone(ZoneId.systemDefault());
        List<String> names = entries.stream()
                .map(entry -> Bundle.TXT_Recovered(entry.title(), times.format(entry.time())))
                .toList();
        Ask.Answer restore = new Ask.Answer("restore", Bundle.BTN_Restore());
        Ask.Answer discard = new Ask.Answer("discard", Bundle.BTN_RecoveryDiscard());
        Ask.Answer later = new Ask.Answer("later", Bundle.BTN_RecoveryLater());
        Ask.Answer answer = Ask.one(Bundle.TTL_Recovery(), Bundle.MSG_Recovery(), names, restore, discard, later);
        if (answer == restore) {
            restore(desk, new ArrayList<>(entries));
        } else {
            if (answer == discard) {
                entries.forEach(desk.recovery()::forget);
            }
            finish(desk);
        }
    }

    private static void restore(ProjectDesk desk, List<RecoveryFolder.Entry> left) {
        if (left.isEmpty()) {
            finish(desk);
            return;
        }
        RecoveryFolder.Entry entry = left.remove(0);
        Runnable next = () -> restore(desk, left);
        try {
            Project kept = desk.recovery().project(entry);
            if (entry.file().filter(Files::exists).isPresent()) {
                desk.openOrSkip(entry.file().get(), () -> {
                    desk.projects().sessions().stream()
                            .filter(session -> session.file().equals(entry.file()))
                            .findFirst()
                            .ifPresentOrElse(session -> take(session, kept), () -> takeAsNew(desk, kept));
                    desk.recovery().forget(entry);
                    next.run();
                });
                return;
            }
            takeAsNew(desk, kept);
            desk.recovery().forget(entry);
        } catch (WellwrightException e) {
            Ask.tell(e);
        }
        next.run();
    }

    private static void take(ProjectSession session, Project kept) {
        session.edit(Bundle.LBL_Recover(), project -> kept.withViews(project.views()));
    }

    /** In no file: an empty project that the kept one replaces, so that it counts as not saved. */
    private static void takeAsNew(ProjectDesk desk, Project kept) {
        Project empty = Project.of(
                "", kept.document().withModels(List.of()).withData(List.of()).withParameters(List.of()));
        take(desk.create(empty), kept);
    }

    private static void finish(ProjectDesk desk) {
        desk.restored();
        ready = true;
        List<Path> named = List.copyOf(NAMED);
        NAMED.clear();
        openNext(new ArrayList<>(named), () -> {
            TopComponent start = WindowManager.getDefault().findTopComponent(StartTopComponent.ID);
            if (start == null) {
                return;
            }
            if (desk.projects().sessions().isEmpty()) {
                start.open();
                start.requestActive();
            } else {
                start.close();
            }
            // Undo and redo belong to the active window, and after a dialog at the start there may be none.
            TopComponent projects = WindowManager.getDefault().findTopComponent(ProjectsTopComponent.ID);
            if (TopComponent.getRegistry().getActivated() == null && projects != null && projects.isOpened()) {
                projects.requestActive();
            }
        });
    }
}
