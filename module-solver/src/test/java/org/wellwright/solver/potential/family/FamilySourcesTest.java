package org.wellwright.solver.potential.family;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.FamilyCatalogue;
import org.wellwright.solver.potential.TermEvaluator;

/**
 * Families against sum rules, limits and published first-order shifts; integrals by the Gauss–Legendre rules of Apache
 * Commons Math.
 */
class FamilySourcesTest {
    private static final GaussIntegratorFactory RULES = new GaussIntegratorFactory();

    private static TermEvaluator bind(String id, double... values) {
        return FamilyCatalogue.require(id).bind(values, ChannelFacts.ofOrbital(0));
    }

    private static double integral(DoubleUnaryOperator f, double low, double high, int pieces) {
        double sum = 0;
        for (int i = 0; i < pieces; i++) {
            double width = (high - low) / pieces;
            GaussIntegrator rule = RULES.legendre(20, low + i * width, low + (i + 1) * width);
            sum += rule.integrate(f::applyAsDouble);
        }
        return sum;
    }

    /** Integrating Poisson's equation twice by parts: ∫ (V + k/r) r² dr = k⟨r²⟩/6 for every charge distribution. */
    private static void obeysTheSumRule(TermEvaluator v, double k, double meanSquareRadius, double edge, double far) {
        DoubleUnaryOperator f = r -> (v.value(r) + k / r) * r * r;
        double total = integral(f, 0, edge, 20) + integral(f, edge, far, 40);
        assertThat(total).isCloseTo(k * meanSquareRadius / 6, within(1e-12 * k * meanSquareRadius));
    }

    @Test
    void nuclearChargesObeyTheSumRuleOfElectrostatics() {
        obeysTheSumRule(bind("nucleus-uniform", 2, 1.5), 2, 0.6 * 1.5 * 1.5, 1.5, 3);
        obeysTheSumRule(bind("nucleus-gaussian", 2, 1.5), 2, 1.5 * 1.5, 1.5, 15);
        double c = 1.2;
        double a = 0.2;
        DoubleUnaryOperator density = s -> 1 / (1 + Math.exp((s - c) / a));
        double charge = integral(s -> s * s * density.applyAsDouble(s), 0, 10, 50);
        double second = integral(s -> Math.pow(s, 4) * density.applyAsDouble(s), 0, 10, 50);
        obeysTheSumRule(bind("nucleus-fermi", 2, c, a), 2, second / charge, c, 12);
    }

    @ParameterizedTest
    @CsvSource({"0.05", "0.4", "1.1", "1.3", "2.5"})
    void theFermiNucleusSolvesPoissonsEquation(double r) {
        double c = 1.2;
        double a = 0.2;
        DoubleUnaryOperator density = s -> 1 / (1 + Math.exp((s - c) / a));
        double charge = integral(s -> s * s * density.applyAsDouble(s), 0, 10, 50);
        double inside = integral(s -> s * s * density.applyAsDouble(s), 0, r, 20);
        double outside = integral(s -> s * density.applyAsDouble(s), r, r + 10, 50);
        assertThat(bind("nucleus-fermi", 2, c, a).value(r))
                .isCloseTo(-2 * (inside / r + outside) / charge, within(1e-12));
        assertThat(bind("nucleus-fermi", 2, c, a).slope(r)).isCloseTo(2 * inside / (r * r) / charge, within(1e-12));
    }

    /**
     * First-order shifts of muonic hydrogen in meV, 9 figures (Pachucki 1996; Borie 2012; recomputed there with CODATA
     * 2022 constants): the expectation value of the potential in point-nucleus states with reduced mass. Lengths in
     * electron bohr, energies in hartree.
     */
    @ParameterizedTest
    @CsvSource({"1, -1898.8296991", "2, -219.58396435"})
    void vacuumPolarizationShiftsMuonicHydrogen(int principal, double published) {
        double fineStructure = 7.2973525643e-3;
        double muon = 206.7682827;
        double proton = 1836.152673426;
        double hartreeInMilliElectronvolt = 27211.386245981;
        double mass = muon * proton / (muon + proton);
        TermEvaluator v = bind("vacuum-polarization", 1, fineStructure, fineStructure);
        DoubleUnaryOperator probability = principal == 1
                ? r -> 4 * mass * mass * mass * r * r * Math.exp(-2 * mass * r)
                : r -> mass * mass * mass / 2 * r * r * Math.pow(1 - mass * r / 2, 2) * Math.exp(-mass * r);
        // r = s⁴ smooths the logarithm at the origin.
        double scale = Math.pow(60 * principal / mass, 0.25);
        double shift = integral(
                s -> v.value(Math.pow(s, 4)) * probability.applyAsDouble(Math.pow(s, 4)) * 4 * s * s * s, 0, scale, 40);
        assertThat(shift * hartreeInMilliElectronvolt).isCloseTo(published, within(2e-8 * Math.abs(published)));
    }

    /**
     * Levels −(μ − λ − 2n)² of λ(λ − 1)/sinh² r − μ(μ + 1)/cosh² r: the ground state sinh^λ r cosh^(−μ) r solves the
     * equation (Pöschl and Teller 1933).
     */
    @Test
    void theCoredPoschlTellerWellHasItsGroundState() {
        double lambda = 1.7;
        double mu = 5.2;
        TermEvaluator v = bind("poschl-teller-core", lambda * (lambda - 1), mu * (mu + 1), 1);
        for (double r : new double[] {0.3, 0.8, 1.5, 3}) {
            double logSlope = lambda / Math.tanh(r) - mu * Math.tanh(r);
            double logCurvature = -lambda / Math.pow(Math.sinh(r), 2) - mu / Math.pow(Math.cosh(r), 2);
            double energy = v.value(r) - (logCurvature + logSlope * logSlope);
            assertThat(energy).isCloseTo(-Math.pow(mu - lambda, 2), within(1e-12 * Math.abs(v.value(r)) + 1e-12));
        }
    }

    @Test
    void theThomasTermIsTheSlopeOfTheWoodsSaxonShapeOverTheRadius() {
        TermEvaluator shape = bind("woods-saxon", -1, 5, 0.6);
        TermEvaluator thomas = bind("thomas", 3, 5, 0.6);
        for (double r = 0.5; r < 12; r += 0.5) {
            assertThat(thomas.value(r)).isCloseTo(3 * shape.slope(r) / r, within(1e-13));
        }
    }

    @Test
    void theSurfaceTermIsTheSlopeOfTheWoodsSaxonShape() {
        TermEvaluator shape = bind("woods-saxon", -1, 5, 0.6);
        TermEvaluator surface = bind("woods-saxon-surface", 3, 5, 0.6);
        for (double r = 0.5; r < 12; r += 0.5) {
            assertThat(surface.value(r)).isCloseTo(3 * 4 * 0.6 * shape.slope(r), within(1e-13));
        }
    }

    @ParameterizedTest
    @CsvSource({"0.2", "1", "3", "9"})
    void dampingIsThatOfItsDefinition(double r) {
        // The tail of the series of e^x, which does not cancel: 1 − e^(−x) Σ_(k≤n) x^k/k! = e^(−x) Σ_(k>n) x^k/k!.
        double b = 1.9;
        double x = b * r;
        double expected = 0;
        int[] orders = {6, 8, 10};
        double[] coefficients = {6.5, 120, 3000};
        for (int j = 0; j < 3; j++) {
            double term = 1;
            double tail = 0;
            for (int k = 1; k < 200; k++) {
                term *= x / k;
                tail += k > orders[j] ? term : 0;
            }
            expected -= coefficients[j] * Math.exp(-x) * tail / Math.pow(r, orders[j]);
        }
        assertThat(bind("damped-dispersion", 6.5, 120, 3000, b).value(r))
                .isCloseTo(expected, within(1e-12 * Math.abs(expected)));
        assertThat(bind("tang-toennies", 40, b, 6.5, 120, 3000).value(r))
                .isCloseTo(expected + 40 * Math.exp(-x), within(1e-12 * (Math.abs(expected) + 40 * Math.exp(-x))));
    }

    @Test
    void moleculesHaveTheirMinimumAndTail() {
        for (TermEvaluator v : new TermEvaluator[] {
            bind("exp-6", 0.7, 3, 13.5),
            bind("mie", 0.7, 3, 6, 12),
            bind("expanded-morse", 0.7, 3, 3, 1.1, 0.2, 0.1, 0.1),
            bind("morse-long-range", 0.7, 3, 90, 500, 4, -1, 0.1, 0.1)
        }) {
            assertThat(v.value(3)).as(v.canonical()).isCloseTo(-0.7, within(1e-14));
            assertThat(v.slope(3)).as(v.canonical()).isCloseTo(0, within(1e-13));
            assertThat(v.value(3.05)).isGreaterThan(v.value(3));
            assertThat(v.value(2.95)).isGreaterThan(v.value(3));
        }
        TermEvaluator longRange = bind("morse-long-range", 0.7, 3, 90, 500, 4, -1, 0.1, 0.1);
        // At r = 300 the next terms of the tail are C8/r² = 0.0056 and below 1e-5.
        assertThat(longRange.value(300) * Math.pow(300, 6)).isCloseTo(-90 - 500.0 / 90_000, within(1e-4));
        TermEvaluator sixth = bind("exp-6", 0.7, 3, 13.5);
        double summit = sixth.walls().inner();
        assertThat(sixth.slope(summit * (1 + 1e-9)))
                .as("the wall stands at the maximum")
                .isCloseTo(0, within(1e-2 * sixth.value(summit)));
        assertThat(sixth.value(summit)).isGreaterThan(sixth.value(1.1 * summit));
    }

    @Test
    void wallsStandWhereTheySay() {
        assertThat(bind("hard-sphere", 1.5).walls().inner()).isEqualTo(1.5);
        assertThat(bind("hard-sphere", 1.5).walls().innerGradient()).containsExactly(1.0);
        assertThat(bind("hard-cavity", 1.5).walls().outer()).isEqualTo(1.5);
        assertThat(bind("shell", 3, 1, 2).breakPoints())
                .extracting(point -> point.jump())
                .containsExactly(-3.0, 3.0);
    }
}
