package org.wellwright.viewer.levels;

import java.awt.BorderLayout;
import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.branding.EmptyState;

/** The level diagram of the selected project. Shows an empty state until a project is open. */
@TopComponent.Description(preferredID = LevelsTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "editor", openAtStartup = true, position = 100)
@TopComponent.OpenActionRegistration(displayName = "#CTL_LevelsWindow", preferredID = LevelsTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.viewer.levels.LevelsTopComponent")
@ActionReference(path = "Menu/Window", position = 210)
@Messages({
    "CTL_LevelsWindow=Level diagram",
    "HINT_LevelsWindow=Calculated levels beside measured ones",
    "MSG_LevelsMissing=No project is open",
    "MSG_LevelsRemedy=Open or create a project from the File menu; its levels are drawn here, each model beside the measured values."
})
public final class LevelsTopComponent extends TopComponent {
    static final String ID = "LevelsTopComponent";
    private static final long serialVersionUID = 1L;

    /** Made by the window system. */
    public LevelsTopComponent() {
        setName(Bundle.CTL_LevelsWindow());
        setDisplayName(Bundle.CTL_LevelsWindow());
        setToolTipText(Bundle.HINT_LevelsWindow());
        setLayout(new BorderLayout());
        add(new EmptyState(Bundle.MSG_LevelsMissing(), Bundle.MSG_LevelsRemedy()), BorderLayout.CENTER);
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
