package org.wellwright.project.window;

import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.awt.ActionReferences;
import org.openide.awt.ActionRegistration;
import org.openide.util.NbBundle.Messages;
import org.wellwright.project.ProjectSession;

/** Saves the selected project under another name. */
@ActionID(category = "File", id = "org.wellwright.project.window.SaveProjectAsAction")
@ActionRegistration(displayName = "#CTL_SaveProjectAs", lazy = false)
@ActionReferences({
    @ActionReference(path = "Menu/File", position = 210),
    @ActionReference(path = "Shortcuts", name = "DS-S")
})
@Messages("CTL_SaveProjectAs=Save &As…")
public final class SaveProjectAsAction extends SelectedProjectAction {
    private static final long serialVersionUID = 1L;

    /** Made by the platform. */
    public SaveProjectAsAction() {
        super(Bundle.CTL_SaveProjectAs(), null);
    }

    @Override
    void act(ProjectSession session) {
        ProjectDesk.get().askAndSave(session, saved -> {});
    }
}
