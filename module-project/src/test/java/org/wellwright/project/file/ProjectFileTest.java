package org.wellwright.project.file;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wellwright.project.Project;
import org.wellwright.solver.model.ParameterShape;

class ProjectFileTest {
    @TempDir
    Path folder;

    static String sample(String name) throws IOException {
        try (InputStream in = ProjectFileTest.class.getResourceAsStream(name)) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }

    static ProjectFile.Content parse(String json) {
        return ProjectFile.parse(json.getBytes(StandardCharsets.UTF_8), "p.wellwright");
    }

    @Test
    void everyRecordOfVersionOneSurvivesUnchangedToTheLastByte() throws IOException {
        String text = sample("everything-1.wellwright");
        assertThat(ProjectFile.text(parse(text).project())).isEqualTo(text);
    }

    @Test
    void savedAndReadAgainIsEqual() throws IOException {
        Project project = parse(sample("everything-1.wellwright")).project();
        Path file = folder.resolve("a.wellwright");
        ProjectFile.save(file, project);
        assertThat(ProjectFile.read(file)).isEqualTo(project);
        assertThat(ProjectFile.read(file).digest()).isEqualTo(project.digest());
    }

    @Test
    void saysWhatItKeepsWithoutUnderstanding() throws IOException {
        assertThat(parse(sample("everything-1.wellwright")).unknown())
                .containsExactlyInAnyOrder("/laboratory", "/systems/0/x-lab", "/parameters/1/colour", "/data/0/plate");
    }

    @Test
    void unknownMembersStayWithTheirItemWhenOthersAreAddedBefore() throws IOException {
        Project project = parse(sample("everything-1.wellwright")).project();
        var document = project.document();
        var parameters = new java.util.ArrayList<>(document.parameters());
        parameters.add(
                0,
                org.wellwright.solver.model.Parameter.scalar(
                        "first",
                        "",
                        org.wellwright.solver.model.Setting.fixed(org.wellwright.solver.units.ExactNumber.ONE)));
        Project changed = project.withDocument(new org.wellwright.solver.model.ModelDocument(
                document.constantsEdition(),
                document.massTable(),
                document.units(),
                document.labels(),
                document.weighting(),
                document.systems(),
                parameters,
                document.models(),
                document.data(),
                document.groups()));
        Project again = parse(ProjectFile.text(changed)).project();
        assertThat(again).isEqualTo(changed);
        assertThat(ProjectFile.text(changed)).contains("\"name\": \"b\"").contains("\"colour\": \"blue\"");
    }

    @Test
    void numbersKeepTheirSpelling() throws IOException {
        Project project = parse(sample("everything-1.wellwright")).project();
        var shape =
                (ParameterShape.Scalar) project.document().parameters().get(0).shape();
        assertThat(shape.setting().value().text()).isEqualTo("1.440");
    }

    @Test
    void aSmallHandWrittenFileIsCompletedByDefaults() {
        Project project = parse("""
                        {"format": "wellwright-project", "version": 1, "units": "atomic",
                         "systems": [{"id": "x", "first": {"particle": "e-"}, "second": {"particle": "p"}}],
                         "parameters": [{"name": "a", "unit": "hartree a0", "value": 1, "free": true}],
                         "models": [{"name": "m", "curves": [{"terms": [{"formula": "-a/r"}]}]}],
                         "data": [{"levels": [{"l": 0, "index": 0}], "value": -0.5, "unit": "hartree", "sigma": 0.01}]}
                        """).project();
        assertThat(project.document().data().get(0).id()).isEqualTo("d1");
        assertThat(project.document().data().get(0).levels().get(0).level().system())
                .isEqualTo("x");
        assertThat(project.document().constantsEdition()).isEqualTo("CODATA 2022");
        assertThat(parse(ProjectFile.text(project)).project()).isEqualTo(project);
    }

    @Test
    void savingKeepsThePreviousFile() throws IOException {
        Project project = parse(sample("everything-1.wellwright")).project();
        Path file = folder.resolve("a.wellwright");
        ProjectFile.save(file, project);
        ProjectFile.save(file, project.withTitle("second"));
        assertThat(ProjectFile.read(folder.resolve("a.wellwright.bak")).title()).isEqualTo(project.title());
        assertThat(ProjectFile.read(file).title()).isEqualTo("second");
        try (var files = Files.list(folder)) {
            assertThat(files.map(f -> f.getFileName().toString()))
                    .containsExactlyInAnyOrder("a.wellwright", "a.wellwright.bak");
        }
    }
}
