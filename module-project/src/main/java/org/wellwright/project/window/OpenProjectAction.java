package org.wellwright.project.window;

import java.awt.event.ActionEvent;
import java.awt.event.ActionListener;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.awt.ActionReferences;
import org.openide.awt.ActionRegistration;
import org.openide.util.NbBundle.Messages;

/** Asks for project files and opens them. */
@ActionID(category = "File", id = "org.wellwright.project.window.OpenProjectAction")
@ActionRegistration(
        displayName = "#CTL_OpenProject",
        iconBase = "org/wellwright/project/window/open.svg",
        asynchronous = false)
@ActionReferences({
    @ActionReference(path = "Menu/File", position = 110),
    @ActionReference(path = "Toolbars/File", position = 110),
    @ActionReference(path = "Shortcuts", name = "D-O")
})
@Messages("CTL_OpenProject=&Open Project…")
public final class OpenProjectAction implements ActionListener {
    @Override
    public void actionPerformed(ActionEvent event) {
        ProjectDesk.get().askAndOpen();
    }
}
