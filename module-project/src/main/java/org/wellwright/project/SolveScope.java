package org.wellwright.project;

import java.util.List;

/**
 * Which levels of a project are solved.
 *
 * @param orbitals the l asked for; empty for those that the data name, and some more
 * @param count levels per channel; 0 for those that the data name, and some more
 */
public record SolveScope(List<Integer> orbitals, int count) {
    /** What the data name, and some more. */
    public static final SolveScope USUAL = new SolveScope(List.of(), 0);

    /** Copies the list and checks the count. */
    public SolveScope {
        orbitals = List.copyOf(orbitals);
        if (count < 0) {
            throw new IllegalArgumentException("a count must be >= 0, got " + count);
        }
    }
}
