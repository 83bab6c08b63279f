package org.wellwright.project.entry;

import java.util.List;
import java.util.Locale;

/** What a column of a table of measured data may hold. */
public enum DatumColumn {
    /** Nothing that is used. */
    NONE("", List.of()),
    /** The combination of levels: "3p - 3s". */
    LEVELS("levels", List.of("level", "transition", "line", "state", "assignment")),
    /** The upper level of a line. */
    UPPER("upper", List.of("upper level", "upper state")),
    /** The lower level of a line. */
    LOWER("lower", List.of("lower level", "lower state")),
    /** v of the upper level. */
    UPPER_V("v'", List.of("v_upper", "vu", "v1")),
    /** J of the upper level. */
    UPPER_J("J'", List.of("j_upper", "ju", "j1")),
    /** v of the lower level; of the only one where the upper is not given. */
    LOWER_V("v\"", List.of("v''", "v_lower", "vl", "v", "v0")),
    /** J of the lower level; of the only one where the upper is not given. */
    LOWER_J("J\"", List.of("j''", "j_lower", "jl", "j", "j0")),
    /** The system, where the project has several. */
    SYSTEM("system", List.of("isotopologue", "isotope", "pair")),
    /** The levels under the fraction bar of a ratio. */
    DENOMINATOR("denominator", List.of()),
    /** The value, with or without its uncertainty and unit: "1.23456(12) eV". */
    VALUE(
            "value",
            List.of(
                    "energy",
                    "measured",
                    "observed",
                    "obs",
                    "position",
                    "wavenumber",
                    "wavelength",
                    "frequency",
                    "mass")),
    /** The standard uncertainty. */
    SIGMA("sigma", List.of("uncertainty", "unc", "error", "err", "u", "±", "σ", "standard uncertainty")),
    /** The standard uncertainty downward. */
    SIGMA_MINUS("sigma-", List.of("σ-", "σ−", "minus")),
    /** The standard uncertainty upward. */
    SIGMA_PLUS("sigma+", List.of("σ+", "plus")),
    /** The unit. */
    UNIT("unit", List.of("units")),
    /** What was measured: "vacuum wavelength", "frequency", ... */
    TRANSFORM("quantity", List.of("transform", "kind", "type")),
    /** The data groups, separated by commas or semicolons. */
    GROUPS("groups", List.of("group", "series")),
    /** Where the value comes from. */
    SOURCE("source", List.of("reference", "ref")),
    /** Whether it counts: yes or no, 1 or 0. */
    USED("used", List.of("use", "include")),
    /** Why it does not count, or a remark. */
    REASON("remark", List.of("reason", "note", "comment", "remarks")),
    /** Its identifier. */
    ID("id", List.of("name", "label", "no", "nr"));

    private final String title;
    private final List<String> aliases;

    DatumColumn(String title, List<String> aliases) {
        this.title = title;
        this.aliases = aliases;
    }

    /** The usual heading; empty for {@link #NONE}. */
    public String title() {
        return title;
    }

    /** The column that a heading names; a unit in brackets after it is left out. {@link #NONE} if it names none. */
    public static DatumColumn ofHeading(String heading) {
        String name = withoutUnit(heading).toLowerCase(Locale.ROOT);
        if (name.isEmpty()) {
            return NONE;
        }
        for (DatumColumn column : values()) {
            if (column != NONE
                    && (name.equals(column.title.toLowerCase(Locale.ROOT))
                            || column.aliases.contains(name)
                            || name.equals(column.name().toLowerCase(Locale.ROOT)))) {
                return column;
            }
        }
        return NONE;
    }

    /**
     * The unit in brackets at the end of a heading: "value (cm^-1)", "value / cm^-1", "value [eV]"; empty if there is
     * none.
     */
    public static String unitOfHeading(String heading) {
        String text = heading.strip();
        String name = withoutUnit(text);
        String rest = text.substring(name.length()).strip();
        if (rest.length() > 1 && (rest.startsWith("(") || rest.startsWith("["))) {
            return rest.substring(1, rest.length() - 1).strip();
        }
        return rest.startsWith("/") ? rest.substring(1).strip() : "";
    }

    private static String withoutUnit(String heading) {
        String text = heading.strip();
        if (text.endsWith(")") && text.indexOf('(') > 0) {
            return text.substring(0, text.indexOf('(')).strip();
        }
        if (text.endsWith("]") && text.indexOf('[') > 0) {
            return text.substring(0, text.indexOf('[')).strip();
        }
        int slash = text.indexOf(" /");
        return slash > 0 ? text.substring(0, slash).strip() : text;
    }
}
