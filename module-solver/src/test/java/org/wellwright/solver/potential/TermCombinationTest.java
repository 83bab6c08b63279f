package org.wellwright.solver.potential;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;

class TermCombinationTest {
    private static final ChannelFacts CHANNEL = ChannelFacts.ofOrbital(0);

    private static TermEvaluator formula(String text, double... values) {
        return FormulaText.parse(text).bind(values, CHANNEL);
    }

    private static TermEvaluator ranged(double[] p) {
        return new RangedTerm(formula("-a/r", p[0]), p[1], p[2], p[3]);
    }

    @Test
    void aRangeIsZeroOutsideAndScaledInside() {
        TermEvaluator v = ranged(new double[] {2, 3, 1, 4});
        assertThat(v.value(0.5)).isZero();
        assertThat(v.value(2)).isEqualTo(-3);
        assertThat(v.value(5)).isZero();
        assertThat(v.parameterCount()).isEqualTo(4);
        assertThat(v.origin()).isEqualTo(OriginBehaviour.FINITE);
        assertThat(v.tail()).isEqualTo(TailBehaviour.ZERO);
        assertThat(v.enclose(5, 6)).isEqualTo(Interval.ZERO);
        assertThat(v.enclose(0.5, 2).contains(0)).isTrue();
        assertThat(v.parameterDerivative(1, 2)).isEqualTo(-1);
        assertThat(v.parameterDerivative(2, 2)).isZero();
    }

    @Test
    void edgesJumpAndMove() {
        List<BreakPoint> points = ranged(new double[] {2, 3, 1, 4}).breakPoints();
        assertThat(points).hasSize(2);
        assertThat(points.get(0).radius()).isEqualTo(1);
        assertThat(points.get(0).jump()).isCloseTo(-6, org.assertj.core.api.Assertions.within(1e-14));
        assertThat(points.get(0).radiusGradient()).containsExactly(0.0, 0.0, 1.0, 0.0);
        assertThat(points.get(1).jump()).isCloseTo(1.5, org.assertj.core.api.Assertions.within(1e-14));
        assertThat(points.get(1).radiusGradient()).containsExactly(0.0, 0.0, 0.0, 1.0);
    }

    @Test
    void anUnrestrictedRangeChangesNothingButTheScale() {
        TermEvaluator inner = formula("-a/r", 2);
        TermEvaluator v = new RangedTerm(inner, 1, 0, Double.POSITIVE_INFINITY);
        assertThat(v.value(0.7)).isEqualTo(inner.value(0.7));
        assertThat(v.breakPoints()).isEmpty();
        assertThat(v.origin()).isEqualTo(inner.origin());
        assertThat(v.tail()).isEqualTo(inner.tail());
        assertThat(v.roundingBound(0.7)).isEqualTo(inner.roundingBound(0.7));
    }

    @Test
    void rangesObeyTheLaws() {
        Random random = new Random(3);
        double[] p = {2, 3, 1, 4};
        EvaluatorLaws.derivativesAgreeWithDifferences(TermCombinationTest::ranged, p, 0.3, 9, 200, random);
        EvaluatorLaws.enclosuresContainSamples(ranged(p), 0.3, 9, 500, 20, random);
        EvaluatorLaws.blocksHaveTheBitsOfSingleValues(ranged(p), 0.3, 9, random);
    }

    private static TermEvaluator sum(double[] p) {
        return PotentialSum.of(
                List.of(formula("-a/r+b*step(r-c)", p[0], p[1], p[2]), formula("d*r", p[3]), formula("1/r^2")));
    }

    @Test
    void aSumHasTheParametersOfItsTermsInOrder() {
        double[] p = {2, 0.5, 1.5, 3};
        TermEvaluator v = sum(p);
        assertThat(v.parameterCount()).isEqualTo(4);
        assertThat(v.value(2)).isEqualTo(-1 + 0.5 + 6 + 0.25);
        assertThat(v.parameterDerivative(3, 2)).isEqualTo(2);
        assertThat(v.breakPoints())
                .singleElement()
                .satisfies(point -> assertThat(point.radiusGradient()).containsExactly(0.0, 0.0, 1.0, 0.0));
        assertThat(v.origin()).isEqualTo(new OriginBehaviour(1, -1, -2, true));
        assertThat(v.tail()).isEqualTo(new TailBehaviour(0, 1, 3, true));
        EvaluatorLaws.derivativesAgreeWithDifferences(TermCombinationTest::sum, p, 0.2, 9, 200, new Random(4));
        EvaluatorLaws.enclosuresContainSamples(v, 0.2, 9, 500, 20, new Random(5));
        EvaluatorLaws.blocksHaveTheBitsOfSingleValues(v, 0.2, 9, new Random(6));
        EvaluatorLaws.behavioursHold(v);
    }

    @Test
    void emptyAndSingleSumsAreWhatTheyShouldBe() {
        TermEvaluator one = formula("r");
        assertThat(PotentialSum.of(List.of(one))).isSameAs(one);
        TermEvaluator none = PotentialSum.of(List.of());
        assertThat(none.value(1)).isZero();
        assertThat(none.enclose(1, 2)).isEqualTo(Interval.ZERO);
        assertThat(none.tail()).isEqualTo(TailBehaviour.ZERO);
    }

    @Test
    void equalTextsMeanEqualBits() {
        assertThat(sum(new double[] {2, 0.5, 1.5, 3}).canonical())
                .isEqualTo(sum(new double[] {2, 0.5, 1.5, 3}).canonical());
        assertThat(sum(new double[] {2, 0.5, 1.5, 3}).canonical())
                .isNotEqualTo(
                        sum(new double[] {2, 0.5, 1.5, 3.0000000000000004}).canonical());
    }

    @Test
    void termRecordsKeepWhatWasTyped() {
        FormulaTerm term = new FormulaTerm(TermFrame.named("core"), "-a/r", Map.of("a", Argument.of(2)));
        assertThat(term.argument("a")).isEqualTo(Argument.of(2));
        assertThat(term.argument("b")).isEqualTo(Argument.named("b"));
        FamilyTerm family = new FamilyTerm(TermFrame.named("core"), "coulomb", Map.of())
                .withArgument("strength", Argument.named("Z"));
        assertThat(family.arguments()).containsEntry("strength", Argument.named("Z"));
        assertThat(family.withFrame(family.frame().withEnabled(false)).frame().enabled())
                .isFalse();
        assertThatThrownBy(() -> new RangedTerm(formula("r"), 1, 3, 2))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("3.0, 2.0");
        assertThat(ChannelFilter.orbitals(1, 2).accepts(ChannelFacts.ofOrbital(1)))
                .isTrue();
        assertThat(ChannelFilter.orbitals(1, 2).accepts(ChannelFacts.ofOrbital(3)))
                .isFalse();
        assertThat(new ChannelFilter(0, 9, List.of(3), List.of()).accepts(new ChannelFacts(1, 3, 1)))
                .isTrue();
        assertThat(new ChannelFilter(0, 9, List.of(3), List.of()).accepts(ChannelFacts.ofOrbital(1)))
                .isFalse();
    }
}
