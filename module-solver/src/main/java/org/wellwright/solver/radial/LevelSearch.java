package org.wellwright.solver.radial;

/**
 * Which levels of a problem are wanted, and how well.
 *
 * @param count the first {@code count} levels; {@link #ALL} for every one below {@code below}
 * @param below only levels below this energy; +∞ means below the lowest threshold
 * @param tolerance half-width of the bounds asked for, relative to max(|E|, ⟨T⟩ + ⟨|V|⟩); {@link #FULL} asks for the
 *     limit of the arithmetic
 */
public record LevelSearch(int count, double below, double tolerance) {
    /** No limit on the number of levels. */
    public static final int ALL = Integer.MAX_VALUE;

    /** The honest limit of the arithmetic. */
    public static final double FULL = 0;

    /** Checks the numbers. */
    public LevelSearch {
        if (count < 1 || Double.isNaN(below) || !(tolerance >= 0 && tolerance < 1)) {
            throw new IllegalArgumentException(
                    "a search needs count >= 1, an energy and 0 <= tolerance < 1, got %d, %s, %s"
                            .formatted(count, below, tolerance));
        }
    }

    /** The first levels at full accuracy. */
    public static LevelSearch first(int count) {
        return new LevelSearch(count, Double.POSITIVE_INFINITY, FULL);
    }

    /** All levels below the threshold at full accuracy. */
    public static LevelSearch all() {
        return first(ALL);
    }
}
