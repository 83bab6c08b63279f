package org.wellwright.project;

import java.util.Objects;
import org.wellwright.solver.model.LevelKey;

/**
 * One line of a spectrum.
 *
 * @param model name of the model that predicts it; empty if it was measured
 * @param upper the upper level
 * @param lower the lower level
 * @param energy transition energy, the project's energy unit
 * @param sigma standard uncertainty of {@code energy}; NaN if not known
 * @param strength absorption oscillator strength; NaN if not known
 */
public record SpectralLine(String model, LevelKey upper, LevelKey lower, double energy, double sigma, double strength) {
    /** Checks that nothing is missing. */
    public SpectralLine {
        Objects.requireNonNull(model, "model");
        Objects.requireNonNull(upper, "upper");
        Objects.requireNonNull(lower, "lower");
    }
}
