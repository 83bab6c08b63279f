package org.wellwright.solver.model;

/** What the uncertainties of the data mean. */
public enum Weighting {
    /** Standard uncertainties as stated. */
    KNOWN,
    /** Known up to one common factor, which the fit takes as √(χ²/ν). */
    KNOWN_UP_TO_SCALE,
    /** Not known: all data weigh alike (in energy), and the scatter of the fit gives σ. */
    MISSING
}
