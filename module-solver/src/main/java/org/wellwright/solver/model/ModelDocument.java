package org.wellwright.solver.model;

import java.util.List;
import java.util.Objects;
import org.wellwright.solver.pair.PairSystem;

/**
 * Everything that determines levels, comparison and fit: a project without its views and notes.
 *
 * @param constantsEdition edition of the constants of nature ("CODATA 2022"), pinned
 * @param massTable edition of the mass table, pinned
 * @param units name of the unit system in which formulas are written and results are shown ("atomic", "eV-nm", ...)
 * @param labels how levels are named
 * @param weighting what the uncertainties of the data mean
 * @param systems the pairs of bodies
 * @param parameters the pool
 * @param models the candidates; the first is the default
 * @param data what was measured
 * @param groups data that share an error
 */
public record ModelDocument(
        String constantsEdition,
        String massTable,
        String units,
        LabelConvention labels,
        Weighting weighting,
        List<PairSystem> systems,
        List<Parameter> parameters,
        List<Model> models,
        List<Datum> data,
        List<DataGroup> groups) {

    /** Copies the lists. */
    public ModelDocument {
        Objects.requireNonNull(constantsEdition, "constantsEdition");
        Objects.requireNonNull(massTable, "massTable");
        Objects.requireNonNull(units, "units");
        Objects.requireNonNull(labels, "labels");
        Objects.requireNonNull(weighting, "weighting");
        systems = List.copyOf(systems);
        parameters = List.copyOf(parameters);
        models = List.copyOf(models);
        data = List.copyOf(data);
        groups = List.copyOf(groups);
    }
}
