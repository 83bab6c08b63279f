package org.wellwright.editor.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.wellwright.editor.TestProjects;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.LabelRule;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.ChannelFilter;
import org.wellwright.solver.units.Dimension;

class TextsTest {
    private final ModelDocument document = TestProjects.document();

    @ParameterizedTest
    @ValueSource(strings = {"all", "l = 0", "l = 1..3", "l >= 2", "l = 1, j = 1/2 3/2", "l >= 1, S = 1", "j = 2"})
    void channelFiltersReadBack(String text) {
        assertThat(ChannelText.text(ChannelText.parse(text))).isEqualTo(text);
    }

    @Test
    void channelFiltersForgiveSpelling() {
        assertThat(ChannelText.parse("l=0..2")).isEqualTo(ChannelFilter.orbitals(0, 2));
        assertThat(ChannelText.parse("l ≥ 1")).isEqualTo(ChannelFilter.orbitals(1, Integer.MAX_VALUE));
        assertThatThrownBy(() -> ChannelText.parse("s waves")).isInstanceOf(InvalidModelException.class);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "l=0: +2", "l=0: +2, l=1: -1", "v: +1", "l=0: +3, v: -1"})
    void labelRulesReadBack(String text) {
        assertThat(LabelText.text(LabelText.parse(text))).isEqualTo(text);
    }

    @Test
    void labelRulesRefuseTheSameOrbitalTwice() {
        assertThatThrownBy(() -> LabelText.parse("l=0: 1, l=0: 2")).isInstanceOf(IllegalArgumentException.class);
        assertThat(LabelText.parse("l=0: 2")).isNotEqualTo(LabelRule.PLAIN);
    }

    @Test
    void argumentsAreNamesNumbersOrNumbersWithUnits() {
        assertThat(ArgumentText.parse("k", new Dimension(1, 1, 0), null, document))
                .isEqualTo(Argument.named("k"));
        assertThat(ArgumentText.parse("1.2 eV", Dimension.ENERGY, null, document))
                .isEqualTo(new Argument.Literal(1.2, "eV"));
        assertThat(ArgumentText.parse("-3e2", Dimension.ENERGY, null, document)).isEqualTo(Argument.of(-300));
        assertThat(ArgumentText.parse("", Dimension.LENGTH, Argument.UNBOUNDED, document))
                .isEqualTo(Argument.UNBOUNDED);
        assertThat(ArgumentText.text(Argument.UNBOUNDED)).isEmpty();
        assertThat(ArgumentText.text(new Argument.Literal(1.2, "eV"))).isEqualTo("1.2 eV");
    }

    @Test
    void argumentsMustFitTheirPlace() {
        assertThatThrownBy(() -> ArgumentText.parse("radius", Dimension.ENERGY, null, document))
                .hasMessageContaining("does not fit")
                .hasMessageContaining("cm^-1");
        assertThatThrownBy(() -> ArgumentText.parse("1.2 nm", Dimension.ENERGY, null, document))
                .hasMessageContaining("does not fit");
        assertThatThrownBy(() -> ArgumentText.parse("dept", Dimension.ENERGY, null, document))
                .hasMessageContaining("no parameter 'dept'")
                .hasMessageContaining("depth");
    }

    @ParameterizedTest
    @CsvSource({
        "0.52134567, 0.0012345, 0.5213(12)",
        "2.2259, 0.078, 2.226(78)",
        "-13.6, 0.25, -13.60(25)",
        "16956.17, 3, 16956.2(30)",
        "123456, 120, 123460(120)",
        "1.2345678e-7, 2.5e-10, 1.2346(25)e-7",
        "0.5, 0, 0.5",
        "NaN, 1, —",
    })
    void computedNumbersShowTheDigitsTheyAreWorth(double value, double sigma, String text) {
        assertThat(Uncertain.text(value, sigma)).isEqualTo(text);
    }
}
