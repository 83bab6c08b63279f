package org.wellwright.project.run;

import java.time.Instant;
import java.util.List;
import java.util.Objects;
import org.wellwright.project.file.JsonValue;

/**
 * One finished calculation.
 *
 * @param time when it ended
 * @param kind what it was ("fit", "solve")
 * @param digest {@link org.wellwright.project.Project#digest} of its input
 * @param program version of this program
 * @param solver name and version of the solver
 * @param command the command that does it again
 * @param result what came out
 */
public record Run(
        Instant time,
        String kind,
        String digest,
        String program,
        String solver,
        List<String> command,
        JsonValue result) {
    /** Copies the list and checks that nothing is missing. */
    public Run {
        Objects.requireNonNull(time, "time");
        Objects.requireNonNull(kind, "kind");
        Objects.requireNonNull(digest, "digest");
        Objects.requireNonNull(program, "program");
        Objects.requireNonNull(solver, "solver");
        Objects.requireNonNull(result, "result");
        command = List.copyOf(command);
    }
}
