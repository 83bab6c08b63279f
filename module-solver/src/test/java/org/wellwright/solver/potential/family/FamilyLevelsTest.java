package org.wellwright.solver.potential.family;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.openide.util.Lookup;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyCatalogue;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.PotentialSum;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialChannel;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.service.SolveRequest;
import org.wellwright.solver.service.SolverService;

/**
 * Published levels of the families, through the service that clients look up. The tolerance, 1e-13 of ⟨T⟩ + ⟨|V|⟩, is
 * what rounding a parameter such as 0.1 or 2^(−1/6) to a double can do to a level.
 */
class FamilyLevelsTest {
    @ParameterizedTest(name = "{1}: {0}")
    @CsvFileSource(resources = "published-levels.csv", numLinesToSkip = 1)
    void agreeWithThePublishedValue(
            String id, String families, String values, double kinetic, int l, int nodes, double value) {
        double[] numbers = Arrays.stream(values.split(";"))
                .mapToDouble(Double::parseDouble)
                .toArray();
        List<TermEvaluator> terms = new ArrayList<>();
        int used = 0;
        for (String name : families.split("\\+")) {
            PotentialFamily family = FamilyCatalogue.require(name);
            int count = family.parameters().size();
            terms.add(family.bind(Arrays.copyOfRange(numbers, used, used + count), ChannelFacts.ofOrbital(l)));
            used += count;
        }
        assertThat(used).isEqualTo(numbers.length);
        TermEvaluator v = PotentialSum.of(terms);
        RadialProblem problem = new RadialProblem(
                kinetic,
                List.of(RadialChannel.of(l)),
                v,
                List.of(),
                v.walls().inner(),
                v.walls().outer());
        SolverService service = Lookup.getDefault().lookup(SolverService.class);
        Spectrum spectrum = service.solve(SolveRequest.of(problem, LevelSearch.first(nodes + 1)), SolveMonitor.NONE);
        Level level = spectrum.levels().get(nodes);
        double allowed = 1e-13 * Math.max(Math.abs(value), level.scale());
        assertThat(Math.abs(level.energy() - value))
                .as("%s: %s against %s", id, level.energy(), value)
                .isLessThanOrEqualTo(allowed);
        assertThat(level.lower() - allowed).isLessThanOrEqualTo(value);
        assertThat(level.upper() + allowed).isGreaterThanOrEqualTo(value);
    }
}
