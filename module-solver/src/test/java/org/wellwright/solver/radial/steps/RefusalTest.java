package org.wellwright.solver.radial.steps;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;

class RefusalTest {
    private static final PerturbedStepSolver SOLVER = new PerturbedStepSolver();

    private static void refuses(RadialProblem problem, LevelSearch search, String... parts) {
        assertThatExceptionOfType(InvalidModelException.class)
                .isThrownBy(() -> SOLVER.solve(problem, search, SolveMonitor.NONE))
                .satisfies(e -> assertThat(e.problem().sentence()).contains(parts));
    }

    @Test
    void anEndlessSeriesNeedsACount() {
        refuses(Problems.formula("-1/r", 0.5, 2), LevelSearch.all(), "no end", "l = 2");
        refuses(Problems.formula("r", 1, 0), LevelSearch.all(), "no end");
        refuses(Problems.walled(Problems.shell(0, 0, 1), 1, 0, 0, 2), LevelSearch.all(), "no end");
        assertThat(SOLVER.solve(Problems.formula("r", 1, 0), new LevelSearch(LevelSearch.ALL, 5, 0), SolveMonitor.NONE)
                        .levels())
                .hasSize(2);
    }

    @Test
    void aFallToTheCentreIsRefusedInTheChannelsThatFall() {
        refuses(Problems.formula("-1.3/r^2 - 1/r", 1, 0), LevelSearch.first(3), "centre", "l = 0");
        assertThat(SOLVER.solve(Problems.formula("-1.3/r^2 - 1/r", 1, 1), LevelSearch.first(3), SolveMonitor.NONE)
                        .levels())
                .hasSize(3);
        refuses(Problems.formula("-1/r^3", 1, 5), LevelSearch.first(1), "centre", "l = 5");
        refuses(RadialProblem.single(1, 0, Problems.unknown(r -> -0.3 / (r * r))), LevelSearch.first(1), "centre");
    }

    @Test
    void aPotentialThatIsNoNumberIsRefusedWithTheRadius() {
        refuses(
                RadialProblem.single(1, 0, Problems.unknown(r -> r > 2 && r < 3 ? Double.NaN : -Math.exp(-r * r))),
                LevelSearch.first(1),
                "not a number at r = 2.");
    }

    @Test
    void aPotentialThatFallsForEverBindsNothing() {
        refuses(Problems.formula("-r^2", 1, 0), LevelSearch.first(1), "nothing is bound");
    }

    @Test
    void overflowFarOutBehindTheWellDoesNotMatter() {
        assertThat(SOLVER.solve(
                                Problems.formula("-50*exp((r-7)/0.6)/(1+exp((r-7)/0.6))^2", 1, 0),
                                LevelSearch.all(),
                                SolveMonitor.NONE)
                        .levels())
                .isNotEmpty();
    }

    @Test
    void stopsWhenTold() {
        SolveMonitor stopped = new SolveMonitor() {
            @Override
            public void progress(double fraction, String what) {}

            @Override
            public boolean cancelled() {
                return true;
            }
        };
        assertThatExceptionOfType(CancellationException.class)
                .isThrownBy(() -> SOLVER.solve(Problems.formula("-1/r", 0.5, 0), LevelSearch.first(5), stopped));
    }
}
