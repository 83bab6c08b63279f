package org.wellwright.editor.edit;

import java.util.List;
import java.util.function.UnaryOperator;
import org.wellwright.project.entry.MeasuredText;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.Names;
import org.wellwright.solver.units.UnitExpression;

/** Edits of pair systems. */
public final class SystemEdits {
    private SystemEdits() {}

    /** A new system of an electron and a proton, last. */
    public static ModelDocument add(ModelDocument document) {
        int number = document.systems().size() + 1;
        String id = Lists.free("system" + number, "-", ids(document));
        ParticleCatalogue table = ParticleCatalogue.STANDARD;
        return document.withSystems(
                Lists.added(document.systems(), PairSystem.of(id, table.body("e-"), table.body("p"))));
    }

    /** A copy behind the original, under an id of its own. */
    public static ModelDocument duplicate(ModelDocument document, int index) {
        PairSystem system = document.systems().get(index);
        String id = Lists.free(system.id() + "-2", "-", ids(document));
        return document.withSystems(Lists.inserted(document.systems(), index + 1, system.withId(id)));
    }

    /**
     * Without a system.
     *
     * @throws InvalidModelException if data or parameters refer to it
     */
    public static ModelDocument remove(ModelDocument document, int index) {
        String id = document.systems().get(index).id();
        long data = document.data().stream()
                .filter(datum ->
                        datum.levels().stream().anyMatch(c -> c.level().system().equals(id))
                                || datum.denominator().stream()
                                        .anyMatch(c -> c.level().system().equals(id)))
                .count();
        if (data > 0) {
            throw new InvalidModelException(
                    "%d measured %s to '%s'".formatted(data, data == 1 ? "value belongs" : "values belong", id),
                    "",
                    "remove the data first");
        }
        for (Parameter parameter : document.parameters()) {
            boolean used = parameter.shape() instanceof ParameterShape.BySystem by
                            && by.entries().stream()
                                    .anyMatch(entry -> entry.system().equals(id))
                    || parameter.shape() instanceof ParameterShape.MassScaled scaled
                            && scaled.reference().equals(id);
            if (used) {
                throw new InvalidModelException(
                        "the parameter '%s' has a number for '%s'".formatted(parameter.name(), id),
                        "",
                        "change what the parameter depends on first");
            }
        }
        return document.withSystems(Lists.without(document.systems(), index))
                .withModels(document.models().stream()
                        .map(model -> model.withSystems(model.systems().stream()
                                .filter(s -> !s.equals(id))
                                .toList()))
                        .toList());
    }

    /**
     * Another id, everywhere.
     *
     * @throws InvalidModelException if it is blank or taken
     */
    public static ModelDocument rename(ModelDocument document, int index, String id) {
        String wanted = id.strip();
        String old = document.systems().get(index).id();
        if (wanted.equals(old)) {
            return document;
        }
        if (wanted.isEmpty() || wanted.contains(":") || wanted.contains("/")) {
            throw new InvalidModelException(
                    "an id needs letters or digits, and neither ':' nor '/'", "", "choose another one");
        }
        if (ids(document).contains(wanted)) {
            throw new InvalidModelException(
                    "there is a system '%s' already".formatted(wanted), "", "choose another id");
        }
        return References.renameSystem(document, old, wanted);
    }

    /** With one system changed. */
    public static ModelDocument with(ModelDocument document, int index, UnaryOperator<PairSystem> change) {
        return document.withSystems(Lists.with(document.systems(), index, change));
    }

    /** A mass as text: a particle of the table, a number with its unit, or the name of a parameter. */
    public static String massText(BodyMass mass) {
        if (mass instanceof BodyMass.Catalogued listed) {
            return listed.particle();
        }
        if (mass instanceof BodyMass.Typed typed) {
            boolean exact = typed.sigma() == null || typed.sigma().sign() == 0;
            String number = exact
                    ? typed.value().text()
                    : MeasuredText.format(typed.value(), typed.sigma(), typed.sigma(), Datum.Limit.NONE);
            return number + " " + typed.unit();
        }
        return ((BodyMass.FromParameter) mass).parameter();
    }

    /**
     * Reads a mass.
     *
     * @throws InvalidModelException if it is none of the three
     */
    public static BodyMass mass(String text, ModelDocument document) {
        String plain = text.strip();
        if (ParticleCatalogue.STANDARD.contains(plain)) {
            return new BodyMass.Catalogued(
                    ParticleCatalogue.STANDARD.find(plain).id());
        }
        if (plain.matches("[-+.\\d].*")) {
            MeasuredText typed = MeasuredText.parse(plain);
            if (typed.unit().isEmpty()) {
                throw new InvalidModelException(
                        "the mass has no unit", "", "write it like '22.98977 u' or '511 keV/c^2'");
            }
            UnitExpression unit = UnitExpression.parse(typed.unit());
            if (!unit.fits(Units.of(document), Dimension.MASS)) {
                throw new InvalidModelException(
                        "'%s' is not a unit of mass".formatted(unit.text()), "", "use one like u, m_e or MeV/c^2");
            }
            return new BodyMass.Typed(typed.value(), typed.sigmaPlus(), unit.text());
        }
        List<String> parameters =
                document.parameters().stream().map(Parameter::name).toList();
        if (parameters.contains(plain)) {
            return new BodyMass.FromParameter(plain);
        }
        List<String> particles = ParticleCatalogue.STANDARD.particles().stream()
                .map(particle -> particle.id())
                .toList();
        throw new InvalidModelException(
                "'%s' is neither a particle of the table, nor a mass, nor a parameter"
                        .formatted(Names.shortened(plain)),
                "",
                Names.remedy(plain, particles));
    }

    private static List<String> ids(ModelDocument document) {
        return document.systems().stream().map(PairSystem::id).toList();
    }
}
