package org.wellwright.solver.radial.steps;

import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.CancellationException;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.SolveMonitor;

/** Isolates levels by counts and refines them by Newton's steps inside the bracket. Used by one thread. */
final class LevelFinder {
    private static final double EPSILON = Math.ulp(1.0);
    private static final int MOST_ITERATIONS = 400;

    private final LevelShooting shooting;
    private final double threshold;
    private final SolveMonitor monitor;
    /** Count of levels below each energy asked so far. */
    private final TreeMap<Double, Integer> counted = new TreeMap<>();

    /**
     * A finder.
     *
     * @param hardyBound an energy below all levels
     */
    LevelFinder(LevelShooting shooting, double threshold, double hardyBound, SolveMonitor monitor) {
        this.shooting = shooting;
        this.threshold = threshold;
        this.monitor = monitor;
        counted.put(hardyBound, 0);
    }

    int count(double energy) {
        if (monitor.cancelled()) {
            throw new CancellationException();
        }
        return counted.computeIfAbsent(energy, shooting::count);
    }

    /**
     * An energy with at least {@code wanted} levels below it, at most {@code ceiling}; the ceiling itself if there are
     * fewer.
     *
     * @param ceiling finite or +∞
     */
    double energyAbove(int wanted, double ceiling) {
        double floor = counted.firstKey();
        double scale = Math.max(Math.abs(floor), Double.MIN_NORMAL) * 1e-3;
        for (int k = 0; k < 1000; k++) {
            double energy;
            if (Double.isFinite(ceiling)) {
                energy = ceiling - Math.scalb(ceiling - floor, -k);
                if (k > 160 || energy == ceiling) {
                    return ceiling;
                }
            } else {
                energy = floor + Math.scalb(scale, k);
            }
            if (count(energy) >= wanted) {
                return energy;
            }
        }
        return ceiling;
    }

    /** The level of this index, which must lie below {@code above}. */
    Level find(int index, double above) {
        double low = counted.firstKey();
        double high = above;
        for (Map.Entry<Double, Integer> entry : counted.entrySet()) {
            if (entry.getValue() <= index) {
                low = Math.max(low, entry.getKey());
            } else {
                high = Math.min(high, entry.getKey());
                break;
            }
        }
        double energy = middle(low, high);
        double last = Double.POSITIVE_INFINITY;
        double before = Double.POSITIVE_INFINITY;
        for (int i = 0; i < MOST_ITERATIONS; i++) {
            if (monitor.cancelled()) {
                throw new CancellationException();
            }
            int count = shooting.countAndStep(energy);
            counted.put(energy, count);
            if (count <= index) {
                low = Math.max(low, energy);
            } else {
                high = Math.min(high, energy);
            }
            double shift = shooting.step();
            double size = Math.abs(shift);
            boolean isolated = count(low) == index && count(high) == index + 1;
            double near = 1e-9 * Math.min(Math.abs(energy) + 1e-300, Math.abs(threshold - energy));
            if (size <= 0.25 * Math.ulp(energy) || size <= near && size >= 0.3 * last) {
                Level level = confirm(index, energy + (size < last ? shift : 0), Math.min(size, last));
                if (level != null) {
                    return level;
                }
                last = Double.POSITIVE_INFINITY;
                before = Double.POSITIVE_INFINITY;
                energy = middle(low, high);
                continue;
            }
            if (high - low <= 2 * Math.ulp(energy)) {
                return level(index, low + 0.5 * (high - low), high - low);
            }
            double next = energy + shift;
            boolean inside = next > low && next < high || size <= near * 1e-3;
            boolean useful = inside && size < 0.5 * before && (isolated || size < 1e-6 * (high - low));
            before = last;
            if (useful) {
                last = size;
                energy = next;
            } else {
                last = Double.POSITIVE_INFINITY;
                before = Double.POSITIVE_INFINITY;
                energy = middle(low, high);
            }
        }
        return level(index, low + 0.5 * (high - low), high - low);
    }

    /** Middle of a bracket; by the ratio of the binding energies where these differ much. */
    private double middle(double low, double high) {
        double deep = threshold - low;
        double shallow = threshold - high;
        if (Double.isFinite(threshold)) {
            if (shallow <= 0) {
                shallow = deep * 1e-4;
            }
            if (deep > 4 * shallow) {
                double energy = threshold - Math.sqrt(deep) * Math.sqrt(shallow);
                if (energy > low && energy < high) {
                    return energy;
                }
            }
        }
        return low + 0.5 * (high - low);
    }

    /** The level if counts on both sides of it agree with its index, else null. */
    private Level confirm(int index, double energy, double shift) {
        Level level = level(index, energy, shift);
        double error = level.errorEstimate();
        for (int i = 0; i < 4; i++) {
            boolean below = shooting.count(energy - error) <= index;
            boolean above = energy + error >= threshold || shooting.count(energy + error) > index;
            if (below && above) {
                return widened(level, error);
            }
            if (error > 1e-7 * level.scale()) {
                return null;
            }
            error *= 8;
        }
        return null;
    }

    private Level level(int index, double energy, double shift) {
        shooting.weigh(energy);
        double kinetic = Math.abs(energy) + shooting.meanPotential();
        double scale = Math.max(kinetic + shooting.meanPotential(), Double.MIN_NORMAL);
        double error = Math.abs(shift) + 2 * EPSILON * scale + shooting.weightedResidue() + Math.ulp(energy);
        return new Level(
                index,
                energy,
                energy - error,
                energy + error,
                Level.BoundKind.ESTIMATE,
                error,
                scale,
                Double.NaN,
                threshold);
    }

    private static Level widened(Level level, double error) {
        double energy = level.energy();
        return new Level(
                level.index(),
                energy,
                energy - error,
                energy + error,
                Level.BoundKind.ESTIMATE,
                error,
                level.scale(),
                level.width(),
                level.threshold());
    }

    /** An energy up to which nothing was missed, given that the search went up to {@code above}. */
    double searchedBelow(int found, double above) {
        double best = counted.firstKey();
        for (Map.Entry<Double, Integer> entry : counted.entrySet()) {
            if (entry.getValue() <= found) {
                best = Math.max(best, entry.getKey());
            }
        }
        return Math.min(best, above);
    }
}
