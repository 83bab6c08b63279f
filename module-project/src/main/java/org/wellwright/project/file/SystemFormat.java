package org.wellwright.project.file;

import org.wellwright.project.file.JsonValue.JsonText;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.ExchangeSymmetry;
import org.wellwright.solver.pair.MassConvention;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.units.ExactNumber;

/** Pair systems in project files. */
final class SystemFormat {
    private SystemFormat() {}

    static PairSystem read(ObjectIn in) {
        in.knowing("id", "title", "first", "second", "massConvention", "exchange", "permittivity", "abundance");
        String id = in.text("id");
        Body first = body(in.required("first"));
        Body second = body(in.required("second"));
        boolean parameter =
                first.mass() instanceof BodyMass.FromParameter || second.mass() instanceof BodyMass.FromParameter;
        MassConvention usual = parameter ? MassConvention.MODEL_PARAMETER : MassConvention.ATOMIC;
        MassConvention convention = in.choice("massConvention", MassConvention.class, usual);
        ExchangeSymmetry exchange = in.choice("exchange", ExchangeSymmetry.class, ExchangeSymmetry.DISTINGUISHABLE);
        ExactNumber permittivity = in.number("permittivity", ExactNumber.ONE);
        ExactNumber abundance = in.number("abundance", null);
        return in.make(() ->
                new PairSystem(id, in.text("title", ""), first, second, convention, exchange, permittivity, abundance));
    }

    private static Body body(ObjectIn in) {
        in.knowing("label", "particle", "mass", "charge", "spin");
        if (in.has("particle") == in.has("mass")) {
            throw in.fault(
                    "a body needs a particle of the catalogue or a mass, and only one of them",
                    "see 'wellwright-batch particles'");
        }
        BodyMass mass = in.has("particle") ? in.make(() -> new BodyMass.Catalogued(in.text("particle"))) : mass(in);
        Body usual = usual(mass);
        String label = in.text("label", usual.label());
        ExactNumber charge = in.number("charge", usual.charge());
        int spin = in.has("spin") ? Spins.twice(in, "spin") : usual.twiceSpin();
        return in.make(() -> new Body(label, mass, charge, spin));
    }

    private static BodyMass mass(ObjectIn in) {
        if (in.value("mass") instanceof JsonText name) {
            return in.make(() -> new BodyMass.FromParameter(name.value()));
        }
        ObjectIn typed = in.required("mass").knowing("value", "sigma", "unit");
        ExactNumber value = typed.number("value");
        ExactNumber sigma = typed.number("sigma", null);
        String unit = typed.text("unit");
        return typed.make(() -> new BodyMass.Typed(value, sigma, unit));
    }

    /** What a body is where the file says no more than its mass. */
    private static Body usual(BodyMass mass) {
        if (mass instanceof BodyMass.Catalogued catalogued) {
            String particle = catalogued.particle();
            return ParticleCatalogue.STANDARD.contains(particle)
                    ? ParticleCatalogue.STANDARD.body(particle)
                    : new Body(particle, mass, ExactNumber.ZERO, -1);
        }
        String label = mass instanceof BodyMass.FromParameter parameter ? parameter.parameter() : "";
        return new Body(label, mass, ExactNumber.ZERO, -1);
    }

    static void write(ObjectOut out, PairSystem system) {
        boolean parameter = system.first().mass() instanceof BodyMass.FromParameter
                || system.second().mass() instanceof BodyMass.FromParameter;
        out.text("id", system.id())
                .text("title", system.title(), "")
                .object("first", system.first(), SystemFormat::body)
                .object("second", system.second(), SystemFormat::body)
                .choice(
                        "massConvention",
                        system.massConvention(),
                        parameter ? MassConvention.MODEL_PARAMETER : MassConvention.ATOMIC)
                .choice("exchange", system.exchange(), ExchangeSymmetry.DISTINGUISHABLE)
                .number("permittivity", system.permittivity(), ExactNumber.ONE)
                .number("abundance", system.abundance());
    }

    private static void body(ObjectOut out, Body body) {
        Body usual = usual(body.mass());
        out.text("label", body.label(), usual.label());
        if (body.mass() instanceof BodyMass.Catalogued catalogued) {
            out.text("particle", catalogued.particle());
        } else if (body.mass() instanceof BodyMass.FromParameter parameter) {
            out.text("mass", parameter.parameter());
        } else {
            out.object(
                    "mass",
                    (BodyMass.Typed) body.mass(),
                    (typed, mass) -> typed.number("value", mass.value())
                            .number("sigma", mass.sigma())
                            .text("unit", mass.unit()));
        }
        JsonValue spin = body.twiceSpin() < 0 ? new JsonText("none") : Spins.json(body.twiceSpin());
        out.number("charge", body.charge(), usual.charge())
                .put("spin", body.twiceSpin() == usual.twiceSpin() ? null : spin);
    }
}
