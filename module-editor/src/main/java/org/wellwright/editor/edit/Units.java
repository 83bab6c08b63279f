package org.wellwright.editor.edit;

import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.units.UnitSystem;

/** The unit system of a document. */
public final class Units {
    private Units() {}

    /**
     * The document's; atomic units where it names one that is not known, which the windows report as a fault of the
     * project.
     */
    public static UnitSystem of(ModelDocument document) {
        try {
            return UnitSystem.named(document.units());
        } catch (InvalidModelException e) {
            return UnitSystem.ATOMIC;
        }
    }
}
