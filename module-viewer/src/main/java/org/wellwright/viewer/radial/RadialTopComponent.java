package org.wellwright.viewer.radial;

import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.viewer.picture.FigureWindow;

/** Radial functions of the selected levels. */
@TopComponent.Description(preferredID = RadialTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "editor", openAtStartup = true, position = 120)
@TopComponent.OpenActionRegistration(displayName = "#CTL_RadialWindow", preferredID = RadialTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.viewer.radial.RadialTopComponent")
@ActionReference(path = "Menu/Window", position = 230)
@Messages({"CTL_RadialWindow=Radial functions", "HINT_RadialWindow=Radial functions of the selected levels"})
public final class RadialTopComponent extends FigureWindow {
    static final String ID = "RadialTopComponent";
    private static final long serialVersionUID = 1L;

    /** Made by the window system. */
    public RadialTopComponent() {
        super("radial", new RadialFigure(), RadialFigure::picture, Parts.STATE);
        setName(Bundle.CTL_RadialWindow());
        setDisplayName(Bundle.CTL_RadialWindow());
        setToolTipText(Bundle.HINT_RadialWindow());
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
