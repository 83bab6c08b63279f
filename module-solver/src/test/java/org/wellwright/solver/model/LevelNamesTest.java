package org.wellwright.solver.model;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;

class LevelNamesTest {
    private static ModelDocument document(LabelConvention labels, List<String> systems, Curve... curves) {
        List<PairSystem> pairs = new ArrayList<>();
        for (String id : systems) {
            pairs.add(PairSystem.of(id, ParticleCatalogue.STANDARD.body("e-"), ParticleCatalogue.STANDARD.body("p")));
        }
        List<Model> models = curves.length == 0 ? List.of() : List.of(Model.of("m", List.of(curves)));
        return new ModelDocument(
                "", "", "atomic", labels, Weighting.KNOWN, pairs, List.of(), models, List.of(), List.of());
    }

    private static Curve curve(String name, SpinScheme scheme, LabelRule rule) {
        Curve plain = Curve.of(name, List.of());
        return new Curve(
                name, List.of(), plain.energyOrigin(), plain.innerWall(), plain.outerWall(), scheme, rule, List.of());
    }

    @ParameterizedTest
    @CsvSource({"1s,0,0", "2p,1,0", "5g,4,0", "4s,0,3", "12d,2,9"})
    void atomicNamesCountFromTheOrbital(String name, int orbital, int index) {
        LevelNames names = LevelNames.of(document(LabelConvention.ATOMIC, List.of("x")));
        LevelKey key = new LevelKey("x", "V", ChannelKey.ofOrbital(orbital), index);
        assertThat(names.name(key)).isEqualTo(name);
        assertThat(names.parse(name)).isEqualTo(key);
        assertThat(names.parse(" l=%d n_r=%d ".formatted(orbital, index))).isEqualTo(key);
    }

    @Test
    void hiddenShellsShiftThePrincipalNumber() {
        LabelRule rule = new LabelRule(List.of(new LabelRule.PrincipalOffset(0, 2)), 0);
        LevelNames names =
                LevelNames.of(document(LabelConvention.ATOMIC, List.of("x"), curve("V", SpinScheme.NONE, rule)));
        assertThat(names.shortName(new LevelKey("x", "V", ChannelKey.ofOrbital(0), 0)))
                .isEqualTo("3s");
        assertThatThrownBy(() -> names.parse("2s")).hasMessageContaining("lowest level with l = 0 is 3s");
    }

    @Test
    void oneSpinNeedsItsTotal() {
        LevelNames names = LevelNames.of(
                document(LabelConvention.ATOMIC, List.of("x"), curve("V", SpinScheme.ONE_SPIN, LabelRule.PLAIN)));
        assertThat(names.parse("3p3/2").channel()).isEqualTo(ChannelKey.ofTotal(1, 3));
        assertThat(names.name(names.parse("3p3/2"))).isEqualTo("3p3/2");
        assertThat(names.parse("3s").channel()).isEqualTo(ChannelKey.ofTotal(0, 1));
        assertThatThrownBy(() -> names.parse("3p"))
                .hasMessageContaining("j is missing")
                .hasMessageContaining("3p3/2");
        assertThatThrownBy(() -> names.parse("3p5/2")).hasMessageContaining("does not go with l = 1");
    }

    @ParameterizedTest
    @ValueSource(strings = {"1^3P_1", "1 3P1", "1³P₁"})
    void twoSpinsReadAsPapersPrintThem(String text) {
        LevelNames names = LevelNames.of(
                document(LabelConvention.RADIAL, List.of("x"), curve("V", SpinScheme.TWO_SPINS, LabelRule.PLAIN)));
        LevelKey key = new LevelKey("x", "V", ChannelKey.ofSpins(1, 2, 2), 0);
        assertThat(names.parse(text)).isEqualTo(key);
        assertThat(names.name(key)).isEqualTo("1^3P_1");
    }

    @ParameterizedTest
    @ValueSource(strings = {"v=2 J=7", "2,7", "(2, 7)", "v=2, J=7"})
    void vibrationalNames(String text) {
        LevelNames names = LevelNames.of(document(LabelConvention.VIBRATIONAL, List.of("x")));
        LevelKey key = new LevelKey("x", "V", ChannelKey.ofOrbital(7), 2);
        assertThat(names.parse(text)).isEqualTo(key);
        assertThat(names.name(key)).isEqualTo("v=2 J=7");
    }

    @Test
    void systemAndCurveStandInFrontWhereThereAreSeveral() {
        LevelNames names = LevelNames.of(document(
                LabelConvention.VIBRATIONAL,
                List.of("A-1", "A-2"),
                curve("lower", SpinScheme.NONE, LabelRule.PLAIN),
                curve("upper", SpinScheme.NONE, LabelRule.PLAIN)));
        LevelKey key = new LevelKey("A-2", "upper", ChannelKey.ofOrbital(3), 1);
        assertThat(names.name(key)).isEqualTo("A-2/upper: v=1 J=3");
        assertThat(names.parse("A-2/upper: v=1 J=3")).isEqualTo(key);
        assertThatThrownBy(() -> names.parse("v=1 J=3")).hasMessageContaining("several systems");
        assertThatThrownBy(() -> names.parse("A-3: v=1 J=3"))
                .hasMessageContaining("A-3")
                .hasMessageContaining("did you mean");
    }

    @Test
    void coupledBlocksAreNamedByTotalAndParity() {
        LevelNames names = LevelNames.of(document(LabelConvention.RADIAL, List.of("x")));
        LevelKey key = new LevelKey("x", "V", new ChannelKey(-1, 2, -1, 1), 0);
        assertThat(names.name(key)).isEqualTo("[J=1,+] 0");
        assertThat(names.parse("[J=1,+] 0")).isEqualTo(key);
    }

    @Test
    void sumsOfLevelsReadBack() {
        LevelNames names = LevelNames.of(document(LabelConvention.ATOMIC, List.of("x")));
        for (String text : List.of("3p - 3s", "3p", "-3p", "1/3 * 2p + 2/3 * 3p - 1s", "2 * 2p - 3d", "0.25 * 2p")) {
            assertThat(LevelSums.text(LevelSums.parse(text, names), names)).isEqualTo(text);
        }
        assertThat(LevelSums.parse("3p→3s", names)).isEqualTo(LevelSums.parse("3p - 3s", names));
        assertThat(LevelSums.parse("3p->3s", names)).isEqualTo(LevelSums.parse("3p-3s", names));
    }

    @Test
    void signsInNamesDoNotSplitASum() {
        LevelNames names = LevelNames.of(document(LabelConvention.ATOMIC, List.of("Na-23", "K-39")));
        List<Datum.Contribution> sum = LevelSums.parse("Na-23: 3p - K-39: 4s", names);
        assertThat(sum).hasSize(2);
        assertThat(sum.get(1).level().system()).isEqualTo("K-39");
        assertThat(sum.get(1).coefficient().value()).isEqualTo(-1);
        assertThat(LevelSums.parse("[J=1,-] 0", LevelNames.of(document(LabelConvention.RADIAL, List.of("x")))))
                .hasSize(1);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "3", "p", "3j", "0s", "1p", "3p -", "3p - q", "0*3p", "1/0*3p", "99999999999s"})
    void refusesWhatNamesNoLevel(String text) {
        LevelNames names = LevelNames.of(document(LabelConvention.ATOMIC, List.of("x")));
        assertThatThrownBy(() -> LevelSums.parse(text, names)).isInstanceOf(InvalidModelException.class);
    }
}
