package org.wellwright.solver.potential.formula;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.Formula;
import org.wellwright.solver.potential.FormulaFault;
import org.wellwright.solver.potential.FormulaText;
import org.wellwright.solver.potential.FormulaToken;
import org.wellwright.solver.potential.TermEvaluator;

/**
 * Random and mutated text: every fault is one line with a column, every formula can be bound and asked. 1,000,000 texts
 * in the campaign.
 */
class FormulaFuzzTest {
    private static final int TEXTS = "full".equals(System.getProperty("wellwright.campaign")) ? 1_000_000 : 20_000;

    @Test
    void neverCrashes() {
        RandomFormulas formulas = new RandomFormulas(99);
        int good = 0;
        int faulty = 0;
        for (int i = 0; i < TEXTS; i++) {
            String text = i % 4 == 0 ? formulas.any(1 + i % 5) : formulas.text();
            Optional<FormulaFault> fault = FormulaText.fault(text);
            tokensCover(text);
            if (fault.isPresent()) {
                faulty++;
                check(text, fault.get());
            } else {
                good++;
                ask(FormulaText.parse(text), formulas);
            }
        }
        assertThat(good).isGreaterThan(TEXTS / 4);
        assertThat(faulty).isGreaterThan(TEXTS / 4);
    }

    private static void check(String text, FormulaFault fault) {
        String sentence = fault.problem().sentence();
        assertThat(sentence).as(text).matches("(line \\d+, )?column \\d+: .+").doesNotContain("\n");
        assertThat(sentence.length()).as(text).isLessThan(400);
        assertThat(fault.start()).as(text).isBetween(0, text.length());
        assertThat(fault.end()).as(text).isBetween(fault.start(), text.length());
    }

    private static void tokensCover(String text) {
        int at = 0;
        for (FormulaToken token : FormulaText.tokens(text)) {
            assertThat(text.substring(at, token.start()).replace("\u00a0", " ").isBlank())
                    .as(text)
                    .isTrue();
            assertThat(token.end()).isGreaterThan(token.start());
            at = token.end();
        }
        assertThat(text.substring(at).replace("\u00a0", " ").isBlank()).as(text).isTrue();
    }

    private static void ask(Formula formula, RandomFormulas formulas) {
        double[] values = new double[formula.names().size()];
        java.util.Arrays.fill(values, 0.7);
        TermEvaluator v = formula.bind(values, ChannelFacts.ofOrbital(2));
        double r = formulas.radius();
        double value = v.value(r);
        double bound = v.roundingBound(r);
        assertThat(bound).as(formula.text()).isGreaterThanOrEqualTo(0);
        assertThat(Double.doubleToLongBits(v.slope(r))).isEqualTo(Double.doubleToLongBits(v.slope(r)));
        assertThat(v.enclose(r, 2 * r).lower())
                .isLessThanOrEqualTo(v.enclose(r, Double.POSITIVE_INFINITY).upper());
        assertThat(v.origin()).isNotNull();
        assertThat(v.tail()).isNotNull();
        double last = 0;
        for (var point : v.breakPoints()) {
            assertThat(point.radius()).isGreaterThanOrEqualTo(last);
            last = point.radius();
        }
        if (Double.isNaN(value)) {
            assertThat(bound)
                    .as("bound of a value that is not defined: %s at %s", formula.text(), r)
                    .isEqualTo(Double.POSITIVE_INFINITY);
        }
    }
}
