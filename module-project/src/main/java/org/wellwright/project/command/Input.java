package org.wellwright.project.command;

import java.util.List;
import java.util.Map;
import org.wellwright.solver.units.Names;

/**
 * The arguments of one call.
 *
 * @param command the subcommand
 * @param options values by option name; an option without a value has an empty list
 * @param positionals the other arguments
 */
record Input(String command, Map<String, List<String>> options, List<String> positionals) {
    /** How a result is printed. */
    enum Format {
        TABLE,
        CSV,
        JSON
    }

    Input {
        options = Map.copyOf(options);
        positionals = List.copyOf(positionals);
    }

    boolean has(String option) {
        return options.containsKey(option);
    }

    /** All values of a repeated option. */
    List<String> values(String option) {
        return options.getOrDefault(option, List.of());
    }

    /** The value of an option, or null; given twice it is a fault. */
    String value(String option) {
        List<String> values = values(option);
        if (values.size() > 1) {
            throw new UsageException("--" + option + " is given " + values.size() + " times", "give it once");
        }
        return values.isEmpty() ? null : values.get(0);
    }

    /** The value of an option that must be there. */
    String required(String option, String label) {
        String value = value(option);
        if (value == null) {
            throw new UsageException(command + " needs --" + option, "add --" + option + " " + label);
        }
        return value;
    }

    /** A finite number, or what to take without. */
    double number(String option, double otherwise) {
        String value = value(option);
        return value == null ? otherwise : number("--" + option, value);
    }

    /** A finite number; the place is named in the fault. */
    static double number(String place, String text) {
        double number;
        try {
            number = Double.parseDouble(text.strip());
            // Java alone takes 1d, 1f and 0x1p0 for numbers.
            if (text.indexOf('x') >= 0
                    || text.strip().endsWith("d")
                    || text.strip().endsWith("f")) {
                throw new NumberFormatException(text);
            }
        } catch (NumberFormatException e) {
            throw new UsageException(
                    place + " is '" + Names.shortened(text) + "', not a number", "write a number such as 0.5 or -1e-3");
        }
        if (!Double.isFinite(number)) {
            throw new UsageException(place + " is " + Names.shortened(text) + ", not a finite number", "");
        }
        return number;
    }

    /** A whole number from {@code least} to a billion, or what to take without. */
    int count(String option, int least, int otherwise) {
        String value = value(option);
        if (value == null) {
            return otherwise;
        }
        return whole("--" + option, value, least, 1_000_000_000);
    }

    /** A whole number in a range; the place is named in the fault. */
    static int whole(String place, String text, int least, int most) {
        int number;
        try {
            number = Integer.parseInt(text.strip());
        } catch (NumberFormatException e) {
            throw new UsageException(
                    place + " is '" + Names.shortened(text) + "'", "write a whole number from " + least);
        }
        if (number < least || number > most) {
            throw new UsageException(place + " is " + number, "write a whole number from " + least + " to " + most);
        }
        return number;
    }

    Format format() {
        String value = value("format");
        if (value == null) {
            return Format.TABLE;
        }
        return switch (value) {
            case "table" -> Format.TABLE;
            case "csv" -> Format.CSV;
            case "json" -> Format.JSON;
            default ->
                throw new UsageException("--format is '" + Names.shortened(value) + "'", "use table, csv or json");
        };
    }
}
