package org.wellwright.project.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.openide.util.Lookup;
import org.openide.util.LookupListener;
import org.wellwright.project.Documents;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectSession;

class FileProjectsTest {
    @TempDir
    Path folder;

    private final FileProjects projects = new FileProjects();

    private Path saved(String name) {
        Path file = folder.resolve(name);
        ProjectFile.save(file, Project.of(name, Documents.hydrogen("1")));
        return file;
    }

    @Test
    void isFoundByLookup() {
        assertThat(Lookup.getDefault().lookup(OpenProjects.class)).isInstanceOf(FileProjects.class);
    }

    @Test
    void theLookupFollowsTheSelection() {
        Lookup.Result<ProjectSession> result = projects.getLookup().lookupResult(ProjectSession.class);
        List<String> heard = new ArrayList<>();
        LookupListener listener = event -> heard.add(result.allInstances().toString());
        result.addLookupListener(listener);
        assertThat(result.allInstances()).isEmpty();
        ProjectSession a = projects.open(saved("a.wellwright"));
        ProjectSession b = projects.open(saved("b.wellwright"));
        assertThat(projects.getLookup().lookup(ProjectSession.class)).isSameAs(b);
        projects.select(a);
        projects.select(new FigureSelection("coulomb", List.of(), 0));
        assertThat(projects.getLookup().lookup(FigureSelection.class).model()).isEqualTo("coulomb");
        projects.close(a);
        assertThat(projects.selected()).contains(b);
        assertThat(projects.getLookup().lookup(FigureSelection.class)).isEqualTo(FigureSelection.NONE);
        projects.close(b);
        assertThat(projects.getLookup().lookup(ProjectSession.class)).isNull();
        assertThat(heard).hasSize(5);
    }

    @Test
    void aFileIsOpenedOnce() {
        Path file = saved("a.wellwright");
        assertThat(projects.open(file))
                .isSameAs(projects.open(folder.resolve(".").resolve("a.wellwright")));
        assertThat(projects.sessions()).hasSize(1);
    }

    @Test
    void savesAndKnowsIt() {
        ProjectSession session = projects.open(saved("a.wellwright"));
        session.edit("Rename", project -> project.withTitle("new"));
        projects.save(session);
        assertThat(session.modified()).isFalse();
        assertThat(ProjectFile.read(folder.resolve("a.wellwright")).title()).isEqualTo("new");
    }

    @Test
    void refusesToOverwriteAnOutsideChange() throws IOException {
        Path file = saved("a.wellwright");
        ProjectSession session = projects.open(file);
        session.edit("Rename", project -> project.withTitle("mine"));
        String theirs = Files.readString(file).replace("a.wellwright", "theirs");
        Files.writeString(file, theirs);
        assertThatThrownBy(() -> projects.save(session)).hasMessageContaining("changed by someone else");
        assertThat(Files.readString(file)).isEqualTo(theirs);
        projects.saveAs(session, file);
        assertThat(ProjectFile.read(file).title()).isEqualTo("mine");
        assertThat(Files.readString(folder.resolve("a.wellwright.bak"))).isEqualTo(theirs);
    }

    @Test
    void aNewProjectAsksForAName() {
        ProjectSession session = projects.add(Project.of("", Documents.hydrogen("1")));
        assertThat(session.displayName()).isEqualTo("Untitled");
        assertThatThrownBy(() -> projects.save(session)).hasMessageContaining("no file yet");
        projects.saveAs(session, folder.resolve("c.wellwright"));
        assertThat(session.displayName()).isEqualTo("c.wellwright");
    }

    @Test
    void oneWriterAtATime() {
        Path file = saved("a.wellwright");
        try (ProjectLock lock = ProjectLock.take(file)) {
            assertThat(lock).isNotNull();
            assertThatThrownBy(() -> ProjectLock.take(file))
                    .hasMessageContaining("being written by process "
                            + ProcessHandle.current().pid());
        }
        try (ProjectLock again = ProjectLock.take(file)) {
            assertThat(again).isNotNull();
        }
        assertThat(folder.resolve("a.wellwright.lock")).doesNotExist();
    }
}
