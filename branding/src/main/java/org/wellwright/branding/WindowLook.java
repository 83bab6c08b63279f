package org.wellwright.branding;

import java.util.prefs.Preferences;
import org.openide.util.NbPreferences;

/** The two looks of the window and the user's choice between them, kept where the platform reads it at its start. */
enum WindowLook {
    LIGHT("com.formdev.flatlaf.FlatLightLaf"),
    DARK("com.formdev.flatlaf.FlatDarkLaf");

    private static final String KEY = "laf";

    private final String className;

    WindowLook(String className) {
        this.className = className;
    }

    /** What the next start will use; light if nothing was chosen, or something that is no longer there. */
    static WindowLook chosen() {
        return DARK.className.equals(preferences().get(KEY, "")) ? DARK : LIGHT;
    }

    /** Makes this the look of the next start. */
    void choose() {
        preferences().put(KEY, className);
    }

    private static Preferences preferences() {
        return NbPreferences.root().node("laf");
    }
}
