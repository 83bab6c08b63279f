package org.wellwright.solver.radial.steps;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;

/** Levels that were published or computed elsewhere to many digits; each row names its source. */
class PublishedLevelsTest {
    private static final PerturbedStepSolver SOLVER = new PerturbedStepSolver();

    /**
     * κ may be a quotient. The tolerance is the table's own last trusted digit or our arithmetic, whichever is larger:
     * 4 eps of ⟨T⟩ + ⟨|V|⟩, and for κ that is no binary fraction the change of E with κ's rounding.
     */
    @ParameterizedTest(name = "{0}")
    @CsvFileSource(resources = "levels.csv", numLinesToSkip = 1)
    void agreesWithTheTable(String id, String formula, String kinetic, int l, int index, double value, int digits) {
        RadialProblem problem = Problems.formula(formula, number(kinetic), l);
        Level level = SOLVER.solve(problem, LevelSearch.first(index + 1), SolveMonitor.NONE)
                .levels()
                .get(index);
        double table = Math.abs(value) * Math.pow(10, 1 - digits);
        assertThat(level.energy()).as(id).isCloseTo(value, within(table + 4 * Math.ulp(1.0) * level.scale()));
        assertThat(Math.abs(level.energy() - value))
                .as("%s: error against its estimate", id)
                .isLessThanOrEqualTo(level.errorEstimate() + table);
    }

    private static double number(String text) {
        String[] parts = text.split("/");
        double value = Double.parseDouble(parts[0]);
        return parts.length == 1 ? value : value / Double.parseDouble(parts[1]);
    }
}
