package org.wellwright.project.command;

import java.util.List;

/** The subcommands by name. */
final class Commands {
    private Commands() {}

    /** Names in the order of the overview. */
    static List<String> names() {
        return List.of("bound", "solve", "compare", "fit", "import", "figure", "report", "validate");
    }

    /** The command of a name, or null. Only this one is made. */
    static Command named(String name) {
        return switch (name) {
            case "bound" -> new BoundCommand();
            case "solve" -> new SolveCommand();
            case "compare" -> new CompareCommand();
            case "fit" -> new FitCommand();
            case "import" -> new ImportCommand();
            case "figure" -> new FigureCommand();
            case "report" -> new ReportCommand();
            case "validate" -> new ValidateCommand();
            default -> null;
        };
    }

    /** The list of commands. */
    static String overview() {
        StringBuilder text = new StringBuilder("""
                Levels of two particles bound by a central force: solve, compare, fit, report.

                  wellwright-batch COMMAND [options]

                """);
        for (String name : names()) {
            Command command = named(name);
            text.append("  ")
                    .append(name)
                    .append(" ".repeat(12 - name.length()))
                    .append(command.syntax().summary())
                    .append('\n');
        }
        return text.append("\nwellwright-batch COMMAND --help shows what a command accepts.\n")
                .toString();
    }
}
