package org.wellwright.project.file;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.model.Prior;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.units.ExactNumber;

/**
 * Parameters of the pool in project files: one number ("value"), or "byL", "byLJ", "bySystem" with "others", or
 * "massScaled" with "value", or "tied".
 */
final class ParameterFormat {
    private static final String[] SETTING = {"value", "free", "min", "max", "prior"};
    private static final List<String> SHAPES = List.of("byL", "byLJ", "bySystem", "tied");

    private ParameterFormat() {}

    static Parameter read(ObjectIn in) {
        in.knowing(with("name", "unit", "convention", "byL", "byLJ", "bySystem", "others", "massScaled", "tied"));
        String name = in.text("name");
        String unit = in.text("unit", "");
        String convention = in.text("convention", "");
        ParameterShape shape = shape(in);
        return in.make(() -> new Parameter(name, unit, convention, shape));
    }

    private static ParameterShape shape(ObjectIn in) {
        List<String> given = new ArrayList<>();
        for (String key : SHAPES) {
            if (in.has(key)) {
                given.add(key);
            }
        }
        if (given.size() > 1 || given.size() == 1 && (in.has("value") || in.has("massScaled"))) {
            throw in.fault(
                    "the parameter is given in two ways",
                    "keep one of 'value', 'byL', 'byLJ', 'bySystem', 'massScaled' with 'value', 'tied'");
        }
        String shape = given.isEmpty() ? "" : given.get(0);
        return switch (shape) {
            case "byL" -> {
                List<ParameterShape.ByOrbital.Entry> entries = in.items("byL", ParameterFormat::orbital);
                Setting others = others(in);
                yield in.make(() -> new ParameterShape.ByOrbital(entries, others));
            }
            case "byLJ" -> {
                List<ParameterShape.ByTotal.Entry> entries = in.items("byLJ", ParameterFormat::total);
                Setting others = others(in);
                yield in.make(() -> new ParameterShape.ByTotal(entries, others));
            }
            case "bySystem" -> {
                List<ParameterShape.BySystem.Entry> entries = in.items("bySystem", ParameterFormat::system);
                Setting others = others(in);
                yield in.make(() -> new ParameterShape.BySystem(entries, others));
            }
            case "tied" -> new ParameterShape.Tied(in.text("tied"));
            default -> single(in);
        };
    }

    private static ParameterShape single(ObjectIn in) {
        if (!in.has("value")) {
            throw in.fault("the parameter has no value", "add \"value\": number");
        }
        Setting setting = setting(in);
        ObjectIn scaled = in.object("massScaled");
        if (scaled == null) {
            return new ParameterShape.Scalar(setting);
        }
        scaled.knowing("reference", "exponent");
        String reference = scaled.text("reference");
        double exponent = scaled.real("exponent", -1);
        return scaled.make(() -> new ParameterShape.MassScaled(setting, reference, exponent));
    }

    private static ParameterShape.ByOrbital.Entry orbital(ObjectIn in) {
        in.knowing(with("l"));
        Setting setting = setting(in);
        int orbital = in.integer("l");
        return in.make(() -> new ParameterShape.ByOrbital.Entry(orbital, setting));
    }

    private static ParameterShape.ByTotal.Entry total(ObjectIn in) {
        in.knowing(with("l", "j"));
        Setting setting = setting(in);
        int orbital = in.integer("l");
        int total = Spins.twice(in, "j");
        return in.make(() -> new ParameterShape.ByTotal.Entry(orbital, total, setting));
    }

    private static ParameterShape.BySystem.Entry system(ObjectIn in) {
        in.knowing(with("system"));
        Setting setting = setting(in);
        String system = in.text("system");
        return in.make(() -> new ParameterShape.BySystem.Entry(system, setting));
    }

    private static Setting others(ObjectIn in) {
        ObjectIn others = in.object("others");
        return others == null ? null : setting(others.knowing(SETTING));
    }

    private static Setting setting(ObjectIn in) {
        ExactNumber value = in.number("value");
        boolean free = in.flag("free", false);
        ExactNumber lower = in.number("min", null);
        ExactNumber upper = in.number("max", null);
        ObjectIn known = in.object("prior");
        Prior prior = known == null ? null : prior(known.knowing("value", "sigma"));
        return in.make(() -> new Setting(value, free, lower, upper, prior));
    }

    private static Prior prior(ObjectIn in) {
        ExactNumber value = in.number("value");
        ExactNumber sigma = in.number("sigma");
        return in.make(() -> new Prior(value, sigma));
    }

    private static String[] with(String... others) {
        List<String> keys = new ArrayList<>(List.of(SETTING));
        keys.addAll(List.of(others));
        return keys.toArray(new String[0]);
    }

    static void write(ObjectOut out, Parameter parameter) {
        out.text("name", parameter.name())
                .text("unit", parameter.unit(), "")
                .text("convention", parameter.convention(), "");
        ParameterShape shape = parameter.shape();
        if (shape instanceof ParameterShape.Scalar scalar) {
            setting(out, scalar.setting());
        } else if (shape instanceof ParameterShape.ByOrbital by) {
            out.items(
                    "byL",
                    by.entries(),
                    null,
                    (item, entry) -> setting(item.integer("l", entry.orbital(), -1), entry.setting()));
            others(out, by.others());
        } else if (shape instanceof ParameterShape.ByTotal by) {
            out.items(
                    "byLJ",
                    by.entries(),
                    null,
                    (item, entry) -> setting(
                            item.integer("l", entry.orbital(), -1).put("j", Spins.json(entry.twiceTotal())),
                            entry.setting()));
            others(out, by.others());
        } else if (shape instanceof ParameterShape.BySystem by) {
            out.items(
                    "bySystem",
                    by.entries(),
                    null,
                    (item, entry) -> setting(item.text("system", entry.system()), entry.setting()));
            others(out, by.others());
        } else if (shape instanceof ParameterShape.MassScaled scaled) {
            setting(out, scaled.setting());
            out.object(
                    "massScaled",
                    scaled,
                    (item, s) -> item.text("reference", s.reference())
                            .put("exponent", item.real("/exponent", s.exponent())));
        } else if (shape instanceof ParameterShape.Tied tied) {
            out.text("tied", tied.formula());
        }
    }

    private static void others(ObjectOut out, Setting others) {
        if (others != null) {
            out.object("others", others, ParameterFormat::setting);
        }
    }

    private static void setting(ObjectOut out, Setting setting) {
        out.number("value", setting.value())
                .flag("free", setting.free(), false)
                .number("min", setting.lower())
                .number("max", setting.upper());
        if (setting.prior() != null) {
            out.object(
                    "prior",
                    setting.prior(),
                    (item, prior) -> item.number("value", prior.value()).number("sigma", prior.sigma()));
        }
    }
}
