package org.wellwright.solver;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;

/** Compares a computed number with a published one of which so many figures are to be trusted. */
public final class PublishedDigits {
    private PublishedDigits() {}

    /** The two differ by at most one unit of the last trusted figure. */
    public static void assertAgree(String id, double computed, String published, int digits) {
        BigDecimal value = new BigDecimal(published);
        BigDecimal unit = value.round(new MathContext(digits)).ulp();
        // Trailing zeros count as figures even where the text has fewer.
        int exponent = value.precision() - value.scale() - digits;
        BigDecimal step = unit.max(BigDecimal.ONE.scaleByPowerOfTen(exponent));
        assertThat(new BigDecimal(computed).subtract(value).abs())
                .as("%s: computed %s, published %s", id, computed, published)
                .isLessThanOrEqualTo(step);
    }
}
