package org.wellwright.solver.radial.steps;

import org.wellwright.solver.potential.TailBehaviour;

/** What a {@link PotentialScan} looks at: V(r), or for coupled channels the lowest curve of V + κλ/r². */
interface SampledPotential {
    /** Fills {@code into[i] = V(radii[i])}, energy. */
    void values(double[] radii, double[] into, int count);

    /** V at one radius. */
    double value(double radius);

    /** A bound on the rounding inside {@link #value}, energy. */
    double roundingBound(double radius);

    /** Break points in ascending order; not to be changed. */
    double[] breaks();

    /** Behaviour at r → ∞, as declared. */
    TailBehaviour tail();

    /** Takes V as the constant {@code value} beyond {@code radius}, where its formula has no number any more. */
    void cutAt(double radius, double value);
}
