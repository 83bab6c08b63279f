package org.wellwright.project.command.json;

import java.nio.file.Path;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.List;
import org.wellwright.project.file.Json;
import org.wellwright.project.report.Version;
import org.wellwright.project.run.Run;
import org.wellwright.solver.fit.FitResult;

/** A fit as an entry of the run history. */
public final class FitRecord {
    private FitRecord() {}

    /**
     * The entry.
     *
     * @param digest {@link org.wellwright.project.Project#digest} of the project that was fitted
     * @param solver name and version of the solver
     */
    public static Run of(Path file, String digest, FitResult fit, String solver) {
        return new Run(
                Instant.now().truncatedTo(ChronoUnit.SECONDS),
                "fit",
                digest,
                Version.text(),
                solver,
                List.of("wellwright-batch", "fit", file.getFileName().toString(), "--model", fit.model()),
                Json.parse(FitJson.write(fit), "fit"));
    }
}
