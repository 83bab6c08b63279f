package org.wellwright.viewer.density;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.SolvedChannel;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.radial.RadialState;
import org.wellwright.viewer.Samples;

class DensityPlaneTest {
    /**
     * |ψ|² of 2p, m = 0 and m = 1 and of 3d, m = 0 of charge 1 in closed form (Bethe and Salpeter 1957, sec. 3; atomic
     * units).
     */
    @Test
    void agreesWithTheClosedForms() {
        DensityPlane p0 = plane(1, 0, 0, DensityPlane.Plane.MERIDIAN);
        DensityPlane p1 = plane(1, 0, 1, DensityPlane.Plane.MERIDIAN);
        DensityPlane d0 = plane(2, 0, 0, DensityPlane.Plane.MERIDIAN);
        Random random = new Random(20240501);
        for (int i = 0; i < 5000; i++) {
            double x = 12 * random.nextDouble() - 6;
            double z = 12 * random.nextDouble() - 6;
            double r = Math.hypot(x, z);
            assertThat(p0.at(x, z)).isCloseTo(z * z * Math.exp(-r) / (32 * Math.PI), within(1e-8 * p0.greatest()));
            assertThat(p1.at(x, z)).isCloseTo(x * x * Math.exp(-r) / (64 * Math.PI), within(1e-8 * p1.greatest()));
            double d = (3 * z * z - r * r) * Math.exp(-r / 3) / (81 * Math.sqrt(6 * Math.PI));
            assertThat(d0.at(x, z)).isCloseTo(d * d, within(1e-8 * d0.greatest()));
        }
    }

    @Test
    void theTableIsAsGoodAsItSaysToTwelve() {
        SolvedChannel channel = Samples.atom(12, 0).models().get(2).channels().get(0);
        RadialState state = channel.spectrum().state(11);
        StateDensity density = new StateDensity(state, 0, 0, state.outerRadius());
        Random random = new Random(3);
        double greatest = density.at(0, 0);
        for (int i = 0; i < 5000; i++) {
            double r = 400 * random.nextDouble() + 1e-3;
            double exact = state.value(0, r) / r;
            assertThat(density.at(0, r)).isCloseTo(exact * exact / (4 * Math.PI), within(2e-7 * greatest));
        }
    }

    @Test
    void thePlaneAcrossTheAxisHasNoPOfMZero() {
        DensityPlane across = plane(1, 0, 1, DensityPlane.Plane.EQUATOR);
        assertThat(across.at(1, 2)).isCloseTo(across.at(Math.sqrt(5), 0), within(1e-14));
        assertThat(across.greatest()).isGreaterThan(0);
        assertThat(plane(1, 0, 0, DensityPlane.Plane.EQUATOR).at(1, 2)).isZero();
    }

    private static DensityPlane plane(int orbital, int index, int magnetic, DensityPlane.Plane plane) {
        FigureInput input = Samples.atom(orbital + 1 + index, orbital);
        LevelKey key = input.models().get(2).channels().get(orbital).key(index);
        return DensityPlane.of(input, new FigureSelection("point charge", List.of(key), magnetic), plane);
    }
}
