package org.wellwright.project.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wellwright.project.file.Json;
import org.wellwright.project.file.JsonValue.JsonArray;
import org.wellwright.project.file.JsonValue.JsonNumber;
import org.wellwright.project.file.JsonValue.JsonObject;
import org.wellwright.project.file.JsonValue.JsonText;

/**
 * The commands that read a project: results on a problem with a closed form, and faults that change nothing on disk.
 */
class ProjectCommandsTest {
    /**
     * Levels of −a/r in atomic units of an infinitely heavy centre, E = −a²/2n² (closed form), without noise for a =
     * 1.25.
     */
    private static final String COULOMB = """
            {"format": "wellwright-project", "version": 1, "units": "atomic",
             "systems": [{"id": "x", "first": {"label": "light", "mass": {"value": 1, "unit": "m_e"}},
                          "second": {"label": "heavy", "mass": {"value": 1e15, "unit": "m_e"}}}],
             "parameters": [{"name": "a", "unit": "hartree bohr", "value": 1.1, "free": true}],
             "models": [{"name": "coulomb", "curves": [{"terms": [{"formula": "-a/r"}]}]}],
             "data": [
               {"id": "1s", "levels": [{"l": 0, "index": 0}], "value": -0.78125, "unit": "hartree", "sigma": 0.001},
               {"id": "2p", "levels": [{"l": 1, "index": 0}], "value": -0.1953125, "unit": "hartree", "sigma": 0.001},
               {"id": "3d-2p", "levels": [{"l": 2, "index": 0}, {"coefficient": -1, "l": 1, "index": 0}],
                "value": 0.10850694444444445, "unit": "hartree", "sigma": 0.001}]}
            """;

    @TempDir
    Path folder;

    private Path file;

    @BeforeEach
    void write() throws IOException {
        file = folder.resolve("coulomb.wellwright");
        Files.writeString(file, COULOMB);
    }

    private static JsonObject json(CommandRun run) {
        assertThat(run.status()).as(run.err()).isZero();
        return (JsonObject) Json.parse(run.out(), "output");
    }

    private static JsonObject item(JsonObject object, String list, int index) {
        return (JsonObject) ((JsonArray) object.members().get(list)).items().get(index);
    }

    private static double number(JsonObject object, String key) {
        return Double.parseDouble(((JsonNumber) object.members().get(key)).text());
    }

    private static String text(JsonObject object, String key) {
        return ((JsonText) object.members().get(key)).value();
    }

    /** Name and content of every file in the folder. */
    private Map<String, String> disk() throws IOException {
        Map<String, String> content = new TreeMap<>();
        try (Stream<Path> files = Files.list(folder)) {
            for (Path path : files.toList()) {
                byte[] bytes = Files.isDirectory(path) ? new byte[0] : Files.readAllBytes(path);
                content.put(
                        path.getFileName().toString(),
                        java.util.Base64.getEncoder().encodeToString(bytes));
            }
        }
        return content;
    }

    @Test
    void fitFindsTheParameterOfDataWithoutNoise() {
        JsonObject fit = json(CommandRun.of("fit", file.toString(), "--format", "json"));
        JsonObject parameter = item(fit, "parameters", 0);
        assertThat(text(parameter, "name")).isEqualTo("a");
        assertThat(text(parameter, "unit")).isEqualTo("hartree bohr");
        assertThat(number(parameter, "value")).isCloseTo(1.25, org.assertj.core.data.Offset.offset(1.25e-9));
        // dE/da = 2E/a, so 1/σ² = Σ (2E_k/a)²/0.001² over the three data.
        double sum = Math.pow(2 * 0.78125 / 1.25, 2)
                + Math.pow(2 * 0.1953125 / 1.25, 2)
                + Math.pow(2 * 0.10850694444444445 / 1.25, 2);
        assertThat(number(parameter, "sigma"))
                .isCloseTo(0.001 / Math.sqrt(sum), org.assertj.core.data.Percentage.withPercentage(0.001));
    }

    @Test
    void solveNamesModelCurveSystemAndUnits() {
        JsonObject solved =
                json(CommandRun.of("solve", file.toString(), "--l", "1", "--count", "2", "--format", "json"));
        JsonObject level = item(solved, "levels", 1);
        assertThat(text(level, "model")).isEqualTo("coulomb");
        assertThat(text(level, "system")).isEqualTo("x");
        assertThat(text(level, "label")).isEqualTo("3p");
        assertThat(number(level, "energy")).isCloseTo(-1.1 * 1.1 / 18, org.assertj.core.data.Offset.offset(1e-12));
        assertThat(text((JsonObject) solved.members().get("units"), "energy")).isEqualTo("hartree");
    }

    @Test
    void compareGivesResidualsInSigma() {
        JsonObject compared = json(CommandRun.of("compare", file.toString(), "--format", "json"));
        JsonObject row = item(item(compared, "models", 0), "rows", 0);
        assertThat(number(row, "residual"))
                .isCloseTo((-0.78125 + 1.1 * 1.1 / 2) / 0.001, org.assertj.core.data.Offset.offset(1e-6));
    }

    @Test
    void withoutWriteNothingOnDiskChanges() throws IOException {
        Map<String, String> before = disk();
        for (String command : new String[] {"validate", "solve", "compare", "fit"}) {
            assertThat(CommandRun.of(command, file.toString()).status()).isZero();
        }
        assertThat(disk()).isEqualTo(before);
    }

    @Test
    void importShowsAndThenAddsData() throws IOException {
        Path table = folder.resolve("new.csv");
        Files.writeString(table, "level,measured,unc\n4f,-0.0488,0.0002\n3p - 2s,0.1085,0.0003\n");
        Map<String, String> before = disk();
        CommandRun shown = CommandRun.of(
                "import", file.toString(), table.toString(), "--columns", "levels=1,value=measured,sigma=3");
        assertThat(shown.status()).as(shown.err()).isZero();
        assertThat(shown.out()).contains("4f").contains("3p - 2s").contains("-0.0488");
        assertThat(disk()).isEqualTo(before);
        CommandRun added = CommandRun.of("import", file.toString(), table.toString(), "--write");
        assertThat(added.status()).as(added.err()).isZero();
        assertThat(CommandRun.of("validate", file.toString()).out()).contains("5 data");
    }

    @Test
    void aFaultyTableAddsNothingAndNamesEveryRow() throws IOException {
        Path table = folder.resolve("new.csv");
        Files.writeString(table, "levels,value,sigma\n4f,-0.0488,0\n9x,1,1\n2s,-0.19,0.1\n");
        Map<String, String> before = disk();
        CommandRun run = CommandRun.of("import", file.toString(), table.toString(), "--write");
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.err().lines())
                .hasSize(2)
                .allSatisfy(line -> assertThat(line).contains("new.csv line "));
        assertThat(disk()).isEqualTo(before);
    }

    @ParameterizedTest
    @ValueSource(strings = {"solve", "compare", "fit", "validate"})
    void brokenFilesGiveOneLineAndStatusTwo(String command) throws IOException {
        byte[] noise = new byte[500];
        new Random(1).nextBytes(noise);
        Map<String, byte[]> broken = Map.of(
                "empty", new byte[0],
                "truncated", COULOMB.substring(0, 300).getBytes(java.nio.charset.StandardCharsets.UTF_8),
                "noise", noise,
                "nested", "[".repeat(200_000).getBytes(java.nio.charset.StandardCharsets.UTF_8),
                "future",
                        COULOMB.replace("\"version\": 1", "\"version\": 9")
                                .getBytes(java.nio.charset.StandardCharsets.UTF_8),
                "type",
                        COULOMB.replace("\"value\": 1.1", "\"value\": []")
                                .getBytes(java.nio.charset.StandardCharsets.UTF_8),
                "cyclic",
                        COULOMB.replace(
                                        "\"value\": 1.1, \"free\": true}",
                                        "\"tied\": \"b\"}, {\"name\": \"b\", \"tied\": \"2*a\"}")
                                .getBytes(java.nio.charset.StandardCharsets.UTF_8),
                "sigma",
                        COULOMB.replace(
                                        "-0.78125, \"unit\": \"hartree\", \"sigma\": 0.001",
                                        "-0.78125, \"unit\": \"hartree\"")
                                .getBytes(java.nio.charset.StandardCharsets.UTF_8),
                "zero",
                        COULOMB.replace(
                                        "-0.78125, \"unit\": \"hartree\", \"sigma\": 0.001",
                                        "-0.78125, \"unit\": \"hartree\", \"sigma\": 0")
                                .getBytes(java.nio.charset.StandardCharsets.UTF_8),
                "formula", COULOMB.replace("\"-a/r\"", "\"-a//r\"").getBytes(java.nio.charset.StandardCharsets.UTF_8));
        for (Map.Entry<String, byte[]> entry : broken.entrySet()) {
            Files.write(file, entry.getValue());
            Map<String, String> before = disk();
            String[] arguments = command.equals("fit")
                    ? new String[] {command, file.toString(), "--write"}
                    : new String[] {command, file.toString()};
            CommandRun run = CommandRun.of(arguments);
            assertThat(run.status()).as(entry.getKey() + ": " + run.err()).isEqualTo(2);
            assertThat(run.out()).isEmpty();
            assertThat(run.err().lines())
                    .as(entry.getKey())
                    .isNotEmpty()
                    .allSatisfy(line -> assertThat(line).contains("coulomb.wellwright"));
            assertThat(run.err()).as(entry.getKey()).doesNotContain("\tat ");
            assertThat(disk()).as(entry.getKey()).isEqualTo(before);
        }
        assertThat(CommandRun.of(command, folder.resolve("none").toString()).err())
                .contains("there is no such file");
    }

    @Test
    void aFitThatCannotBeKnownSaysWhatToAdd() throws IOException {
        Files.writeString(
                file,
                COULOMB.replace(
                                "\"free\": true}",
                                "\"free\": true}, {\"name\": \"b\", \"unit\": \"hartree\", \"value\": 0, \"free\": true},"
                                        + " {\"name\": \"c\", \"unit\": \"1/bohr\", \"value\": 1, \"free\": true}, {\"name\": \"d\", \"unit\": \"hartree/bohr\", \"value\": 0, \"free\": true}")
                        .replace("\"-a/r\"", "\"-a/r + b*exp(-c*r) + d*r*exp(-r/c)\""));
        Map<String, String> before = disk();
        CommandRun run = CommandRun.of("fit", file.toString(), "--write");
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.err()).containsAnyOf("add", "fix", "prior");
        assertThat(disk()).isEqualTo(before);
    }

    @Test
    void aDatumThatNamesAMissingLevelIsRefusedByTheFit() throws IOException {
        Files.writeString(
                file, COULOMB.replace("\"-a/r\"", "\"-a*exp(-r^2)\"").replace("\"hartree bohr\"", "\"hartree\""));
        Map<String, String> before = disk();
        CommandRun run = CommandRun.of("fit", file.toString(), "--write");
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.err()).contains("1s");
        assertThat(disk()).isEqualTo(before);
    }

    @Test
    void reportSaysWhichFiguresAreMissingWhereNoneIsInstalled() throws IOException {
        Path target = folder.resolve("report");
        CommandRun run = CommandRun.of("report", file.toString(), "-o", target.toString());
        assertThat(run.status()).as(run.err()).isZero();
        assertThat(run.out()).contains("coulomb").contains("±");
        String page = Files.readString(target.resolve("report.html"));
        assertThat(page)
                .contains("Missing figure, level diagram: the module that draws it is not installed")
                .contains("Missing figure, density")
                .contains("Fitted parameters", "Which model holds", "To make it again", "CODATA 2022")
                .doesNotContain("http://", "https://", "<script");
        for (String table : new String[] {"data", "ranking", "residuals", "parameters", "covariance", "predictions"}) {
            assertThat(Files.readString(target.resolve(table + ".csv")))
                    .as(table)
                    .contains("\r\n");
        }
        CommandRun figure = CommandRun.of(
                "figure",
                file.toString(),
                "levels",
                "-o",
                folder.resolve("x.svg").toString());
        assertThat(figure.status()).isEqualTo(2);
        assertThat(figure.err()).contains("no figure is installed");
    }

    @Test
    void textFromTheProjectIsEscapedInTheReport() throws IOException {
        Files.writeString(
                file,
                COULOMB.replace("\"units\"", "\"title\": \"<b>&\\\"\", \"notes\": \"<script>x</script>\", \"units\""));
        CommandRun.of("report", file.toString(), "-o", folder.resolve("r").toString());
        assertThat(Files.readString(folder.resolve("r").resolve("report.html")))
                .contains("<title>&lt;b&gt;&amp;&quot;</title>")
                .doesNotContain("<script>");
    }

    @Test
    void anUnknownModelIsCorrected() {
        assertThat(CommandRun.of("fit", file.toString(), "--model", "colomb").err())
                .contains("did you mean coulomb");
    }
}
