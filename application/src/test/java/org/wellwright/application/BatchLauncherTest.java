package org.wellwright.application;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Runs {@code bin/wellwright-batch} as a script would: no display, no user directory. */
class BatchLauncherTest {
    private static final String[] COULOMB = {
        "bound", "--formula", "-1/r", "--kinetic", "0.5", "--l", "0..1", "--count", "3", "--format", "json"
    };
    private static final Pattern LEVEL = Pattern.compile(
            "\"l\": (\\d+), \"radialNodes\": (\\d+), \"energy\": (\\S+), \"lower\": (\\S+), \"upper\": (\\S+),");

    @TempDir
    Path scratch;

    @Test
    void solvesTheCoulombProblem() throws Exception {
        assertSolvesCoulomb(PackagedApplication.built());
    }

    @Test
    void needsNoWindowModules() throws Exception {
        PackagedApplication copy = PackagedApplication.built().copyTo(scratch.resolve("application"));
        for (String module : List.of("viewer", "editor", "branding")) {
            Files.delete(copy.folder().resolve("wellwright/modules/org-wellwright-%s.jar".formatted(module)));
        }
        assertSolvesCoulomb(copy);
    }

    @Test
    void runsFromAFolderWithBlanksAndThroughALink() throws Exception {
        PackagedApplication copy = PackagedApplication.built().copyTo(scratch.resolve("a folder with blanks"));
        assertSolvesCoulomb(copy);
        Path link =
                Files.createSymbolicLink(scratch.resolve("ww"), copy.folder().resolve("bin/wellwright-batch"));
        PackagedApplication.Outcome outcome =
                PackagedApplication.run(new ProcessBuilder(link.toString(), "--version"), scratch);
        assertThat(outcome.status()).isZero();
        assertThat(outcome.output()).startsWith("Wellwright");
    }

    @Test
    void refusesBadInputInOneLineWithStatusTwo() throws Exception {
        PackagedApplication.Outcome outcome = PackagedApplication.built()
                .batch(scratch, "bound", "--formula", "-1/(r", "--kinetic", "0.5", "--l", "0", "--count", "1");
        assertThat(outcome.status()).isEqualTo(2);
        assertThat(outcome.output()).isEmpty();
        assertThat(outcome.errors()).hasLineCount(1).contains("column");
    }

    /** Energies −1/(2n²) of the point Coulomb problem in atomic units (Bethe and Salpeter 1957, eq. 2.11). */
    private void assertSolvesCoulomb(PackagedApplication application) throws Exception {
        PackagedApplication.Outcome outcome = application.batch(scratch, COULOMB);
        assertThat(outcome.status()).as(outcome.errors()).isZero();
        assertThat(outcome.errors()).isEmpty();
        List<Integer> principals = new ArrayList<>();
        Matcher level = LEVEL.matcher(outcome.output());
        while (level.find()) {
            int n = Integer.parseInt(level.group(1)) + Integer.parseInt(level.group(2)) + 1;
            double exact = -0.5 / (n * n);
            assertThat(Double.parseDouble(level.group(3))).isCloseTo(exact, within(1e-13 * -exact));
            assertThat(Double.parseDouble(level.group(4))).isLessThanOrEqualTo(exact);
            assertThat(Double.parseDouble(level.group(5))).isGreaterThanOrEqualTo(exact);
            principals.add(n);
        }
        assertThat(principals).containsExactly(1, 2, 3, 2, 3, 4);
    }
}
