package org.wellwright.solver.radial.spectral;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.concurrent.CancellationException;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.openide.util.Lookup;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.OriginBehaviour;
import org.wellwright.solver.potential.TailBehaviour;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.ChannelTerm;
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

/** Laws that hold for every potential, and problems that have no answer. */
class LawsTest {
    private static final SpectralElementSolver SOLVER = new SpectralElementSolver();

    private static Spectrum solve(RadialProblem problem, LevelSearch search) {
        return SOLVER.solve(problem, search, SolveMonitor.NONE);
    }

    private static TermEvaluator formula(String text) {
        return FormulaText.parse(text).bind(Map.of(), ChannelFacts.ofOrbital(0));
    }

    private static RadialProblem problem(String text, double kinetic, int l) {
        return RadialProblem.single(kinetic, l, formula(text));
    }

    /** A first guess of where to stop may fall on the next level: −1/50 for the first four at l = 0. */
    @Test
    void aSearchForTheFirstLevelsEndsBetweenTheLastAndTheNext() {
        SolverService service = Lookup.getDefault().lookup(SolverService.class);
        for (int l = 0; l <= 2; l++) {
            for (int count = 1; count <= 10; count++) {
                Spectrum spectrum = service.solve(
                        SolveRequest.of(problem("-1/r", 0.5, l), LevelSearch.first(count)), SolveMonitor.NONE);
                int last = count + l;
                assertThat(spectrum.searchedBelow())
                        .as("l = %d, count = %d: %s", l, count, spectrum.message())
                        .isGreaterThan(-0.5 / (last * last))
                        .isLessThan(-0.5 / ((last + 1) * (last + 1)) * (1 + 1e-6));
                assertThat(spectrum.completeness()).isEqualTo(Completeness.COUNTED);
            }
        }
    }

    @Test
    void statesAreOrthonormalAndHaveTheNodesOfTheirIndex() {
        Spectrum spectrum = solve(problem("r^-12 - 2*r^-6", 1e-3, 2), LevelSearch.all());
        assertThat(spectrum.levels()).hasSizeGreaterThan(4);
        for (Level level : spectrum.levels()) {
            RadialState u = spectrum.state(level.index());
            for (Level other : spectrum.levels()) {
                double overlap = u.overlap(0, spectrum.state(other.index()), 0, r -> 1);
                assertThat(overlap).isCloseTo(level.index() == other.index() ? 1 : 0, within(2e-12));
            }
            int nodes = 0;
            double previous = 0;
            for (int i = 1; i < 20000; i++) {
                double r = u.innerRadius() + (20 - u.innerRadius()) * i / 20000;
                double value = u.value(0, r);
                if (Math.abs(value) > 1e-9) {
                    nodes += value * previous < 0 ? 1 : 0;
                    previous = value;
                }
            }
            assertThat(nodes).isEqualTo(level.index());
        }
    }

    /** ⟨T⟩ = ⟨r dV/dr⟩/2 (Fock 1930). */
    @Test
    void virialTheoremHolds() {
        for (String text : new String[] {"-1/r", "r", "0.3*r^2 - 1/r", "ln(r)", "-20*exp(-r)"}) {
            Spectrum spectrum = solve(problem(text, 0.5, 1), LevelSearch.first(3));
            TermEvaluator v = spectrum.problem().common();
            for (Level level : spectrum.levels()) {
                RadialState u = spectrum.state(level.index());
                double half = 0.5 * u.expectation(r -> r * v.slope(r));
                assertThat(u.kineticEnergy()).as(text).isCloseTo(half, within(1e-12 * level.scale()));
            }
        }
    }

    @Test
    void gradientsAgreeWithDifferencesEdgesIncluded() {
        double h = 1e-4;
        for (int l : new int[] {0, 2}) {
            RadialState u = solve(
                            RadialProblem.single(0.7, l, PlainPotential.squareWell(60, 1.3)), LevelSearch.first(2))
                    .state(1);
            double depth =
                    difference(h, x -> energy(RadialProblem.single(0.7, l, PlainPotential.squareWell(60 + x, 1.3))));
            double radius =
                    difference(h, x -> energy(RadialProblem.single(0.7, l, PlainPotential.squareWell(60, 1.3 + x))));
            double kinetic =
                    difference(h, x -> energy(RadialProblem.single(0.7 + x, l, PlainPotential.squareWell(60, 1.3))));
            assertThat(u.gradient().common(0)).isCloseTo(depth, within(1e-8));
            assertThat(u.gradient().common(1)).isCloseTo(radius, within(1e-5));
            assertThat(u.gradient().kinetic()).isCloseTo(kinetic, within(1e-5));
        }
    }

    private static double energy(RadialProblem problem) {
        return solve(problem, LevelSearch.first(2)).levels().get(1).energy();
    }

    private static double difference(double h, DoubleUnaryOperator f) {
        return (f.applyAsDouble(h) - f.applyAsDouble(-h)) / (2 * h);
    }

    /**
     * du/dZ of a hydrogen-like state solves (H − E) w = u/r − ⟨1/r⟩ u; ⟨r⟩ = 5/Z for 2p gives d⟨r⟩/dZ = 2⟨u|r|w⟩ = −5.
     */
    @Test
    void responseGivesDerivativesOfExpectationValues() {
        RadialState u = solve(RadialProblem.single(0.5, 1, PlainPotential.coulomb(1)), LevelSearch.first(1))
                .state(0);
        RadialState w = u.response((c, r) -> u.value(c, r) / r);
        assertThat(u.overlap(0, w, 0, r -> 1)).isCloseTo(0, within(1e-12));
        assertThat(2 * u.overlap(0, w, 0, r -> r)).isCloseTo(-5, within(1e-9));
    }

    /** Two uncoupled oscillators seen in rotated channels. */
    @Test
    void rotatedChannelsHaveTheLevelsOfTheUncoupledOnes() {
        DoubleUnaryOperator first = r -> 0.5 * r * r;
        DoubleUnaryOperator second = r -> 2 * r * r + 1.3 / (1 + r * r);
        double c = Math.cos(0.4);
        double s = Math.sin(0.4);
        TailBehaviour tail = TailBehaviour.power(2, 1);
        PlainPotential v11 = plain("11", r -> c * c * first.applyAsDouble(r) + s * s * second.applyAsDouble(r), tail);
        PlainPotential v22 = plain("22", r -> s * s * first.applyAsDouble(r) + c * c * second.applyAsDouble(r), tail);
        PlainPotential v12 = plain("12", r -> c * s * (first.applyAsDouble(r) - second.applyAsDouble(r)), tail);
        RadialProblem coupled = new RadialProblem(
                0.5,
                List.of(RadialChannel.of(1), RadialChannel.of(1)),
                plain("0", r -> 0, TailBehaviour.ZERO),
                List.of(new ChannelTerm(0, 0, v11), new ChannelTerm(0, 1, v12), new ChannelTerm(1, 1, v22)),
                0,
                Double.POSITIVE_INFINITY);
        List<Double> exact = new ArrayList<>();
        for (DoubleUnaryOperator v : List.of(first, second)) {
            solve(RadialProblem.single(0.5, 1, plain("v" + exact.size(), v, tail)), LevelSearch.first(8))
                    .levels()
                    .stream()
                    .map(Level::energy)
                    .forEach(exact::add);
        }
        Collections.sort(exact);
        for (Level level : solve(coupled, LevelSearch.first(8)).levels()) {
            assertThat(exact.get(level.index())).isBetween(level.lower(), level.upper());
        }
    }

    private static PlainPotential plain(String name, DoubleUnaryOperator v, TailBehaviour tail) {
        return PlainPotential.of(name, v, OriginBehaviour.FINITE, tail);
    }

    @Test
    void boundsHoldForRandomUnitsMassesAndTolerances() {
        Random random = new Random(20240501);
        for (int i = 0; i < 150; i++) {
            double kinetic = Math.exp(8 * random.nextGaussian());
            double length = Math.exp(8 * random.nextGaussian());
            double charge = 2 * kinetic / length;
            int l = random.nextInt(12);
            double tolerance = random.nextBoolean() ? 0 : Math.pow(10, -13 + random.nextInt(10));
            LevelSearch search = new LevelSearch(1 + random.nextInt(12), Double.POSITIVE_INFINITY, tolerance);
            Spectrum spectrum = solve(RadialProblem.single(kinetic, l, PlainPotential.coulomb(charge)), search);
            assertThat(spectrum.levels()).hasSize(search.count());
            for (Level level : spectrum.levels()) {
                double n = level.index() + l + 1;
                double exact = -charge * charge / (4 * kinetic * n * n);
                double rounded = 4e-16 * Math.abs(exact);
                assertThat(level.lower()).isLessThanOrEqualTo(exact + rounded);
                assertThat(level.upper()).isGreaterThanOrEqualTo(exact - rounded);
                double half = 0.5 * (level.upper() - level.lower()) / level.scale();
                assertThat(half).isLessThan(Math.max(tolerance, 2e-15));
            }
        }
    }

    @Test
    void aResultDoesNotDependOnWhatElseWasAsked() {
        SolverService service = Lookup.getDefault().lookup(SolverService.class);
        List<SolveRequest> requests = new ArrayList<>();
        for (int l = 0; l < 6; l++) {
            requests.add(SolveRequest.of(problem("-0.5/r + 0.2*r", 0.5, l), LevelSearch.first(4)));
        }
        List<Spectrum> together = service.solveAll(requests, SolveMonitor.NONE);
        for (int l = 0; l < 6; l++) {
            Spectrum alone = service.solve(requests.get(l), SolveMonitor.NONE);
            assertThat(together.get(l).levels()).isEqualTo(alone.levels());
        }
    }

    /** The well is 1e-6 of its radius wide: only the interval bounds of the formula can show it. */
    @Test
    void aNarrowWellFarOutIsFound() {
        Spectrum spectrum = solve(problem("-5000*exp(-(r-100000)^2/0.01)", 1, 0), LevelSearch.all());
        assertThat(spectrum.levels()).isNotEmpty();
        assertThat(spectrum.levels().get(0).energy()).isBetween(-5000.0, -3000.0);
    }

    @Test
    void aFormulaThatOverflowsFarOutIsSolved() {
        Spectrum spectrum = solve(problem("exp((r-7)/0.6)/(1+exp((r-7)/0.6))^2*(-50)", 1, 1), LevelSearch.all());
        assertThat(spectrum.levels()).hasSize(4);
    }

    @Test
    void whatHasNoAnswerIsRefusedByName() {
        assertThatThrownBy(() -> solve(problem("-1/r", 0.5, 0), LevelSearch.all()))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("no end");
        assertThatThrownBy(() -> solve(problem("-2/r^2", 0.5, 1), LevelSearch.first(1)))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("l = 1");
        assertThatThrownBy(() -> solve(problem("-r", 0.5, 0), LevelSearch.first(1)))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("falls");
    }

    @Test
    void cancellingStopsTheWork() {
        SolveMonitor cancelled = new SolveMonitor() {
            @Override
            public void progress(double fraction, String what) {}

            @Override
            public boolean cancelled() {
                return true;
            }
        };
        assertThatThrownBy(() -> SOLVER.solve(problem("-1/r", 0.5, 0), LevelSearch.first(50), cancelled))
                .isInstanceOf(CancellationException.class);
    }
}
