package org.wellwright.project.window;

import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.awt.ActionReferences;
import org.openide.awt.ActionRegistration;
import org.openide.util.NbBundle.Messages;
import org.wellwright.project.ProjectSession;

/** Saves the selected project. */
@ActionID(category = "File", id = "org.wellwright.project.window.SaveProjectAction")
@ActionRegistration(displayName = "#CTL_SaveProject", lazy = false)
@ActionReferences({
    @ActionReference(path = "Menu/File", position = 200, separatorBefore = 195),
    @ActionReference(path = "Toolbars/File", position = 120),
    @ActionReference(path = "Shortcuts", name = "D-S")
})
@Messages("CTL_SaveProject=&Save")
public final class SaveProjectAction extends SelectedProjectAction {
    private static final long serialVersionUID = 1L;

    /** Made by the platform. */
    public SaveProjectAction() {
        super(Bundle.CTL_SaveProject(), "org/wellwright/project/window/save.svg");
    }

    @Override
    void act(ProjectSession session) {
        ProjectDesk.get().save(session, saved -> {});
    }
}
