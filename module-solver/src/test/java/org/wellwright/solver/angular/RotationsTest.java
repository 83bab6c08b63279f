package org.wellwright.solver.angular;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.RotationConvention;
import org.apache.commons.math3.geometry.euclidean.threed.RotationOrder;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.api.Test;

class RotationsTest {
    @Test
    void rowsAreOrthonormal() {
        Random random = new Random(20240501);
        for (int trial = 0; trial < 60; trial++) {
            int j = random.nextInt(121);
            double beta = random.nextDouble() * Math.PI;
            int first = j - 2 * random.nextInt(j + 1);
            int second = j - 2 * random.nextInt(j + 1);
            double sum = 0;
            for (int m = -j; m <= j; m += 2) {
                sum += Rotations.smallD(j, first, m, beta) * Rotations.smallD(j, second, m, beta);
            }
            assertThat(sum)
                    .as("2j = %d, rows %d %d, beta %s", j, first, second, beta)
                    .isCloseTo(first == second ? 1 : 0, within(1e-13));
        }
    }

    @Test
    void turningTwiceAddsTheAngles() {
        int j = 31;
        double[][] first = Rotations.smallDMatrix(j, 0.83);
        double[][] second = Rotations.smallDMatrix(j, -2.41);
        double[][] both = Rotations.smallDMatrix(j, 0.83 - 2.41);
        for (int row = 0; row <= j; row++) {
            for (int column = 0; column <= j; column++) {
                double sum = 0;
                for (int k = 0; k <= j; k++) {
                    sum += first[row][k] * second[k][column];
                }
                assertThat(sum).isCloseTo(both[row][column], within(1e-13));
            }
        }
    }

    @Test
    void aFullTurnChangesTheSignOfHalfIntegerSpin() {
        assertThat(Rotations.smallD(3, 3, 1, 0.4 + 2 * Math.PI))
                .isCloseTo(-Rotations.smallD(3, 3, 1, 0.4), within(1e-15));
        assertThat(Rotations.smallD(4, 4, 2, 0.4 + 2 * Math.PI))
                .isCloseTo(Rotations.smallD(4, 4, 2, 0.4), within(1e-15));
    }

    @Test
    void rotatedHarmonicIsTheHarmonicAtBackRotatedPoints() {
        Random random = new Random(7);
        for (int trial = 0; trial < 50; trial++) {
            int l = random.nextInt(9);
            int m = random.nextInt(2 * l + 1) - l;
            double alpha = 6 * random.nextDouble();
            double beta = 3 * random.nextDouble();
            double gamma = 6 * random.nextDouble();
            Vector3D point = new Vector3D(6 * random.nextDouble(), 3 * random.nextDouble() - 1.5);
            Rotation rotation = new Rotation(RotationOrder.ZYZ, RotationConvention.VECTOR_OPERATOR, alpha, beta, gamma);
            Vector3D back = rotation.applyInverseTo(point);
            Complex sum = Complex.ZERO;
            for (int k = -l; k <= l; k++) {
                sum = sum.add(
                        Rotations.bigD(2 * l, 2 * k, 2 * m, alpha, beta, gamma).multiply(at(l, k, point)));
            }
            assertThat(sum.subtract(at(l, m, back)).abs()).as("l %d m %d", l, m).isLessThan(1e-12);
        }
    }

    @Test
    void refusesAProjectionOutOfStepNamingIt() {
        assertThatThrownBy(() -> Rotations.smallD(3, 2, 1, 0.1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("2m = 2");
        assertThatThrownBy(() -> Rotations.smallD(2, 4, 0, 0.1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("2m = 4");
    }

    private static Complex at(int l, int m, Vector3D point) {
        return SphericalHarmonics.complex(l, m, Math.PI / 2 - point.getDelta(), point.getAlpha());
    }
}
