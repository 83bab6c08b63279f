package org.wellwright.solver.radial.spectral;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.function.IntToDoubleFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialChannel;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.radial.Spectrum;

/** Levels with closed forms. Sources: Landau and Lifshitz (1977), sections 33, 36; Flügge (1971), problems 58, 65. */
class ClosedFormTest {
    private static final SpectralElementSolver SOLVER = new SpectralElementSolver();

    private static void check(RadialProblem problem, int count, double relative, IntToDoubleFunction exact) {
        Spectrum spectrum = SOLVER.solve(problem, LevelSearch.first(count), SolveMonitor.NONE);
        assertThat(spectrum.levels()).hasSize(count);
        for (Level level : spectrum.levels()) {
            double expected = exact.applyAsDouble(level.index());
            assertThat(level.energy()).isCloseTo(expected, within(relative * Math.abs(expected)));
            assertThat(level.lower()).isLessThanOrEqualTo(expected);
            assertThat(level.upper()).isGreaterThanOrEqualTo(expected);
            assertThat(level.boundKind()).isEqualTo(Level.BoundKind.TWO_SIDED);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2, 5, 10})
    void coulombLevelsOfThirtyShells(int l) {
        check(RadialProblem.single(0.5, l, PlainPotential.coulomb(1)), 30 - l, 3e-15, nodes -> {
            double n = nodes + l + 1;
            return -0.5 / (n * n);
        });
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 7, 60})
    void oscillatorLevels(int l) {
        check(RadialProblem.single(0.5, l, PlainPotential.power(0.5, 2)), 31, 5e-15, nodes -> 2 * nodes + l + 1.5);
    }

    @Test
    void sphericalBox() {
        PlainPotential zero = PlainPotential.of("zero", r -> 0, OriginBehaviour.FINITE, TailBehaviour.ZERO);
        RadialProblem box = new RadialProblem(1, List.of(RadialChannel.of(0)), zero, List.of(), 0, 2);
        check(box, 20, 5e-15, nodes -> Math.pow((nodes + 1) * Math.PI / 2, 2));
    }
}
