package org.wellwright.project.command;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.cli.CommandLine;
import org.apache.commons.cli.DefaultParser;
import org.apache.commons.cli.Option;
import org.apache.commons.cli.Options;
import org.apache.commons.cli.ParseException;
import org.apache.commons.cli.UnrecognizedOptionException;
import org.wellwright.solver.units.Names;

/**
 * What a subcommand accepts: positional arguments and long options; {@code -o} and {@code -h} are short for two of
 * them.
 */
final class Syntax {
    private final String command;
    private final String summary;
    private final List<String> positionals;
    private final Map<String, Entry> entries = new LinkedHashMap<>();

    private record Entry(String name, String label, String help) {}

    /**
     * A syntax with the options that every command has.
     *
     * @param positionals labels of the positional arguments, all required; one in brackets may be left out, "FILE…"
     *     takes several
     */
    Syntax(String command, String summary, String... positionals) {
        this.command = command;
        this.summary = summary;
        this.positionals = List.of(positionals);
    }

    /** An option with a value. */
    Syntax option(String name, String label, String help) {
        entries.put(name, new Entry(name, label, help));
        return this;
    }

    /** An option without a value. */
    Syntax flag(String name, String help) {
        return option(name, "", help);
    }

    /** The options of a command that prints a result. */
    Syntax result(String formats) {
        return option("format", formats, "how to print the result")
                .option("output", "FILE", "write the result to FILE (also -o FILE)");
    }

    /**
     * Reads the arguments after the command's name. A value may follow its option after a space or '=', whatever it
     * starts with.
     *
     * @throws UsageException if they do not fit
     */
    Input parse(String[] arguments) {
        flag("debug", "show where in the program a fault arose").flag("help", "show this text (also -h)");
        Options options = new Options();
        for (Entry entry : entries.values()) {
            options.addOption(Option.builder()
                    .longOpt(entry.name())
                    .hasArg(!entry.label().isEmpty())
                    .get());
        }
        CommandLine line;
        try {
            line = DefaultParser.builder()
                    .setAllowPartialMatching(false)
                    .setStripLeadingAndTrailingQuotes(false)
                    .get()
                    .parse(options, joined(arguments));
        } catch (UnrecognizedOptionException e) {
            String name = e.getOption();
            throw new UsageException(
                    command + " has no option " + Names.shortened(name),
                    Names.remedy(
                            name, entries.keySet().stream().map(n -> "--" + n).toList()));
        } catch (ParseException e) {
            throw new UsageException(command + ": " + e.getMessage(), "see wellwright-batch " + command + " --help");
        }
        Map<String, List<String>> values = new LinkedHashMap<>();
        for (Entry entry : entries.values()) {
            if (line.hasOption(entry.name())) {
                String[] given = line.getOptionValues(entry.name());
                values.put(entry.name(), given == null ? List.of() : List.of(given));
            }
        }
        return new Input(command, values, line.getArgList());
    }

    /**
     * Checks the number of positional arguments.
     *
     * @throws UsageException if there are too few or too many
     */
    void check(Input input) {
        int most = 0;
        int least = 0;
        for (String label : positionals) {
            most = label.contains("…") ? Integer.MAX_VALUE : most + 1;
            least += label.startsWith("[") ? 0 : 1;
        }
        int given = input.positionals().size();
        if (given < least) {
            throw new UsageException(command + " needs " + positionals.get(given), "write: " + usage());
        }
        if (given > most) {
            throw new UsageException(
                    command + " has no use for '"
                            + Names.shortened(input.positionals().get(most)) + "'",
                    "write: " + usage());
        }
    }

    /** Joins a value to its option, so that one that starts with a minus is not taken for an option. */
    private String[] joined(String[] arguments) {
        List<String> joined = new ArrayList<>();
        for (int i = 0; i < arguments.length; i++) {
            String argument = arguments[i];
            if (argument.equals("--")) {
                joined.addAll(List.of(arguments).subList(i, arguments.length));
                break;
            }
            String name = argument.equals("-o")
                    ? "output"
                    : argument.equals("-h") ? "help" : argument.startsWith("--") ? argument.substring(2) : "";
            Entry entry = entries.get(name);
            if (entry == null) {
                joined.add(argument);
            } else if (entry.label().isEmpty()) {
                joined.add("--" + name);
            } else if (i + 1 < arguments.length) {
                joined.add("--" + name + "=" + arguments[++i]);
            } else {
                throw new UsageException(command + ": the option --" + name + " needs a value", "add " + entry.label());
            }
        }
        return joined.toArray(new String[0]);
    }

    private String usage() {
        return "wellwright-batch " + command + (positionals.isEmpty() ? "" : " " + String.join(" ", positionals))
                + (entries.isEmpty() ? "" : " [options]");
    }

    /** What the command does, in a sentence. */
    String summary() {
        return summary;
    }

    /** The help text. */
    String help() {
        StringBuilder text =
                new StringBuilder(summary).append("\n\n  ").append(usage()).append("\n\n");
        int width = 0;
        for (Entry entry : entries.values()) {
            width = Math.max(width, entry.name().length() + entry.label().length());
        }
        for (Entry entry : entries.values()) {
            String head = "--" + entry.name() + (entry.label().isEmpty() ? "" : " " + entry.label());
            text.append("  ").append(head).append(" ".repeat(width + 5 - head.length()));
            text.append(entry.help().replace("\n", "\n" + " ".repeat(width + 7)))
                    .append('\n');
        }
        return text.toString();
    }
}
