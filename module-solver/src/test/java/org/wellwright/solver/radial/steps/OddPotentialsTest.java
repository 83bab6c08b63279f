package org.wellwright.solver.radial.steps;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.spectral.SpectralElementSolver;

/**
 * Potentials chosen to be awkward: kinks, edges, odd powers, and formulas whose own rounding explodes at the origin.
 */
class OddPotentialsTest {
    private static final PerturbedStepSolver STEPS = new PerturbedStepSolver();
    private static final SpectralElementSolver SPECTRAL = new SpectralElementSolver();

    private static void bothAgree(String formula, double kinetic, int l, int count) {
        RadialProblem problem = Problems.formula(formula, kinetic, l);
        List<Level> levels = STEPS.solve(problem, LevelSearch.first(count), SolveMonitor.NONE)
                .levels();
        List<Level> bounds = SPECTRAL.solve(problem, LevelSearch.first(count), SolveMonitor.NONE)
                .levels();
        assertThat(levels).as(formula).hasSameSizeAs(bounds);
        for (int i = 0; i < levels.size(); i++) {
            double slack = levels.get(i).errorEstimate();
            assertThat(levels.get(i).energy())
                    .as("%s, kinetic %s, l = %d, level %d", formula, kinetic, l, i)
                    .isBetween(bounds.get(i).lower() - slack, bounds.get(i).upper() + slack);
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "-40*(sin(r)-r*cos(r))/r^3*exp(-r/4)",
                "-40*(r-sin(r))/r^3*exp(-r/4)",
                "-9*(1-exp(-r)-r+r^2/2)/r^3",
                "30*(1-exp(-r)-r)/r^3*exp(-r/3)",
                "-30*(1-exp(-0.1*r))/r*exp(-r/3)",
                "-5/(r+1e-6)",
                "-1/r+3*exp(-10*r)/r",
                "abs(r-3)-1/r",
                "max(-5, -1/r)",
                "-3*step(2-r)+2*step(r-2)*step(3-r)",
                "r^(-2.5)-1/r",
                "-exp(-sqrt(r))*9",
                "-8*exp(-r)*cos(3*r)",
                "-1/(1+r^2)^0.9",
                "0.01*r^10-3*r"
            })
    void bothMethodsAgree(String formula) {
        bothAgree(formula, 1, 0, 6);
        bothAgree(formula, 0.3, 1, 5);
    }

    @Test
    void bothMethodsAgreeOnRandomWells() {
        Random random = new Random(20240501);
        int cases = "full".equals(System.getProperty("wellwright.campaign")) ? 2_000 : 60;
        for (int i = 0; i < cases; i++) {
            double depth = Math.pow(10, 2 * random.nextDouble());
            double width = 0.3 + 2 * random.nextDouble();
            double place = 4 * random.nextDouble();
            String well = switch (random.nextInt(4)) {
                case 0 -> "-%.6g*exp(-((r-%.6g)/%.6g)^2)";
                case 1 -> "-%.6g/cosh((r-%.6g)/%.6g)^2";
                case 2 -> "-%.6g/(1+exp((r-%.6g)/%.6g*4))";
                default -> "-%.6g*step(r-%.6g)*step(%.6g+4-r)";
            };
            String formula = String.format(Locale.ROOT, well, depth, place, width);
            if (random.nextBoolean()) {
                formula += String.format(Locale.ROOT, " - %.6g*exp(-r/2)/r", 3 * random.nextDouble());
            }
            bothAgree(formula, Math.pow(10, -1.5 + 2 * random.nextDouble()), random.nextInt(6), 4);
        }
    }

    /** V = −r^−1.9 scales: κ → 2κ is r → 2^10 r and E → 2^−19 E, for every level down to 1e-14 of the deepest. */
    @Test
    void almostCriticalCoresScale() {
        double[] expected = new double[6];
        for (int k = -2; k <= 2; k++) {
            RadialProblem problem = Problems.formula("-1/r^1.9", Math.scalb(1.0, k), 0);
            List<Level> levels = STEPS.solve(problem, LevelSearch.first(6), SolveMonitor.NONE)
                    .levels();
            for (int i = 0; i < 6; i++) {
                double energy = Math.scalb(levels.get(i).energy(), 19 * k);
                double error = Math.scalb(levels.get(i).errorEstimate(), 19 * k);
                expected[i] = k == -2 ? energy : expected[i];
                assertThat(energy).as("level %d, k = %d", i, k).isCloseTo(expected[i], within(2 * error));
            }
        }
    }
}
