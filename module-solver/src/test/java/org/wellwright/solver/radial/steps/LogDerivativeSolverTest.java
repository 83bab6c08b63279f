package org.wellwright.solver.radial.steps;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.function.IntToDoubleFunction;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.ChannelTerm;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialChannel;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.spectral.SpectralElementSolver;

class LogDerivativeSolverTest {
    private static final LogDerivativeSolver SOLVER = new LogDerivativeSolver();
    private static final double EPSILON = Math.ulp(1.0);

    private static TermEvaluator formula(String text) {
        return FormulaText.parse(text).bind(new double[0], ChannelFacts.ofOrbital(0));
    }

    private static ChannelTerm term(int row, int column, String text) {
        return new ChannelTerm(row, column, formula(text));
    }

    private static RadialProblem coupled(
            double kinetic, List<RadialChannel> channels, String common, ChannelTerm... rest) {
        return new RadialProblem(kinetic, channels, formula(common), List.of(rest), 0, Double.POSITIVE_INFINITY);
    }

    private static void check(RadialProblem problem, double[] expected) {
        List<Level> levels = SOLVER.solve(problem, LevelSearch.first(expected.length), SolveMonitor.NONE)
                .levels();
        assertThat(levels).hasSize(expected.length);
        for (int i = 0; i < expected.length; i++) {
            Level level = levels.get(i);
            assertThat(level.energy()).as("level %d", i).isCloseTo(expected[i], within(4 * EPSILON * level.scale()));
            assertThat(Math.abs(level.energy() - expected[i])).isLessThanOrEqualTo(level.errorEstimate());
        }
    }

    private static double[] first(int count, IntToDoubleFunction... series) {
        return Stream.of(series)
                .flatMapToDouble(f -> IntStream.range(0, count).mapToDouble(f))
                .sorted()
                .limit(count)
                .toArray();
    }

    @ParameterizedTest
    @CsvSource({"0", "1", "3", "12"})
    void singleChannelsHaveTheirClosedForms(int l) {
        check(Problems.formula("-1/r", 0.5, l), first(15, n -> -0.5 / ((n + l + 1.0) * (n + l + 1.0))));
        check(Problems.formula("0.5*r^2", 0.5, l), first(15, n -> 2 * n + l + 1.5));
    }

    /** Channels of equal l that a rotation uncouples: the levels are those of both potentials together. */
    @Test
    void rotatedChannelsHaveTheLevelsOfBothPotentials() {
        List<RadialChannel> channels = List.of(RadialChannel.of(1), RadialChannel.of(1));
        // cos = 0.6, sin = 0.8: V = R diag(r²/2, 2r²) Rᵀ, then r²/2 and r²/2 + 3.3.
        RadialProblem strengths =
                coupled(0.5, channels, "0", term(0, 0, "1.46*r^2"), term(1, 1, "1.04*r^2"), term(0, 1, "-0.72*r^2"));
        check(strengths, first(16, n -> 2 * n + 2.5, n -> 4 * n + 5));
        RadialProblem constants =
                coupled(0.5, channels, "0.5*r^2", term(0, 0, "1.188"), term(1, 1, "2.112"), term(0, 1, "1.584"));
        check(constants, first(16, n -> 2 * n + 2.5, n -> 2 * n + 5.8));
    }

    @Test
    void twoChannelsBetweenWalls() {
        List<RadialChannel> channels = List.of(RadialChannel.of(0), RadialChannel.of(0));
        RadialProblem box = new RadialProblem(1, channels, formula("0"), List.of(term(0, 1, "2")), 1, 3);
        IntToDoubleFunction level = n -> Math.pow((n + 1) * Math.PI / 2, 2);
        check(box, first(14, n -> level.applyAsDouble(n) - 2, n -> level.applyAsDouble(n) + 2));
    }

    /**
     * The same critical strengths as in CountTest, in a channel that a second one of higher threshold does not touch.
     */
    @ParameterizedTest
    @CsvSource({"2.6840046509240915383, 1", "17.795699547133907188, 2"})
    void countsAtTheThresholdChangeAtTheCriticalStrength(double critical, int levels) {
        List<RadialChannel> channels = List.of(RadialChannel.of(0), new RadialChannel(2, 6, 1e3));
        for (int sign = -1; sign <= 1; sign += 2) {
            String well = "-%s*exp(-r^2)".formatted(critical * (1 + sign * 1e-11));
            assertThat(SOLVER.countBelow(coupled(1, channels, well), 0)).isEqualTo(sign < 0 ? levels - 1 : levels);
        }
    }

    static Stream<Arguments> coupledProblems() {
        RadialChannel s = RadialChannel.of(0);
        RadialChannel d = RadialChannel.of(2);
        return Stream.of(
                Arguments.of(
                        "S and D waves with a tensor shape",
                        coupled(
                                20.75,
                                List.of(s, d),
                                "-110*exp(-r^2/4)",
                                term(0, 1, "-20*r^2*exp(-r^2/3)"),
                                term(1, 1, "8*r^2*exp(-r^2/3)")),
                        2),
                Arguments.of(
                        "three channels with thresholds",
                        coupled(
                                0.5,
                                List.of(s, new RadialChannel(1, 2, 0.2), new RadialChannel(2, 6, 0.5)),
                                "-3*exp(-0.2*r)",
                                term(0, 1, "0.4*r*exp(-r)"),
                                term(1, 2, "0.5*exp(-0.5*r)"),
                                term(0, 2, "0.2*exp(-r)")),
                        12),
                Arguments.of(
                        "two molecular curves",
                        coupled(
                                1e-4,
                                List.of(s, new RadialChannel(2, 6, 0.05)),
                                "r^(-12)-2*r^(-6)",
                                term(0, 1, "0.1*r^2*exp(-r^2)")),
                        30),
                Arguments.of(
                        "Coulomb with a short-range coupling",
                        coupled(0.5, List.of(s, d), "-1/r", term(0, 1, "0.3*r^2*exp(-r)")),
                        14),
                Arguments.of(
                        "confined pair",
                        coupled(
                                0.4,
                                List.of(RadialChannel.of(1), RadialChannel.of(3)),
                                "-0.5/r + 0.2*r",
                                term(0, 1, "0.1*r*exp(-r/2)"),
                                term(0, 0, "-0.05*exp(-r)")),
                        16));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("coupledProblems")
    void agreesWithTheFirstMethod(String name, RadialProblem problem, int count) {
        SpectralElementSolver first = new SpectralElementSolver();
        List<Level> levels = SOLVER.solve(problem, LevelSearch.first(count), SolveMonitor.NONE)
                .levels();
        List<Level> bounds = first.solve(problem, LevelSearch.first(count), SolveMonitor.NONE)
                .levels();
        assertThat(levels).hasSameSizeAs(bounds).isNotEmpty();
        for (int i = 0; i < levels.size(); i++) {
            double slack = levels.get(i).errorEstimate();
            assertThat(levels.get(i).energy())
                    .as("level %d", i)
                    .isBetween(bounds.get(i).lower() - slack, bounds.get(i).upper() + slack);
        }
        double[] energies = levels.stream().mapToDouble(Level::energy).toArray();
        Random random = new Random(20240501);
        double lowest = energies[0];
        double top = energies[energies.length - 1];
        boolean full = "full".equals(System.getProperty("wellwright.campaign"));
        List<Double> asked = new ArrayList<>();
        random.doubles(full ? 400 : 25, lowest - 0.05 * Math.abs(lowest), top).forEach(asked::add);
        for (double level : energies) {
            asked.add(level * (1 - Math.signum(level) * 1e-11));
        }
        for (double energy : asked) {
            int expected =
                    (int) DoubleStream.of(energies).filter(e -> e < energy).count();
            assertThat(SOLVER.countBelow(problem, energy))
                    .as("second method at %s", energy)
                    .isEqualTo(expected);
            assertThat(first.countBelow(problem, energy))
                    .as("first method at %s", energy)
                    .isEqualTo(expected);
        }
    }

    @Test
    void refusesWhatHasNoAnswer() {
        List<RadialChannel> channels = List.of(RadialChannel.of(0), RadialChannel.of(2));
        assertThatExceptionOfType(InvalidModelException.class)
                .isThrownBy(() -> SOLVER.solve(
                        coupled(1, channels, "-exp(-r)", term(0, 1, "1/r^3")), LevelSearch.first(1), SolveMonitor.NONE))
                .withMessageContaining("regular at r = 0");
        assertThatExceptionOfType(InvalidModelException.class)
                .isThrownBy(() -> SOLVER.solve(
                        coupled(1, channels, "-1/r", term(0, 1, "exp(-r)")), LevelSearch.all(), SolveMonitor.NONE))
                .withMessageContaining("no end");
        assertThatExceptionOfType(InvalidModelException.class)
                .isThrownBy(() -> SOLVER.solve(
                        coupled(1, channels, "-1.5/r^2", term(0, 1, "exp(-r)")),
                        LevelSearch.first(1),
                        SolveMonitor.NONE))
                .withMessageContaining("centre")
                .withMessageContaining("l = 0");
    }
}
