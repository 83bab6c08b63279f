package org.wellwright.editor.models;

import java.awt.BorderLayout;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.branding.EmptyState;

/** The models of the selected project. Shows an empty state until a project is open. */
@TopComponent.Description(preferredID = ModelsTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "explorer", openAtStartup = true, position = 100)
@TopComponent.OpenActionRegistration(displayName = "#CTL_ModelsWindow", preferredID = ModelsTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.editor.models.ModelsTopComponent")
@ActionReference(path = "Menu/Window", position = 110)
@Messages({
    "CTL_ModelsWindow=Models",
    "HINT_ModelsWindow=The models of the selected project, their terms and parameters",
    "MSG_ModelsMissing=No project is open",
    "MSG_ModelsRemedy=Open or create a project from the File menu; its models, terms and parameters are edited here."
})
public final class ModelsTopComponent extends TopComponent {
    static final String ID = "ModelsTopComponent";
    private static final long serialVersionUID = 1L;

    /** Made by the window system. */
    public ModelsTopComponent() {
        setName(Bundle.CTL_ModelsWindow());
        setDisplayName(Bundle.CTL_ModelsWindow());
        setToolTipText(Bundle.HINT_ModelsWindow());
        setLayout(new BorderLayout());
        add(new EmptyState(Bundle.MSG_ModelsMissing(), Bundle.MSG_ModelsRemedy()), BorderLayout.CENTER);
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
