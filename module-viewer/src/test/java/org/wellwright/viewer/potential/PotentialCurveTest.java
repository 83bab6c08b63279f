package org.wellwright.viewer.potential;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.wellwright.project.SolvedChannel;
import org.wellwright.viewer.Samples;

class PotentialCurveTest {
    @Test
    void turningPointsAreThoseOfTheClosedForm() {
        // −1/r + l(l+1)/2r² = −1/2n² at r = n² ± n √(n² − l(l+1)).
        SolvedChannel channel = Samples.atom(6, 2).models().get(2).channels().get(2);
        PotentialCurve curve = new PotentialCurve(channel, true);
        for (int n = 3; n <= 6; n++) {
            List<PotentialCurve.Allowed> allowed = curve.allowed(-0.5 / (n * n), 500);
            double root = n * Math.sqrt(n * n - 6.0);
            assertThat(allowed).hasSize(1);
            assertThat(allowed.get(0).from()).isCloseTo(n * n - root, within(1e-9));
            assertThat(allowed.get(0).to()).isCloseTo(n * n + root, within(1e-9));
        }
    }

    @Test
    void withoutTheCentrifugalTermTheWellReachesTheCentre() {
        SolvedChannel channel = Samples.atom(3, 1).models().get(2).channels().get(1);
        List<PotentialCurve.Allowed> allowed = new PotentialCurve(channel, false).allowed(-0.125, 100);
        assertThat(allowed).hasSize(1);
        assertThat(allowed.get(0).from()).isZero();
        assertThat(allowed.get(0).to()).isCloseTo(8, within(1e-9));
    }
}
