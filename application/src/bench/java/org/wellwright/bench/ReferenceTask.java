package org.wellwright.bench;

import java.util.List;
import java.util.function.DoubleSupplier;
import org.wellwright.solver.potential.BreakPoint;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.Level;

/**
 * What the reference methods are handed so that they do their best: V, the levels' energies to compare with, and the
 * radii between which the highest level lives (20 units of action into the forbidden regions).
 */
final class ReferenceTask {
    private static final double ACTION = 20;

    final TermEvaluator potential;
    final double kinetic;
    final double inner;
    final double outer;
    final double[] energies;
    final double[] scales;

    /** Finds the radii for the given levels, lowest first. */
    ReferenceTask(BoundCase problem, List<Level> levels) {
        potential = problem.potential();
        kinetic = problem.kinetic();
        energies = levels.stream()
                .mapToDouble(level -> problem.exact() == null
                        ? level.energy()
                        : problem.exact().applyAsDouble(level.index()))
                .toArray();
        scales = levels.stream().mapToDouble(Level::scale).toArray();
        inner = innerRadius(energies[energies.length - 1]);
        outer = outerRadius(energies[energies.length - 1]);
    }

    double value(double r) {
        return potential.value(r);
    }

    /** Radii between two where V is not smooth, in the order they are met. */
    double[] edges(double from, double to) {
        double[] ascending = potential.breakPoints().stream()
                .mapToDouble(BreakPoint::radius)
                .filter(r -> r > Math.min(from, to) && r < Math.max(from, to))
                .toArray();
        double[] met = ascending.clone();
        for (int i = 0; i < met.length && to < from; i++) {
            met[i] = ascending[met.length - 1 - i];
        }
        return met;
    }

    /** Radius of the innermost classically allowed sample, seen from small r. */
    double firstAllowed(double energy) {
        double r = 1e-9;
        while (!(value(r) < energy)) {
            r *= 1.003;
        }
        return r;
    }

    double lastAllowed(double energy) {
        double r = 1e9;
        while (!(value(r) < energy)) {
            r /= 1.003;
        }
        return r;
    }

    private double innerRadius(double energy) {
        double r = firstAllowed(energy);
        double action = 0;
        while (action < ACTION && r > 1e-8) {
            double next = r / 1.003;
            action += (r - next) * Math.sqrt(Math.max(0, (value(next) - energy) / kinetic));
            r = next;
        }
        return r > 1e-8 ? r : 0;
    }

    /** End of the outer forbidden region of a level. */
    double outerRadius(double energy) {
        double r = lastAllowed(energy);
        double action = 0;
        while (action < ACTION) {
            double next = r * 1.003;
            action += (next - r) * Math.sqrt(Math.max(0, (value(next) - energy) / kinetic));
            r = next;
        }
        return r;
    }

    /**
     * Largest error of energies in the order of the levels, relative to each level's scale; +∞ if there are too few.
     */
    double error(double[] found) {
        double worst = found.length < energies.length ? Double.POSITIVE_INFINITY : 0;
        for (int i = 0; i < Math.min(found.length, energies.length); i++) {
            worst = Math.max(worst, Math.abs(found[i] - energies[i]) / scales[i]);
        }
        return worst;
    }

    /** Least of up to three timings, in ms; the results are summed so that none can be left out. */
    static double millis(DoubleSupplier work) {
        double best = Double.POSITIVE_INFINITY;
        double sum = 0;
        long begin = System.nanoTime();
        for (int i = 0; i < 3 && System.nanoTime() - begin < 500_000_000L; i++) {
            long start = System.nanoTime();
            sum += work.getAsDouble();
            best = Math.min(best, (System.nanoTime() - start) / 1e6);
        }
        if (Double.isNaN(sum)) {
            throw new IllegalStateException("a reference method gave no number");
        }
        return best;
    }
}
