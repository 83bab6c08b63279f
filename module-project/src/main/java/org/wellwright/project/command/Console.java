package org.wellwright.project.command;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import org.wellwright.project.file.SafeFile;
import org.wellwright.solver.Problem;

/** Where results and faults go: UTF-8 whatever the locale. */
final class Console {
    private final PrintStream out;
    private final PrintStream err;

    Console(PrintStream out, PrintStream err) {
        this.out = out;
        this.err = err;
    }

    /** Standard output and standard error of the process. */
    static Console standard() {
        return new Console(
                new PrintStream(new FileOutputStream(FileDescriptor.out), false, StandardCharsets.UTF_8),
                new PrintStream(new FileOutputStream(FileDescriptor.err), true, StandardCharsets.UTF_8));
    }

    /** Prints a result, or writes it to the file that {@code --output} names. */
    void result(Input input, String text) {
        String file = input.value("output");
        if (file == null) {
            print(text);
        } else {
            SafeFile.replace(Path.of(file), text.getBytes(StandardCharsets.UTF_8), false);
        }
    }

    /** Prints to standard output. */
    void print(String text) {
        // One array, since the stream itself is not buffered.
        byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
        out.write(bytes, 0, bytes.length);
    }

    /** One line of what the user should know. */
    void say(String line) {
        err.println("wellwright-batch: " + line);
    }

    /** One fault. */
    void fault(Problem problem) {
        say(problem.sentence());
    }

    /** Where in the program a fault arose. */
    void trace(Throwable fault) {
        fault.printStackTrace(err);
    }

    /** Whether everything printed has arrived. */
    boolean arrived() {
        return !out.checkError();
    }
}
