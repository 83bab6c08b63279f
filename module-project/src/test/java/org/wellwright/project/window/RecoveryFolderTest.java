package org.wellwright.project.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wellwright.project.Project;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.units.UnitSystem;

class RecoveryFolderTest {
    private static final Instant NOON = Instant.parse("2026-03-01T12:00:00Z");

    @TempDir
    Path folder;

    private final Project project =
            NewProject.project("Füllung, \"1\"", UnitSystem.EV_NM, "e-", "p", LabelConvention.ATOMIC);

    private RecoveryFolder recovery() {
        return new RecoveryFolder(folder.resolve("recovery"));
    }

    @Test
    void whatIsKeptComesBackEqual() {
        Path file = folder.resolve("with blank and ü.wellwright");
        recovery().keep("one", project.withNotes("line 1\nline 2"), "Füllung", Optional.of(file), NOON);
        recovery().keep("two", project, "Untitled", Optional.empty(), NOON.minusSeconds(60));
        assertThat(recovery().entries()).extracting(RecoveryFolder.Entry::id).containsExactly("two", "one");
        RecoveryFolder.Entry entry = recovery().entries().get(1);
        assertThat(entry.file()).contains(file);
        assertThat(entry.title()).isEqualTo("Füllung");
        assertThat(entry.time()).isEqualTo(NOON);
        assertThat(recovery().project(entry)).isEqualTo(project.withNotes("line 1\nline 2"));
    }

    @Test
    void aLaterStateReplacesTheEarlierOneAndForgettingLeavesNothing() throws IOException {
        recovery().keep("one", project, "a", Optional.empty(), NOON);
        recovery().keep("one", project.withNotes("later"), "a", Optional.empty(), NOON.plusSeconds(1));
        assertThat(recovery().project(recovery().entries().get(0)).notes()).isEqualTo("later");
        recovery().forget("one");
        recovery().forget("one");
        assertThat(recovery().entries()).isEmpty();
        try (Stream<Path> left = Files.list(folder.resolve("recovery"))) {
            assertThat(left).isEmpty();
        }
    }

    @Test
    void tornEntriesCostOnlyThemselves() throws IOException {
        recovery().keep("one", project, "a", Optional.empty(), NOON);
        Files.writeString(folder.resolve("recovery/torn.about"), "title=b\ntime=yester");
        Files.writeString(folder.resolve("recovery/torn.wellwright"), "{");
        Files.writeString(folder.resolve("recovery/lonely.about"), "title=c\ntime=2026-03-01T12:00:00Z");
        assertThat(recovery().entries()).extracting(RecoveryFolder.Entry::id).containsExactly("one");
    }
}
