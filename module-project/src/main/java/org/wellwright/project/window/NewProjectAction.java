package org.wellwright.project.window;

import java.awt.event.ActionEvent;
import java.awt.event.ActionListener;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.awt.ActionReferences;
import org.openide.awt.ActionRegistration;
import org.openide.util.NbBundle.Messages;

/** Asks what a new project starts from, and adds it. */
@ActionID(category = "File", id = "org.wellwright.project.window.NewProjectAction")
@ActionRegistration(
        displayName = "#CTL_NewProject",
        iconBase = "org/wellwright/project/window/new.svg",
        asynchronous = false)
@ActionReferences({
    @ActionReference(path = "Menu/File", position = 100),
    @ActionReference(path = "Toolbars/File", position = 100),
    @ActionReference(path = "Shortcuts", name = "D-N")
})
@Messages("CTL_NewProject=&New Project…")
public final class NewProjectAction implements ActionListener {
    @Override
    public void actionPerformed(ActionEvent event) {
        NewProject.ask().ifPresent(ProjectDesk.get()::create);
    }
}
