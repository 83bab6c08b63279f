package org.wellwright.solver.angular;

import org.apache.commons.math3.complex.Complex;

/**
 * Spherical harmonics Y_lm(θ, φ) = Θ_lm(θ) e^{imφ} with ∫|Y|² dΩ = 1 and the phase of Condon and Shortley, and their
 * real combinations.
 *
 * <p>Θ_lm rises from l = |m| by the three-term recurrence of the normalised associated Legendre functions (Holmes and
 * Featherstone 2002, eq. 11). The start Θ_mm ∝ sin^m θ is kept as mantissa and exponent, so nothing overflows and
 * nothing underflows before the end. Relative error about (l + |m|)·2e-16 of the largest value near by.
 */
public final class SphericalHarmonics {
    private static final double ROOT_HALF_OVER_PI = 0.5 / Math.sqrt(Math.PI);

    private SphericalHarmonics() {}

    /**
     * Θ_lm(θ), the part of Y_lm without e^{imφ}.
     *
     * @param orbital l, ≥ 0
     * @param magnetic m, −l to l
     * @param cosine cos θ
     * @param sine sin θ ≥ 0, given apart so that it keeps its digits near the axis
     * @throws IllegalArgumentException if |m| > l
     */
    public static double polar(int orbital, int magnetic, double cosine, double sine) {
        int m = Math.abs(magnetic);
        if (m > orbital) {
            throw new IllegalArgumentException(
                    "a spherical harmonic needs |m| <= l, got l = %d, m = %d".formatted(orbital, magnetic));
        }
        double before = 0;
        double here = 1;
        for (int l = m + 1; l <= orbital; l++) {
            double top = (double) l * l - (double) m * m;
            double last = (l - 1.0) * (l - 1.0) - (double) m * m;
            double next = Math.sqrt((4.0 * l * l - 1) / top)
                    * (cosine * here - Math.sqrt(last / (4 * (l - 1.0) * (l - 1.0) - 1)) * before);
            before = here;
            here = next;
        }
        double norm = ROOT_HALF_OVER_PI;
        for (int k = 1; k <= m; k++) {
            norm *= Math.sqrt((2 * k + 1.0) / (2 * k));
        }
        double value = ScaledPower.times(here * norm, sine, m);
        return magnetic > 0 && m % 2 != 0 ? -value : value;
    }

    /**
     * Y_lm(θ, φ).
     *
     * @param theta polar angle, rad, 0 to π
     * @param phi azimuth, rad
     * @throws IllegalArgumentException if |m| > l
     */
    public static Complex complex(int orbital, int magnetic, double theta, double phi) {
        double polar = polar(orbital, magnetic, Math.cos(theta), Math.sin(theta));
        return new Complex(polar * Math.cos(magnetic * phi), polar * Math.sin(magnetic * phi));
    }

    /**
     * The real spherical harmonic: √2 |Θ| cos mφ for m > 0, Θ_l0 for m = 0, √2 |Θ| sin |m|φ for m < 0, with the sign
     * that makes l = 1 the functions √(3/4π) x/r (m = 1), y/r (m = −1) and z/r (m = 0).
     *
     * @throws IllegalArgumentException if |m| > l
     */
    public static double real(int orbital, int magnetic, double theta, double phi) {
        // Θ of negative order carries no (−1)^m, which is the sign wanted for both.
        double polar = polar(orbital, -Math.abs(magnetic), Math.cos(theta), Math.sin(theta));
        if (magnetic == 0) {
            return polar;
        }
        return Math.sqrt(2) * polar * (magnetic > 0 ? Math.cos(magnetic * phi) : Math.sin(-magnetic * phi));
    }
}
