package org.wellwright.project.window;

import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.awt.ActionRegistration;
import org.openide.util.NbBundle.Messages;
import org.wellwright.project.ProjectSession;

/** Saves all projects that have unsaved changes. */
@ActionID(category = "File", id = "org.wellwright.project.window.SaveAllProjectsAction")
@ActionRegistration(displayName = "#CTL_SaveAllProjects", lazy = false)
@ActionReference(path = "Menu/File", position = 220)
@Messages("CTL_SaveAllProjects=Save A&ll")
public final class SaveAllProjectsAction extends SelectedProjectAction {
    private static final long serialVersionUID = 1L;

    /** Made by the platform. */
    public SaveAllProjectsAction() {
        super(Bundle.CTL_SaveAllProjects(), null);
    }

    @Override
    void act(ProjectSession session) {
        ProjectDesk.get().saveAll(saved -> {});
    }
}
