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

    /** The same with another unit system. */
    public ModelDocument withUnits(String newUnits) {
        return new ModelDocument(
                constantsEdition, massTable, newUnits, labels, weighting, systems, parameters, models, data, groups);
    }

    /** The same with another convention of labels. */
    public ModelDocument withLabels(LabelConvention newLabels) {
        return new ModelDocument(
                constantsEdition, massTable, units, newLabels, weighting, systems, parameters, models, data, groups);
    }

    /** The same with another meaning of the uncertainties. */
    public ModelDocument withWeighting(Weighting newWeighting) {
        return new ModelDocument(
                constantsEdition, massTable, units, labels, newWeighting, systems, parameters, models, data, groups);
    }

    /** The same with other systems. */
    public ModelDocument withSystems(List<PairSystem> newSystems) {
        return new ModelDocument(
                constantsEdition, massTable, units, labels, weighting, newSystems, parameters, models, data, groups);
    }

    /** The same with other parameters. */
    public ModelDocument withParameters(List<Parameter> newParameters) {
        return new ModelDocument(
                constantsEdition, massTable, units, labels, weighting, systems, newParameters, models, data, groups);
    }

    /** The same with other models. */
    public ModelDocument withModels(List<Model> newModels) {
        return new ModelDocument(
                constantsEdition, massTable, units, labels, weighting, systems, parameters, newModels, data, groups);
    }

    /** The same with other data. */
    public ModelDocument withData(List<Datum> newData) {
        return new ModelDocument(
                constantsEdition, massTable, units, labels, weighting, systems, parameters, models, newData, groups);
    }

    /** The same with other groups. */
    public ModelDocument withGroups(List<DataGroup> newGroups) {
        return new ModelDocument(
                constantsEdition, massTable, units, labels, weighting, systems, parameters, models, data, newGroups);
    }
}
