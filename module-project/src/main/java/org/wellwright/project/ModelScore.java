package org.wellwright.project;

/**
 * How well one model agrees with the data that count.
 *
 * @param model name of the model
 * @param chiSquare χ²
 * @param degrees ν = number of data and priors minus number of free parameters; not positive where nothing can be said
 */
public record ModelScore(String model, double chiSquare, int degrees) {
    /** χ²/ν, NaN where ν is not positive. */
    public double reduced() {
        return degrees > 0 ? chiSquare / degrees : Double.NaN;
    }
}
