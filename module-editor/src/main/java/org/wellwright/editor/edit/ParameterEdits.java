package org.wellwright.editor.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import org.wellwright.project.entry.QuantityText;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.model.Prior;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.UnitExpression;
import org.wellwright.solver.units.UnitSystem;

/**
 * Edits of the pool of parameters. A number of the pool is addressed by the index of its parameter and its own index
 * there; the number for all other places comes last.
 */
public final class ParameterEdits {
    private ParameterEdits() {}

    /** A new parameter before an index. */
    public static ModelDocument add(ModelDocument document, int index) {
        int number = 1;
        while (names(document).contains("p" + number)) {
            number++;
        }
        Parameter parameter = Parameter.scalar("p" + number, "", Setting.free(ExactNumber.ONE));
        return document.withParameters(Lists.inserted(document.parameters(), index, parameter));
    }

    /** A copy under another name behind the original. */
    public static ModelDocument duplicate(ModelDocument document, int index) {
        Parameter parameter = document.parameters().get(index);
        Parameter copy = parameter.withName(Lists.free(parameter.name() + "_2", "_", names(document)));
        return document.withParameters(Lists.inserted(document.parameters(), index + 1, copy));
    }

    /**
     * Without a parameter.
     *
     * @throws InvalidModelException if it is used; says where
     */
    public static ModelDocument remove(ModelDocument document, int index) {
        String name = document.parameters().get(index).name();
        List<String> users = References.usersOf(document, name);
        if (!users.isEmpty()) {
            String all =
                    String.join("; ", users.subList(0, Math.min(3, users.size()))) + (users.size() > 3 ? "; …" : "");
            throw new InvalidModelException("'%s' is used by %s".formatted(name, all), "", "take it out there first");
        }
        return document.withParameters(Lists.without(document.parameters(), index));
    }

    /** One parameter moved to another index. */
    public static ModelDocument move(ModelDocument document, int from, int to) {
        return document.withParameters(Lists.moved(document.parameters(), from, to));
    }

    /**
     * Another name, everywhere.
     *
     * @throws InvalidModelException if it is no name, or taken
     */
    public static ModelDocument rename(ModelDocument document, int index, String name) {
        String wanted = name.strip();
        String old = document.parameters().get(index).name();
        if (wanted.equals(old)) {
            return document;
        }
        if (names(document).contains(wanted)) {
            throw new InvalidModelException(
                    "there is a parameter '%s' already".formatted(wanted), "", "choose another name");
        }
        if (wanted.equals("r") || wanted.equals("l") || wanted.equals("pi")) {
            throw new InvalidModelException(
                    "'%s' has a meaning of its own in formulas".formatted(wanted), "", "choose another name");
        }
        if (!wanted.matches("\\p{L}[\\p{L}\\p{N}_]*")) {
            throw new InvalidModelException(
                    "'%s' is not a name".formatted(wanted), "", "use a letter, then letters, digits and underscores");
        }
        return References.renameParameter(document, old, wanted);
    }

    /**
     * Another unit. Numbers are converted where the old and the new unit go together, and kept as they are where they
     * do not.
     *
     * @throws InvalidModelException if the unit cannot be read
     */
    public static ModelDocument withUnit(ModelDocument document, int index, String unit) {
        String wanted = UnitExpression.parse(unit).text();
        Parameter parameter = document.parameters().get(index);
        double factor = conversion(parameter.unit(), wanted, UnitSystem.named(document.units()));
        Parameter next = parameter.withUnit(wanted);
        if (factor != 1) {
            next = next.withShape(mapped(next.shape(), setting -> scaled(setting, factor)));
        }
        Parameter changed = next;
        return document.withParameters(Lists.with(document.parameters(), index, old -> changed));
    }

    /** One of the numbers, or null where the parameter is tied. */
    public static Setting setting(Parameter parameter, int entry) {
        List<Setting> settings = settings(parameter.shape());
        return entry < settings.size() ? settings.get(entry) : null;
    }

    /** With one number changed; a tied parameter stays as it is. */
    public static ModelDocument withSetting(
            ModelDocument document, int index, int entry, UnaryOperator<Setting> change) {
        int[] at = {0};
        return withShape(
                document,
                index,
                mapped(
                        document.parameters().get(index).shape(),
                        setting -> at[0]++ == entry ? change.apply(setting) : setting));
    }

    /** With other numbers. */
    public static ModelDocument withShape(ModelDocument document, int index, ParameterShape shape) {
        return document.withParameters(
                Lists.with(document.parameters(), index, parameter -> parameter.withShape(shape)));
    }

    /** With another convention. */
    public static ModelDocument withConvention(ModelDocument document, int index, String convention) {
        return document.withParameters(
                Lists.with(document.parameters(), index, parameter -> parameter.withConvention(convention.strip())));
    }

    /** The numbers of a shape in order. */
    public static List<Setting> settings(ParameterShape shape) {
        List<Setting> settings = new ArrayList<>();
        mapped(shape, setting -> {
            settings.add(setting);
            return setting;
        });
        return settings;
    }

    /** A shape with each of its numbers changed, in order. */
    static ParameterShape mapped(ParameterShape shape, UnaryOperator<Setting> change) {
        if (shape instanceof ParameterShape.Scalar scalar) {
            return new ParameterShape.Scalar(change.apply(scalar.setting()));
        }
        if (shape instanceof ParameterShape.MassScaled scaled) {
            return new ParameterShape.MassScaled(change.apply(scaled.setting()), scaled.reference(), scaled.exponent());
        }
        if (shape instanceof ParameterShape.ByOrbital by) {
            List<ParameterShape.ByOrbital.Entry> entries = by.entries().stream()
                    .map(e -> new ParameterShape.ByOrbital.Entry(e.orbital(), change.apply(e.setting())))
                    .toList();
            return new ParameterShape.ByOrbital(entries, others(by.others(), change));
        }
        if (shape instanceof ParameterShape.ByTotal by) {
            List<ParameterShape.ByTotal.Entry> entries = by.entries().stream()
                    .map(e -> new ParameterShape.ByTotal.Entry(e.orbital(), e.twiceTotal(), change.apply(e.setting())))
                    .toList();
            return new ParameterShape.ByTotal(entries, others(by.others(), change));
        }
        if (shape instanceof ParameterShape.BySystem by) {
            List<ParameterShape.BySystem.Entry> entries = by.entries().stream()
                    .map(e -> new ParameterShape.BySystem.Entry(e.system(), change.apply(e.setting())))
                    .toList();
            return new ParameterShape.BySystem(entries, others(by.others(), change));
        }
        return shape;
    }

    private static Setting others(Setting setting, UnaryOperator<Setting> change) {
        return setting == null ? null : change.apply(setting);
    }

    private static double conversion(String from, String to, UnitSystem system) {
        try {
            return QuantityText.factor(from, to, system);
        } catch (InvalidModelException e) {
            return 1;
        }
    }

    private static Setting scaled(Setting setting, double factor) {
        Prior prior = setting.prior() == null
                ? null
                : new Prior(
                        scaled(setting.prior().value(), factor),
                        scaled(setting.prior().sigma(), factor));
        return new Setting(
                scaled(setting.value(), factor),
                setting.free(),
                scaled(setting.lower(), factor),
                scaled(setting.upper(), factor),
                prior);
    }

    private static ExactNumber scaled(ExactNumber number, double factor) {
        return number == null ? null : QuantityText.times(number, factor);
    }

    private static List<String> names(ModelDocument document) {
        return document.parameters().stream().map(Parameter::name).toList();
    }
}
