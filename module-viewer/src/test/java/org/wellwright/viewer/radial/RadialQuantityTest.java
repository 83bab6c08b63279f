package org.wellwright.viewer.radial;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.wellwright.solver.radial.RadialState;
import org.wellwright.viewer.Samples;

class RadialQuantityTest {
    private final RadialState state =
            Samples.atom(1, 0).models().get(2).channels().get(0).spectrum().state(0);

    /** 1s of charge 1: u = 2r e^{−r} (Bethe and Salpeter 1957, eq. 3.17). */
    @Test
    void showsWhatItsNameSays() {
        double[] radii = new double[400];
        for (int i = 0; i < radii.length; i++) {
            radii[i] = 0.02 * (i + 1);
        }
        double[] reduced = RadialQuantity.REDUCED.sample(state, radii);
        double[] full = RadialQuantity.FULL.sample(state, radii);
        double[] density = RadialQuantity.DENSITY.sample(state, radii);
        double[] within = RadialQuantity.CUMULATIVE.sample(state, radii);
        for (int i = 0; i < radii.length; i++) {
            double r = radii[i];
            double decay = Math.exp(-r);
            assertThat(reduced[i]).isCloseTo(2 * r * decay, within(1e-12));
            assertThat(full[i]).isCloseTo(2 * decay, within(1e-12));
            assertThat(density[i]).isCloseTo(4 * r * r * decay * decay, within(1e-12));
            assertThat(within[i]).isCloseTo(1 - decay * decay * (1 + 2 * r + 2 * r * r), within(1e-8));
        }
    }

    @Test
    void unitsStandOnTheAxes() {
        assertThat(RadialQuantity.REDUCED.label("bohr")).isEqualTo("u(r) = r R(r) (√(1/bohr))");
        assertThat(RadialQuantity.FULL.label("fm")).isEqualTo("R(r) (√(1/fm³))");
        assertThat(RadialQuantity.DENSITY.label("Å")).isEqualTo("r² R(r)² (1/Å)");
        assertThat(RadialQuantity.CUMULATIVE.label("nm")).isEqualTo("Probability within r");
    }
}
