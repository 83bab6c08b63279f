package org.wellwright.project.file;

import java.util.List;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.CurveCoupling;
import org.wellwright.solver.model.Geometry;
import org.wellwright.solver.model.LabelRule;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelError;
import org.wellwright.solver.model.OccupiedLevel;
import org.wellwright.solver.model.SpinScheme;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.Term;
import org.wellwright.solver.units.ExactNumber;

/** Models and their curves in project files. */
final class ModelFormat {
    /** The name of a curve that has none. */
    static final String CURVE = "V";

    private ModelFormat() {}

    static Model read(ObjectIn in) {
        in.knowing("name", "note", "systems", "curves", "couplings", "geometry", "error");
        String name = in.text("name");
        String note = in.text("note", "");
        List<String> systems = in.texts("systems");
        List<Curve> curves = in.items("curves", "name", position -> CURVE, ModelFormat::curve);
        List<CurveCoupling> couplings = in.items("couplings", ModelFormat::coupling);
        Geometry geometry = in.choice("geometry", Geometry.class, Geometry.SPACE);
        List<ModelError.Part> parts = in.items("error", ModelFormat::part);
        if (curves.isEmpty() && !in.list("curves").isEmpty()) {
            throw new Faults.Noted();
        }
        return in.make(() -> new Model(name, note, systems, curves, couplings, geometry, new ModelError(parts)));
    }

    private static Curve curve(ObjectIn in) {
        in.knowing("name", "terms", "energyOrigin", "innerWall", "outerWall", "spin", "labels", "occupied");
        List<Term> terms = TermFormat.readAll(in, "terms");
        if (in.list("terms").isEmpty()) {
            throw in.fault("the curve has no terms", "add \"terms\": [{\"formula\": \"-a/r\"}]");
        }
        Argument origin = Arguments.read(in, "energyOrigin", Argument.ZERO);
        Argument inner = Arguments.read(in, "innerWall", Argument.ZERO);
        Argument outer = Arguments.read(in, "outerWall", Argument.UNBOUNDED);
        SpinScheme spin = in.choice("spin", SpinScheme.class, SpinScheme.NONE);
        ObjectIn labels = in.object("labels");
        LabelRule rule = labels == null ? LabelRule.PLAIN : labels(labels);
        List<OccupiedLevel> occupied = in.items("occupied", ModelFormat::occupied);
        return in.make(() -> new Curve(in.name(), terms, origin, inner, outer, spin, rule, occupied));
    }

    private static CurveCoupling coupling(ObjectIn in) {
        in.knowing("first", "second", "terms");
        String first = in.text("first");
        String second = in.text("second");
        List<Term> terms = TermFormat.readAll(in, "terms");
        return in.make(() -> new CurveCoupling(first, second, terms));
    }

    private static LabelRule labels(ObjectIn in) {
        in.knowing("principalOffsets", "vibrationalOffset");
        List<LabelRule.PrincipalOffset> offsets = in.items("principalOffsets", item -> {
            item.knowing("l", "add");
            int orbital = item.integer("l");
            int add = item.integer("add");
            return item.make(() -> new LabelRule.PrincipalOffset(orbital, add));
        });
        int vibrational = in.integer("vibrationalOffset", 0);
        return in.make(() -> new LabelRule(offsets, vibrational));
    }

    private static OccupiedLevel occupied(ObjectIn in) {
        in.knowing(Spins.with("index"));
        ChannelKey channel = Spins.channel(in);
        int index = in.integer("index");
        return in.make(() -> new OccupiedLevel(channel, index));
    }

    private static ModelError.Part part(ObjectIn in) {
        in.knowing("group", "measure", "value", "unit", "fitted");
        ModelError.Measure measure = in.choice("measure", ModelError.Measure.class, ModelError.Measure.ABSOLUTE);
        ExactNumber value = in.number("value");
        String unit = in.text("unit", "");
        boolean fitted = in.flag("fitted", false);
        return in.make(() -> new ModelError.Part(in.text("group", ""), measure, value, unit, fitted));
    }

    static void write(ObjectOut out, Model model) {
        out.text("name", model.name())
                .text("note", model.note(), "")
                .texts("systems", model.systems())
                .items("curves", model.curves(), Curve::name, ModelFormat::curve)
                .items("couplings", model.couplings(), null, ModelFormat::coupling)
                .choice("geometry", model.geometry(), Geometry.SPACE)
                .items("error", model.error().parts(), null, ModelFormat::part);
    }

    private static void curve(ObjectOut out, Curve curve) {
        out.text("name", curve.name(), CURVE);
        TermFormat.writeAll(out, "terms", curve.terms());
        Arguments.write(out, "energyOrigin", curve.energyOrigin(), Argument.ZERO);
        Arguments.write(out, "innerWall", curve.innerWall(), Argument.ZERO);
        Arguments.write(out, "outerWall", curve.outerWall(), Argument.UNBOUNDED);
        out.choice("spin", curve.spinScheme(), SpinScheme.NONE)
                .object("labels", curve.labels(), ModelFormat::labels)
                .items("occupied", curve.occupied(), null, ModelFormat::occupied);
    }

    private static void coupling(ObjectOut out, CurveCoupling coupling) {
        out.text("first", coupling.first()).text("second", coupling.second());
        TermFormat.writeAll(out, "terms", coupling.terms());
    }

    private static void labels(ObjectOut out, LabelRule rule) {
        out.items(
                        "principalOffsets",
                        rule.principalOffsets(),
                        null,
                        (item, offset) -> item.integer("l", offset.orbital(), -1)
                                .put("add", JsonValue.JsonNumber.of(offset.offset())))
                .integer("vibrationalOffset", rule.vibrationalOffset(), 0);
    }

    private static void occupied(ObjectOut out, OccupiedLevel level) {
        Spins.channel(out, level.channel());
        out.integer("index", level.index(), -1);
    }

    private static void part(ObjectOut out, ModelError.Part part) {
        out.text("group", part.group(), "")
                .choice("measure", part.measure(), ModelError.Measure.ABSOLUTE)
                .number("value", part.value())
                .text("unit", part.unit(), "")
                .flag("fitted", part.fitted(), false);
    }
}
