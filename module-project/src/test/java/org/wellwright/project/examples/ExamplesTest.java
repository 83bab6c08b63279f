package org.wellwright.project.examples;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wellwright.project.Project;
import org.wellwright.project.file.ProjectFile;

/** The shipped examples are sound, say that they are invented, and hold the data that their generator makes. */
class ExamplesTest {
    private static Path file(String name) {
        return Path.of("..", "application", "src", "examples", name + ProjectFile.ENDING);
    }

    @ParameterizedTest
    @ValueSource(strings = {"alkali-ion", "diatomic", "heavy-quark-pair"})
    void areSoundAndInTheFixedLayout(String name) throws IOException {
        ProjectFile.Content content = ProjectFile.open(file(name));
        assertThat(content.problems()).isEmpty();
        assertThat(content.unknown()).isEmpty();
        assertThat(ProjectFile.text(content.project())).isEqualTo(Files.readString(file(name)));
        assertThat(content.project().notes())
                .startsWith("Invented data")
                .contains("seed " + ExampleGenerator.SEEDS.get(name));
    }

    @ParameterizedTest
    @ValueSource(strings = {"alkali-ion", "diatomic", "heavy-quark-pair"})
    void holdTheDataThatTheGeneratorMakes(String name) throws IOException {
        Project shipped = ProjectFile.read(file(name));
        assertThat(new ExampleGenerator().data(name, ExampleGenerator.SEEDS.get(name)))
                .isEqualTo(shipped.document().data());
    }
}
