package org.wellwright.project.file;

import java.util.List;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.units.ExactNumber;

/** Measured data and their groups in project files. */
final class DatumFormat {
    private DatumFormat() {}

    /** The id of a datum that has none, by its position from 0. */
    static String unnamed(int position) {
        return "d" + (position + 1);
    }

    /**
     * Reads a datum.
     *
     * @param onlySystem the system of a level that names none; empty if the project has several
     */
    static Datum read(ObjectIn in, String onlySystem) {
        in.knowing(
                "id",
                "levels",
                "denominator",
                "transform",
                "radiusPower",
                "multipole",
                "value",
                "unit",
                "sigma",
                "sigmaMinus",
                "sigmaPlus",
                "limit",
                "groups",
                "source",
                "used",
                "reason");
        Transform transform = in.choice("transform", Transform.class, Transform.NONE);
        List<Datum.Contribution> levels = in.items("levels", item -> contribution(item, onlySystem));
        List<Datum.Contribution> denominator = in.items("denominator", item -> contribution(item, onlySystem));
        if (levels.size() < in.list("levels").size()
                || denominator.size() < in.list("denominator").size()) {
            throw new Faults.Noted();
        }
        Datum.Detail usual = Datum.Detail.STANDARD;
        int power = in.integer("radiusPower", usual.radiusPower());
        int multipole = in.integer("multipole", usual.multipole());
        ExactNumber value = in.number("value");
        String unit = in.text("unit", transform == Transform.RATIO ? "" : null);
        if (unit == null) {
            throw in.fault("'unit' is missing", "add the unit of the value");
        }
        if (in.has("sigma") && (in.has("sigmaMinus") || in.has("sigmaPlus"))) {
            throw in.fault(
                    "sigma", "'sigma' stands beside 'sigmaMinus' or 'sigmaPlus'", "keep 'sigma', or both others");
        }
        ExactNumber both = in.number("sigma", null);
        ExactNumber minus = in.number("sigmaMinus", both);
        ExactNumber plus = in.number("sigmaPlus", both);
        Datum.Limit limit = in.choice("limit", Datum.Limit.class, Datum.Limit.NONE);
        List<String> groups = in.texts("groups");
        String source = in.text("source", "");
        boolean used = in.flag("used", true);
        String reason = in.text("reason", "");
        return in.make(() -> new Datum(
                in.name(),
                levels,
                denominator,
                transform,
                new Datum.Detail(power, multipole),
                value,
                unit,
                minus,
                plus,
                limit,
                groups,
                source,
                used,
                reason));
    }

    private static Datum.Contribution contribution(ObjectIn in, String onlySystem) {
        in.knowing(Spins.with("coefficient", "system", "curve", "index"));
        ExactNumber coefficient = in.number("coefficient", ExactNumber.ONE);
        String system = in.text("system", onlySystem);
        if (system.isEmpty()) {
            throw in.fault(
                    "'system' is missing", "the project has several systems: name the one this level belongs to");
        }
        String curve = in.text("curve", ModelFormat.CURVE);
        ChannelKey channel = Spins.channel(in);
        int index = in.integer("index");
        return in.make(() -> new Datum.Contribution(coefficient, new LevelKey(system, curve, channel, index)));
    }

    static void write(ObjectOut out, Datum datum, String unnamed, String onlySystem) {
        boolean symmetric = datum.sigmaMinus() != null && datum.sigmaMinus().equals(datum.sigmaPlus());
        out.text("id", datum.id(), unnamed)
                .items("levels", datum.levels(), null, (item, c) -> contribution(item, c, onlySystem))
                .items("denominator", datum.denominator(), null, (item, c) -> contribution(item, c, onlySystem))
                .choice("transform", datum.transform(), Transform.NONE)
                .integer("radiusPower", datum.detail().radiusPower(), Datum.Detail.STANDARD.radiusPower())
                .integer("multipole", datum.detail().multipole(), Datum.Detail.STANDARD.multipole())
                .number("value", datum.value())
                .put(
                        "unit",
                        datum.transform() == Transform.RATIO && datum.unit().isEmpty()
                                ? null
                                : new JsonValue.JsonText(datum.unit()))
                .number("sigma", symmetric ? datum.sigmaPlus() : null)
                .number("sigmaMinus", symmetric ? null : datum.sigmaMinus())
                .number("sigmaPlus", symmetric ? null : datum.sigmaPlus())
                .choice("limit", datum.limit(), Datum.Limit.NONE)
                .texts("groups", datum.groups())
                .text("source", datum.source(), "")
                .flag("used", datum.used(), true)
                .text("reason", datum.reason(), "");
    }

    private static void contribution(ObjectOut out, Datum.Contribution contribution, String onlySystem) {
        LevelKey level = contribution.level();
        out.number("coefficient", contribution.coefficient(), ExactNumber.ONE)
                .text("system", level.system(), onlySystem)
                .text("curve", level.curve(), ModelFormat.CURVE);
        Spins.channel(out, level.channel());
        out.integer("index", level.index(), -1);
    }

    static DataGroup readGroup(ObjectIn in) {
        in.knowing("id", "title", "kind", "sigma", "unit");
        String id = in.text("id");
        in.text("kind");
        DataGroup.Kind kind = in.choice("kind", DataGroup.Kind.class, null);
        ExactNumber sigma = in.number("sigma", null);
        return in.make(() -> new DataGroup(id, in.text("title", ""), kind, sigma, in.text("unit", "")));
    }

    static void writeGroup(ObjectOut out, DataGroup group) {
        out.text("id", group.id())
                .text("title", group.title(), "")
                .choice("kind", group.kind(), null)
                .number("sigma", group.sigma())
                .text("unit", group.unit(), "");
    }
}
