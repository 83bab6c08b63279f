package org.wellwright.viewer.density;

import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.viewer.picture.FigureWindow;

/** The density of the selected state in a plane. */
@TopComponent.Description(preferredID = DensityTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "editor", openAtStartup = true, position = 130)
@TopComponent.OpenActionRegistration(displayName = "#CTL_DensityWindow", preferredID = DensityTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.viewer.density.DensityTopComponent")
@ActionReference(path = "Menu/Window", position = 240)
@Messages({"CTL_DensityWindow=Density", "HINT_DensityWindow=The density of the selected state in a plane"})
public final class DensityTopComponent extends FigureWindow {
    static final String ID = "DensityTopComponent";
    private static final long serialVersionUID = 1L;

    /** Made by the window system. */
    public DensityTopComponent() {
        super("density", new DensityFigure(), DensityFigure::picture, Parts.STATE_AND_PROJECTION);
        setName(Bundle.CTL_DensityWindow());
        setDisplayName(Bundle.CTL_DensityWindow());
        setToolTipText(Bundle.HINT_DensityWindow());
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
