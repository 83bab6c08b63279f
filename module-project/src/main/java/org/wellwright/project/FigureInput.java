package org.wellwright.project;

import java.util.List;
import java.util.Objects;
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
 * @param comparison every datum beside what the models say
 * @param scores how well each model agrees
 * @param lines predicted and measured lines
 */
public record FigureInput(
        String title,
        String digest,
        ModelDocument document,
        List<SolvedModel> models,
        List<MeasuredLevel> measured,
        List<DatumComparison> comparison,
        List<ModelScore> scores,
        List<SpectralLine> lines) {

    /** Copies the lists. */
    public FigureInput {
        Objects.requireNonNull(title, "title");
        Objects.requireNonNull(digest, "digest");
        Objects.requireNonNull(document, "document");
        models = List.copyOf(models);
        measured = List.copyOf(measured);
        comparison = List.copyOf(comparison);
        scores = List.copyOf(scores);
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

    /** How well a model agrees, or null. */
    public ModelScore score(String model) {
        for (ModelScore score : scores) {
            if (score.model().equals(model)) {
                return score;
            }
        }
        return null;
    }
}
