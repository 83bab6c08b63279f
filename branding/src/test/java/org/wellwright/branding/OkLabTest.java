package org.wellwright.branding;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Color;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class OkLabTest {
    @Test
    void whiteIsLightnessOneWithoutColour() {
        // Ottosson (2020): D65 white maps to L = 1, a = b = 0; his matrices carry ten digits.
        OkLab white = OkLab.of(Color.WHITE);
        assertThat(white.lightness()).isCloseTo(1, within(1e-7));
        assertThat(Math.hypot(white.a(), white.b())).isLessThan(1e-4);
    }

    @ParameterizedTest
    @ValueSource(ints = {0x000000, 0xffffff, 0x123456, 0xfedcba, 0xff0000, 0x00ff00, 0x0000ff, 0x808080})
    void everyScreenColourSurvivesTheWayThereAndBack(int rgb) {
        assertThat(OkLab.of(new Color(rgb)).toColor()).isEqualTo(new Color(rgb));
    }

    @ParameterizedTest
    @EnumSource(ColourVision.class)
    void greyStaysGreyForEveryKindOfColourVision(ColourVision vision) {
        for (int row = 0; row < 3; row++) {
            assertThat(vision.rowSum(row)).isCloseTo(1, within(2e-6));
        }
    }
}
