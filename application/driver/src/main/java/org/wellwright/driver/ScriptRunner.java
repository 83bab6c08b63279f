package org.wellwright.driver;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.openide.util.Lookup;

/**
 * Runs a script to its end or to its first failure and writes one line a step into {@code SCRIPT.log}.
 *
 * <p>A script that fails, or ends without {@code exit}, ends the process: with status 3 after a failure, of which
 * {@code failure.png} beside the script shows the main window, and with 4 for the missing {@code exit}.
 */
final class ScriptRunner {
    private static final int FAILED = 3;
    private static final int NO_EXIT = 4;

    private ScriptRunner() {}

    static void run(Path file) {
        Path log = file.resolveSibling(file.getFileName() + ".log");
        int status = NO_EXIT;
        try {
            Script script = Script.read(file);
            Map<String, DriverCommand> commands = Lookup.getDefault().lookupAll(DriverCommand.class).stream()
                    .collect(Collectors.toMap(DriverCommand::name, Function.identity()));
            for (Script.Step step : script.steps()) {
                note(log, "line %d: %s %s".formatted(step.line(), step.name(), step.arguments()));
                run(script, step, commands.get(step.name()));
            }
            note(log, "FAILED: the script ends without exit");
        } catch (ScriptFailure | IOException failure) {
            note(log, "FAILED: " + failure.getMessage());
            Screen.saveQuietly(file.resolveSibling("failure.png"));
            status = FAILED;
        } catch (RuntimeException failure) {
            note(log, "FAILED: " + failure);
            failure.printStackTrace();
            status = FAILED;
        }
        Runtime.getRuntime().halt(status);
    }

    private static void run(Script script, Script.Step step, DriverCommand command) {
        if (command == null) {
            throw new ScriptFailure("no command is called " + step.name());
        }
        int wanted = command.arguments().isEmpty() ? 0 : command.arguments().split(" ").length;
        if (step.arguments().size() != wanted) {
            throw new ScriptFailure("%s takes: %s".formatted(step.name(), command.arguments()));
        }
        command.run(script, step.arguments());
    }

    private static void note(Path log, String line) {
        try {
            Files.writeString(log, line + "\n", StandardOpenOption.CREATE, StandardOpenOption.APPEND);
        } catch (IOException failure) {
            System.err.println(line);
        }
    }
}
