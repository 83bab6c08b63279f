package org.wellwright.project.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wellwright.project.file.ProjectFile;
import org.wellwright.project.run.RunHistory;

/** A new user's first project, typed from the README's page and nothing else. */
class ReadmeTest {
    private static final Path README = Path.of("..", "README.md");

    @TempDir
    Path folder;

    private Path file;
    private String readme;

    @BeforeEach
    void typeTheFile() throws IOException {
        readme = Files.readString(README);
        int start = readme.indexOf("```json\n") + "```json\n".length();
        file = folder.resolve("first.wellwright");
        Files.writeString(file, readme.substring(start, readme.indexOf("```", start)));
    }

    @Test
    void isValidWithNothingLeftOver() {
        CommandRun run = CommandRun.of("validate", file.toString());
        assertThat(run.err()).isEmpty();
        assertThat(run.out()).contains("valid");
        assertThat(run.status()).isZero();
    }

    @Test
    void solvesAndCompares() {
        CommandRun solved = CommandRun.of("solve", file.toString(), "--model", "bell", "--format", "csv");
        assertThat(solved.status()).as(solved.err()).isZero();
        assertThat(solved.out())
                .startsWith("model,curve,system,label,l,J,index,energy")
                .contains("bell,V,pair,1S,0");
        CommandRun compared = CommandRun.of("compare", file.toString());
        assertThat(compared.status()).as(compared.err()).isZero();
        assertThat(compared.out()).contains("parabola", "bell", "slow tail");
    }

    @Test
    void fitsAsThePageSaysAndWritesProjectHistoryAndBackup() throws IOException {
        String before = Files.readString(file);
        CommandRun run = CommandRun.of("fit", file.toString(), "--model", "bell", "--write");
        assertThat(run.status()).as(run.err()).isZero();
        String shown = readme.substring(readme.indexOf("    model bell\n"));
        for (String line : run.out().split("\n")) {
            // The number of steps may change with the search; everything else is what the page shows.
            if (!line.isBlank() && !line.startsWith("χ²")) {
                assertThat(shown).contains("    " + line + "\n");
            }
        }
        assertThat(Files.readString(folder.resolve("first.wellwright.bak"))).isEqualTo(before);
        assertThat(ProjectFile.open(file).problems()).isEmpty();
        assertThat(RunHistory.of(file).read().runs())
                .singleElement()
                .satisfies(r -> assertThat(r.kind()).isEqualTo("fit"));
        assertThat(folder.resolve("first.wellwright.lock")).doesNotExist();
    }
}
