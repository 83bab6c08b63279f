package org.wellwright.project.command;

import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.wellwright.project.file.ProjectFileException;
import org.wellwright.project.report.Version;
import org.wellwright.solver.Problem;
import org.wellwright.solver.SolverException;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.units.Names;

/** Starts the headless command: {@code wellwright-batch COMMAND …}. */
public final class Main {
    private static final int FAILED = 1;
    private static final int REFUSED = 2;

    private Main() {}

    /**
     * Runs one command and ends the process with its status: 0 done, 1 the science failed, 2 bad usage or bad input.
     */
    public static void main(String[] arguments) {
        System.exit(run(arguments, Console.standard()));
    }

    /** Runs one command; never throws. */
    static int run(String[] arguments, Console console) {
        boolean debug = Arrays.asList(arguments).contains("--debug");
        int status;
        try {
            status = dispatch(arguments, console);
        } catch (ProjectFileException e) {
            e.problems().forEach(console::fault);
            status = failed(e, REFUSED, debug, console);
        } catch (SolverException e) {
            console.fault(e.problem());
            status = failed(e, FAILED, debug, console);
        } catch (WellwrightException e) {
            console.fault(e.problem());
            status = failed(e, REFUSED, debug, console);
        } catch (CancellationException e) {
            console.say("cancelled");
            status = failed(e, FAILED, debug, console);
        } catch (RuntimeException | StackOverflowError | OutOfMemoryError e) {
            console.fault(new Problem(
                    "a fault of the program itself: " + e.getClass().getSimpleName(),
                    "",
                    debug ? "please report it" : "run again with --debug and report it"));
            status = failed(e, FAILED, debug, console);
        }
        if (!console.arrived()) {
            console.say("standard output cannot be written");
            return REFUSED;
        }
        return status;
    }

    private static int failed(Throwable fault, int status, boolean debug, Console console) {
        if (debug) {
            console.trace(fault);
        }
        return status;
    }

    private static int dispatch(String[] arguments, Console console) {
        String name = arguments.length == 0 ? "--help" : arguments[0];
        if (name.equals("--help") || name.equals("-h") || name.equals("help")) {
            console.print(Commands.overview());
            return arguments.length == 0 ? REFUSED : 0;
        }
        if (name.equals("--version")) {
            console.print("Wellwright " + Version.text() + "\n");
            return 0;
        }
        Command command = Commands.named(name);
        if (command == null) {
            List<String> names = Commands.names();
            String remedy = Names.near(name, names).isEmpty()
                    ? "use one of " + String.join(", ", names)
                    : Names.remedy(name, names);
            throw new UsageException("there is no command '" + Names.shortened(name) + "'", remedy);
        }
        Syntax syntax = command.syntax();
        Input input = syntax.parse(Arrays.copyOfRange(arguments, 1, arguments.length));
        if (input.has("help")) {
            console.print(syntax.help());
            return 0;
        }
        syntax.check(input);
        return command.run(input, console);
    }
}
