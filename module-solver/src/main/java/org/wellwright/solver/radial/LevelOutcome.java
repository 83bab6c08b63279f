package org.wellwright.solver.radial;

/**
 * What became of one wanted level: found, or missing with the reason; one that fails does not take the others with it.
 */
public sealed interface LevelOutcome permits Level, MissingLevel {
    /** Position in the order of energy, from 0; the node count in an uncoupled channel. */
    int index();
}
