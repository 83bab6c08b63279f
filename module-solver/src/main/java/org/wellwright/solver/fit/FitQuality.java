package org.wellwright.solver.fit;

/**
 * How well a model meets the data.
 *
 * @param chiSquare Σ (residual/σ)² over used data, priors and group errors, with σ as stated (σ = 1 unit where it is
 *     missing)
 * @param observations used data plus priors plus group errors of known σ
 * @param adjusted free parameters plus group errors
 * @param logLikelihood natural logarithm of the likelihood at the values given, normalisation included; NaN where σ is
 *     missing
 */
public record FitQuality(double chiSquare, int observations, int adjusted, double logLikelihood) {
    /** ν = observations − adjusted; may be 0 or less. */
    public int degreesOfFreedom() {
        return observations - adjusted;
    }

    /** χ²/ν; NaN if ν ≤ 0. */
    public double reducedChiSquare() {
        return degreesOfFreedom() > 0 ? chiSquare / degreesOfFreedom() : Double.NaN;
    }

    /** Akaike's criterion for known σ, χ² + 2k (Akaike 1974): the smaller, the better. */
    public double criterion() {
        return chiSquare + 2.0 * adjusted;
    }
}
