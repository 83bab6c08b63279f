package org.wellwright.solver.radial.steps;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

class CountTest {
    private static final PerturbedStepSolver SOLVER = new PerturbedStepSolver();

    @Test
    void coulombCountsAreExactAtRandomEnergies() {
        Random random = new Random(20240501);
        for (int i = 0; i < 400; i++) {
            int l = random.nextInt(20);
            double n = l + 1 + 40 * random.nextDouble();
            int expected = (int) Math.ceil(n) - l - 1;
            assertThat(SOLVER.countBelow(Problems.formula("-1/r", 0.5, l), -0.5 / (n * n)))
                    .as("l = %d, n = %s", l, n)
                    .isEqualTo(expected);
        }
    }

    @Test
    void countsChangeAtTheLevelItself() {
        for (int l = 0; l < 5; l++) {
            RadialProblem problem = Problems.formula("0.5*r^2", 0.5, l);
            for (int n = 0; n < 20; n++) {
                double level = 2 * n + l + 1.5;
                assertThat(SOLVER.countBelow(problem, level * (1 - 1e-13))).isEqualTo(n);
                assertThat(SOLVER.countBelow(problem, level * (1 + 1e-13))).isEqualTo(n + 1);
            }
        }
    }

    /** Strength at which a level reaches the threshold; recomputed to 20 digits elsewhere by shooting at E = 0. */
    @ParameterizedTest(name = "{0}")
    @CsvSource({
        "3d screened Coulomb, -exp(-d*r)/r, 0.5, 2, 0.091345120771732184928, 1, -1",
        "3p screened Coulomb, -exp(-d*r)/r, 0.5, 1, 0.11271049835952494497, 2, -1",
        "3s screened Coulomb, -exp(-d*r)/r, 0.5, 0, 0.13945029406417801388, 3, -1",
        "4s screened Coulomb, -exp(-d*r)/r, 0.5, 0, 0.078828110273171565170, 4, -1",
        "2p Hulthen, -d/(exp(d*r)-1), 0.5, 1, 0.37693599609354549111, 1, -1",
        "3d Hulthen, -d/(exp(d*r)-1), 0.5, 2, 0.15766196117877842550, 1, -1",
        "first in a Gaussian, -d*exp(-r^2), 1, 0, 2.6840046509240915383, 1, 1",
        "second in a Gaussian, -d*exp(-r^2), 1, 0, 17.795699547133907188, 2, 1",
        "first in an exponential, -d*exp(-r), 1, 0, 1.44579649073669613029899394, 1, 1"
    })
    void countsAtTheThresholdChangeAtTheCriticalStrength(
            String name, String formula, double kinetic, int l, double critical, int levels, int sign) {
        double bound = critical * (1 + sign * 1e-12);
        double unbound = critical * (1 - sign * 1e-12);
        String text = formula.replace("d*", "(%s)*").replace("-d/", "-(%s)/").replace("%s", "D");
        assertThat(SOLVER.countBelow(Problems.formula(text.replace("D", Double.toString(bound)), kinetic, l), 0))
                .isEqualTo(levels);
        assertThat(SOLVER.countBelow(Problems.formula(text.replace("D", Double.toString(unbound)), kinetic, l), 0))
                .isEqualTo(levels - 1);
    }

    /** A level 4e-11 of the depth below the threshold: asked for by count and found again. */
    @Test
    void levelsFarBelowTheDepthAreFound() {
        RadialProblem problem = Problems.formula("r^(-12) - 2*r^(-6)", 1e-4, 0);
        Spectrum all = SOLVER.solve(problem, LevelSearch.all(), SolveMonitor.NONE);
        assertThat(all.levels()).hasSize(24);
        assertThat(SOLVER.countBelow(problem, 0)).isEqualTo(24);
        assertThat(SOLVER.countBelow(problem, 10)).isEqualTo(24);
        double last = all.levels().get(23).energy();
        assertThat(SOLVER.countBelow(problem, last * (1 + 1e-9))).isEqualTo(23);
        assertThat(SOLVER.countBelow(problem, last * (1 - 1e-9))).isEqualTo(24);
    }

    @Test
    void levelsOfADoubleWellComeInPairsCloserThanRounding() {
        RadialProblem problem = Problems.formula("40*((r-12)^2-36)^2/36", 1, 0);
        Spectrum spectrum = SOLVER.solve(problem, LevelSearch.first(6), SolveMonitor.NONE);
        assertThat(spectrum.levels()).hasSize(6);
        for (int pair = 0; pair < 3; pair++) {
            double lower = spectrum.levels().get(2 * pair).energy();
            double upper = spectrum.levels().get(2 * pair + 1).energy();
            assertThat(Math.abs(upper - lower)).isLessThan(1e-11 * upper);
        }
        double between = 0.5
                * (spectrum.levels().get(1).energy() + spectrum.levels().get(2).energy());
        assertThat(SOLVER.countBelow(problem, between)).isEqualTo(2);
    }

    @Test
    void narrowWellsFarOutAreSeen() {
        RadialProblem problem = RadialProblem.single(1e-3, 0, Problems.shell(-10, 3e5, 3e5 + 1));
        int whole = SOLVER.countBelow(problem, 0);
        assertThat(whole).isEqualTo((int) Math.ceil(Math.sqrt(10 / 1e-3) / Math.PI));
    }

    @Test
    void emptyWellsHaveNoLevel() {
        assertThat(SOLVER.countBelow(Problems.formula("-exp(-r)", 1, 0), 0)).isZero();
        assertThat(SOLVER.countBelow(Problems.formula("exp(-r)", 1, 0), 0)).isZero();
        assertThat(SOLVER.solve(Problems.formula("exp(-r)", 1, 0), LevelSearch.all(), SolveMonitor.NONE)
                        .levels())
                .isEmpty();
    }
}
