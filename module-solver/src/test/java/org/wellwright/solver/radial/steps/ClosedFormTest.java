package org.wellwright.solver.radial.steps;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.IntToDoubleFunction;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

/** Levels with a closed form (Landau and Lifshitz 1977, §§ 33, 36; Flügge 1971), from every scale of n, l and κ. */
class ClosedFormTest {
    private static final PerturbedStepSolver SOLVER = new PerturbedStepSolver();
    private static final double EPSILON = Math.ulp(1.0);

    /** Within 4 eps of ⟨T⟩ + ⟨|V|⟩ and within the level's own estimate. */
    private static void check(RadialProblem problem, int count, IntToDoubleFunction exact) {
        Spectrum spectrum = SOLVER.solve(problem, LevelSearch.first(count), SolveMonitor.NONE);
        assertThat(spectrum.levels()).hasSize(count);
        for (Level level : spectrum.levels()) {
            double expected = exact.applyAsDouble(level.index());
            assertThat(level.energy())
                    .as("level %d", level.index())
                    .isCloseTo(expected, within(4 * EPSILON * Math.max(level.scale(), Math.abs(expected))));
            assertThat(Math.abs(level.energy() - expected)).isLessThanOrEqualTo(level.errorEstimate());
        }
        assertThat(spectrum.searchedBelow()).isGreaterThan(exact.applyAsDouble(count - 1));
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2, 3, 10, 50, 200})
    void coulomb(int l) {
        check(Problems.formula("-1/r", 0.5, l), 30, n -> -0.5 / ((n + l + 1.0) * (n + l + 1.0)));
    }

    @Test
    void coulombToTheHundredthShell() {
        check(Problems.formula("-1/r", 0.5, 0), 100, n -> -0.5 / ((n + 1.0) * (n + 1.0)));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-12, 1e-5, 1e-3, 1e3, 1e6, 1e12})
    void coulombOfAnyMass(double kinetic) {
        check(Problems.formula("-1/r", kinetic, 1), 20, n -> -0.25 / kinetic / ((n + 2.0) * (n + 2.0)));
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 3, 10, 50, 200})
    void oscillator(int l) {
        check(Problems.formula("0.5*r^2", 0.5, l), 31, n -> 2 * n + l + 1.5);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-10, 1e-4, 1e4, 1e10})
    void oscillatorOfAnyMass(double kinetic) {
        check(Problems.formula("r^2", kinetic, 2), 12, n -> Math.sqrt(kinetic) * (4 * n + 7));
    }

    /** On r > 0 Morse's formula for the whole line holds to e^{−2S} where V(0) is out of reach: here beyond 1e-40. */
    @Test
    void morse() {
        double range = 0.711248;
        check(
                Problems.formula("188.4355*(exp(-2*0.711248*(r-20)) - 2*exp(-0.711248*(r-20)))", 1, 0),
                19,
                n -> -square(Math.sqrt(188.4355) - range * (n + 0.5)));
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 5, 40})
    void kratzer(int l) {
        check(
                Problems.formula("-20*(1.5/r - 1.125/r^2)", 0.5, l),
                12,
                n -> -450 / square(n + 0.5 + Math.sqrt(square(l + 0.5) + 45)));
    }

    /** s − ½ = √(¼ + λ + c/κ), from just above 0 to 60; no level of c/r² − 1/r depends on l and c apart. */
    @ParameterizedTest
    @ValueSource(doubles = {0.5001, 0.51, 0.6, 0.75, 1.2, 1.5, 3.3, 17.7, 60.4})
    void inverseSquareCores(double s) {
        TermEvaluator core = org.wellwright.solver.potential.FormulaText.parse("c/r^2 - 1/r")
                .bind(new double[] {s * (s - 1)}, org.wellwright.solver.potential.ChannelFacts.ofOrbital(0));
        Spectrum spectrum = SOLVER.solve(RadialProblem.single(1, 0, core), LevelSearch.first(15), SolveMonitor.NONE);
        // The closed form itself amplifies the rounding of c: s = ½ + √(¼ + c), so that ds = eps |c|/(2s − 1).
        double given = 0.5 + Math.sqrt(0.25 + s * (s - 1));
        for (Level level : spectrum.levels()) {
            double n = level.index() + given;
            double rounding = 2 * EPSILON * (0.25 + Math.abs(s * (s - 1))) / (2 * s - 1) * 0.5 / (n * n * n);
            assertThat(level.energy()).isCloseTo(-0.25 / (n * n), within(4 * EPSILON * level.scale() + rounding));
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 4})
    void pseudoharmonic(int l) {
        double w = 4 / 1.4;
        check(
                Problems.formula("8*(r/1.4 - 1.4/r)^2", 0.5, l),
                12,
                n -> -16 + w / 2 * (4 * n + 2 + 2 * Math.sqrt(square(l + 0.5) + 16 * 1.4 * 1.4)));
    }

    /** Zeros of the spherical Bessel functions, Abramowitz and Stegun (1964), table 10.6, recomputed to 25 digits. */
    @ParameterizedTest
    @CsvSource({
        "1, 0, 4.49340945790906417530788093",
        "1, 1, 7.72525183693770716419506893",
        "3, 0, 6.98793200050051995901533339",
        "10, 0, 15.0334693037434380643607353"
    })
    void sphericalBox(int l, int index, double zero) {
        RadialProblem box = Problems.walled(Problems.shell(0, 0, 1), 2, l, 0, 2.5);
        Level level = SOLVER.solve(box, LevelSearch.first(index + 1), SolveMonitor.NONE)
                .levels()
                .get(index);
        double expected = 2 * square(zero / 2.5);
        assertThat(level.energy()).isCloseTo(expected, within(4 * EPSILON * level.scale()));
    }

    @Test
    void boxBetweenTwoWalls() {
        RadialProblem box = Problems.walled(Problems.shell(0, 0, 1), 1, 0, 3, 5);
        check(box, 40, n -> square((n + 1) * Math.PI / 2));
    }

    /** k j_{l−1}(kR) k_l(qR) + q k_{l−1}(qR) j_l(kR) = 0 with κ = 1, R = 1, solved to 30 digits. */
    @ParameterizedTest
    @CsvSource({
        "50, 0, 0, -42.47490376021918615185",
        "50, 0, 1, -20.71411100143330834833",
        "50, 1, 0, -34.70330598969830493185",
        "100, 1, 1, -51.57434349633855864376",
        "100, 3, 0, -60.07041653892492718628"
    })
    void squareWell(double depth, int l, int index, double expected) {
        RadialProblem well = RadialProblem.single(1, l, Problems.shell(-depth, 0, 1));
        Level level = SOLVER.solve(well, LevelSearch.first(index + 1), SolveMonitor.NONE)
                .levels()
                .get(index);
        assertThat(level.energy()).isCloseTo(expected, within(4 * EPSILON * depth));
    }

    /** An edge that the potential does not declare costs accuracy and the estimate says so. */
    @Test
    void squareWellWithAHiddenEdge() {
        RadialProblem well = RadialProblem.single(1, 3, Problems.unknown(r -> r < 1 ? -100 : 0));
        Level level = SOLVER.solve(well, LevelSearch.first(1), SolveMonitor.NONE)
                .levels()
                .get(0);
        double error = Math.abs(level.energy() + 60.07041653892492718628);
        assertThat(error).isLessThan(1e-8).isLessThanOrEqualTo(level.errorEstimate());
    }

    /** What the formula declares about its ends is a help, not a need. */
    @ParameterizedTest
    @MethodSource("undeclared")
    void endsAreFoundWhereTheyAreNotDeclared(TermEvaluator v, int l, IntToDoubleFunction exact) {
        check(RadialProblem.single(0.5, l, v), 15, exact);
    }

    static Stream<Arguments> undeclared() {
        return Stream.of(
                Arguments.of(Problems.unknown(r -> -1 / r), 0, (IntToDoubleFunction) n -> -0.5 / square(n + 1)),
                Arguments.of(Problems.unknown(r -> -1 / r), 4, (IntToDoubleFunction) n -> -0.5 / square(n + 5)),
                Arguments.of(Problems.unknown(r -> 0.5 * r * r), 1, (IntToDoubleFunction) n -> 2 * n + 2.5));
    }

    private static double square(double x) {
        return x * x;
    }
}
