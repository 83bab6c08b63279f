package org.wellwright.solver.radial.spectral;

import java.util.ArrayList;
import java.util.List;

/**
 * Two-sided bounds of the true operator's levels from the residuals of C¹ trial functions.
 *
 * <p>With E_{n−1} ≤ a &lt; ρ &lt; b ≤ E_{n+1} and ε = ‖Hu − ρu‖ the level lies in [ρ − ε²/(b − ρ), ρ + ε²/(ρ − a)]
 * (Temple 1928; Kato 1949); the lowest level lies below ρ itself. Neighbours too near for that are bounded together,
 * see {@link Cluster}.
 */
final class Enclosure {
    private static final int LARGEST_CLUSTER = 6;

    private final List<Solution> levels;
    private final MeshData mesh;
    private final double above;
    private final double[] lower;
    private final double[] upper;
    private final double[] gap;

    private Enclosure(List<Solution> levels, MeshData mesh, double above) {
        this.levels = levels;
        this.mesh = mesh;
        this.above = above;
        lower = new double[levels.size()];
        upper = new double[levels.size()];
        gap = new double[levels.size()];
    }

    /**
     * Bounds of all levels.
     *
     * @param above an energy with no further level between the last one and it
     */
    static Enclosure of(List<Solution> levels, MeshData mesh, double above) {
        Enclosure result = new Enclosure(levels, mesh, above);
        int n = levels.size();
        for (int i = 0; i < n; i++) {
            result.single(i);
        }
        for (int i = 0; i < n; ) {
            int end = i + 1;
            while (end < n && end - i < LARGEST_CLUSTER && result.tooNear(end - 1, end)) {
                end++;
            }
            if (end > i + 1) {
                result.together(i, end);
            }
            i = end;
        }
        return result;
    }

    /** Whether Temple's inequality with this neighbour would cost more than rounding. */
    private boolean tooNear(int i, int j) {
        Solution a = levels.get(i);
        Solution b = levels.get(j);
        double distance = b.smoothEnergy() - a.smoothEnergy();
        double square = Math.max(a.residual() * a.residual(), b.residual() * b.residual());
        return distance < 4 * (a.residual() + b.residual() + a.rounding() + b.rounding())
                || square > 0.2 * distance * Math.min(a.rounding(), b.rounding())
                        && distance < 1e-3 * (a.scale() + b.scale());
    }

    private double floorOf(int j) {
        if (j >= levels.size()) {
            return above;
        }
        Solution next = levels.get(j);
        return Math.min(next.smoothEnergy() - next.residual() - next.rounding(), above);
    }

    private double ceilingOf(int j) {
        Solution below = levels.get(j);
        return below.smoothEnergy() + below.residual() + below.rounding();
    }

    private void single(int i) {
        Solution level = levels.get(i);
        double rho = level.smoothEnergy();
        double square = level.residual() * level.residual();
        double next = floorOf(i + 1) - rho;
        double down = next > level.residual() ? square / next : level.residual();
        double up = 0;
        gap[i] = next;
        if (i > 0) {
            double previous = rho - ceilingOf(i - 1);
            up = previous > level.residual() ? square / previous : level.residual();
            gap[i] = Math.min(next, previous);
        }
        lower[i] = rho - down - level.rounding();
        upper[i] = rho + up + level.rounding();
    }

    private void together(int from, int to) {
        Quotient quotient = mesh.quotient();
        List<Trial> trials = new ArrayList<>();
        double rounding = 0;
        double reference = 0;
        for (int i = from; i < to; i++) {
            trials.add(smooth(quotient, levels.get(i).trial()));
            rounding = Math.max(rounding, levels.get(i).rounding());
            reference += levels.get(i).smoothEnergy() / (to - from);
        }
        Cluster cluster = ClusterMatrices.of(mesh.grid(), trials, reference);
        double next = floorOf(to);
        double[] low = cluster.bounds(next);
        double[] high = from == 0 ? cluster.ritz() : cluster.bounds(ceilingOf(from - 1));
        for (int i = from; i < to; i++) {
            double rho = levels.get(i).smoothEnergy();
            // Both kinds of bounds hold, so the tighter of each end does.
            double below = low[i - from] - rounding;
            double over = high[i - from] + rounding;
            if (below > lower[i] && below <= rho + rounding) {
                lower[i] = below;
            }
            if (over < upper[i] && over >= rho - rounding) {
                upper[i] = over;
            }
            double room = from > 0 ? Math.min(next - rho, rho - ceilingOf(from - 1)) : next - rho;
            gap[i] = Math.max(gap[i], room);
        }
    }

    private static Trial smooth(Quotient quotient, Trial trial) {
        quotient.evaluate(trial);
        quotient.smooth(trial);
        return trial.with(quotient.smoothCoefficients());
    }

    double lower(int i) {
        return lower[i];
    }

    double upper(int i) {
        return upper[i];
    }

    /** Distance to the nearest level that is not bounded together with this one. */
    double gap(int i) {
        return gap[i];
    }
}
