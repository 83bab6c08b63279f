package org.wellwright.solver.radial.spectral;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.openide.util.Lookup;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialChannel;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialState;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.service.SolveRequest;
import org.wellwright.solver.service.SolverService;

/**
 * Levels and expectation values from outside the project, through the service that clients look up. Each row of
 * {@code published-levels.csv} names its source; {@code tolerance} is relative to max(|E|, ⟨T⟩ + ⟨|V|⟩), or to the
 * value for expectations, and covers what rounding the formula's own numbers to double does to the problem.
 */
class PublishedLevelsTest {
    private static final SolverService SERVICE = Lookup.getDefault().lookup(SolverService.class);

    private static TermEvaluator formula(String text, String parameters) {
        Map<String, Double> values = new TreeMap<>();
        if (parameters != null && !parameters.isEmpty()) {
            for (String one : parameters.split(";")) {
                String[] parts = one.split("=");
                values.put(parts[0], Double.parseDouble(parts[1]));
            }
        }
        return FormulaText.parse(text).bind(values, ChannelFacts.ofOrbital(0));
    }

    private static double number(String text, double otherwise) {
        if (text == null || text.isEmpty()) {
            return otherwise;
        }
        String[] parts = text.split("/");
        return parts.length == 1
                ? Double.parseDouble(text)
                : Double.parseDouble(parts[0]) / Double.parseDouble(parts[1]);
    }

    @ParameterizedTest(name = "{0}")
    @CsvFileSource(resources = "published-levels.csv", numLinesToSkip = 1)
    void agreesWithThePublishedValue(
            String id,
            String text,
            String parameters,
            String kinetic,
            int l,
            int nodes,
            String innerWall,
            String outerWall,
            String observable,
            double value,
            int digits,
            double tolerance) {
        RadialProblem problem = new RadialProblem(
                number(kinetic, 0),
                List.of(RadialChannel.of(l)),
                formula(text, parameters),
                List.of(),
                number(innerWall, 0),
                number(outerWall, Double.POSITIVE_INFINITY));
        Spectrum spectrum = SERVICE.solve(SolveRequest.of(problem, LevelSearch.first(nodes + 1)), SolveMonitor.NONE);
        assertThat(spectrum.completeness()).as(spectrum.message()).isEqualTo(Completeness.COUNTED);
        Level level = spectrum.levels().get(nodes);
        double known = Math.pow(10, 1 - digits) * Math.abs(value);
        if (observable.equals("energy")) {
            double scale = Math.max(Math.abs(value), level.scale());
            assertThat(Math.abs(level.energy() - value))
                    .as("energy %s", level.energy())
                    .isLessThan(tolerance * scale + known);
            assertThat(level.lower() - known - tolerance * scale).isLessThanOrEqualTo(value);
            assertThat(level.upper() + known + tolerance * scale).isGreaterThanOrEqualTo(value);
            assertThat(level.upper() - level.lower()).isLessThan(2 * tolerance * scale);
        } else {
            double computed = observed(spectrum.state(nodes), observable);
            assertThat(Math.abs(computed - value))
                    .as("%s = %s", observable, computed)
                    .isLessThan(tolerance * Math.abs(value) + known);
        }
    }

    /** A contact density is |R(0)|² = u′(0)². */
    private static double observed(RadialState state, String observable) {
        if (observable.equals("contact")) {
            double slope = state.slope(0, 0);
            return slope * slope;
        }
        TermEvaluator weight = formula(observable, "");
        return state.expectation(weight::value);
    }
}
