package org.wellwright.solver.radial.steps;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.radial.spectral.SpectralElementSolver;

/**
 * Two methods that share nothing but the potential: their levels agree within their bounds, and their counts at random
 * energies outside the rounding of a level.
 */
class AgreementTest {
    private static final boolean FULL = "full".equals(System.getProperty("wellwright.campaign"));
    /** Energies over all potentials together. */
    private static final int ENERGIES = FULL ? 50_000 : 3_000;

    private static final PerturbedStepSolver STEPS = new PerturbedStepSolver();
    private static final SpectralElementSolver SPECTRAL = new SpectralElementSolver();

    static Stream<Arguments> potentials() {
        return Stream.of(
                Arguments.of("-1/r", 0.5, 0, 40),
                Arguments.of("-1/r", 0.5, 25, 20),
                Arguments.of("-2.5*exp(-0.05*r)/r", 0.5, 1, 10),
                Arguments.of("0.5*r^2", 0.5, 2, 25),
                Arguments.of("r^4 - 12*r^2", 1, 0, 20),
                Arguments.of("-0.52/r + r/5.4756", 0.5, 1, 20),
                Arguments.of("log(r)", 1, 0, 20),
                Arguments.of("r^0.1", 0.4, 3, 12),
                Arguments.of("r^(-12) - 2*r^(-6)", 1e-4, 0, 24),
                Arguments.of("r^(-12) - 2*r^(-6)", 1e-4, 30, 18),
                Arguments.of("188.4355*(exp(-2*0.711248*(r-1.9975)) - 2*exp(-0.711248*(r-1.9975)))", 1, 0, 19),
                Arguments.of("-50/(1+exp((r-7)/0.6))", 1, 4, 12),
                Arguments.of("-400*exp(-r^2)", 1, 0, 9),
                Arguments.of("20*(exp(-2*(r-0.6)) - 2*exp(-(r-0.6)))", 1, 0, 4),
                Arguments.of("(-1+5*exp(-2*r))/r", 1, 1, 15),
                Arguments.of("-0.24/r^2 - 1/r", 1, 0, 15),
                Arguments.of("3/r^2 - 4/sqrt(r)", 0.7, 0, 12),
                Arguments.of("-2^0.8*r^(-1.5)", 0.5, 1, 12),
                Arguments.of("40*((r-12)^2-36)^2/36", 1, 0, 12),
                Arguments.of("-30*exp(-(r-2)^2) - 30*exp(-(r-6)^2/2) + 4*exp(-(r-4)^2)", 1, 1, 8));
    }

    @ParameterizedTest(name = "{0}, l = {2}")
    @MethodSource("potentials")
    void levelsAndCountsAgree(String formula, double kinetic, int l, int count) {
        RadialProblem problem = Problems.formula(formula, kinetic, l);
        Spectrum primary = SPECTRAL.solve(problem, LevelSearch.first(count), SolveMonitor.NONE);
        List<Level> levels = STEPS.solve(problem, LevelSearch.first(count), SolveMonitor.NONE)
                .levels();
        assertThat(levels).hasSameSizeAs(primary.levels()).isNotEmpty();
        for (int i = 0; i < levels.size(); i++) {
            Level bound = primary.levels().get(i);
            Level other = levels.get(i);
            assertThat(other.energy())
                    .as("level %d", i)
                    .isBetween(bound.lower() - other.errorEstimate(), bound.upper() + other.errorEstimate());
        }
        Random random = new Random(formula.hashCode() * 31L + l);
        double lowest = levels.get(0).energy();
        double top = levels.get(levels.size() - 1).energy();
        int asked = 0;
        for (int i = 0; i < ENERGIES / 20; i++) {
            double energy = energy(random, levels, lowest, top);
            if (levels.stream().anyMatch(level -> Math.abs(level.energy() - energy) <= 1e-13 * level.scale())) {
                continue;
            }
            long expected =
                    levels.stream().filter(level -> level.energy() < energy).count();
            assertThat(STEPS.countBelow(problem, energy))
                    .as("second method at %s", energy)
                    .isEqualTo((int) expected);
            assertThat(SPECTRAL.countBelow(problem, energy))
                    .as("first method at %s", energy)
                    .isEqualTo((int) expected);
            asked++;
        }
        assertThat(asked).isGreaterThan(ENERGIES / 40);
    }

    /** Half of the energies anywhere below the highest level, half close to a level. */
    private static double energy(Random random, List<Level> levels, double lowest, double top) {
        if (random.nextBoolean()) {
            return lowest + (top - lowest) * (1.05 * random.nextDouble() - 0.05);
        }
        Level near = levels.get(random.nextInt(levels.size() - 1));
        double distance = near.scale() * Math.pow(10, -3 - 10 * random.nextDouble());
        return Math.min(top, near.energy() + (random.nextBoolean() ? distance : -distance));
    }
}
