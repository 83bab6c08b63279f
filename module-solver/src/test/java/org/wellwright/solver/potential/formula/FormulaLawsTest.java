package org.wellwright.solver.potential.formula;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import org.apache.commons.math3.dfp.Dfp;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.potential.EvaluatorLaws;
import org.wellwright.solver.potential.Interval;

class FormulaLawsTest {
    private static final double[] VALUES = {0.7, 1.3};

    private static BoundFormula bound(Graph graph) {
        return new BoundFormula(
                graph, java.util.Arrays.copyOf(VALUES, graph.names().size()), 1);
    }

    private static boolean isFinite(Dfp x) {
        return !x.isNaN() && !x.isInfinite();
    }

    @Test
    void roundingBoundHoldsAgainstSixtyDigits() {
        RandomFormulas formulas = new RandomFormulas(11);
        int checked = 0;
        double tightness = 0;
        for (int i = 0; i < 1_500; i++) {
            Graph graph = FormulaParser.parse(formulas.smooth(1 + i % 5));
            BoundFormula v = bound(graph);
            double r = formulas.radius();
            double value = v.value(r);
            double bound = v.roundingBound(r);
            if (!(bound < Double.POSITIVE_INFINITY) || Math.abs(value) > 1e100) {
                continue;
            }
            Dfp exact = PreciseEvaluation.value(graph, VALUES, 1, PreciseEvaluation.FIELD.newDfp(r));
            if (!isFinite(exact)) {
                continue;
            }
            double error =
                    exact.subtract(PreciseEvaluation.FIELD.newDfp(value)).abs().toDouble();
            assertThat(error)
                    .as("%s at %s: %s against %s", v.canonical(), r, value, exact)
                    .isLessThanOrEqualTo(bound);
            checked++;
            tightness += bound <= 100 * error + 1e-14 * Math.abs(value) ? 1 : 0;
        }
        assertThat(checked).isGreaterThan(1_300);
        assertThat(tightness / checked)
                .as("share of bounds that are not absurdly wide")
                .isGreaterThan(0.5);
    }

    @Test
    void derivativesAgreeWithDifferencesAtSixtyDigits() {
        RandomFormulas formulas = new RandomFormulas(12);
        int checked = 0;
        for (int i = 0; i < 1_000; i++) {
            Graph graph = FormulaParser.parse(formulas.smooth(1 + i % 4));
            BoundFormula v = bound(graph);
            double r = Math.pow(10, -1 + 2 * formulas.random().nextDouble());
            for (int j = -1; j < graph.names().size(); j++) {
                double exact = j < 0 ? v.slope(r) : v.parameterDerivative(j, r);
                Dfp difference = difference(graph, r, j);
                if (!isFinite(difference) || Math.abs(exact) > 1e60) {
                    continue;
                }
                double scale = Math.abs(exact) + Math.abs(v.value(r)) + 1e-12;
                assertThat(exact)
                        .as("derivative %d of %s at %s", j, v.canonical(), r)
                        .isCloseTo(difference.toDouble(), org.assertj.core.api.Assertions.within(1e-9 * scale));
                checked++;
            }
        }
        assertThat(checked).isGreaterThan(1_500);
    }

    private static Dfp difference(Graph graph, double r, int j) {
        Dfp h = PreciseEvaluation.FIELD.newDfp("1e-18");
        if (j < 0) {
            Dfp x = PreciseEvaluation.FIELD.newDfp(r);
            return PreciseEvaluation.value(graph, VALUES, 1, x.add(h))
                    .subtract(PreciseEvaluation.value(graph, VALUES, 1, x.subtract(h)))
                    .divide(h.multiply(2));
        }
        // A double cannot hold a step of 1e-18: take 2^-26 and extrapolate once.
        Dfp x = PreciseEvaluation.FIELD.newDfp(r);
        Dfp one = parameterDifference(graph, x, j, 0x1p-22);
        Dfp half = parameterDifference(graph, x, j, 0x1p-23);
        return half.multiply(4).subtract(one).divide(3);
    }

    private static Dfp parameterDifference(Graph graph, Dfp r, int j, double step) {
        double[] up = VALUES.clone();
        double[] down = VALUES.clone();
        up[j] += step;
        down[j] -= step;
        return PreciseEvaluation.value(graph, up, 1, r)
                .subtract(PreciseEvaluation.value(graph, down, 1, r))
                .divide(PreciseEvaluation.FIELD.newDfp(up[j] - down[j]));
    }

    @Test
    void enclosuresContainSamples() {
        RandomFormulas formulas = new RandomFormulas(13);
        for (int i = 0; i < 1_000; i++) {
            String text = i % 2 == 0 ? formulas.smooth(1 + i % 4) : formulas.any(1 + i % 4);
            BoundFormula v = bound(FormulaParser.parse(text));
            EvaluatorLaws.enclosuresContainSamples(v, 1e-2, 1e2, 10, 10, new Random(i));
        }
    }

    @Test
    void enclosuresAreSecondOrderInTheWidth() {
        BoundFormula v = bound(FormulaParser.parse("(1-exp(-(r-2)))^2-1/r+0.3*r*exp(-r)"));
        double coarse = v.enclose(2.3, 2.4).width() - Math.abs(v.value(2.4) - v.value(2.3));
        double fine = v.enclose(2.3, 2.31).width() - Math.abs(v.value(2.31) - v.value(2.3));
        assertThat(Math.max(fine, 1e-15)).isLessThan(0.02 * coarse + 1e-14);
    }

    @Test
    void blocksHaveTheBitsOfSingleValues() {
        RandomFormulas formulas = new RandomFormulas(14);
        for (int i = 0; i < 1_000; i++) {
            BoundFormula v = bound(FormulaParser.parse(formulas.any(1 + i % 5)));
            EvaluatorLaws.blocksHaveTheBitsOfSingleValues(v, 1e-3, 1e4, new Random(i));
        }
    }

    @Test
    void behavioursHoldForRandomFormulas() {
        RandomFormulas formulas = new RandomFormulas(15);
        int known = 0;
        for (int i = 0; i < 1_000; i++) {
            BoundFormula v = bound(FormulaParser.parse(formulas.smooth(1 + i % 3)));
            if (v.tail().known() && v.origin().known()) {
                known++;
                EvaluatorLaws.behavioursHold(v);
            }
        }
        assertThat(known).as("formulas whose behaviour at both ends is known").isGreaterThan(700);
    }

    @Test
    void intermediateOverflowIsSurvived() {
        BoundFormula bump = bound(FormulaParser.parse("exp((r-7)/0.6)/(1+exp((r-7)/0.6))^2"));
        for (double r : new double[] {100, 220, 300, 430, 440, 5_000}) {
            double z = (r - 7) / 0.6;
            assertThat(bump.value(r))
                    .isCloseTo(Math.exp(-z), org.assertj.core.api.Assertions.within(1e-12 * Math.exp(-z)));
            assertThat(bump.slope(r))
                    .isCloseTo(-Math.exp(-z) / 0.6, org.assertj.core.api.Assertions.within(1e-12 * Math.exp(-z)));
            assertThat(bump.roundingBound(r)).isLessThanOrEqualTo(1e-11 * Math.exp(-z) + 1e-320);
        }
        BoundFormula one = bound(FormulaParser.parse("exp(r)*exp(-r)+sinh(r)/cosh(r)"));
        assertThat(one.value(2_000)).isCloseTo(2, org.assertj.core.api.Assertions.within(1e-12));
        assertThat(one.value(2e5)).isCloseTo(2, org.assertj.core.api.Assertions.within(1e-9));
        assertThat(bound(FormulaParser.parse("exp(r)")).value(1e4)).isEqualTo(Double.POSITIVE_INFINITY);
    }

    @Test
    void cancellingFormsAreComputedStably() {
        double r = 1e-9;
        assertThat(bound(FormulaParser.parse("1-exp(-0.1*r)")).value(r))
                .isCloseTo(1e-10 - 5e-21, org.assertj.core.api.Assertions.within(1e-25));
        assertThat(bound(FormulaParser.parse("ln(1+r)")).value(r))
                .isCloseTo(r - r * r / 2, org.assertj.core.api.Assertions.within(1e-24));
        assertThat(bound(FormulaParser.parse("1-cos(r)")).value(r))
                .isCloseTo(r * r / 2, org.assertj.core.api.Assertions.within(1e-33));
        assertThat(bound(FormulaParser.parse("sqrt(1+r^2)-1")).value(r))
                .isCloseTo(r * r / 2, org.assertj.core.api.Assertions.within(1e-33));
        assertThat(bound(FormulaParser.parse("1-erf(r)")).value(5))
                .isCloseTo(
                        1.5374597944280349e-12,
                        org.assertj.core.api.Assertions.within(1e-26)); // closed form, computed at 40 digits
    }

    @Test
    void literalsThatAreNoDoublesWidenTheEnclosure() {
        Interval exact = bound(FormulaParser.parse("0.5*r")).enclose(1, 1);
        Interval rounded = bound(FormulaParser.parse("0.1*r")).enclose(1, 1);
        assertThat(exact).isEqualTo(Interval.of(0.5));
        assertThat(rounded.lower()).isLessThan(0.1);
        assertThat(rounded.upper()).isGreaterThan(0.1);
    }
}
