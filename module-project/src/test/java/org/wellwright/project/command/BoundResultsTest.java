package org.wellwright.project.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wellwright.project.file.Json;
import org.wellwright.project.file.JsonValue;
import org.wellwright.project.file.JsonValue.JsonArray;
import org.wellwright.project.file.JsonValue.JsonNumber;
import org.wellwright.project.file.JsonValue.JsonObject;
import org.wellwright.project.file.JsonValue.JsonText;
import org.wellwright.solver.Problem;
import org.wellwright.solver.SolverException;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.MissingLevel;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.service.SolveRequest;
import org.wellwright.solver.service.SolverService;

/** What {@code bound} prints, held against closed forms. */
class BoundResultsTest {
    private static JsonObject json(String... arguments) {
        CommandRun run = CommandRun.of(arguments);
        assertThat(run.status()).as(run.err()).isZero();
        return (JsonObject) Json.parse(run.out(), "output");
    }

    private static List<JsonValue> list(JsonObject object, String key) {
        return ((JsonArray) object.members().get(key)).items();
    }

    private static double number(JsonValue object, String key) {
        return Double.parseDouble(((JsonNumber) ((JsonObject) object).members().get(key)).text());
    }

    private static String text(JsonValue object, String key) {
        return ((JsonText) ((JsonObject) object).members().get(key)).value();
    }

    private static void holds(JsonValue level, double exact, double relative) {
        assertThat(number(level, "energy"))
                .isCloseTo(exact, org.assertj.core.data.Offset.offset(Math.abs(exact) * relative));
        // The closed form itself is rounded to a double.
        double rounding = Math.ulp(exact);
        assertThat(number(level, "lower")).isLessThanOrEqualTo(exact + rounding);
        assertThat(number(level, "upper")).isGreaterThanOrEqualTo(exact - rounding);
    }

    /** E = −1/2n² (Schrödinger 1926), n = n_r + l + 1. */
    @Test
    void coulombLevelsWithBoundsAndCounts() {
        JsonObject result = json(
                "bound", "--formula", "-1/r", "--kinetic", "0.5", "--l", "0..3", "--count", "5", "--format", "json");
        assertThat(list(result, "levels")).hasSize(20);
        for (JsonValue level : list(result, "levels")) {
            double n = number(level, "radialNodes") + number(level, "l") + 1;
            holds(level, -0.5 / (n * n), 1e-13);
        }
        assertThat(list(result, "channels")).hasSize(4).allSatisfy(channel -> {
            assertThat(text(channel, "complete")).isIn("counted", "proved");
            assertThat(number(channel, "threshold")).isZero();
        });
    }

    /** E = 2 n_r + l + 3/2 (isotropic oscillator). */
    @Test
    void oscillatorLevelsHaveNoThreshold() {
        JsonObject result =
                json("bound", "--formula=0.5*r^2", "--kinetic=0.5", "--l=0..2", "--count=4", "--format=json");
        for (JsonValue level : list(result, "levels")) {
            holds(level, 2 * number(level, "radialNodes") + number(level, "l") + 1.5, 1e-13);
        }
        assertThat(list(result, "channels"))
                .allSatisfy(
                        channel -> assertThat(((JsonObject) channel).members().get("threshold"))
                                .isEqualTo(JsonValue.JsonLiteral.NULL));
    }

    /** The levels scale with μ/m_e = 1/(1 + m_e/m_p); m_p/m_e = 1836.152 673 426 (CODATA 2022). */
    @Test
    void aPairOfTheCatalogueGivesReducedMassValues() {
        JsonObject result = json(
                "bound",
                "--formula",
                "-1/r",
                "--pair",
                "e-,p",
                "--units",
                "atomic",
                "--count",
                "2",
                "--format",
                "json");
        double mass = 1 / (1 + 1 / 1836.152673426);
        holds(list(result, "levels").get(0), -0.5 * mass, 1e-13);
        assertThat(text(result.members().get("units"), "energy")).isEqualTo("hartree");
        assertThat(text(result.members().get("units"), "length")).isEqualTo("bohr");
        JsonObject same = json(
                "bound",
                "--formula",
                "-1/r",
                "--reduced-mass",
                Double.toString(mass),
                "--units",
                "atomic",
                "--count",
                "1",
                "--format",
                "json");
        holds(list(same, "levels").get(0), -0.5 * mass, 1e-13);
    }

    @Test
    void theRangeCutsTheFormulaOff() {
        // A square well of depth 8 and radius 1 with ħ²/2μ = ½ binds one s level and one p level (π/2 < √16 < 3π/2).
        JsonObject result = json(
                "bound", "--formula", "-8", "--kinetic", "0.5", "--range", "0,1", "--l", "0..3", "--format", "json");
        assertThat(list(result, "levels")).hasSize(2);
    }

    @Test
    void tableAndCsvHoldTheSameLevels() {
        CommandRun table =
                CommandRun.of("bound", "--formula", "-a/r", "--set", "a=1", "--kinetic", "0.5", "--count", "2");
        assertThat(table.out()).contains("-0.5000000").contains("two-sided").contains("n_r");
        CommandRun csv = CommandRun.of(
                "bound", "--formula", "-a/r", "--set=a=1", "--kinetic", "0.5", "--count", "2", "--format", "csv");
        assertThat(csv.out().lines())
                .hasSize(3)
                .first()
                .asString()
                .isEqualTo("l,J,index,energy,lower,upper,boundKind,width,complete,energyUnit");
    }

    @Test
    void noBoundLevelIsAnAnswer() {
        CommandRun run = CommandRun.of("bound", "--formula", "exp(-r)", "--kinetic", "0.5", "--format", "json");
        assertThat(run.status()).isZero();
        assertThat(run.err()).contains("no bound level");
        assertThat(list((JsonObject) Json.parse(run.out(), "output"), "levels")).isEmpty();
    }

    @Test
    void endlessSeriesAndFallsToTheCentreAreRefused() {
        CommandRun endless = CommandRun.of("bound", "--formula", "-1/r", "--kinetic", "0.5");
        assertThat(endless.status()).isEqualTo(2);
        assertThat(endless.err()).contains("has no end").contains("how many levels");
        CommandRun fall =
                CommandRun.of("bound", "--formula", "-1/r^2", "--kinetic", "0.5", "--l", "0..3", "--count", "1");
        assertThat(fall.status()).isEqualTo(2);
        assertThat(fall.err()).contains("l = 0");
    }

    @Test
    void aResultGoesToAFile(@TempDir Path folder) throws IOException {
        Path file = folder.resolve("levels.json");
        CommandRun run = CommandRun.of(
                "bound",
                "--formula",
                "-1/r",
                "--kinetic",
                "0.5",
                "--count",
                "1",
                "--format",
                "json",
                "-o",
                file.toString());
        assertThat(run.status()).isZero();
        assertThat(run.out()).isEmpty();
        assertThat(Files.readString(file)).contains("\"levels\"");
        Files.delete(file);
        CommandRun.of("bound", "--formula", "-1//r", "--kinetic", "0.5", "-o", file.toString());
        assertThat(file).doesNotExist();
    }

    /** A solver that finds nothing, or disputes. */
    private record StubSolver(boolean disputes) implements SolverService {
        @Override
        public String id() {
            return "stub";
        }

        @Override
        public String displayName() {
            return "stub";
        }

        @Override
        public String version() {
            return "0";
        }

        @Override
        public Spectrum solve(SolveRequest request, SolveMonitor monitor) {
            if (disputes) {
                throw new SolverException("the second method differs by 3e-9", "l = 0, n_r = 2", "split the term");
            }
            return new Spectrum(
                    request.problem(),
                    request.search(),
                    List.of(new MissingLevel(0, new Problem("not resolved", "l = 0, n_r = 0", "ask for less"))),
                    List.of(),
                    Completeness.NO,
                    -1,
                    "one level is missing",
                    new Spectrum.Effort(1, 1, 1));
        }

        @Override
        public List<Spectrum> solveAll(List<SolveRequest> requests, SolveMonitor monitor) {
            return requests.stream().map(request -> solve(request, monitor)).toList();
        }
    }

    @Test
    void whatTheScienceCannotSayIsStatusOne() {
        BoundCommand command = new BoundCommand(() -> new StubSolver(false));
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        Console console = new Console(
                new PrintStream(out, true, StandardCharsets.UTF_8), new PrintStream(err, true, StandardCharsets.UTF_8));
        Input input =
                command.syntax().parse(new String[] {"--formula", "-1/r", "--kinetic", "0.5", "--format", "json"});
        assertThat(command.run(input, console)).isEqualTo(1);
        assertThat(err.toString(StandardCharsets.UTF_8))
                .contains("not resolved")
                .contains("one level is missing");
        assertThat(out.toString(StandardCharsets.UTF_8)).contains("\"complete\": \"no\"");
        org.assertj.core.api.Assertions.assertThatThrownBy(
                        () -> new BoundCommand(() -> new StubSolver(true)).run(input, console))
                .isInstanceOf(SolverException.class);
    }
}
