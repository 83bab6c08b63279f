package org.wellwright.solver.pair;

/**
 * Which mass of a body enters the kinetic energy. Elementary particles and typed masses are taken as they are under
 * every convention.
 */
public enum MassConvention {
    /** The neutral atom's mass. */
    ATOMIC,
    /**
     * The bare nucleus: atom minus all its electrons (their binding, below 1e-8 of light atoms' mass, is neglected).
     */
    NUCLEAR,
    /** The atom minus as many electrons as the body's charge says (plus, for a negative charge). */
    ION,
    /** Effective masses typed by the user, as in a solid. */
    EFFECTIVE,
    /** At least one mass is a parameter of the pool, as a quark mass. */
    MODEL_PARAMETER
}
