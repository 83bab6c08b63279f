package org.wellwright.solver.radial;

import org.wellwright.solver.Problem;

/**
 * A wanted level that could not be computed.
 *
 * @param index its position from 0
 * @param problem why, and how to mend it
 */
public record MissingLevel(int index, Problem problem) implements LevelOutcome {}
