package org.wellwright.solver.pair;

/** What exchanging the two bodies does. */
public enum ExchangeSymmetry {
    /** The bodies differ. */
    DISTINGUISHABLE,
    /** Identical bodies of integer spin. */
    IDENTICAL_BOSONS,
    /** Identical bodies of half-integer spin. */
    IDENTICAL_FERMIONS,
    /** A particle and its antiparticle. */
    PARTICLE_ANTIPARTICLE
}
