package org.wellwright.solver.radial;

/** How sure it is that no level was missed below the energy searched. */
public enum Completeness {
    /** A variational count from below and the exact count of a minorant from above meet. */
    PROVED,
    /** Two independent methods count the same, but V is known only where it was sampled. */
    COUNTED,
    /** The counts differ or a level is missing; the message says why. */
    NO
}
