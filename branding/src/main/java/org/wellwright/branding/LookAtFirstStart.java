package org.wellwright.branding;

import org.openide.modules.ModuleInstall;

/**
 * Writes the chosen look down before the window exists; without a choice on record the platform would come up in
 * Swing's own look.
 */
public final class LookAtFirstStart extends ModuleInstall {
    private static final long serialVersionUID = 1L;

    @Override
    public void validate() {
        WindowLook.chosen().choose();
    }
}
