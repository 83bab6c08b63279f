package org.wellwright.viewer.potential;

import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.viewer.picture.FigureWindow;

/** The potentials of the selected project with their levels. */
@TopComponent.Description(preferredID = PotentialTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "editor", openAtStartup = true, position = 110)
@TopComponent.OpenActionRegistration(displayName = "#CTL_PotentialWindow", preferredID = PotentialTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.viewer.potential.PotentialTopComponent")
@ActionReference(path = "Menu/Window", position = 220)
@Messages({"CTL_PotentialWindow=Potentials", "HINT_PotentialWindow=Potentials with levels between their turning points"
})
public final class PotentialTopComponent extends FigureWindow {
    static final String ID = "PotentialTopComponent";
    private static final long serialVersionUID = 1L;

    /** Made by the window system. */
    public PotentialTopComponent() {
        super("potential", new PotentialFigure(), PotentialFigure::picture, Parts.STATE);
        setName(Bundle.CTL_PotentialWindow());
        setDisplayName(Bundle.CTL_PotentialWindow());
        setToolTipText(Bundle.HINT_PotentialWindow());
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
