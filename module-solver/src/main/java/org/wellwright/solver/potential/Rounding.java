package org.wellwright.solver.potential;

/**
 * What rounding bounds are made of (Higham 2002, chapters 2 and 3): the unit roundoff and the last step that makes a
 * computed bound a bound.
 */
public final class Rounding {
    /** Unit roundoff u = 2⁻⁵³: a basic operation has relative error at most u. */
    public static final double UNIT = 0x1p-53;

    /**
     * Relative error of {@code Math.exp}, {@code log}, {@code pow}, {@code sin} …: 1 unit in the last place is at most
     * 2u.
     */
    public static final double LIBRARY = 2 * UNIT;

    /** Factor that covers the rounding of the bound itself in up to some thousand operations. */
    public static final double SLACK = 1 + 0x1p-40;

    private Rounding() {}

    /**
     * A bound of relative error {@code units}·u on a computed value, with room for underflow; +∞ if the value is not
     * finite.
     */
    public static double relative(double value, double units) {
        double size = Math.abs(value);
        return size <= Double.MAX_VALUE ? size * (units * UNIT) * SLACK + Double.MIN_VALUE : Double.POSITIVE_INFINITY;
    }
}
