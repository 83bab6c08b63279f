package org.wellwright.project;

import java.util.List;
import java.util.Objects;
import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.ModelComparison;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.units.UnitSystem;

/**
 * All that a figure can show of a project at one moment. Immutable; energies and lengths are in the project's units.
 *
 * @param title the project's title
 * @param digest digest of the document, for the metadata of exported figures
 * @param document the document
 * @param models what solving gave, in the order of the document's models
 * @param measured levels that the data fix
 * @param comparison every datum beside what the models say, or null
 * @param lines predicted and measured lines
 */
public record FigureInput(
        String title,
        String digest,
        ModelDocument document,
        List<SolvedModel> models,
        List<MeasuredLevel> measured,
        Comparison comparison,
        List<SpectralLine> lines) {

    /** Copies the lists. */
    public FigureInput {
        Objects.requireNonNull(title, "title");
        Objects.requireNonNull(digest, "digest");
        Objects.requireNonNull(document, "document");
        models = List.copyOf(models);
        measured = List.copyOf(measured);
        lines = List.copyOf(lines);
    }

    /** The units of every number here. */
    public UnitSystem units() {
        return UnitSystem.named(document.units());
    }

    /** The solved model of a name, or null. */
    public SolvedModel model(String name) {
        for (SolvedModel model : models) {
            if (model.model().equals(name)) {
                return model;
            }
        }
        return null;
    }

    /** A model beside the data, or null. */
    public ModelComparison compared(String model) {
        if (comparison != null) {
            for (ModelComparison one : comparison.models()) {
                if (one.model().equals(model)) {
                    return one;
                }
            }
        }
        return null;
    }
}
