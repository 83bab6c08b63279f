package org.wellwright.editor.models;

import javax.swing.JLabel;
import org.wellwright.solver.potential.FamilyParameter;
import org.wellwright.solver.potential.PotentialFamily;

/** Families of potentials in words. */
final class FamilyText {
    private FamilyText() {}

    /** Formula, validity and source, below each other. */
    static JLabel label(PotentialFamily family) {
        JLabel label = new JLabel(html(family, 230));
        label.setName("family.description");
        label.getAccessibleContext()
                .setAccessibleName(family.formula() + ". " + family.validity() + " " + family.source());
        return label;
    }

    static String html(PotentialFamily family, int width) {
        return "<html><div style='width:%dpx'><code>V(r) = %s</code><br>%s<br><i>%s</i></div>"
                .formatted(width, escape(family.formula()), escape(family.validity()), escape(family.source()));
    }

    /** "depth D". */
    static String title(FamilyParameter parameter) {
        return parameter.name().equals(parameter.symbol())
                ? parameter.name()
                : parameter.name() + " " + parameter.symbol();
    }

    private static String escape(String text) {
        return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
    }
}
