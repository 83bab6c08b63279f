package org.wellwright.viewer.levels;

import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.viewer.picture.FigureWindow;

/** The level diagram of the selected project. */
@TopComponent.Description(preferredID = LevelsTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "editor", openAtStartup = true, position = 100)
@TopComponent.OpenActionRegistration(displayName = "#CTL_LevelsWindow", preferredID = LevelsTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.viewer.levels.LevelsTopComponent")
@ActionReference(path = "Menu/Window", position = 210)
@Messages({"CTL_LevelsWindow=Level diagram", "HINT_LevelsWindow=Calculated levels beside measured ones"})
public final class LevelsTopComponent extends FigureWindow {
    static final String ID = "LevelsTopComponent";
    private static final long serialVersionUID = 1L;

    /** Made by the window system. */
    public LevelsTopComponent() {
        super("levels", new LevelsFigure(), LevelsFigure::picture, Parts.PICTURE);
        setName(Bundle.CTL_LevelsWindow());
        setDisplayName(Bundle.CTL_LevelsWindow());
        setToolTipText(Bundle.HINT_LevelsWindow());
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
