package org.wellwright.solver.observable;

/**
 * Wavelengths in standard air: dry, 15 °C, 101 325 Pa, 330 ppm of carbon dioxide.
 *
 * <p>n − 1 = 10⁻⁸ [8060.51 + 2480990/(132.274 − σ²) + 17455.7/(39.32957 − σ²)] with the vacuum wavenumber σ in µm⁻¹,
 * for 185 nm to 1690 nm. Source: Peck and Reeder (1972), J. Opt. Soc. Am. 62, 958, eq. 3 (coefficients from memory).
 * Below 200 nm lines are quoted in vacuum (common practice, no source), so that is the lower limit here.
 */
public final class StandardAir {
    /** Shortest vacuum wavelength, nm. */
    public static final double SHORTEST = 200;

    /** Longest vacuum wavelength, nm. */
    public static final double LONGEST = 1690;

    private StandardAir() {}

    /** Whether a vacuum wavelength (nm) lies where the formula holds and air wavelengths are in use. */
    public static boolean covers(double vacuumWavelength) {
        return vacuumWavelength >= SHORTEST && vacuumWavelength <= LONGEST;
    }

    /** The index of refraction n at a vacuum wavelength (nm). */
    public static double index(double vacuumWavelength) {
        double square = square(vacuumWavelength);
        return 1 + 1e-8 * (8060.51 + 2480990 / (132.274 - square) + 17455.7 / (39.32957 - square));
    }

    /** dn/dλ at a vacuum wavelength λ (nm), 1/nm. */
    public static double indexSlope(double vacuumWavelength) {
        double square = square(vacuumWavelength);
        double one = 132.274 - square;
        double other = 39.32957 - square;
        double bySquare = 1e-8 * (2480990 / (one * one) + 17455.7 / (other * other));
        return bySquare * -2 * square / vacuumWavelength;
    }

    private static double square(double vacuumWavelength) {
        double perMicrometre = 1000 / vacuumWavelength;
        return perMicrometre * perMicrometre;
    }
}
