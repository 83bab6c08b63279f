package org.wellwright.project.window;

import java.awt.event.ActionEvent;
import javax.swing.AbstractAction;
import javax.swing.Action;
import javax.swing.SwingUtilities;
import org.openide.util.ImageUtilities;
import org.openide.util.Lookup;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.ProjectSession;

/** An action on the selected project: grey while there is none, or while there is nothing to do. */
abstract class SelectedProjectAction extends AbstractAction {
    private static final long serialVersionUID = 1L;

    private final transient OpenProjects open = Lookup.getDefault().lookup(OpenProjects.class);
    private final transient Runnable changed = () -> SwingUtilities.invokeLater(this::follow);
    private transient ProjectSession followed;

    SelectedProjectAction(String text, String icon) {
        super(text);
        if (icon != null) {
            putValue("iconBase", icon);
            putValue(Action.SMALL_ICON, ImageUtilities.loadImageIcon(icon, false));
        }
        open.addListener(changed);
        follow();
    }

    private void follow() {
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
        setEnabled(followed != null && applies(followed));
    }

    /** Whether there is something to do for a project. */
    boolean applies(ProjectSession session) {
        return true;
    }

    /** Does it. */
    abstract void act(ProjectSession session);

    @Override
    public void actionPerformed(ActionEvent event) {
        open.selected().ifPresent(this::act);
    }
}
