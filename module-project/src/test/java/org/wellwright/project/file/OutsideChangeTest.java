package org.wellwright.project.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Weighting;

/** What happens when somebody else writes into the file of an open project. */
class OutsideChangeTest {
    @TempDir
    Path folder;

    private final FileProjects projects = new FileProjects();
    private Path file;
    private ProjectSession session;

    @BeforeEach
    void open() {
        file = folder.resolve("a.wellwright");
        ModelDocument document = new ModelDocument(
                "CODATA 2022",
                "",
                "atomic",
                LabelConvention.ATOMIC,
                Weighting.KNOWN,
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of());
        ProjectFile.save(file, Project.of("mine", document));
        session = projects.open(file);
    }

    private void changeOutside() throws IOException {
        Files.writeString(file, Files.readString(file).replace("mine", "theirs"));
    }

    @Test
    void aFileThatIsTheSameIsNotChanged() {
        assertThat(projects.changedOutside(session)).isFalse();
        session.edit("Change the notes", project -> project.withNotes("x"));
        projects.save(session);
        assertThat(projects.changedOutside(session)).isFalse();
    }

    @Test
    void anOutsideChangeIsNoticedAndNotOverwritten() throws IOException {
        changeOutside();
        assertThat(projects.changedOutside(session)).isTrue();
        session.edit("Change the notes", project -> project.withNotes("x"));
        assertThatThrownBy(() -> projects.save(session))
                .isInstanceOf(WellwrightException.class)
                .hasMessageContaining("changed by someone else");
        assertThat(Files.readString(file)).contains("theirs");
    }

    @Test
    void readingAgainTakesItUpAsOneStep() throws IOException {
        session.edit("Change the notes", project -> project.withNotes("x"));
        changeOutside();
        projects.readAgain(session);
        assertThat(session.project().title()).isEqualTo("theirs");
        assertThat(session.modified()).isFalse();
        assertThat(projects.changedOutside(session)).isFalse();
        session.undo();
        assertThat(session.project().title()).isEqualTo("mine");
        assertThat(session.project().notes()).isEqualTo("x");
        assertThat(session.modified()).isTrue();
    }

    @Test
    void aFaultyFileLeavesTheProjectAsItWas() throws IOException {
        Files.writeString(file, "{");
        assertThatThrownBy(() -> projects.readAgain(session)).isInstanceOf(ProjectFileException.class);
        assertThat(session.project().title()).isEqualTo("mine");
        Files.delete(file);
        assertThat(projects.changedOutside(session)).isTrue();
    }

    @Test
    void listenersHearOfOpeningSelectingAndClosing() {
        int[] heard = {0};
        Runnable listener = () -> heard[0]++;
        projects.addListener(listener);
        ProjectSession other = projects.add(session.project());
        projects.select(session);
        projects.close(other);
        assertThat(heard[0]).isEqualTo(3);
        projects.removeListener(listener);
        projects.close(session);
        assertThat(heard[0]).isEqualTo(3);
    }
}
