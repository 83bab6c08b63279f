package org.wellwright.solver.radial.spectral;

import java.util.List;

/**
 * Two-sided bounds of the true operator's levels from the residuals of C¹ trial functions.
 *
 * <p>With E_{n−1} ≤ a &lt; ρ &lt; b ≤ E_{n+1} and ε = ‖Hu − ρu‖ the level lies in [ρ − ε²/(b − ρ), ρ + ε²/(ρ − a)]
 * (Temple 1928; Kato 1949); the lowest level lies below ρ itself.
 */
final class Enclosure {
    private final double[] lower;
    private final double[] upper;

    private Enclosure(int size) {
        lower = new double[size];
        upper = new double[size];
    }

    /**
     * Bounds of all levels.
     *
     * @param above an energy with no further level between the last one and it
     */
    static Enclosure of(List<Solution> levels, double above) {
        int n = levels.size();
        Enclosure result = new Enclosure(n);
        for (int i = 0; i < n; i++) {
            Solution level = levels.get(i);
            double rho = level.smoothEnergy();
            double square = level.residual() * level.residual();
            double next = above;
            if (i + 1 < n) {
                Solution up = levels.get(i + 1);
                next = Math.min(up.smoothEnergy() - up.residual() - up.rounding(), above);
            }
            double down = level.residual();
            if (next - rho > level.residual()) {
                down = square / (next - rho);
            }
            double up = 0;
            if (i > 0) {
                Solution below = levels.get(i - 1);
                double previous = below.smoothEnergy() + below.residual() + below.rounding();
                up = level.residual();
                if (rho - previous > level.residual()) {
                    up = square / (rho - previous);
                }
            }
            result.lower[i] = rho - down - level.rounding();
            result.upper[i] = rho + up + level.rounding();
        }
        return result;
    }

    double lower(int i) {
        return lower[i];
    }

    double upper(int i) {
        return upper[i];
    }
}
