package org.wellwright.solver.units;

/**
 * A physical dimension energy^a · length^b · mass^c.
 *
 * @param energy exponent a
 * @param length exponent b
 * @param mass exponent c
 */
public record Dimension(int energy, int length, int mass) {
    /** A pure number. */
    public static final Dimension NONE = new Dimension(0, 0, 0);

    /** An energy. */
    public static final Dimension ENERGY = new Dimension(1, 0, 0);

    /** A length. */
    public static final Dimension LENGTH = new Dimension(0, 1, 0);

    /** A mass. */
    public static final Dimension MASS = new Dimension(0, 0, 1);

    /** The product of two dimensions. */
    public Dimension times(Dimension other) {
        return new Dimension(energy + other.energy, length + other.length, mass + other.mass);
    }

    /** The dimension to an integer power. */
    public Dimension power(int exponent) {
        return new Dimension(energy * exponent, length * exponent, mass * exponent);
    }
}
