package org.wellwright.viewer.density;

import org.wellwright.solver.angular.SphericalHarmonics;
import org.wellwright.solver.radial.RadialState;

/**
 * |R(r) Y_lm|² of an uncoupled state, length⁻³. R comes from a table of 4,096 equal steps of √r to {@link #end} by
 * cubic interpolation (error below 1e-7 of its maximum for n ≤ 12); beyond the end the density is 0. Immutable,
 * thread-safe.
 */
final class StateDensity {
    private static final int STEPS = 4096;

    private final double[] radial = new double[STEPS + 4];
    private final int orbital;
    private final int magnetic;
    private final double end;

    StateDensity(RadialState state, int orbital, int magnetic, double end) {
        this.orbital = orbital;
        this.magnetic = magnetic;
        this.end = end;
        // The k-th place holds R at √r = (k − 1) steps; R is an even function of √r.
        for (int k = 2; k < radial.length; k++) {
            double root = (k - 1.0) / STEPS;
            double r = end * root * root;
            radial[k] = state.value(0, r) / r;
        }
        radial[0] = radial[2];
        radial[1] = orbital > 0 ? 0 : (15 * radial[2] - 6 * radial[3] + radial[4]) / 10;
    }

    /** Where the table ends. */
    double end() {
        return end;
    }

    /**
     * The density.
     *
     * @param axial distance from the axis of quantisation, ≥ 0
     * @param along distance along that axis
     */
    double at(double axial, double along) {
        double r = Math.sqrt(axial * axial + along * along);
        double value = r == 0
                ? radialPart(0) * SphericalHarmonics.polar(orbital, magnetic, 1, 0)
                : radialPart(r) * SphericalHarmonics.polar(orbital, magnetic, along / r, axial / r);
        return value * value;
    }

    private double radialPart(double r) {
        double t = Math.sqrt(r / end) * STEPS;
        if (t > STEPS) {
            return 0;
        }
        int i = (int) t;
        double s = t - i;
        double a = radial[i];
        double b = radial[i + 1];
        double c = radial[i + 2];
        double d = radial[i + 3];
        // Lagrange's cubic through four neighbours.
        return b + s * (c - a / 3 - b / 2 - d / 6 + s * ((a + c) / 2 - b + s * ((b - c) / 2 + (d - a) / 6)));
    }
}
