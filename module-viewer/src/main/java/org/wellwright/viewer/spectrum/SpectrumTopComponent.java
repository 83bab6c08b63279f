package org.wellwright.viewer.spectrum;

import org.openide.awt.ActionID;
import org.openide.awt.ActionReference;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.TopComponent;
import org.wellwright.viewer.picture.FigureWindow;

/** The lines of the selected project. */
@TopComponent.Description(preferredID = SpectrumTopComponent.ID, persistenceType = TopComponent.PERSISTENCE_ALWAYS)
@TopComponent.Registration(mode = "editor", openAtStartup = true, position = 150)
@TopComponent.OpenActionRegistration(displayName = "#CTL_SpectrumWindow", preferredID = SpectrumTopComponent.ID)
@ActionID(category = "Window", id = "org.wellwright.viewer.spectrum.SpectrumTopComponent")
@ActionReference(path = "Menu/Window", position = 260)
@Messages({"CTL_SpectrumWindow=Lines", "HINT_SpectrumWindow=Calculated lines beside measured ones"})
public final class SpectrumTopComponent extends FigureWindow {
    static final String ID = "SpectrumTopComponent";
    private static final long serialVersionUID = 1L;

    /** Made by the window system. */
    public SpectrumTopComponent() {
        super("spectrum", new SpectrumFigure(), SpectrumFigure::picture, Parts.PICTURE);
        setName(Bundle.CTL_SpectrumWindow());
        setDisplayName(Bundle.CTL_SpectrumWindow());
        setToolTipText(Bundle.HINT_SpectrumWindow());
    }

    @Override
    protected String preferredID() {
        return ID;
    }
}
