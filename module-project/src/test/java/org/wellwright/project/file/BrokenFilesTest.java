package org.wellwright.project.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Every broken file gives a {@link ProjectFileException} whose sentence is one line with the place; nothing else
 * escapes.
 */
class BrokenFilesTest {
    @TempDir
    Path folder;

    private static String fault(byte[] bytes) {
        ProjectFileException e =
                catchThrowableOfType(ProjectFileException.class, () -> ProjectFile.parse(bytes, "p.wellwright"));
        assertThat(e).isNotNull();
        String sentence = e.problem().sentence();
        assertThat(sentence).startsWith("p.wellwright").doesNotContain("\n").doesNotContain("tools.jackson");
        assertThat(sentence.length()).isLessThan(500);
        return sentence;
    }

    private static String fault(String json) {
        return fault(json.getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void missing() {
        ProjectFileException e = catchThrowableOfType(
                ProjectFileException.class, () -> ProjectFile.read(folder.resolve("none.wellwright")));
        assertThat(e.problem().sentence()).contains("there is no such file");
        e = catchThrowableOfType(ProjectFileException.class, () -> ProjectFile.read(folder));
        assertThat(e.problem().sentence()).contains("folder");
    }

    @Test
    void emptyOrBlank() {
        assertThat(fault("")).contains("the file is empty");
        assertThat(fault(" \n\t\n")).contains("the file is empty");
    }

    @Test
    void truncatedAnywhereOrWithAByteChangedNeverEscapesAsAnythingElse() throws IOException {
        byte[] whole = ProjectFileTest.sample("everything-1.wellwright").getBytes(StandardCharsets.UTF_8);
        for (int length = 1; length < whole.length - 1; length += 7) {
            assertThat(fault(java.util.Arrays.copyOf(whole, length))).contains("line");
        }
        Random random = new Random(20240501);
        int refused = 0;
        for (int i = 0; i < 3000; i++) {
            byte[] bytes = whole.clone();
            bytes[random.nextInt(bytes.length)] = (byte) random.nextInt(256);
            try {
                ProjectFile.parse(bytes, "p.wellwright");
            } catch (ProjectFileException e) {
                refused++;
                assertThat(e.problem().sentence()).startsWith("p.wellwright").doesNotContain("\n");
            }
        }
        assertThat(refused).isGreaterThan(1500);
    }

    @Test
    void randomBytes() {
        Random random = new Random(7);
        for (int i = 0; i < 300; i++) {
            byte[] bytes = new byte[1 + random.nextInt(400)];
            random.nextBytes(bytes);
            fault(bytes);
        }
    }

    @Test
    void brackets() {
        assertThat(fault("[".repeat(200_000))).contains("nested deeper than 60").contains("line 1");
        assertThat(fault("{\"a\":".repeat(200_000))).contains("nested deeper than 60");
    }

    @Test
    void futureVersionAndForeignFiles() {
        assertThat(fault("{\"format\": \"wellwright-project\", \"version\": 2}"))
                .contains("version 2")
                .contains("/version");
        assertThat(fault("{\"format\": \"other\"}")).contains("not a Wellwright project");
        assertThat(fault("[1]")).contains("an array");
        assertThat(fault("{} {}")).contains("more after the end");
        assertThat(fault("{\"a\": 1, \"a\": 2}")).contains("line 1");
        assertThat(fault("{\"format\": NaN}")).contains("line 1");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "/parameters/0/value | \"value\": 1.440, | \"value\": \"big\", | must be a number, not a text",
                "/parameters/0/value | \"value\": 1.440, | \"value\": 1e999, | too large",
                "/parameters/0 | \"value\": 1.440, | \"valu\": 1.440, | has no value",
                "/parameters/0 | \"max\": 2 | \"max\": 0.1 | lower < upper",
                "/parameters/0 | \"name\": \"a\", | \"name\": \"2a\", | a letter followed",
                "/parameters/1/prior | \"sigma\": 0.001} | \"sigma\": 0} | sigma > 0",
                "/parameters/6 | \"tied\": \"2*a\" | \"tied\": \"2*a\", \"value\": 2 | in two ways",
                "/systems/0 | \"permittivity\": 1.00, | \"permittivity\": 0, | permittivity must be positive",
                "/systems/0/second/mass | \"value\": 38.9630, | \"value\": -1, | mass must be positive",
                "/systems/1/exchange | \"particle-antiparticle\" | \"twins\" | use one of distinguishable",
                "/models/0/curves/0/terms/0/formula | \"formula\": \"-a/r*exp(-r/c)\" | \"formula\": 3 | must be a text",
                "/models/0/curves/0/terms/0 | \"formula\": \"-a/r*exp(-r/c)\" | \"formulae\": \"a\" | a term needs one of",
                "/models/0/curves/0/terms/2/table | [1.50, \"by_system\"] | [0.5, 1] | must ascend",
                "/models/0/curves/0/terms/2/table/knots | [1.50, \"by_system\"] | [1.5] | not [radius",
                "/models/0/curves/0/terms/1/channels/l | \"l\": \"1..3\" | \"l\": \"one\" | write 2",
                "/groups/0 | \"sigma\": 0.02, | \"sigma\": 0, | sigma > 0",
                "/data/0 | \"sigma\": 0.0020, | \"sigma\": 0, | must be positive",
                "/data/0/sigma | \"sigma\": 0.0020, | \"sigma\": 0.0020, \"sigmaPlus\": 1, | stands beside",
                "/data/0/levels/0/j | \"j\": \"3/2\", \"index\": 0}, | \"j\": \"x\", \"index\": 0}, | a half such as",
                "/data/0/levels/0/index | \"j\": \"3/2\", \"index\": 0}, | \"j\": \"3/2\", \"index\": 0.5}, | whole number",
                "/data/0/levels/0 | {\"system\": \"light\", \"l\": 1, | {\"l\": 1, | several systems",
                "/data/1 | \"transform\": \"ratio\", | \"transform\": \"none\", \"unit\": \"eV\", | needs a denominator",
                "/views | \"from\": \"-5\" | \"from\": -5 | not an object of texts",
                "/units | \"units\": \"eV-nm\" | \"units\": [] | must be a text, not an array",
            })
    void wrongContentNamesPointerAndLine(String pointer, String old, String replacement, String words)
            throws IOException {
        String text = ProjectFileTest.sample("everything-1.wellwright");
        assertThat(text).contains(old);
        String sentence = fault(text.replace(old, replacement));
        assertThat(sentence).contains(" at " + pointer + ":").contains(words).containsPattern("line \\d+");
    }

    @Test
    void severalFaultsAreListedTogether() throws IOException {
        String text = ProjectFileTest.sample("everything-1.wellwright")
                .replace("\"value\": 1.440,", "\"value\": true,")
                .replace("\"sigma\": 0.0020,", "\"sigma\": -1,");
        ProjectFileException e = catchThrowableOfType(ProjectFileException.class, () -> ProjectFileTest.parse(text));
        assertThat(e.problems()).hasSize(2);
    }
}
