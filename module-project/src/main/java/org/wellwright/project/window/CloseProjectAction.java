package org.wellwright.project.window;

import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.awt.ActionRegistration;
import org.openide.util.NbBundle.Messages;
import org.wellwright.project.ProjectSession;

/** Closes the selected project. */
@ActionID(category = "File", id = "org.wellwright.project.window.CloseProjectAction")
@ActionRegistration(displayName = "#CTL_CloseProject", lazy = false)
@ActionReference(path = "Menu/File", position = 130)
@Messages("CTL_CloseProject=&Close Project")
public final class CloseProjectAction extends SelectedProjectAction {
    private static final long serialVersionUID = 1L;

    /** Made by the platform. */
    public CloseProjectAction() {
        super(Bundle.CTL_CloseProject(), null);
    }

    @Override
    void act(ProjectSession session) {
        ProjectDesk.get().close(session);
    }
}
