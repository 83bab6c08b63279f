package org.wellwright.editor.notes;

import java.util.Optional;
import org.wellwright.editor.parts.Entry;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.units.UnitSystem;

/** Turns what is typed about a project as a whole into edits of it. */
final class NotesController {
    private final ProjectSession session;

    NotesController(ProjectSession session) {
        this.session = session;
    }

    Optional<Problem> setTitle(String text) {
        return Entry.attempt(() -> session.edit("Change the title", project -> project.withTitle(text.strip())));
    }

    /** A burst of typing is one step. */
    void setNotes(String text) {
        session.edit("Change the notes", "notes", project -> project.withNotes(text));
    }

    void endTyping() {
        session.endGesture();
    }

    /**
     * Other units to show results in. Plain numbers in formulas then mean these; parameters and data keep their own
     * units.
     */
    void setUnits(UnitSystem units) {
        session.edit(
                "Change the units",
                project -> project.withDocument(project.document().withUnits(units.id())));
    }

    void setLabels(LabelConvention labels) {
        session.edit(
                "Change the names of levels",
                project -> project.withDocument(project.document().withLabels(labels)));
    }
}
