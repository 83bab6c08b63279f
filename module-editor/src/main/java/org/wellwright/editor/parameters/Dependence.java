package org.wellwright.editor.parameters;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.wellwright.editor.edit.ParameterEdits;
import org.wellwright.project.entry.QuantityText;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.ParameterShape;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.UnitSystem;

/** What a parameter can depend on, and how its numbers carry over from one kind to the next. */
enum Dependence {
    /** One number everywhere. */
    NOTHING("nothing: one number everywhere"),
    /** One number per l. */
    ORBITAL("l: one number per orbital quantum number"),
    /** One number per l and j. */
    TOTAL("l and j"),
    /** One number per system. */
    SYSTEM("the pair system"),
    /** Proportional to a power of the reduced mass. */
    MASS("a power of the reduced mass");

    private final String title;

    Dependence(String title) {
        this.title = title;
    }

    @Override
    public String toString() {
        return title;
    }

    static Dependence of(ParameterShape shape) {
        if (shape instanceof ParameterShape.ByOrbital) {
            return ORBITAL;
        }
        if (shape instanceof ParameterShape.ByTotal) {
            return TOTAL;
        }
        if (shape instanceof ParameterShape.BySystem) {
            return SYSTEM;
        }
        return shape instanceof ParameterShape.MassScaled ? MASS : NOTHING;
    }

    /** What the list field of a shape holds: "0, 1, 2", "1 1/2, 1 3/2", or "system exponent". */
    static String places(ParameterShape shape, ModelDocument document) {
        if (shape instanceof ParameterShape.ByOrbital by) {
            return String.join(
                    ", ",
                    by.entries().stream()
                            .map(e -> Integer.toString(e.orbital()))
                            .toList());
        }
        if (shape instanceof ParameterShape.ByTotal by) {
            return String.join(
                    ", ",
                    by.entries().stream()
                            .map(e -> e.orbital() + " " + e.twiceTotal() + "/2")
                            .toList());
        }
        if (shape instanceof ParameterShape.MassScaled scaled) {
            return scaled.reference() + " " + ExactNumber.of(scaled.exponent());
        }
        return "";
    }

    /** What the list field holds when this kind is chosen anew. */
    String suggestion(ModelDocument document) {
        return switch (this) {
            case NOTHING, SYSTEM -> "";
            case ORBITAL -> "0, 1, 2";
            case TOTAL -> "0 1/2, 1 1/2, 1 3/2";
            case MASS ->
                document.systems().isEmpty() ? "" : document.systems().get(0).id() + " -1";
        };
    }

    /** What the list field means. */
    String question() {
        return switch (this) {
            case NOTHING -> "";
            case ORBITAL -> "Values of l, separated by commas";
            case TOTAL -> "Pairs of l and j, as 1 3/2, separated by commas";
            case SYSTEM -> "";
            case MASS -> "Reference system and exponent, as 'HD -1'";
        };
    }

    /**
     * The shape with numbers taken over from an old one.
     *
     * @param places the list field
     * @param others whether there is a number for every place that is not listed
     * @throws InvalidModelException if the list cannot be read
     */
    ParameterShape shape(ParameterShape old, String places, boolean others, ModelDocument document) {
        List<Setting> settings = ParameterEdits.settings(old);
        Setting first = settings.isEmpty() ? Setting.fixed(ExactNumber.ONE) : settings.get(0);
        Setting rest = others ? settings.isEmpty() ? first : settings.get(settings.size() - 1) : null;
        return switch (this) {
            case NOTHING -> new ParameterShape.Scalar(first);
            case ORBITAL -> {
                List<ParameterShape.ByOrbital.Entry> entries = new ArrayList<>();
                for (int orbital : numbers(places)) {
                    entries.add(new ParameterShape.ByOrbital.Entry(orbital, orbitalSetting(old, orbital, first)));
                }
                yield new ParameterShape.ByOrbital(entries, rest);
            }
            case TOTAL -> {
                List<ParameterShape.ByTotal.Entry> entries = new ArrayList<>();
                for (String pair : places.split(",")) {
                    String[] parts = pair.strip().split("[\\s;/]+");
                    if (!pair.strip().matches("\\d{1,3}\\s+\\d{1,3}/2")) {
                        throw new InvalidModelException(
                                "'%s' is not a pair of l and j".formatted(pair.strip()), "", "write it like 1 3/2");
                    }
                    int orbital = Integer.parseInt(parts[0]);
                    entries.add(new ParameterShape.ByTotal.Entry(
                            orbital, Integer.parseInt(parts[1]), orbitalSetting(old, orbital, first)));
                }
                yield new ParameterShape.ByTotal(entries, rest);
            }
            case SYSTEM -> {
                List<ParameterShape.BySystem.Entry> entries = new ArrayList<>();
                for (PairSystem system : document.systems()) {
                    entries.add(new ParameterShape.BySystem.Entry(system.id(), systemSetting(old, system.id(), first)));
                }
                yield new ParameterShape.BySystem(entries, entries.isEmpty() ? first : rest);
            }
            case MASS -> {
                int blank = places.strip().lastIndexOf(' ');
                String reference =
                        blank < 0 ? "" : places.strip().substring(0, blank).strip();
                if (document.systems().stream().noneMatch(system -> system.id().equals(reference))) {
                    throw new InvalidModelException(
                            "'%s' names no system and exponent".formatted(places.strip()),
                            "",
                            "write a system's id and a power, as 'HD -1'");
                }
                double exponent = QuantityText.parse(
                                places.strip().substring(blank + 1), "", UnitSystem.named(document.units()))
                        .value();
                yield new ParameterShape.MassScaled(first, reference, exponent);
            }
        };
    }

    private static Setting orbitalSetting(ParameterShape old, int orbital, Setting otherwise) {
        if (old instanceof ParameterShape.ByOrbital by) {
            for (ParameterShape.ByOrbital.Entry entry : by.entries()) {
                if (entry.orbital() == orbital) {
                    return entry.setting();
                }
            }
            return by.others() == null ? otherwise : by.others();
        }
        return otherwise;
    }

    private static Setting systemSetting(ParameterShape old, String system, Setting otherwise) {
        if (old instanceof ParameterShape.BySystem by) {
            for (ParameterShape.BySystem.Entry entry : by.entries()) {
                if (entry.system().equals(system)) {
                    return entry.setting();
                }
            }
        }
        return otherwise;
    }

    private static TreeSet<Integer> numbers(String text) {
        TreeSet<Integer> numbers = new TreeSet<>();
        for (String part : text.split("[,\\s]+")) {
            if (!part.isEmpty()) {
                if (!part.matches("\\d{1,3}")) {
                    throw new InvalidModelException(
                            "'%s' is not an l".formatted(part), "", "write whole numbers from 0, as 0, 1, 2");
                }
                numbers.add(Integer.parseInt(part));
            }
        }
        if (numbers.isEmpty()) {
            throw new InvalidModelException("no l is listed", "", "write them as 0, 1, 2");
        }
        return numbers;
    }
}
