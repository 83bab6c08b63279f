package org.wellwright.branding;

import java.util.prefs.Preferences;
import org.openide.modules.ModuleInstall;
import org.openide.util.NbPreferences;

/**
 * Chooses the light look when the user has not yet chosen one; without it the window would come up in Swing's own.
 * Called before the window exists.
 */
public final class LookAtFirstStart extends ModuleInstall {
    private static final long serialVersionUID = 1L;
    private static final String LIGHT_LOOK = "com.formdev.flatlaf.FlatLightLaf";

    @Override
    public void validate() {
        Preferences look = NbPreferences.root().node("laf");
        if (look.get("laf", "").isBlank()) {
            look.put("laf", LIGHT_LOOK);
        }
    }
}
