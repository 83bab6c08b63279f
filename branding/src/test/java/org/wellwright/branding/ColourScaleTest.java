package org.wellwright.branding;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

class ColourScaleTest {
    private static final int STEPS = 32;

    static Stream<Map.Entry<String, ColourScale>> scales() {
        return Stream.of(
                Map.entry("sequential", ColourScale.sequential()),
                Map.entry("diverging", ColourScale.diverging()),
                Map.entry("diverging on dark", ColourScale.divergingOnDark()),
                Map.entry("cyclic", ColourScale.cyclic()));
    }

    @ParameterizedTest
    @MethodSource("scales")
    void equalStepsLookEquallyLarge(Map.Entry<String, ColourScale> scale) {
        double least = Double.MAX_VALUE;
        double most = 0;
        for (int i = 0; i < STEPS; i++) {
            double step = distance(
                    scale.getValue().at((double) i / STEPS), scale.getValue().at((i + 1.0) / STEPS));
            least = Math.min(least, step);
            most = Math.max(most, step);
        }
        // Chords cut the bends of the curve and bytes round it; both stay below a fifth of a step.
        assertThat(most / least).as(scale.getKey()).isLessThan(1.2);
    }

    @ParameterizedTest
    @EnumSource(ColourVision.class)
    void theSequentialScaleGrowsLighterForEveryKindOfColourVision(ColourVision vision) {
        double last = -1;
        for (int i = 0; i <= STEPS; i++) {
            double lightness = lightness(vision, ColourScale.sequential().at((double) i / STEPS));
            assertThat(lightness).as("step %d", i).isGreaterThan(last);
            last = lightness;
        }
    }

    @ParameterizedTest
    @EnumSource(ColourVision.class)
    void theTwoSidesOfADivergingScaleDifferForEveryKindOfColourVision(ColourVision vision) {
        for (ColourScale scale : new ColourScale[] {ColourScale.diverging(), ColourScale.divergingOnDark()}) {
            OkLab low = vision.see(OkLab.of(scale.at(0.1)));
            OkLab high = vision.see(OkLab.of(scale.at(0.9)));
            assertThat(low.distance(high)).isGreaterThan(0.1);
        }
    }

    @ParameterizedTest
    @EnumSource(ColourVision.class)
    void quarterTurnsOfTheCyclicScaleDifferForEveryKindOfColourVision(ColourVision vision) {
        for (int i = 0; i < 4; i++) {
            for (int j = 0; j < i; j++) {
                OkLab one = vision.see(OkLab.of(ColourScale.cyclic().at(i / 4.0)));
                OkLab other = vision.see(OkLab.of(ColourScale.cyclic().at(j / 4.0)));
                assertThat(one.distance(other)).as("quarters %d and %d", i, j).isGreaterThan(0.1);
            }
        }
    }

    @Test
    void theCyclicScaleCloses() {
        assertThat(ColourScale.cyclic().at(1)).isEqualTo(ColourScale.cyclic().at(0));
    }

    @Test
    void valuesOutsideTakeTheNearerEndAndNotANumberIsGrey() {
        ColourScale scale = ColourScale.sequential();
        assertThat(scale.at(-3)).isEqualTo(scale.at(0));
        assertThat(scale.at(7)).isEqualTo(scale.at(1));
        assertThat(scale.at(Double.NaN)).isEqualTo(new Color(0x808080));
    }

    private static double lightness(ColourVision vision, Color colour) {
        return vision.see(OkLab.of(colour)).lightness();
    }

    private static double distance(Color one, Color other) {
        return OkLab.of(one).distance(OkLab.of(other));
    }
}
