package org.wellwright.project.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wellwright.project.Project;
import org.wellwright.project.file.ProjectFile;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.units.UnitSystem;

class ExamplesTest {
    @TempDir
    Path folder;

    @Test
    void listsWhatCanBeReadByFileName() throws IOException {
        Project project = NewProject.project("An ion", UnitSystem.ATOMIC, "e-", "p", LabelConvention.ATOMIC);
        ProjectFile.save(folder.resolve("b.wellwright"), project.withNotes("First sentence. " + "Long ".repeat(100)));
        ProjectFile.save(folder.resolve("a.wellwright"), project.withTitle("Another"));
        Files.writeString(folder.resolve("c.wellwright"), "{broken");
        assertThat(Examples.all(folder)).extracting(Examples.Example::title).containsExactly("Another", "An ion");
        assertThat(Examples.all(folder).get(1).note())
                .hasSizeLessThanOrEqualTo(220)
                .startsWith("First sentence.");
        assertThat(Examples.copy(Examples.all(folder).get(1)).title()).isEqualTo("An ion");
        assertThat(Examples.all(folder.resolve("nowhere"))).isEmpty();
    }
}
