package org.wellwright.project.window;

import java.awt.Frame;
import javax.swing.JFrame;
import javax.swing.JRootPane;
import javax.swing.SwingUtilities;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.WindowManager;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.ProjectSession;

/** The title of the main window: the selected project, a star if it has unsaved changes, and the application's name. */
@Messages({"TTL_Application=Wellwright", "# {0} - project", "TTL_WithProject={0} – Wellwright"})
final class WindowTitle {
    private final OpenProjects open;
    private final Runnable changed = () -> SwingUtilities.invokeLater(this::show);
    private ProjectSession followed;

    private WindowTitle(OpenProjects open) {
        this.open = open;
    }

    static void follow(ProjectDesk desk) {
        WindowTitle title = new WindowTitle(desk.projects());
        desk.projects().addListener(title.changed);
        title.show();
    }

    private void show() {
        ProjectSession selected = open.selected().orElse(null);
        if (selected != followed) {
            if (followed != null) {
                followed.removeListener(changed);
            }
            followed = selected;
            if (followed != null) {
                followed.addListener(changed);
            }
        }
        Frame frame = WindowManager.getDefault().getMainWindow();
        if (followed == null) {
            frame.setTitle(Bundle.TTL_Application());
            return;
        }
        frame.setTitle(Bundle.TTL_WithProject(followed.displayName() + (followed.modified() ? " *" : "")));
        if (frame instanceof JFrame window) {
            JRootPane root = window.getRootPane();
            root.putClientProperty("Window.documentModified", followed.modified());
            root.putClientProperty(
                    "Window.documentFile",
                    followed.file().map(file -> file.toFile()).orElse(null));
        }
    }
}
