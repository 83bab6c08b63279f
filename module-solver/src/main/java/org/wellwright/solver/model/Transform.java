package org.wellwright.solver.model;

/** How a combination of levels E = Σ c_k E_k becomes the measured number. */
public enum Transform {
    /** E itself: a level, a line, a splitting, a centroid; the unit may be an energy, a wavenumber or a frequency. */
    NONE,
    /** λ = hc/E in vacuum. */
    VACUUM_WAVELENGTH,
    /** λ = hc/(n E) in standard air. */
    AIR_WAVELENGTH,
    /** ν = E/h. */
    FREQUENCY,
    /** Energy of the photon that the free pair emits: E (1 − E/(2 M c²)), M the mass of the upper level. */
    PHOTON_EMISSION,
    /** Energy of the photon that the free pair absorbs: E (1 + E/(2 M c²)), M the mass of the lower level. */
    PHOTON_ABSORPTION,
    /** Σ c_k (m₁ + m₂ + E_k/c²). */
    ABSOLUTE_MASS,
    /** Σ c_k E_k divided by Σ d_k E_k. */
    RATIO,
    /** ⟨r^k⟩^(1/k) of one level. */
    RADIUS,
    /** Width of one level. */
    WIDTH,
    /** Rate of one transition, from the level with the positive to that with the negative coefficient. */
    RATE
}
