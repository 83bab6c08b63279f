package org.wellwright.solver.model;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.pair.ExchangeSymmetry;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.Names;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/** Finds what is wrong with data and their groups; the part of {@link ModelCheck} that looks at what was measured. */
final class DataCheck {
    private static final List<String> RATE_UNITS = List.of("1/s", "s^-1", "1/us", "1/ns");

    private final ModelDocument document;
    private final UnitSystem units;
    private final Map<String, PairSystem> systems;
    private final List<Problem> problems = new ArrayList<>();

    DataCheck(ModelDocument document, UnitSystem units) {
        this.document = document;
        this.units = units;
        this.systems = ModelCheck.systemsById(document);
    }

    List<Problem> problems() {
        for (int i = 0; i < document.groups().size(); i++) {
            String at = "/groups/" + i + "/unit";
            String unit = document.groups().get(i).unit();
            try {
                UnitExpression.parse(unit);
            } catch (InvalidModelException fault) {
                problems.add(ModelCheck.under(at, fault.problem()));
            }
        }
        for (int i = 0; i < document.data().size(); i++) {
            datum("/data/" + i, document.data().get(i));
        }
        return problems;
    }

    private void datum(String at, Datum datum) {
        levels(at + "/levels", datum.levels());
        levels(at + "/denominator", datum.denominator());
        unit(at, datum);
        shape(at, datum);
        for (String group : datum.groups()) {
            group(at + "/groups", group, datum);
        }
        boolean needsSigma = document.weighting() != Weighting.MISSING && datum.limit() == Datum.Limit.NONE;
        if (datum.used() && needsSigma && datum.sigmaPlus() == null) {
            add(
                    at + "/sigma",
                    "the datum '%s' has no sigma".formatted(datum.id()),
                    "give it one, do not use it, or say that all sigmas are missing");
        }
    }

    private void levels(String at, List<Datum.Contribution> contributions) {
        for (int i = 0; i < contributions.size(); i++) {
            LevelKey key = contributions.get(i).level();
            String place = at + "/" + i;
            PairSystem system = systems.get(key.system());
            if (system == null) {
                add(
                        place,
                        "the pair system '%s' does not exist".formatted(Names.shortened(key.system())),
                        Names.remedy(key.system(), systems.keySet()));
                continue;
            }
            curve(place, key);
            ChannelKey channel = key.channel();
            boolean identical = system.exchange() == ExchangeSymmetry.IDENTICAL_BOSONS
                    || system.exchange() == ExchangeSymmetry.IDENTICAL_FERMIONS;
            if (identical
                    && !channel.coupled()
                    && channel.twiceSpin() >= 0
                    && channel.twiceSpin() % 2 == 0
                    && (channel.orbital() + channel.twiceSpin() / 2) % 2 != 0) {
                add(
                        place,
                        "identical bodies have no level with %s: l + S must be even".formatted(channel.describe()),
                        "change l or S");
            }
        }
    }

    private void curve(String at, LevelKey key) {
        List<String> names = new ArrayList<>();
        for (Model model : document.models()) {
            Curve curve = model.curve(key.curve());
            if (curve != null && model.serves(key.system())) {
                return;
            }
            model.curves().forEach(other -> names.add(other.name()));
        }
        if (!document.models().isEmpty()) {
            add(
                    at,
                    "no model has a curve '%s' for the system '%s'"
                            .formatted(Names.shortened(key.curve()), key.system()),
                    Names.remedy(key.curve(), names.stream().distinct().toList()));
        }
    }

    private void unit(String at, Datum datum) {
        if (datum.transform() == Transform.RATE) {
            if (!RATE_UNITS.contains(datum.unit())) {
                add(
                        at + "/unit",
                        "the unit '%s' is not one of a rate".formatted(Names.shortened(datum.unit())),
                        "use one of " + String.join(", ", RATE_UNITS));
            }
            return;
        }
        UnitExpression unit;
        try {
            unit = UnitExpression.parse(datum.unit());
            unit.factorTo(units, dimension(datum.transform()));
        } catch (InvalidModelException fault) {
            problems.add(ModelCheck.under(at + "/unit", fault.problem()));
            return;
        }
        if (datum.transform() == Transform.FREQUENCY && !unit.frequency()) {
            add(at + "/unit", "a frequency needs a unit like MHz, got '%s'".formatted(unit.text()), "change the unit");
        }
    }

    /** Dimension of what a transform gives. */
    static Dimension dimension(Transform transform) {
        return switch (transform) {
            case NONE, FREQUENCY, PHOTON_EMISSION, PHOTON_ABSORPTION, WIDTH, RATE -> Dimension.ENERGY;
            case ABSOLUTE_MASS -> Dimension.MASS;
            case VACUUM_WAVELENGTH, AIR_WAVELENGTH, RADIUS -> Dimension.LENGTH;
            case RATIO -> Dimension.NONE;
        };
    }

    private void shape(String at, Datum datum) {
        Transform transform = datum.transform();
        boolean wavelength = transform == Transform.VACUUM_WAVELENGTH || transform == Transform.AIR_WAVELENGTH;
        if (wavelength && datum.value().sign() <= 0) {
            add(at + "/value", "a wavelength must be positive, got " + datum.value(), "change the value");
        }
        boolean photon = transform == Transform.PHOTON_EMISSION || transform == Transform.PHOTON_ABSORPTION;
        if ((photon || transform == Transform.RATE) && !line(datum.levels())) {
            add(
                    at + "/levels",
                    "a photon belongs to one upper level with coefficient 1 and one lower with -1",
                    "change the levels or the transform");
        }
        if ((transform == Transform.RADIUS || transform == Transform.WIDTH)
                && (datum.levels().size() != 1
                        || datum.levels().get(0).coefficient().value() != 1)) {
            add(at + "/levels", "a radius or width belongs to one level with coefficient 1", "change the levels");
        }
    }

    private static boolean line(List<Datum.Contribution> levels) {
        if (levels.size() != 2) {
            return false;
        }
        double one = levels.get(0).coefficient().value();
        double other = levels.get(1).coefficient().value();
        return Math.abs(one) == 1 && one == -other;
    }

    private void group(String at, String id, Datum datum) {
        List<String> ids = document.groups().stream().map(DataGroup::id).toList();
        for (DataGroup group : document.groups()) {
            if (!group.id().equals(id)) {
                continue;
            }
            boolean shift = group.kind() == DataGroup.Kind.ADDITIVE || group.kind() == DataGroup.Kind.UNKNOWN_OFFSET;
            if (shift && !UnitExpression.parse(group.unit()).fits(units, dimension(datum.transform()))) {
                add(
                        at,
                        "the error of the group '%s' in '%s' cannot be added to the datum '%s'"
                                .formatted(id, group.unit(), datum.id()),
                        "give the group the datum's kind of unit");
            }
            return;
        }
        add(at, "the data group '%s' does not exist".formatted(Names.shortened(id)), Names.remedy(id, ids));
    }

    private void add(String at, String what, String remedy) {
        problems.add(new Problem(what, at, remedy));
    }
}
