package org.wellwright.project.report;

import org.apache.commons.math3.special.Gamma;
import org.wellwright.solver.fit.FitQuality;

/** Probabilities that a report states. */
final class Significance {
    private Significance() {}

    /**
     * Chance of a larger χ² with ν degrees of freedom, Q(ν/2, χ²/2) (Abramowitz and Stegun 1964, eq. 26.4.19); NaN if ν
     * ≤ 0.
     */
    static double chiSquareTail(FitQuality quality) {
        int degrees = quality.degreesOfFreedom();
        return degrees > 0 ? Gamma.regularizedGammaQ(degrees / 2.0, quality.chiSquare() / 2) : Double.NaN;
    }
}
