package org.wellwright.editor.parts;

import java.awt.Color;
import javax.swing.UIManager;

/** Colours of the window's present look, for what Swing has no name for. */
public final class Tones {
    private Tones() {}

    /** Of what is wrong. */
    public static Color problem() {
        return dark() ? new Color(0xff7b72) : new Color(0xb3261e);
    }

    /** Of what is less important. */
    public static Color faint() {
        Color faint = UIManager.getColor("Label.disabledForeground");
        return faint == null ? Color.GRAY : faint;
    }

    /** Of numbers in formulas. */
    public static Color number() {
        return dark() ? new Color(0x79c0ff) : new Color(0x0b5cad);
    }

    /** Of names that the project defines. */
    public static Color name() {
        return dark() ? new Color(0xd2a8ff) : new Color(0x6b2fa0);
    }

    /** Of names that the language defines. */
    public static Color word() {
        return dark() ? new Color(0x7ee0c0) : new Color(0x0f6b50);
    }

    /** Whether the look is dark. */
    public static boolean dark() {
        Color ground = UIManager.getColor("Panel.background");
        return ground != null && ground.getRed() * 0.3 + ground.getGreen() * 0.59 + ground.getBlue() * 0.11 < 128;
    }
}
