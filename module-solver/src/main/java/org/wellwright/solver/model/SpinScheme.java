package org.wellwright.solver.model;

/** Which angular momenta label the channels of a curve. */
public enum SpinScheme {
    /** No spin: l alone. */
    NONE,
    /** One spin (that of the first body): l and j. */
    ONE_SPIN,
    /** Two spins added to S: l, S and J. Channels of equal J and parity couple where a tensor term acts. */
    TWO_SPINS
}
