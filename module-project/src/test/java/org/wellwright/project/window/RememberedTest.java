package org.wellwright.project.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.units.UnitSystem;

class RememberedTest {
    private final Remembered remembered = new Remembered(new MemoryPreferences());

    private static Path file(int number) {
        return Path.of("/data/project " + number + ".wellwright");
    }

    @Test
    void theLatestFileStandsFirstAndOnce() {
        for (int i = 0; i < 20; i++) {
            remembered.used(file(i));
        }
        remembered.used(file(15));
        assertThat(remembered.recent()).hasSize(Remembered.MOST_RECENT).startsWith(file(15), file(19), file(18));
        remembered.gone(file(19));
        assertThat(remembered.recent()).doesNotContain(file(19)).hasSize(Remembered.MOST_RECENT - 1);
        remembered.forgetRecent();
        assertThat(remembered.recent()).isEmpty();
    }

    @Test
    void openProjectsAreRememberedByTheirFiles() {
        ProjectSession one = new ProjectSession(
                NewProject.project("one", UnitSystem.ATOMIC, "e-", "p", LabelConvention.ATOMIC), file(1));
        ProjectSession unsaved = new ProjectSession(one.project(), null);
        ProjectSession two = new ProjectSession(one.project(), file(2));
        remembered.note(List.of(one, unsaved, two), Optional.of(two));
        assertThat(remembered.open()).containsExactly(file(1), file(2));
        assertThat(remembered.selected()).contains(file(2));
        remembered.note(List.of(unsaved), Optional.of(unsaved));
        assertThat(remembered.open()).isEmpty();
        assertThat(remembered.selected()).isEmpty();
    }
}
