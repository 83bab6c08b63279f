package org.wellwright.solver.radial;

/**
 * One channel of a radial problem.
 *
 * @param orbital l, the label, ≥ 0
 * @param centrifugal λ in κλ/r²; l(l+1) unless the geometry says otherwise (l² − ¼ in a plane)
 * @param threshold energy added to this channel (0 as a rule)
 */
public record RadialChannel(int orbital, double centrifugal, double threshold) {
    /** Checks that the numbers are usable. */
    public RadialChannel {
        if (orbital < 0 || !Double.isFinite(centrifugal) || !Double.isFinite(threshold)) {
            throw new IllegalArgumentException(
                    "a channel needs l >= 0 and finite numbers, got l = %d, centrifugal %s, threshold %s"
                            .formatted(orbital, centrifugal, threshold));
        }
    }

    /** The ordinary channel of orbital angular momentum l in three dimensions. */
    public static RadialChannel of(int orbital) {
        return new RadialChannel(orbital, (double) orbital * (orbital + 1), 0);
    }
}
