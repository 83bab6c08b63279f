package org.wellwright.example;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.openide.util.Lookup;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.PotentialFamily;
import org.wellwright.solver.potential.TermEvaluator;

class GaussianFamilyTest {
    private static final ChannelFacts S_WAVE = ChannelFacts.ofOrbital(0);

    private final PotentialFamily family = Lookup.getDefault().lookupAll(PotentialFamily.class).stream()
            .filter(found -> found.id().equals("example-gaussian"))
            .findFirst()
            .orElseThrow();

    @Test
    void fallsToOneOverEAtItsRange() {
        TermEvaluator well = family.bind(new double[] {3, 2}, S_WAVE);
        assertThat(well.value(2)).isCloseTo(-3 / Math.E, within(1e-15));
    }

    @Test
    void derivativesAgreeWithDifferences() {
        Random random = new Random(20240501);
        double h = 1e-5;
        for (int i = 0; i < 100; i++) {
            double depth = random.nextDouble(0.1, 5);
            double range = random.nextDouble(0.5, 3);
            double r = random.nextDouble(0.1, 4);
            TermEvaluator well = family.bind(new double[] {depth, range}, S_WAVE);
            assertThat(well.slope(r)).isCloseTo((well.value(r + h) - well.value(r - h)) / (2 * h), within(1e-8));
            for (int p = 0; p < 2; p++) {
                double[] up = {depth, range};
                double[] down = {depth, range};
                up[p] += h;
                down[p] -= h;
                double difference = (family.bind(up, S_WAVE).value(r)
                                - family.bind(down, S_WAVE).value(r))
                        / (2 * h);
                assertThat(well.parameterDerivative(p, r)).isCloseTo(difference, within(1e-8));
            }
        }
    }

    @Test
    void theIntervalHoldsEveryValueBetweenItsEnds() {
        Random random = new Random(20240502);
        for (double depth : new double[] {2, -2}) {
            TermEvaluator well = family.bind(new double[] {depth, 1.5}, S_WAVE);
            for (int i = 0; i < 200; i++) {
                double from = random.nextDouble(0.01, 5);
                double to = from + random.nextDouble(0, 5);
                double r = from + (to - from) * random.nextDouble();
                assertThat(well.enclose(from, to).contains(well.value(r))).isTrue();
                assertThat(well.enclose(from, Double.POSITIVE_INFINITY).contains(well.value(r)))
                        .isTrue();
            }
        }
    }

    @Test
    void refusesARangeThatIsNotAboveZero() {
        assertThatThrownBy(() -> family.bind(new double[] {1, 0}, S_WAVE))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("range a must be above zero");
    }
}
